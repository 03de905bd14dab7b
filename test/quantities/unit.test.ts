import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { dimensionText, isDimensionless, sameDimension } from '../../pipeline/quantities/dimension.ts';
import { isFault } from '../../pipeline/quantities/fault.ts';
import { fromSI, parseUnit, toSI, type Unit } from '../../pipeline/quantities/unit.ts';
import { knownSymbols } from '../../pipeline/quantities/unit-symbols.ts';

const unit = (text: string): Unit => {
  const read = parseUnit(text);
  if (isFault(read)) throw new Error(read.text);
  return read;
};

/**
 * Factors as printed in NIST Special Publication 811 (2008 edition), appendix B.8, seven digits or exact; the tolerance is half a unit of the last printed digit.
 * The SI unit is typed beside it, so that the dimension is checked too.
 */
const nist: readonly (readonly [text: string, factor: string, si: string])[] = [
  ['atm', '1.01325E+05', 'Pa'],
  ['at', '9.80665E+04', 'Pa'],
  ['bar', '1.0E+05', 'Pa'],
  ['mbar', '1.0E+02', 'Pa'],
  ['torr', '1.333224E+02', 'Pa'],
  ['mmHg', '1.333224E+02', 'Pa'],
  ['inHg', '3.386389E+03', 'Pa'],
  ['inH2O', '2.490889E+02', 'Pa'],
  ['ftH2O', '2.989067E+03', 'Pa'],
  ['cmH2O', '9.80665E+01', 'Pa'],
  ['mmH2O', '9.80665E+00', 'Pa'],
  ['kgf/cm2', '9.80665E+04', 'Pa'],
  ['psi', '6.894757E+03', 'Pa'],
  ['lbf/in2', '6.894757E+03', 'Pa'],
  ['lbf/ft2', '4.788026E+01', 'Pa'],
  ['psf', '4.788026E+01', 'Pa'],
  ['dyn/cm2', '1.0E-01', 'Pa'],
  ['BTU', '1.055056E+03', 'J'],
  ['BTU(th)', '1.05435E+03', 'J'],
  ['cal', '4.1868E+00', 'J'],
  ['cal(th)', '4.184E+00', 'J'],
  ['kcal', '4.1868E+03', 'J'],
  ['erg', '1.0E-07', 'J'],
  ['kWh', '3.6E+06', 'J'],
  ['kW h', '3.6E+06', 'J'],
  ['ft lbf', '1.355818E+00', 'J'],
  ['eV', '1.602177E-19', 'J'],
  ['BTU/h', '2.930711E-01', 'W'],
  ['BTU/s', '1.055056E+03', 'W'],
  ['hp', '7.456999E+02', 'W'],
  ['hp(metric)', '7.354988E+02', 'W'],
  ['hp(electric)', '7.46E+02', 'W'],
  ['BTU/(h ft2 degF)', '5.678263E+00', 'W/(m^2 K)'],
  ['BTU/(s ft2 degF)', '2.044175E+04', 'W/(m^2 K)'],
  ['BTU ft/(h ft2 degF)', '1.730735E+00', 'W/(m K)'],
  ['BTU in/(h ft2 degF)', '1.442279E-01', 'W/(m K)'],
  ['BTU/(lb degF)', '4.1868E+03', 'J/(kg K)'],
  ['BTU/lb', '2.326E+03', 'J/kg'],
  ['BTU/(ft2 h)', '3.154591E+00', 'W/m^2'],
  ['BTU/ft3', '3.725895E+04', 'J/m^3'],
  ['degF h ft2/BTU', '1.761102E-01', 'm^2 K/W'],
  ['cal/(g K)', '4.1868E+03', 'J/(kg K)'],
  ['cal(th)/(cm s degC)', '4.184E+02', 'W/(m K)'],
  ['W/in2', '1.550003E+03', 'W/m^2'],
  ['in', '2.54E-02', 'm'],
  ['ft', '3.048E-01', 'm'],
  ['yd', '9.144E-01', 'm'],
  ['mile', '1.609344E+03', 'm'],
  ['mil', '2.54E-05', 'm'],
  ['micron', '1.0E-06', 'm'],
  ['Å', '1.0E-10', 'm'],
  ['in2', '6.4516E-04', 'm^2'],
  ['ft^2', '9.290304E-02', 'm^2'],
  ['ha', '1.0E+04', 'm^2'],
  ['in3', '1.638706E-05', 'm^3'],
  ['ft3', '2.831685E-02', 'm^3'],
  ['yd3', '7.645549E-01', 'm^3'],
  ['gal', '3.785412E-03', 'm^3'],
  ['gal(UK)', '4.54609E-03', 'm^3'],
  ['bbl(oil)', '1.589873E-01', 'm^3'],
  ['L', '1.0E-03', 'm^3'],
  ['gal/min', '6.30902E-05', 'm^3/s'],
  ['gpm', '6.30902E-05', 'm^3/s'],
  ['ft3/min', '4.719474E-04', 'm^3/s'],
  ['cfm', '4.719474E-04', 'm^3/s'],
  ['ft/min', '5.08E-03', 'm/s'],
  ['in/s', '2.54E-02', 'm/s'],
  ['km/h', '2.777778E-01', 'm/s'],
  ['lb', '4.535924E-01', 'kg'],
  ['oz', '2.834952E-02', 'kg'],
  ['slug', '1.45939E+01', 'kg'],
  ['t', '1.0E+03', 'kg'],
  ['lb/ft3', '1.601846E+01', 'kg/m^3'],
  ['lb/gal', '1.198264E+02', 'kg/m^3'],
  ['slug/ft3', '5.153788E+02', 'kg/m^3'],
  ['g/cm3', '1.0E+03', 'kg/m^3'],
  ['lb/h', '1.259979E-04', 'kg/s'],
  ['lb/min', '7.559873E-03', 'kg/s'],
  ['lbf', '4.448222E+00', 'N'],
  ['kgf', '9.80665E+00', 'N'],
  ['dyn', '1.0E-05', 'N'],
  ['pdl', '1.38255E-01', 'N'],
  ['lbf/ft', '1.45939E+01', 'N/m'],
  ['P', '1.0E-01', 'Pa s'],
  ['cP', '1.0E-03', 'Pa s'],
  ['lb/(ft s)', '1.488164E+00', 'Pa s'],
  ['lb/(ft h)', '4.133789E-04', 'Pa s'],
  ['lbf s/ft2', '4.788026E+01', 'Pa s'],
  ['St', '1.0E-04', 'm^2/s'],
  ['cSt', '1.0E-06', 'm^2/s'],
  ['ft2/h', '2.58064E-05', 'm^2/s'],
  ['d', '8.64E+04', 's'],
  ['h', '3.6E+03', 's'],
  ['min', '6.0E+01', 's'],
  ['rev', '1', '1'],
];

