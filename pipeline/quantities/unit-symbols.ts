import { type Dimension, dimension, dimensionless } from './dimension.ts';
import { aliases } from './unit-aliases.ts';

/** One symbol of a unit: SI value = number * times / over + offset. */
interface UnitSymbol {
  readonly times: number;
  readonly over: number;
  readonly offset: number;
  readonly dimension: Dimension;
  /** SI prefixes it may carry, as letters; empty where none. */
  readonly prefixes: string;
  /** 1 where the symbol is an angle (rad, deg). */
  readonly angle: number;
  /** A gas volume at a reference condition. */
  readonly normal: boolean;
  /** Which of several meanings was taken; said to the user. */
  readonly meaning?: string;
}

interface Extra {
  readonly over?: number;
  readonly offset?: number;
  readonly prefixes?: string;
  readonly angle?: number;
  readonly normal?: boolean;
  readonly meaning?: string;
}

const all = 'QRYZEPTGMkhdcmμnpfazyrqD'; // D stands for da
const symbol = (times: number, dim: Dimension, extra: Extra = {}): UnitSymbol => ({
  times,
  over: extra.over ?? 1,
  offset: extra.offset ?? 0,
  dimension: dim,
  prefixes: extra.prefixes ?? '',
  angle: extra.angle ?? 0,
  normal: extra.normal ?? false,
  meaning: extra.meaning,
});

const length = dimension({ m: 1 });
const area = dimension({ m: 2 });
const volume = dimension({ m: 3 });
const mass = dimension({ kg: 1 });
const time = dimension({ s: 1 });
const rate = dimension({ s: -1 });
const volumeFlow = dimension({ m: 3, s: -1 });
const force = dimension({ kg: 1, m: 1, s: -2 });
const pressure = dimension({ kg: 1, m: -1, s: -2 });
const energy = dimension({ kg: 1, m: 2, s: -2 });
const power = dimension({ kg: 1, m: 2, s: -3 });
const viscosity = dimension({ kg: 1, m: -1, s: -1 });
const kinematic = dimension({ m: 2, s: -1 });
const temperature = dimension({ K: 1 });
const charge = dimension({ A: 1, s: 1 });

const g0 = 9.80665; // m/s2, standard acceleration of free fall, SI brochure; NIST SP 811 B.8
const pound = 0.45359237; // kg, exact, NIST SP 811 B.8
const inch = 0.0254; // m, exact, NIST SP 811 B.8
const foot = 0.3048; // m, exact, NIST SP 811 B.8
const gallonUS = 3.785411784e-3; // m3, 231 in3, exact; NIST SP 811 B.8 prints 3.785 412 E-03
const gallonUK = 4.54609e-3; // m3, exact, NIST SP 811 B.8
const btu = 1055.05585262; // J, International Table, exact, NIST SP 811 B.8 footnote 9
const calorie = 4.1868; // J, International Table, exact, NIST SP 811 B.8 footnote 9
const poundForce = pound * g0; // N, 4.448 221 615 260 5 in NIST SP 811 B.8
const psi = poundForce / inch ** 2; // Pa, 6894.757 in NIST SP 811 B.8

const internationalTable = 'International Table value (1 cal = 4.1868 J, 1 BTU = 1055.056 J)';
const shaftHorsepower = 'mechanical horsepower, 745.70 W; the metric one is hp(metric)';
const usGallon = 'US gallon, 3.7854 L; the British one is gal(UK)';

