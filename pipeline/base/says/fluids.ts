const celsius = (T: number): string => `${Number((T - 273.15).toFixed(2))} degC`;
const pressure = (p: number): string => (p < 1e6 ? `${Number((p / 1e3).toPrecision(4))} kPa` : `${Number((p / 1e6).toPrecision(4))} MPa`);
const state = (T: number, p: number): string => `${celsius(T)} and ${pressure(p)}`;

/** A condition with its number, temperatures in degC. */
const condition = (name: string, value: number): string =>
  name === 'temperature'
    ? `${name} ${celsius(value)}`
    : name === 'pressure'
      ? `${name} ${pressure(value)}`
      : `${name} ${Number(value.toPrecision(5))}`;
const conditions = (names: readonly string[], values: readonly number[]): string =>
  names.map((name, k) => condition(name, values[k]!)).join(', ');

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

  tooDense: (T: number, p: number, most: number): string =>
    `${state(T, p)} is too dense for the equations of a gas at low pressure, which hold up to ${pressure(most)} at that temperature; give the properties as quantities or as a table`,
  denseGas: (T: number, p: number): string =>
    `at ${state(T, p)} the equations of a gas at low pressure are used; it is dense enough for them to be some percent off`,

  outsideHumidAir: (T: number, p: number, from: number, to: number, most: number): string =>
    `${state(T, p)} is outside ${celsius(from)} to ${celsius(to)} and ${pressure(most)}, where this model of humid air holds`,
  noHumidity: (phi: number, T: number, p: number): string =>
    `a relative humidity of ${Number((100 * phi).toPrecision(4))} % at ${state(T, p)} is not possible; it runs from 0 to 100 %, and the vapour pressure stays below the pressure`,
  belowDewPoint: (T: number, bulk: number, phi: number): string =>
    `${celsius(T)} is below the dew point of air with ${Number((100 * phi).toPrecision(3))} % relative humidity at ${celsius(bulk)}; condensation is not modelled`,
  humiditySame: 'Humid air at film and wall is taken to hold as much vapour as in the bulk.',
  noMassFraction: (w: number, from: number, to: number): string =>
    `a mass fraction of ${Number(w.toPrecision(4))} is outside ${from} to ${to}, where this model holds`,
  frozen: (T: number, freezing: number, w: number): string =>
    `${celsius(T)} is below the freezing point of ${celsius(freezing)} at a mass fraction of ${Number(w.toPrecision(3))}`,
  statedFor: (T: number, from: number, to: number): string =>
    `its accuracy is stated for ${celsius(from)} to ${celsius(to)}; at ${celsius(T)} it is an extrapolation`,

  outsideTable: (name: string, value: number, from: number, to: number): string =>
    `${condition(name, value)} is outside the table, which runs from ${condition(name, from)} to ${condition(name, to)}; nothing is extrapolated, so add rows to it`,
  tableBy: (name: string, known: readonly string[]): string =>
    `a table of properties cannot run over ${name}; it runs over one or two of ${known.join(', ')}`,
  tableNoColumn: (name: string): string => `the table of properties has no column ${name}, over which it is to run`,
  tableNotNumbers: (name: string): string => `the table of properties has a ${name} that is not a number`,
  tableShort: (name: string): string => `the table of properties needs at least two different values of ${name}`,
  tableTwice: (names: readonly string[], values: readonly number[]): string =>
    `the table of properties has two rows for ${conditions(names, values)}`,
  tableHole: (names: readonly string[], values: readonly number[], count: number): string =>
    `the table of properties has no row for ${conditions(names, values)}${count > 1 ? ` and ${count - 1} further places` : ''}; it must give every combination of ${names.join(' and ')}`,
  tableEmpty: (by: readonly string[]): string => `the table of properties has no column besides ${by.join(' and ')}`,
  tableNotPositive: (name: string): string => `the table of properties has a ${name} that is not above zero`,

  needsPositive: (gives: string, keys: readonly string[], values: readonly number[]): string =>
    `${gives} cannot be estimated: ${keys.map((key, k) => `${key} ${Number(values[k]!.toPrecision(4))}`).join(', ')}; all must be above zero`,
  diluteSolute: 'The diffusivity is an estimate for a dilute solute; a measured one is better.',
  largeSolute: 'The diffusivity is that of a rigid sphere, large beside the molecules of the liquid.',
  smallSolute: (gives: string, r: number): string =>
    `${gives}: a solute of radius ${Number((1e9 * r).toPrecision(3))} nm is small for the Stokes-Einstein equation, which reads too low for small molecules`,
  denseDiffusion: (gives: string, p: number): string =>
    `${gives}: the estimate holds at low pressure, up to about 1 MPa; here ${pressure(p)}`,
  unusualVolume: (gives: string, v: number): string =>
    `${gives}: a molar volume of ${Number((1e6 * v).toPrecision(3))} cm^3/mol is outside the 14 to 500 cm^3/mol such estimates are used for`,

  pressureAssumed: (fluid: string, key: string): string => `No ${key} is given for ${fluid}: its properties are taken at 101.325 kPa.`,
  pressureAmbient: (fluid: string, key: string): string => `No ${key} is given for ${fluid}: its properties are taken at ambient_pressure.`,
  accuracyNotStated: (what: string): string => `The source states no accuracy for the ${what}: it counts as exact.`,
};
