import { describe, expect, test } from 'vitest';
import { catalogue } from '../../correlations/catalogue.ts';
import { pilotlaw } from './captured.ts';

test('the list names every entry on a line of its own', async () => {
  const { exit, out, err } = await pilotlaw('correlations');
  expect([exit, err]).toEqual([0, '']);
  expect(
    out
      .trim()
      .split('\n')
      .map((line) => line.split(/ +/)[0]),
  ).toEqual(catalogue.map(({ id }) => id));
});

test('--family, --gives and --search narrow it down together', async () => {
  const { out } = await pilotlaw('correlations', '--family', 'tube', '--gives', 'Nu', '--search', 'LAMINAR wall');
  const ids = out
    .trim()
    .split('\n')
    .map((line) => line.split(/ +/)[0]!);
  expect(ids.length).toBeGreaterThan(0);
  for (const id of ids) expect(catalogue.find((one) => one.id === id)).toMatchObject({ family: 'tube', form: { response: 'Nu' } });
  expect((await pilotlaw('correlations', '--search', 'no such words anywhere')).exit).toBe(2);
});

test('--json is a list with the promised keys', async () => {
  const list = JSON.parse((await pilotlaw('correlations', '--json')).out);
  expect(list).toHaveLength(catalogue.length);
  for (const entry of list)
    expect(Object.keys(entry)).toEqual([
      'id',
      'authors',
      'year',
      'title',
      'family',
      'gives',
      'needs',
      'limits',
      'accuracy',
      'source',
      'reads',
    ]);
  expect(JSON.parse((await pilotlaw('correlations', '--json', '--search', 'no such words anywhere')).out)).toEqual([]);
});

test('one in full: formula, definitions, range, source', async () => {
  const { out } = await pilotlaw('correlations', 'churchill-bernstein-1977');
  for (const part of [
    'Nu = 0.3 + 0.62 * Re',
    'properties at film temperature',
    'Re * Pr >= 0.2',
    'J. Heat Transfer 99 (1977) 300',
    'lower bound',
  ])
    expect(out).toContain(part);
});

test('quantities that stand in a form by themselves are told with their SI unit', async () => {
  const { out } = await pilotlaw('correlations', 'vant-riet-1979-coalescing');
  for (const part of ['gas_velocity: superficial gas velocity, m/s', 'power_per_volume: power per volume of liquid, W/m^3'])
    expect(out).toContain(part);
});

describe('--at', () => {
  // Incropera and others, Fundamentals of Heat and Mass Transfer, 6th ed. 2007, Example 7.4: Nu = 40.6 at Re = 6071, Pr = 0.70.
  test('the value of a printed example, and that it is in range', async () => {
    const { exit, out } = await pilotlaw('correlations', 'churchill-bernstein-1977', '--at', 'Re=6071, Pr=0.70', '--json');
    const result = JSON.parse(out);
    expect([exit, Object.keys(result)]).toEqual([0, ['id', 'gives', 'value', 'in_range', 'limits']]);
    expect(result.value).toBeCloseTo(40.6, 1);
    expect(result).toMatchObject({
      gives: 'Nu',
      in_range: true,
      limits: [
        { says: 'Re * Pr >= 0.2', inside: true },
        { says: 'Re <= 1e7', inside: true },
      ],
    });
  });

  test('outside is told in words and in JSON', async () => {
    const { exit, out } = await pilotlaw('correlations', 'churchill-bernstein-1977', '--at', 'Re=6e7, Pr=0.70');
    expect(exit).toBe(0);
    expect(out).toMatch(/OUTSIDE the range its authors state\n {4}Re \* Pr >= 0.2: inside\n {4}Re <= 1e7: OUTSIDE/);
    expect(JSON.parse((await pilotlaw('correlations', 'churchill-bernstein-1977', '--at', 'Re=6e7, Pr=0.70', '--json')).out).in_range).toBe(
      false,
    );
  });

  test('a limit on a group that the formula does not need and that is not given is not judged', async () => {
    const bare = JSON.parse((await pilotlaw('correlations', 'leveque-1928-mean', '--at', 'Gz_heat=500', '--json')).out);
    expect(bare.in_range).toBeNull();
    expect(bare.limits).toContainEqual({ says: 'Re <= 2300', inside: null });
    expect(JSON.parse((await pilotlaw('correlations', 'leveque-1928-mean', '--at', 'Gz_heat=500, Re=1000', '--json')).out).in_range).toBe(
      true,
    );
    expect((await pilotlaw('correlations', 'leveque-1928-mean', '--at', 'Gz_heat=500')).out).toMatch(/not all of its range/);
  });

  test.each([
    [['correlations', 'churchill-bernstein-1977', '--at', 'Re=6071'], /^--at: Pr is needed too/],
    [
      ['correlations', 'churchill-bernstein-1977', '--at', 'Re=6071, Pe=1'],
      /^--at: Pe does not stand in this correlation, which has Re, Pr; did you mean "Re"\?/,
    ],
    [['correlations', 'churchill-bernstein-1977', '--at', 'Re=-1, Pr=0.7'], /^Nu has no value there/],
    [['correlations', '--at', 'Re=1'], /^--at needs the id of one correlation/],
    [
      ['correlations', 'churchill-bernstien-1977'],
      /no published correlation has the id "churchill-bernstien-1977"; did you mean "churchill-bernstein-1977"\?/,
    ],
  ])('%j', async (words, expected) => {
    const { exit, out, err } = await pilotlaw(...words);
    expect(err).toMatch(expected);
    expect([exit, out]).toEqual([2, '']);
  });
});