/** Symbols by their case-sensitive names. Factors: SI brochure (9th ed., tables 4 to 8) where no source stands beside the number. */
const named: Readonly<Record<string, UnitSymbol>> = {
  // SI base and derived units
  m: symbol(1, length, { prefixes: all }),
  g: symbol(1, mass, { over: 1000, prefixes: all }),
  s: symbol(1, time, { prefixes: all }),
  A: symbol(1, dimension({ A: 1 }), { prefixes: all }),
  K: symbol(1, temperature, { prefixes: 'kmμ' }),
  mol: symbol(1, dimension({ mol: 1 }), { prefixes: all }),
  cd: symbol(1, dimension({ cd: 1 })),
  Hz: symbol(1, rate, { prefixes: all }),
  N: symbol(1, force, { prefixes: all }),
  Pa: symbol(1, pressure, { prefixes: all }),
  J: symbol(1, energy, { prefixes: all }),
  W: symbol(1, power, { prefixes: all }),
  V: symbol(1, dimension({ kg: 1, m: 2, s: -3, A: -1 }), { prefixes: all }),
  Ω: symbol(1, dimension({ kg: 1, m: 2, s: -3, A: -2 }), { prefixes: 'GMkmμ' }),
  S: symbol(1, dimension({ kg: -1, m: -2, s: 3, A: 2 }), { prefixes: 'kmμn' }),
  T: symbol(1, dimension({ kg: 1, s: -2, A: -1 }), { prefixes: 'mμ' }),
  degC: symbol(1, temperature, { offset: 273.15 }),
  // non-SI units accepted with the SI
  min: symbol(60, time),
  h: symbol(3600, time),
  d: symbol(86_400, time),
  week: symbol(604_800, time),
  L: symbol(1, volume, { over: 1000, prefixes: 'Mkhdcmμn' }),
  t: symbol(1000, mass, { prefixes: 'kM' }),
  eV: symbol(1.602176634e-19, energy, { prefixes: 'kM' }), // exact, SI 2019
  // joined as instruments print them
  Wh: symbol(3600, energy, { prefixes: 'kMGT' }),
  Ws: symbol(1, energy, { prefixes: 'kM' }),
  Ah: symbol(3600, charge, { prefixes: 'kmμ' }),
  Nm: symbol(1, energy, { prefixes: 'kMm' }),
  Ncm: symbol(1, energy, { over: 100, prefixes: 'm' }),
  Pas: symbol(1, viscosity, { prefixes: 'kmμ' }),
  // angle, revolutions, counts
  rad: symbol(1, dimensionless, { angle: 1, prefixes: 'mμ' }),
  deg: symbol(Math.PI, dimensionless, { over: 180, angle: 1 }),
  rev: symbol(1, dimensionless),
  rpm: symbol(1, rate, { over: 60 }),
  rps: symbol(1, rate),
  '%': symbol(1, dimensionless, { over: 100 }),
  '‰': symbol(1, dimensionless, { over: 1000 }),
  // length, area, volume
  in: symbol(inch, length),
  ft: symbol(foot, length),
  yd: symbol(0.9144, length), // exact, NIST SP 811 B.8
  mil: symbol(inch, length, { over: 1000 }),
  mile: symbol(1609.344, length), // exact, NIST SP 811 B.8
  Å: symbol(1, length, { over: 1e10 }),
  ha: symbol(10_000, area),
  cc: symbol(1, volume, { over: 1e6 }),
  gal: symbol(gallonUS, volume, { meaning: usGallon }),
  'gal(US)': symbol(gallonUS, volume),
  'gal(UK)': symbol(gallonUK, volume),
  'bbl(oil)': symbol(42 * gallonUS, volume), // 42 gal (US): 1.589 873 E-01 in NIST SP 811 B.8
  cf: symbol(foot ** 3, volume),
  lpm: symbol(1, volumeFlow, { over: 60_000 }),
  lph: symbol(1, volumeFlow, { over: 3_600_000 }),
  gpm: symbol(gallonUS, volumeFlow, { over: 60, meaning: usGallon }),
  'gpm(UK)': symbol(gallonUK, volumeFlow, { over: 60 }),
  cfm: symbol(foot ** 3, volumeFlow, { over: 60 }),
  // gas volumes at a reference condition
  NL: symbol(1, volume, { over: 1000, normal: true }),
  NmL: symbol(1, volume, { over: 1e6, normal: true }),
  Nm3: symbol(1, volume, { normal: true }),
  Sm3: symbol(1, volume, { normal: true }),
  SL: symbol(1, volume, { over: 1000, normal: true }),
  scf: symbol(foot ** 3, volume, { normal: true }),
  scfm: symbol(foot ** 3, volumeFlow, { over: 60, normal: true }),
  scfh: symbol(foot ** 3, volumeFlow, { over: 3600, normal: true }),
  sccm: symbol(1, volumeFlow, { over: 60e6, normal: true }),
  slpm: symbol(1, volumeFlow, { over: 60_000, normal: true }),
  // mass and force
  lb: symbol(pound, mass),
  oz: symbol(pound, mass, { over: 16, meaning: 'avoirdupois ounce, 28.35 g' }),
  slug: symbol(poundForce / foot, mass), // 14.593 90 kg in NIST SP 811 B.8
  dyn: symbol(1, force, { over: 1e5 }), // exact, NIST SP 811 B.8
  lbf: symbol(poundForce, force),
  pdl: symbol(pound * foot, force), // 0.138 255 N in NIST SP 811 B.8
  kgf: symbol(g0, force), // exact, NIST SP 811 B.8
  // pressure
  bar: symbol(1e5, pressure, { prefixes: 'kmμ' }),
  atm: symbol(101_325, pressure), // exact, NIST SP 811 B.8
  at: symbol(g0 * 1e4, pressure), // technical atmosphere, exact, NIST SP 811 B.8
  torr: symbol(101_325, pressure, { over: 760 }), // NIST SP 811 B.8: 133.3224
  mtorr: symbol(101_325, pressure, { over: 760_000 }),
  mmHg: symbol(133.322387415, pressure), // conventional, 13.5951 g/cm3 at standard gravity; NIST SP 811 B.8: 133.3224
  inHg: symbol(133.322387415 * 25.4, pressure), // conventional; NIST SP 811 B.8: 3386.389
  mmH2O: symbol(g0, pressure), // conventional; NIST SP 811 B.8: 9.806 65
  cmH2O: symbol(10 * g0, pressure),
  mH2O: symbol(1000 * g0, pressure),
  inH2O: symbol(25.4 * g0, pressure), // conventional; NIST SP 811 B.8: 249.0889
  ftH2O: symbol(304.8 * g0, pressure), // conventional; NIST SP 811 B.8: 2989.067
  psi: symbol(psi, pressure, { prefixes: 'k' }),
  psf: symbol(poundForce / foot ** 2, pressure), // 47.880 26 in NIST SP 811 B.8
  // energy and power
  cal: symbol(calorie, energy, { prefixes: 'kM', meaning: internationalTable }),
  'cal(th)': symbol(4.184, energy, { prefixes: 'kM' }), // exact, NIST SP 811 B.8
  BTU: symbol(btu, energy, { prefixes: 'kM', meaning: internationalTable }),
  'BTU(th)': symbol(1054.35, energy), // NIST SP 811 B.8: 1.054 350 E+03
  erg: symbol(1, energy, { over: 1e7 }), // exact, NIST SP 811 B.8
  hp: symbol(550 * foot * poundForce, power, { meaning: shaftHorsepower }), // 550 ft lbf/s: 7.456 999 E+02 in NIST SP 811 B.8
  'hp(mechanical)': symbol(550 * foot * poundForce, power),
  'hp(metric)': symbol(75 * g0, power), // 75 m kgf/s: 7.354 988 E+02 in NIST SP 811 B.8
  'hp(electric)': symbol(746, power), // exact, NIST SP 811 B.8
  // viscosity
  P: symbol(1, viscosity, { over: 10, prefixes: 'mcμ' }), // poise, exact, NIST SP 811 B.8
  St: symbol(1, kinematic, { over: 1e4, prefixes: 'mcμ' }), // stokes, exact, NIST SP 811 B.8
  // temperature
  degF: symbol(5, temperature, { over: 9, offset: (459.67 * 5) / 9 }), // NIST SP 811 B.8
  degR: symbol(5, temperature, { over: 9 }), // NIST SP 811 B.8
};

