import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { type Amount, parseAmount } from '../../pipeline/quantities/amount.ts';
import { readDecimal } from '../../pipeline/quantities/decimal.ts';
import { type Fault, isFault } from '../../pipeline/quantities/fault.ts';
import { amountText, numberText } from '../../pipeline/quantities/friendly.ts';
import { isRange, parseRange } from '../../pipeline/quantities/range.ts';
import { parseSpread } from '../../pipeline/quantities/spread.ts';
import { unitFor } from '../../pipeline/quantities/unit-for.ts';
import { quantityOf } from '../../pipeline/quantities/vocabulary.ts';

const given = <T extends object>(read: T | Fault): T => {
  if (isFault(read)) throw new Error(read.text);
  return read as T;
};
const refused = (read: object | number): string => (typeof read === 'object' && isFault(read) ? read.code : 'read');
const remedy = (read: object | number): string => (typeof read === 'object' && isFault(read) ? read.text : '');
const amount = (text: string, name: string): Amount => given(parseAmount(text, quantityOf(name)));

describe('amounts', () => {
  // the conversions are those of unit.test.ts; here: number, unit and quantity together
  test.each([
    ['120 mm', 'impeller_diameter', 0.12],
    ['120mm', 'impeller_diameter', 0.12],
    ['997 kg/m^3', 'density', 997],
    ['1.0e-9 m^2/s', 'diffusivity', 1e-9],
    ['300 1/min', 'rotation_speed', 5],
    ['300 rpm', 'rotation_speed', 5],
    ['5 Hz', 'rotation_speed', 5],
    ['25 degC', 'temperature', 298.15],
    ['25 °C', 'temperature', 298.15],
    ['25 C', 'temperature', 298.15],
    ['77 F', 'temperature', 298.15],
    ['298.15 K', 'temperature', 298.15],
    ['1.27', 'power_number', 1.27],
    ['45 %', 'relative_humidity', 0.45],
    ['3 mol/L', 'bulk_concentration', 3000],
    ['3 g/L', 'saturation_concentration', 3],
    ['2 mol/h', 'mass_rate', 2 / 3600],
    ['0.2 wt%', 'mass_fraction', 0.002],
    ['12 degC', 'inlet_temperature_other', 285.15],
  ])('%s of %s', (text, name, si) => {
    expect(amount(text, name).si / si).toBeCloseTo(1, 14);
  });

  // 2 pi rad are one revolution, SI brochure table 4
  test('rad/s of a rotation speed are turned to revolutions, and only there', () => {
    expect(amount(`${10 * Math.PI} rad/s`, 'rotation_speed').si).toBeCloseTo(5, 14);
    expect(given(parseAmount('10 rad/s')).si).toBe(10);
  });

  test.each([
    ['3 m/s', 'viscosity', 'unit-dimension', 'Pa s'],
    ['2 kg/cm2', 'pressure', 'unit-dimension', 'kgf/cm2'],
    ['5 kg/h', 'volume_flow', 'unit-dimension', 'mass_flow'],
    ['60', 'liquid_volume', 'unit-missing', 'm^3'],
    ['5,3 mm', 'diameter', 'not-a-number', 'decimal mark'],
    ['1 100 m', 'length', 'amount-unreadable', '1.5 m'],
    ['1e999 m', 'length', 'number-overflow', 'too large'],
    ['1e-999 m', 'length', 'number-underflow', 'too small'],
    ['0x10 m', 'length', 'unit-unknown', 'units are written like'],
    ['-300 degC', 'temperature', 'below-absolute-zero', 'absolute zero'],
    ['about 3 mm', 'diameter', 'amount-unreadable', '1.5 m'],
    ['3 vol%', 'mass_fraction', 'unit-reference', 'mass'],
    ['3 wt%', 'gas_holdup', 'unit-reference', 'volume'],
    ['2 bar(g)', 'ambient_pressure', 'unit-reference', 'absolute'],
    ['2 psid', 'pressure', 'unit-reference', 'bar(g)'],
    ['10 NL/min', 'volume_flow', 'unit-condition', '0 degC, 101.325 kPa'],
    ['six blades mm', 'impeller_type', 'amount-unreadable', '"'],
    ['6 mm', 'impeller_type', 'unit-of-text', 'text'],
  ])('%s of %s is refused', (text, name, code, says) => {
    const read = parseAmount(text, quantityOf(name));
    expect(refused(read)).toBe(code);
    expect(remedy(read)).toContain(says);
  });

  test('a unit given twice is refused, once beside the number is not', () => {
    expect(refused(parseAmount('120 mm', quantityOf('length'), 'mm'))).toBe('unit-twice');
    expect(given(parseAmount('120', quantityOf('length'), 'mm')).si).toBe(0.12);
  });

  test('gauge pressures and stated normal volumes keep their reference', () => {
    expect(amount('2 bar(g)', 'pressure')).toMatchObject({ si: 2e5, unit: { reference: { kind: 'gauge' } } });
    expect(amount('10 NL/min (0 degC, 101.325 kPa)', 'volume_flow').unit.reference).toEqual({
      kind: 'normal',
      temperature: 273.15,
      pressure: 101_325,
    });
  });
});

