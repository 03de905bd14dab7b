import { expect, test } from 'vitest';
import { InputError } from '../../pipeline/base/input-error.ts';
import { formatMessage } from '../../pipeline/base/message.ts';
import { parseOwnCorrelations } from '../../pipeline/study/own-correlations.ts';

// Dittus and Boelter 1930 in the form handbooks print for heating; here only as text.
const one =
  '- {id: tube-1930, authors: Dittus and Boelter, year: 1930, gives: Nu, family: tube, form: "Nu = 0.023 * Re^0.8 * Pr^0.4", groups: {Re: pipe, Nu: pipe}, at: {Pr: film}, in: {velocity: ft/s}, limits: ["Re >= 1e4", "0.7 <= Pr <= 160"], accuracy: 20 %, reads: mean line, source: a handbook}\n';

const told = (text: string): readonly string[] => {
  try {
    parseOwnCorrelations(text, 'own.yaml');
  } catch (error) {
    if (error instanceof InputError) return error.messages.map(formatMessage);
    throw error;
  }
  return [];
};

test('an entry keeps its texts and places', () => {
  const [entry] = parseOwnCorrelations(one, 'own.yaml');
  expect(entry).toMatchObject({
    id: { is: 'tube-1930' },
    year: 1930,
    groups: { Re: { is: 'pipe' } },
    at: { Pr: { is: 'film' } },
    in: { velocity: { is: 'ft/s' } },
    accuracy: '20 %',
    reads: { is: 'mean line' },
  });
  expect(entry!.limits.map(({ is }) => is)).toEqual(['Re >= 1e4', '0.7 <= Pr <= 160']);
  expect(entry!.limits[1]!.place).toMatchObject({ file: 'own.yaml', line: 1, key: '[1].limits[2]' });
});

test.each([
  ['a repeated id', one + one, /^own.yaml:2:8 {2}\[2\].id: a second correlation with id "tube-1930"/],
  ['a missing form', one.replace(/form: "[^"]*", /, ''), /form: is missing; give the correlation/],
  ['an unknown key', one.replace('gives', 'give'), /unknown key "give"; did you mean "gives"\?/],
  ['a year that is none', one.replace('year: 1930', 'year: old'), /"old" is not a year/],
  ['an unknown temperature', one.replace('Pr: film', 'Pr: flim'), /"flim" is not one of bulk, film, wall; did you mean "film"\?/],
  ['a map instead of a list', 'id: x\n', /a map of keys is not a list of correlations/],
  ['nothing', '', /nothing in it/],
])('%s', (_, text, expected) => {
  expect(
    told(text).some((message) => expected.test(message)),
    told(text).join('\n'),
  ).toBe(true);
});