export interface FoundSymbol {
  readonly symbol: UnitSymbol;
  /** Decimal exponent of the prefix. */
  readonly exponent: number;
}

const prefixExponents: Readonly<Record<string, number>> = {
  Q: 30,
  R: 27,
  Y: 24,
  Z: 21,
  E: 18,
  P: 15,
  T: 12,
  G: 9,
  M: 6,
  k: 3,
  h: 2,
  d: -1,
  c: -2,
  m: -3,
  μ: -6,
  n: -9,
  p: -12,
  f: -15,
  a: -18,
  z: -21,
  y: -24,
  r: -27,
  q: -30,
}; // SI brochure 9th ed., table 7

const own = <T>(record: Readonly<Record<string, T>>, key: string): T | undefined => (Object.hasOwn(record, key) ? record[key] : undefined);

function prefixed(text: string): FoundSymbol | undefined {
  const letter = text.startsWith('u') ? 'μ' : text[0]!;
  const rest = text.slice(1);
  const symbolOfRest = own(named, own(aliases, rest) ?? rest);
  const exponent = own(prefixExponents, letter);
  if (symbolOfRest === undefined || exponent === undefined || rest.length === 0) return undefined;
  return symbolOfRest.prefixes.includes(letter) ? { symbol: symbolOfRest, exponent } : undefined;
}

/** A symbol with or without an SI prefix; the whole name wins over prefix + name (min, cd, ft, mil). */
export function findSymbol(text: string): FoundSymbol | undefined {
  if (text.length === 0) return undefined;
  const alias = own(aliases, text);
  const whole = own(named, alias ?? text);
  if (whole !== undefined) return { symbol: whole, exponent: 0 };
  if (alias !== undefined) return prefixed(alias);
  if (text.startsWith('da')) {
    const deca = own(named, text.slice(2));
    if (deca?.prefixes.includes('D')) return { symbol: deca, exponent: 1 };
  }
  return prefixed(text);
}

/** Names for "did you mean". */
export const knownSymbols: readonly string[] = [
  ...Object.keys(named),
  ...Object.keys(aliases),
  'kg',
  'mg',
  'mm',
  'cm',
  'km',
  'μm',
  'nm',
  'ms',
  'mL',
  'kPa',
  'MPa',
  'hPa',
  'mbar',
  'mPas',
  'cP',
  'cSt',
  'kW',
  'MW',
  'mW',
  'kJ',
  'MJ',
  'kWh',
  'kcal',
  'mA',
  'mV',
  'mmol',
  'kmol',
  'mS',
  'uS',
  'um',
  'kN',
];