describe('ranges', () => {
  test('the unit may stand once or twice', () => {
    const speed = given(parseRange('400 to 600 rpm', quantityOf('rotation_speed')));
    expect([speed.from.si, speed.to.si]).toEqual([400 / 60, 10]);
    expect(['400 to 600 rpm', '400 rpm', 'torr'].map(isRange)).toEqual([true, false, false]);
    const temperature = given(parseRange('15 degC to 313.15 K', quantityOf('temperature')));
    expect([temperature.from.si, temperature.to.si]).toEqual([288.15, 313.15]);
  });

  test.each([
    ['600 to 400 rpm', 'range-reversed'],
    ['4-6 mm', 'range-unreadable'],
    ['4 to 5 to 6 mm', 'range-unreadable'],
    ['4 to', 'range-unreadable'],
    ['4 m to 6', 'unit-missing'],
  ])('%s is refused', (text, code) => {
    expect(refused(parseRange(text, quantityOf(text.includes('rpm') ? 'rotation_speed' : 'length')))).toBe(code);
  });
});

describe('uncertainties', () => {
  const of = (text: string, name: string) => parseSpread(text, { quantity: quantityOf(name) });

  test.each([
    ['0.5 %', 'rotation_speed', { share: 0.005 }],
    ['0.5%', 'rotation_speed', { share: 0.005 }],
    ['1 % of the value', 'volume_flow', { share: 0.01 }],
    ['1 % of 60 L/min', 'volume_flow', { si: 1e-5 }],
    ['0.1 % of 200 K', 'temperature', { si: 0.2 }],
    ['0.1 K', 'temperature', { si: 0.1 }],
    ['1.8 degR', 'temperature', { si: 1 }],
    ['0.5 mm', 'diameter', { si: 0.0005 }],
    ['30 rpm', 'rotation_speed', { si: 0.5 }],
    ['0.02', 'relative_humidity', { si: 0.02 }],
    ['2 %', 'relative_humidity', { share: 0.02 }],
    ['0.01 mol/L', 'bulk_concentration', { si: 10 }],
    ['0', 'power_number', { si: 0 }],
  ])('%s of %s', (text, name, size) => {
    expect(of(text, name)).toEqual(size);
  });

  test.each([
    ['1 %', 'temperature', 'spread-of-temperature', 'in K'],
    ['0.1 degC', 'temperature', 'spread-degrees', 'in K'],
    ['0.2 °F', 'temperature', 'spread-degrees', '0.5556 K'],
    ['1 % of 50 degC', 'temperature', 'spread-degrees', 'in K'],
    ['± 3 %', 'volume_flow', 'spread-sign', 'accuracy'],
    ['+/- 3 %', 'volume_flow', 'spread-sign', 'accuracy'],
    ['1 % of full scale', 'volume_flow', 'spread-of-scale', '50 L/min'],
    ['1 % FS', 'volume_flow', 'spread-unreadable', '0.5 %'],
    ['-1 %', 'time', 'spread-negative', 'size'],
    ['2 m', 'time', 'unit-dimension', 's'],
    ['2', 'time', 'unit-missing', 'unit'],
    ['0.1 bar(g)', 'pressure', 'spread-gauge', 'without (g)'],
    ['small', 'time', 'spread-unreadable', '0.5 %'],
    ['0.1 K + 0.5 %', 'temperature', 'spread-unreadable', '0.5 %'],
  ])('%s of %s is refused', (text, name, code, says) => {
    expect(refused(of(text, name))).toBe(code);
    expect(remedy(of(text, name))).toContain(says);
  });

  test("a user's own quantity has its unit's dimension", () => {
    const unit = given(unitFor(undefined, 'degC'));
    expect(parseSpread('0.1 K', { unit })).toEqual({ si: 0.1 });
    expect(refused(parseSpread('1 %', { unit }))).toBe('spread-of-temperature');
    expect(refused(parseSpread('1 m', { unit }))).toBe('unit-dimension');
  });
});

