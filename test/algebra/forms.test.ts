import { describe, expect, test } from 'vitest';
import { derivative } from '../../pipeline/algebra/derivative.ts';
import { evaluate } from '../../pipeline/algebra/evaluate.ts';
import { parseForm } from '../../pipeline/algebra/parse.ts';
import { exprText, formText } from '../../pipeline/algebra/print.ts';
import { compile } from '../../pipeline/algebra/tape.ts';

const form = (text: string) => {
  const parsed = parseForm(text, { known: ['Re', 'Pr', 'Sc', 'Nu', 'Sh'], needsParameter: true });
  if ('faults' in parsed) throw new Error(parsed.faults.map((fault) => fault.text).join());
  return parsed.form;
};
const laws = [
  'Nu = C * Re^a * Pr^(1/3)',
  'Sh = 2 + C * Re^a * Sc^(1/3)',
  'Nu = (A^n + (C * Re^0.5)^n)^(1/n)',
  'Nu = C * ln(1 + Re) * exp(-b * Pr)',
  'Nu = C * Re^0.5 - b / Pr',
];
const at = { Re: 5.2, Pr: 1.7, Sc: 2.3 };
const theta = { C: 0.6, a: 0.7, A: 1.2, n: 2.1, b: 0.4 };

describe.each(laws)('%s', (text) => {
  test('prints to a text that reads back as the same law', () => {
    expect(form(formText(form(text)))).toEqual(form(text));
  });

  test('analytic slopes are the numerical ones, and the tape gives the same', () => {
    const { tree, groups, constants } = form(text);
    const slopes = constants.map((name) => derivative(tree, name));
    const tape = compile(
      [tree, ...slopes],
      groups,
      constants,
      groups.map((name) => Float64Array.of(at[name as 'Re'])),
    );
    tape.load();
    tape.run(Float64Array.from(constants, (name) => theta[name as 'C']));
    expect(tape.out[0]![0]).toBeCloseTo(evaluate(tree, at, theta), 12);
    constants.forEach((name, k) => {
      const h = 1e-5;
      const moved = (by: number): number => evaluate(tree, at, { ...theta, [name]: theta[name as 'C'] + by });
      const numeric = (moved(h) - moved(-h)) / (2 * h);
      expect(tape.out[k + 1]![0]! / numeric).toBeCloseTo(1, 7);
    });
  });
});

test('a piecewise law whose branches meet far from one is no fault', () => {
  expect(form('Sh = max(A, C * Re^a) * Sc^c').constants).toEqual(['A', 'C', 'a', 'c']);
});

test('1/3 is printed as the fraction it is, one half as a number', () => {
  expect(exprText(form('Nu = C * Re^0.5 * Pr^(1/3)').tree)).toBe('C * Re^0.5 * Pr^(1/3)');
});

test.each([
  ['Nu = C * D * Re^a', /C and D/],
  ['Nu = C * Prr^a', /Prr.*Pr/],
  ['Nu = 0.023 * Re^0.8', /at least one parameter/],
  [`Nu = ${'('.repeat(300)}C${')'.repeat(300)}`, /100 levels/],
])('%s is refused', (text, why) => {
  expect(() => form(text)).toThrow(why);
});

// Found by throwing inputs at the reader (test/strength/fuzz.ts).
test.each([
  ['Nu = C^0', 'law-inseparable', /does not depend on the parameter C/],
  ['Nu = Re^a + 0 * D', 'law-inseparable', /does not depend on the parameter D/],
  ['Nu = C * Re^a * D^0', 'law-inseparable', /does not depend on the parameter D/],
  ['Nu = C - C + Re', 'law-inseparable', /does not depend on the parameter C/],
  ['Nu = C * Re^5e-3242', 'law-number', /5e-3242 is too small for a number/],
])('%s is refused: %s', (text, code, says) => {
  const parsed = parseForm(text, { known: ['Re', 'Nu'], needsParameter: true });
  expect('faults' in parsed ? parsed.faults.map((fault) => fault.code) : []).toEqual([code]);
  expect('faults' in parsed ? parsed.faults[0]!.text : '').toMatch(says);
});
