const celsius = (T: number): string => `${Number((T - 273.15).toFixed(2))} degC`;
const pressure = (p: number): string => (p < 1e6 ? `${Number((p / 1e3).toPrecision(4))} kPa` : `${Number((p / 1e6).toPrecision(4))} MPa`);
const state = (T: number, p: number): string => `${celsius(T)} and ${pressure(p)}`;

/** What the property models tell the reader; temperatures come in K, pressures in Pa. */
export const says = {
  property: (key: string, fluid: string, text: string): string => `${key} of ${fluid}: ${text}`,

  outsideTemperature: (T: number, from: number, to: number): string =>
    `${celsius(T)} is outside ${celsius(from)} to ${celsius(to)}, where this model holds`,
  outsideLiquidWater: (T = Number.NaN, p = Number.NaN): string =>
    `${state(T, p)} is outside 0 to 350 degC and 100 MPa, where the equation for liquid water holds`,
  outsideSteam: (T = Number.NaN, p = Number.NaN): string =>
    `${state(T, p)} is outside the equation for steam (0 to 800 degC, up to 100 MPa, not the dense region around the critical point)`,
  boils: (T: number, p: number, by: number): string =>
    `at ${pressure(p)} water boils ${Number(by.toPrecision(3))} K below ${celsius(T)}; give the pressure it is under as \`pressure\`, or name the fluid steam`,
  mayBoil: (T: number, p: number, by: number, limit: number): string =>
    `at ${state(T, p)} the liquid is ${Number(by.toPrecision(2))} K above its boiling point; liquid properties are used up to ${limit} K above it, boiling is not modelled`,
  condenses: (T: number, p: number, by: number): string =>
    `at ${pressure(p)} steam condenses ${Number(by.toPrecision(3))} K above ${celsius(T)}; give the pressure it is under as \`pressure\`, or name the fluid water`,
  mayCondense: (T: number, p: number, by: number, limit: number): string =>
    `at ${state(T, p)} steam is ${Number(by.toPrecision(2))} K below its dew point; vapour properties are used up to ${limit} K below it, condensation is not modelled`,

  pressureAssumed: (fluid: string, key: string): string => `No ${key} is given for ${fluid}: its properties are taken at 101.325 kPa.`,
  pressureAmbient: (fluid: string, key: string): string => `No ${key} is given for ${fluid}: its properties are taken at ambient_pressure.`,
  accuracyNotStated: (what: string): string => `The source states no accuracy for the ${what}: it counts as exact.`,
};