describe('decimal numbers', () => {
  test.each(['0', '12', '-3.5', '+3.5', '.5', '5.', '1e-9', '1E+05', '6.02e23', ' 7 ', '−4'])('%s is one', (text) => {
    expect(readDecimal(text, '.')).toBe(Number(text.trim().replace('−', '-')));
  });

  test('with a decimal comma', () => {
    expect(readDecimal('3,75e2', ',')).toBe(375);
    expect(refused(readDecimal('3.75', ','))).toBe('not-a-number');
  });

  test.each([
    '',
    'n.d.',
    '<0.01',
    '>5',
    '1,234',
    '1.234,5',
    '1,234.5',
    "1'234",
    '1 234',
    '0x1F',
    'NaN',
    'Infinity',
    '-inf',
    '#DIV/0!',
    '5 %',
    '5 mm',
    '1e',
    'e5',
    '--3',
    '3-4',
    '1_000',
    '2024-05-01',
    '12:30',
    '１２',
    '٣',
    'TRUE',
  ])('"%s" is none', (text) => {
    expect(refused(readDecimal(text, '.'))).toBe('not-a-number');
  });

  test('1e999 and 1e-999 are refused, 0e5 is zero', () => {
    expect(refused(readDecimal('1e999', '.'))).toBe('number-overflow');
    expect(refused(readDecimal('1e-999', '.'))).toBe('number-underflow');
    expect(readDecimal('0e5', '.')).toBe(0);
  });

  test('what is read is what JavaScript reads of the same digits (1,000 seeded texts)', () => {
    fc.assert(
      fc.property(fc.string({ maxLength: 12, unit: fc.constantFrom(...'0123456789.,+-eE xX%') }), (text) => {
        const read = readDecimal(text, '.');
        return typeof read !== 'number' || read === Number(text);
      }),
      { seed: 21, numRuns: 1000 },
    );
  });
});

describe('texts for readers', () => {
  test.each([
    [0.12, 'diameter', '120 mm'],
    [5, 'rotation_speed', '300 rpm'],
    [298.15, 'temperature', '25 degC'],
    [1e-9, 'diffusivity', '1e-9 m^2/s'],
    [1e5, 'pressure', '1 bar'],
    [0.00089, 'viscosity', '0.89 mPa s'],
    [0.34, 'voidage', '0.34'],
    [1349.2, 'heat_transfer_coefficient', '1349 W/(m^2 K)'],
  ])('%d of %s is %s', (si, name, text) => {
    expect(amountText(si, quantityOf(name)!)).toBe(text);
  });

  test('a friendly text is read back as the same value', () => {
    for (const name of ['diameter', 'rotation_speed', 'temperature', 'mass_rate', 'pressure', 'heat_rate', 'limiting_current']) {
      expect(amount(amountText(0.0123456, quantityOf(name)!, 6), name).si).toBeCloseTo(0.0123456, 2);
    }
  });

  test('numbers that are none are said', () => {
    expect([numberText(Number.NaN), numberText(Infinity), numberText(0), numberText(-1.5e-7)]).toEqual([
      'not known',
      'infinite',
      '0',
      '-1.5e-7',
    ]);
  });
});
