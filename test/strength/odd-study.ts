import fc from 'fast-check';
import { goodStudy } from '../dist/broken.ts';

/** Right sides of laws by the grammar: sound in form, whatever they mean. */
const { law } = fc.letrec<{ law: string; term: string }>((tie) => ({
  term: fc.oneof(
    { depthSize: 'small', withCrossShrink: true },
    fc.constantFrom('Re', 'Pr', 'C', 'a', 'b', 'n', '1/3', '0.4', '2', '1e-8', '3.66', 'pi'),
    fc.tuple(fc.constantFrom('exp', 'ln', 'sqrt', 'tanh', 'abs', 'sin', 'atan', 'log10'), tie('term')).map(([name, x]) => `${name}(${x})`),
    fc.tuple(fc.constantFrom('min', 'max'), tie('term'), tie('term')).map(([name, x, y]) => `${name}(${x}, ${y})`),
    fc.tuple(tie('term'), fc.constantFrom('+', '-', '*', '/', '^'), tie('term')).map(([x, sign, y]) => `(${x} ${sign} ${y})`),
  ),
  law: tie('term').map((x) => `Nu = C * ${x}`),
}));

const number = fc.oneof(
  { weight: 6, arbitrary: fc.double({ min: 0.01, max: 90, noNaN: true }) },
  { weight: 1, arbitrary: fc.constantFrom(0, -0, 1e-300, 1e300, 5e-324, -1, 79.999999999, 80, 1e-9) },
);

/** Eight rows; most cells plausible, some extreme, some rows repeated. */
const trials = fc
  .array(fc.tuple(number, number, number, number), { minLength: 3, maxLength: 14 })
  .chain((rows) => fc.tuple(fc.constant(rows), fc.array(fc.nat(rows.length - 1), { maxLength: 4 }), fc.boolean()))
  .map(([rows, repeated, sane]) => {
    const all = [...rows, ...repeated.map((k) => rows[k]!)].map(([flow, a, b, c], k) => {
      const cells = sane ? [0.02 + (flow % 1), 20 + (a % 2), 30 + (b % 20), 80 + (c % 3)] : [flow, a, b, c];
      return [`r${k}`, ...cells.map((x) => (Number.isFinite(x) ? x : 1))].join(',');
    });
    return `run,flow,T_in [degC],T_out [degC],T_wall [degC]\n${all.join('\n')}\n`;
  });

const fit = fc.record(
  {
    error: fc.constantFrom('relative', 'absolute'),
    weights: fc.constantFrom('uncertainty', 'equal'),
    scatter: fc.constantFrom('estimate', 'none'),
    campaign_effect: fc.constantFrom('auto', 'none', 'intercept'),
    confidence: fc.constantFrom(0.5, 0.9, 0.999999),
    resamples: fc.constantFrom(0, 1, 50),
    monte_carlo: fc.boolean(),
  },
  { requiredKeys: [] },
);

const rest = fc.constantFrom(
  'audit: none',
  'audit: {against: applicable, tolerance: 20 %}',
  'audit: {against: applicable, analogy: true}',
  'audit: none\nplant: {quantities: {mass_flow: 0.3 kg/s to 3 kg/s, temperature: 40 degC, diameter: 50 mm, length: 3 m}}',
  'audit: {against: applicable}\nplant: {quantities: {mass_flow: 1e9 kg/s, temperature: 40 degC, diameter: 1e-9 m, length: 3 m}}',
  'audit: none\nrig: {mass_flow: [0.05 kg/s, 0.4 kg/s], campaigns: new}',
);

const changes: readonly (readonly [string, string])[] = [
  ['diameter: 20 mm', 'diameter: {value: 20 mm, systematic: 300 %}'],
  ['diameter: 20 mm', 'diameter: 1e-200 m'],
  ['length: 2 m', 'length: 1e200 m'],
  ['random: 1 %', 'random: 500 %'],
  ['random: 1 %', 'systematic: 0.001 %'],
  ['random: 0.1 K', 'random: 50 K'],
  ['Nu: pipe', 'Nu: {column: flow}'],
  ['{name: water, temperature: temperature}', '{name: air, temperature: temperature}'],
  ['trial: run', 'trial: run\n  campaign: run'],
  ['trial: run', 'trial: run\n  order: flow\n  setting: T_in'],
];

/** A study and its trials, sound in form: what they say may be absurd, extreme or beyond what data can tell. */
export const oddStudy: fc.Arbitrary<{ readonly study: string; readonly trials: string }> = fc
  .tuple(
    fc.array(law, { minLength: 1, maxLength: 2 }),
    trials,
    fc.option(fit),
    rest,
    fc.array(fc.constantFrom(...changes), { maxLength: 2 }),
  )
  .map(([laws, table, how, tail, some]) => {
    const list = laws.map((one) => `  - ${JSON.stringify(one)}`).join('\n');
    const bare = goodStudy.replace('  - Nu = C * Re^a * Pr^0.4', list).replace('audit: none\n', '');
    const changed = some.reduce((text, [from, to]) => text.replace(from, to), bare);
    return { study: `${changed}${tail}\n${how === null ? '' : `fit: ${JSON.stringify(how)}\n`}`, trials: table };
  });
