/** Diffusivity estimators, SI in and out: K, Pa s, kg/mol, m^3/mol, Pa, m^2/s. */

/** Boltzmann constant, J/K: SI 2019, exact. */
const BOLTZMANN = 1.380649e-23;

/** Wilke and Chang 1955: a dilute solute in a liquid. The 1e-12 and powers of ten turn cP, g/mol, cm^3/mol and cm^2/s into SI. */
export const wilkeChang = (T: number, viscosity: number, soluteVolume: number, solventMass: number, association: number): number =>
  (7.4e-12 * Math.sqrt(association * 1e3 * solventMass) * T) / (1e3 * viscosity * (1e6 * soluteVolume) ** 0.6);

/** Hayduk and Laudie 1974: a dilute non-electrolyte in water. Needs only the viscosity of water and the solute's molar volume at its boiling point. */
export const haydukLaudie = (viscosity: number, soluteVolume: number): number =>
  13.26e-9 / ((1e3 * viscosity) ** 1.14 * (1e6 * soluteVolume) ** 0.589);

/** Stokes and Einstein: a sphere that is large beside the molecules of the liquid. */
export const stokesEinstein = (T: number, viscosity: number, radius: number): number =>
  (BOLTZMANN * T) / (6 * Math.PI * viscosity * radius);

/** Fuller, Schettler and Giddings 1966, constants of Fuller, Ensley, Giddings 1969: two gases at low pressure; diffusion volumes as the sums of the authors' increments (cm^3/mol). */
export function fuller(T: number, p: number, massA: number, massB: number, volumeA: number, volumeB: number): number {
  const mass = 2e3 / (1 / massA + 1 / massB);
  return (0.00143e-4 * T ** 1.75) / ((p / 1e5) * Math.sqrt(mass) * (Math.cbrt(volumeA) + Math.cbrt(volumeB)) ** 2);
}