/** Half a unit in the last printed digit; an exact factor is printed with as many digits as it has. */
const halfDigit = (printed: string): number => {
  const [digits, exponent = '0'] = printed.split('E');
  return 0.5 * 10 ** (Number(exponent) - (digits!.split('.')[1]?.length ?? 0));
};

test.each(nist)('%s is %s %s (NIST SP 811, B.8)', (text, printed, si) => {
  const read = unit(text);
  expect(Math.abs(read.times / read.over - Number(printed))).toBeLessThanOrEqual(halfDigit(printed));
  expect(sameDimension(read.dimension, unit(si).dimension), dimensionText(read.dimension)).toBe(true);
});

test('a conversion that is off by one digit of the table fails', () => {
  const read = unit('psi');
  expect(Math.abs(read.times / read.over - 6.894758e3)).toBeGreaterThan(halfDigit('6.894757E+03'));
});

/** SI brochure, 9th ed.: definitions of derived units (table 4), prefixes (table 7) and units in use with the SI (table 8); powers of ten are exact. */
const brochure: readonly (readonly [text: string, one: number, si: string])[] = [
  ['rpm', 1 / 60, '1/s'],
  ['1/min', 1 / 60, '1/s'],
  ['min⁻¹', 1 / 60, '1/s'],
  ['U/min', 1 / 60, '1/s'],
  ['Hz', 1, '1/s'],
  ['L/min', 1e-3 / 60, 'm^3/s'],
  ['l/h', 1e-3 / 3600, 'm^3/s'],
  ['m³/h', 1 / 3600, 'm^3/s'],
  ['mL/min', 1e-6 / 60, 'm^3/s'],
  ['kg h⁻¹', 1 / 3600, 'kg/s'],
  ['kg/h', 1 / 3600, 'kg/s'],
  ['kmol/h', 1 / 3.6, 'mol/s'],
  ['mPa·s', 1e-3, 'Pa s'],
  ['mPas', 1e-3, 'Pa s'],
  ['Pa.s', 1, 'Pa s'],
  ['mm2/s', 1e-6, 'm^2/s'],
  ['10⁻⁹ m²/s', 1e-9, 'm^2/s'],
  ['1e-9 m2/s', 1e-9, 'm^2/s'],
  ['W/(m^2 K)', 1, 'W/(m^2 K)'],
  ['kW/(m²·K)', 1e3, 'W/(m^2 K)'],
  ['W m⁻² K⁻¹', 1, 'W/(m^2 K)'],
  ['W.m-2.K-1', 1, 'W/(m^2 K)'],
  ['kcal/(h m2 degC)', 4186.8 / 3600, 'W/(m^2 K)'],
  ['kJ/(kgK)', 1e3, 'J/(kg K)'],
  ['m2K/W', 1, 'm^2 K/W'],
  ['m²·K/W', 1, 'm^2 K/W'],
  ['g/L', 1, 'kg/m^3'],
  ['mg/L', 1e-3, 'kg/m^3'],
  ['g/100 mL', 10, 'kg/m^3'],
  ['mol/L', 1e3, 'mol/m^3'],
  ['mmol/l', 1, 'mol/m^3'],
  ['g/mol', 1e-3, 'kg/mol'],
  ['µS/cm', 1e-4, 'S/m'],
  ['uS/cm', 1e-4, 'S/m'],
  ['mS/cm', 0.1, 'S/m'],
  ['mA', 1e-3, 'A'],
  ['mAh', 3.6, 'A s'],
  ['mN/m', 1e-3, 'N/m'],
  ['N m', 1, 'J'],
  ['Nm', 1, 'J'],
  ['%', 0.01, '1'],
  ['‰', 0.001, '1'],
  ['wt%', 0.01, '1'],
  ['Gew.-%', 0.01, '1'],
  ['Vol.-%', 0.01, '1'],
  ['% RH', 0.01, '1'],
  ['ppm(mass)', 1e-6, '1'],
  ['ppmv', 1e-6, '1'],
  ['g/kg', 1e-3, '1'],
  ['μm', 1e-6, 'm'],
  ['um', 1e-6, 'm'],
  ['hPa', 100, 'Pa'],
  ['kPa', 1e3, 'Pa'],
  ['m^(1/2)', 1, 'm^0.5'],
  ['deg', Math.PI / 180, '1'],
  ['-', 1, '1'],
  ['', 1, '1'],
  ['1', 1, '1'],
];

