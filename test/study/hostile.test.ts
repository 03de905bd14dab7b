import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { InputError } from '../../pipeline/base/input-error.ts';
import { parseOwnCorrelations } from '../../pipeline/study/own-correlations.ts';
import { parseStudy } from '../../pipeline/study/parse-study.ts';

/** Parses, or refuses with messages that all have a place; anything else is a defect. */
function survives(text: string): 'accepted' | 'refused' {
  for (const parse of [parseStudy, parseOwnCorrelations]) {
    try {
      parse(text, 'study.yaml');
      if (parse === parseStudy) return 'accepted';
    } catch (error) {
      if (!(error instanceof InputError)) throw error;
      expect(error.messages.length).toBeGreaterThan(0);
      for (const { place, text: said } of error.messages)
        expect(place?.file === 'study.yaml' && said.length > 0 && said.length < 1000).toBe(true);
    }
  }
  return 'refused';
}

const many = 80_000;
const lol = [
  'a: &a ["x","x","x","x","x","x","x","x","x"]',
  ...Array.from('bcdefghij', (c, k) => `${c}: &${c} [${Array(9).fill(`*${'abcdefghij'[k]}`).join(',')}]`),
].join('\n');

describe('hostile text is refused in seconds', () => {
  test.each([
    ['brackets', '['.repeat(many)],
    ['braces', '{'.repeat(many)],
    ['sequences in a line', '- '.repeat(many / 2)],
    ['question marks', '? '.repeat(many / 2)],
    ['nested maps', Array.from({ length: 600 }, (_, k) => `${' '.repeat(k)}k:`).join('\n')],
    ['anchors', '&a '.repeat(many / 3)],
    ['aliases', `a: &a 1\nb: [${'*a,'.repeat(many / 3.2)}1]`],
    ['an alias bomb', lol],
    ['closed brackets', '[]'.repeat(many / 2)],
    ['bangs', '! '.repeat(many / 2)],
    ['directives', '%a\n'.repeat(many / 3)],
    ['documents', '---\n'.repeat(many / 4)],
    ['keys', Array.from({ length: 25_000 }, (_, k) => `k${k}: 1`).join('\n')],
    ['the same key', 'title: 1\n'.repeat(many / 9)],
    ['one long text', `title: ${'x'.repeat(many)}`],
    ['laws', `laws: [${'a,'.repeat(many / 2.1)}]`],
    ['more than is read', ' '.repeat(300_000)],
    ['NUL', 'title: "\0"\n'],
    ['NUL bare', '\0\0\0'],
    ['lone surrogates', 'title: \ud800\n'],
  ])('%s', (_, text) => {
    const start = performance.now();
    expect(survives(text)).toBe('refused');
    expect(performance.now() - start).toBeLessThan(15_000);
  });
});

const piece = fc.constantFrom(
  'pilotlaw: 1',
  'title',
  'laws',
  'quantities',
  'fit',
  'plant',
  'rig',
  'audit',
  'fluid',
  'groups',
  'trials',
  'output',
  'coefficient',
  ': ',
  '\n',
  '  ',
  '- ',
  '[',
  ']',
  '{',
  '}',
  ',',
  '&a ',
  '*a',
  '!!str ',
  '"',
  "'",
  '|',
  '>',
  '? ',
  '#',
  '\t',
  '%',
  '1e999',
  '0x1F',
  '.inf',
  '.nan',
  'null',
  'true',
  '~',
  '<<',
  '__proto__',
  'constructor',
  '---',
  '...',
  '20 %',
  'é',
  '\u2028',
);

test('any mixture of YAML pieces is read or refused, never a defect', () => {
  fc.assert(
    fc.property(fc.array(piece, { maxLength: 60 }), (pieces) => {
      survives(pieces.join(''));
    }),
    { seed: 8, numRuns: 1500 },
  );
});

const sound = `pilotlaw: 1
title: T
transfer: mass
trials: {file: t.csv, leave_out: [{trial: 1, reason: r}]}
quantities: {d: {value: 3 mm, expanded: 1 mm, k: 2}, u: 3 m/s}
fluid: {own: water, other: {table: t.csv, by: [temperature]}}
coefficient: {route: r, series: {file: l.csv, trial: t, time: t, value: c, window: [0 s, 1 s]}}
groups: {Re: pipe}
laws: [{form: Sh = C * Re^a, start: {a: 1}, bounds: {a: [0, 2]}}]
rig: {u: [1 m/s, 2 m/s]}
plant: {quantities: {u: 3 m/s}, target: {find: area}}
`;

test('a sound study with any one piece put in, taken out or exchanged is read or refused', () => {
  expect(survives(sound)).toBe('accepted');
  fc.assert(
    fc.property(fc.nat(sound.length), fc.nat(12), fc.option(piece), (at, cut, put) => {
      survives(sound.slice(0, at) + (put ?? '') + sound.slice(at + cut));
    }),
    { seed: 9, numRuns: 1500 },
  );
});
