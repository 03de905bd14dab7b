/** One gas in a mixture: mole fraction, molar mass kg/mol, viscosity Pa s, thermal conductivity W/(m K). */
export interface Part {
  readonly x: number;
  readonly molarMass: number;
  readonly viscosity: number;
  readonly conductivity: number;
}

/** Wilke's interaction factor: C. R. Wilke, J. Chem. Phys. 18 (1950) 517. */
const interaction = (a: Part, b: Part): number =>
  (1 + Math.sqrt(a.viscosity / b.viscosity) * (b.molarMass / a.molarMass) ** 0.25) ** 2 / Math.sqrt(8 * (1 + a.molarMass / b.molarMass));

const mixed = (parts: readonly Part[], of: (part: Part) => number): number =>
  parts.reduce((sum, a) => (a.x === 0 ? sum : sum + (a.x * of(a)) / parts.reduce((all, b) => all + b.x * interaction(a, b), 0)), 0);

/** Viscosity of a gas mixture at low pressure in Pa s: Wilke 1950. */
export const mixtureViscosity = (parts: readonly Part[]): number => mixed(parts, ({ viscosity }) => viscosity);

/** Thermal conductivity of a gas mixture at low pressure in W/(m K): Wassiljewa's sum with the factors of Mason and Saxena 1958 (their 1.065 taken as 1). */
export const mixtureConductivity = (parts: readonly Part[]): number => mixed(parts, ({ conductivity }) => conductivity);