test.each(brochure)('"%s" is %d %s', (text, one, si) => {
  const read = unit(text);
  expect(read.times / read.over / one).toBeCloseTo(1, 14);
  expect(sameDimension(read.dimension, unit(si).dimension), dimensionText(read.dimension)).toBe(true);
});

// NIST SP 811, B.8 and B.9: T/K = t/degC + 273.15; T/K = (t/degF + 459.67)/1.8; ITS-90: water boils near 373.124 K, freezes at 273.15 K.
test.each([
  ['degC', 0, 273.15],
  ['°C', 100, 373.15],
  ['℃', -40, 233.15],
  ['degF', -40, 233.15],
  ['°F', 212, 373.15],
  ['degF', 32, 273.15],
  ['degR', 491.67, 273.15],
  ['K', 300, 300],
])('%s %d is %d K', (text, value, kelvin) => {
  expect(toSI(value, unit(text))).toBeCloseTo(kelvin, 10);
  expect(fromSI(kelvin, unit(text))).toBeCloseTo(value, 10);
});

test('a degree inside a product is a difference', () => {
  expect(unit('W/(m2 degC)').offset).toBe(0);
  expect(toSI(3, unit('degC/min'))).toBeCloseTo(0.05, 15);
  expect(toSI(9, unit('degF/s'))).toBeCloseTo(5, 14);
});

test('numbers keep their last bit', () => {
  expect(toSI(25.4, unit('mm'))).toBe(0.0254);
  expect(toSI(120, unit('mm'))).toBe(0.12);
  expect(toSI(300, unit('rpm'))).toBe(5);
  expect(toSI(0.1, unit('kg'))).toBe(0.1);
});

describe("the trade's meanings are taken and said", () => {
  test.each([
    ['W/m2 K', 'W/(m^2 K)'],
    ['W/m²K', 'W/(m^2 K)'],
    ['W/m2*K', 'W/(m^2 K)'],
    ['W/m2/K', 'W/(m^2 K)'],
    ['J/kg K', 'J/(kg K)'],
    ['J/kgK', 'J/(kg K)'],
    ['W/m K', 'W/(m K)'],
    ['kg/m²s', 'kg/(m^2 s)'],
  ])('%s is %s', (text, meant) => {
    expect(sameDimension(unit(text).dimension, unit(meant).dimension)).toBe(true);
    expect(unit(text).notes.map((note) => note.code)).toEqual(['unit-slash']);
  });

  test.each(['gal/min', 'hp', 'BTU', 'kcal', 'oz'])('%s says which one', (text) => {
    expect(unit(text).notes.map((note) => note.code)).toEqual(['unit-meaning']);
  });

  test('clear texts have no note', () => {
    expect(['W/(m^2 K)', 'mm', 'L/min', 'g/100 mL', 'kg/(m s)'].flatMap((text) => unit(text).notes)).toEqual([]);
  });
});

describe('references are kept', () => {
  test.each([
    ['bar(g)', { kind: 'gauge' }],
    ['barg', { kind: 'gauge' }],
    ['bar g', { kind: 'gauge' }],
    ['psig', { kind: 'gauge' }],
    ['psi(g)', { kind: 'gauge' }],
    ['kPa (g)', { kind: 'gauge' }],
    ['barü', { kind: 'gauge' }],
    ['psid', { kind: 'differential' }],
    ['psia', undefined],
    ['bar abs', undefined],
    ['NL/min', { kind: 'normal' }],
    ['Nm3/h', { kind: 'normal' }],
    ['Nm³/h', { kind: 'normal' }],
    ['m³N/h', { kind: 'normal' }],
    ['scfm', { kind: 'normal' }],
    ['slpm', { kind: 'normal' }],
    ['NL/min (0 degC, 101.325 kPa)', { kind: 'normal', temperature: 273.15, pressure: 101_325 }],
    ['Nm3/h at 0 degC, 1 atm', { kind: 'normal', temperature: 273.15, pressure: 101_325 }],
    ['ppm(volume)', { kind: 'share', of: 'volume' }],
    ['mol%', { kind: 'share', of: 'amount' }],
    ['% w/w', { kind: 'share', of: 'mass' }],
  ])('%s', (text, reference) => {
    expect(unit(text).reference).toEqual(reference);
  });
});

describe('what is no unit or has two meanings is refused with a remedy', () => {
  test.each([
    ['rmp', 'unit-unknown', 'did you mean "rpm"?'],
    ['KPA', 'unit-unknown', 'did you mean "kPa"?'],
    ['cp', 'unit-unknown', 'did you mean "cP"?'],
    ['kg/hh', 'unit-unknown', '"hh"'],
    ['ppm', 'unit-ambiguous', 'ppm(mass) or ppm(volume)'],
    ['ton', 'unit-ambiguous', 'write t or lb'],
    ['ton/h', 'unit-ambiguous', 'write t or lb'],
    ['W/mK', 'unit-ambiguous', 'W/(m K)'],
    ['C', 'unit-ambiguous', 'degC'],
    ['°', 'unit-ambiguous', 'degC'],
    ['ccm', 'unit-ambiguous', 'cm3'],
    ['cps', 'unit-ambiguous', 'cP'],
    ['J/kg/K s', 'unit-ambiguous', 'brackets'],
    ['kg m/s/K m', 'unit-ambiguous', 'brackets'],
    ['W/m2-K', 'unit-unreadable', 'W/(m^2 K)'],
    ['kg,m', 'unit-unreadable', 'space'],
    ['x10^-9 m2/s', 'unit-unreadable', 'powers as ^2'],
    ['5 mm', 'unit-number', 'power of ten'],
    ['1000', 'unit-number', 'number'],
    ['m^0', 'unit-power', '-12 to 12'],
    ['m^400', 'unit-power', '-12 to 12'],
    ['W/((m2) K)', 'unit-brackets', 'brackets'],
    ['m(s)', 'unit-brackets', 'brackets'],
    ['W/(m2 K', 'unit-brackets', 'brackets'],
    ['m/', 'unit-brackets', '1/s'],
    ['/min', 'unit-brackets', '1/s'],
    ['m//s', 'unit-brackets', '1/s'],
    ['NL/min (0 degC, 3 mm)', 'unit-condition', 'NL/min (0 degC, 101.325 kPa)'],
    ['__proto__', 'unit-unknown', 'no unit'],
    ['constructor', 'unit-unknown', 'no unit'],
  ])('%s', (text, code, remedy) => {
    const read = parseUnit(text);
    expect(isFault(read) ? read.code : read).toBe(code);
    expect(isFault(read) && read.text).toContain(remedy);
  });

  test('a text of 10,000 characters', () => {
    expect(isFault(parseUnit('m'.repeat(10_000)))).toBe(true);
  });
});

describe('laws (seeded, 1,000 cases each)', () => {
  const safe = knownSymbols.filter((name) => {
    const read = parseUnit(name);
    return !isFault(read) && !isDimensionless(read.dimension) && read.offset === 0 && read.reference === undefined && name !== 'mK';
  });
  const symbol = fc.constantFrom(...safe);
  const runs = { seed: 20, numRuns: 1000 } as const;

  test('any text is a unit with a finite factor or a fault with a sentence; never an exception', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 120 }), (text) => {
        const read = parseUnit(text);
        return isFault(read) ? read.text.length > 10 : Number.isFinite(read.times / read.over) && read.times > 0;
      }),
      runs,
    );
  });

  test('texts made of unit pieces neither', () => {
    const piece = fc.oneof(symbol, fc.constantFrom('/', ' ', '*', '(', ')', '^', '2', '-1', '²', '⁻¹', '%', '.', '10^-9', '(g)'));
    fc.assert(
      fc.property(fc.array(piece, { maxLength: 10 }), (pieces) => {
        const read = parseUnit(pieces.join(''));
        return isFault(read) ? read.text.length > 10 : read.times > 0 && read.over > 0;
      }),
      runs,
    );
  });

  test('there and back again', () => {
    fc.assert(
      fc.property(symbol, fc.double({ min: 1e-6, max: 1e6, noNaN: true }), (name, value) => {
        expect(fromSI(toSI(value, unit(name)), unit(name)) / value).toBeCloseTo(1, 12);
      }),
      runs,
    );
  });

  test('a/(b c) = a b^-1 c^-1, in factor and dimension', () => {
    fc.assert(
      fc.property(symbol, symbol, symbol, (a, b, c) => {
        const slash = unit(`${a}/(${b} ${c})`);
        const powers = unit(`${a} ${b}^-1 ${c}^-1`);
        expect(sameDimension(slash.dimension, powers.dimension)).toBe(true);
        expect(slash.times / slash.over / (powers.times / powers.over)).toBeCloseTo(1, 12);
      }),
      runs,
    );
  });
});
