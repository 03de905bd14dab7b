import { describe, expect, test } from 'vitest';
import { seeded } from '../../pipeline/numerics/random.ts';
import { type Asked, bestPlan, type Candidate, criterion, type DesignProblem } from '../../pipeline/scale-up/next/design.ts';
import { studyOf } from './study-on-disk.ts';

const nothing = { h: [0, 0, 0], s: 0, e: [] };
const grid = (n: number): readonly number[] => Array.from({ length: n }, (_, k) => -1 + (2 * k) / (n - 1));
const quadratic: readonly Candidate[] = grid(21).map((t) => ({ x: [1, t, t * t], d: [] }));
const faint = (p: number): readonly number[] => Array.from({ length: p * p }, (_, k) => (k % (p + 1) === 0 ? 1e-9 : 0));

/** All multisets of `count` of n indices. */
function plans(n: number, count: number, from = 0): readonly (readonly number[])[] {
  if (count === 0) return [[]];
  return Array.from({ length: n - from }, (_, k) => from + k).flatMap((k) => plans(n, count - 1, k).map((rest) => [k, ...rest]));
}

describe('the design of further trials', () => {
  // Kiefer and Wolfowitz 1960: a design is D-optimal where the variance function is nowhere above p/N; for a parabola on [-1, 1] thirds at -1, 0, 1.
  test('equivalence theorem for a parabola', () => {
    const problem: DesignProblem = {
      information: faint(3),
      pulls: [],
      candidates: quadratic,
      variance: 1,
      shrink: () => 0,
      campaign: nothing,
      asked: [],
    };
    const plan = bestPlan(problem, 12, seeded(1));
    const at = plan.map((index) => grid(21)[index]!).sort((a, b) => a - b);
    expect(at).toEqual([-1, -1, -1, -1, 0, 0, 0, 0, 1, 1, 1, 1]);
    const asked = (x: readonly number[]): number => criterion({ ...problem, asked: [{ w: x, plant: [] }] }, plan);
    for (const { x } of quadratic) expect(12 * asked(x)).toBeLessThan(3 + 1e-6);
    expect(12 * asked([1, 1, 1])).toBeCloseTo(3, 6);
  });

  // Exhaustive search over all multisets, in a new campaign, in an old one, with a systematic source.
  test.each([
    ['one campaign', () => 0, nothing],
    ['a new campaign', (s: number) => 0.04 / (1 + 0.04 * s), nothing],
    ['the last campaign', (s: number) => 0.04 / (1 + 0.04 * s), { h: [30, -5, 12], s: 40, e: [] }],
  ] as const)('equals exhaustive search: %s', (_, shrink, campaign) => {
    const random = seeded(7);
    for (let round = 0; round < 10; round++) {
      const candidates = Array.from({ length: 9 }, () => ({ x: [1, random.normal(), random.normal()], d: [] }));
      const asked: readonly Asked[] = [{ w: [1, 2 * random.normal(), random.normal()], plant: [] }];
      const problem: DesignProblem = {
        information: [50, 4, 1, 4, 30, 2, 1, 2, 20],
        pulls: [],
        candidates,
        variance: 0.05,
        shrink,
        campaign,
        asked,
      };
      const best = Math.min(...plans(9, 3).map((plan) => criterion(problem, plan)));
      expect(criterion(problem, bestPlan(problem, 3, seeded(round)))).toBeCloseTo(best, 12);
    }
  });

  // Matrix algebra by hand for one trial: Phi after = (Phi^-1 + x x^T/v - shrink h h^T)^-1, and a source's pull shifts with it.
  test('criterion by hand, with campaign and source', () => {
    const problem: DesignProblem = {
      information: [4],
      pulls: [[2]],
      candidates: [{ x: [3], d: [0.5] }],
      variance: 0.5,
      shrink: (s) => 0.1 / (1 + 0.1 * s),
      campaign: { h: [0], s: 0, e: [0] },
      asked: [{ w: [2], plant: [-0.3] }],
    };
    const shrink = 0.1 / (1 + 0.1 * 2);
    const phi = 1 / (4 + 9 / 0.5 - shrink * 6 ** 2);
    const pull = 2 + (3 * 0.5) / 0.5 - shrink * 6 * 1;
    expect(criterion(problem, [0])).toBeCloseTo(4 * phi + (2 * phi * pull - 0.3) ** 2, 14);
  });

  // Published argument for random effects: level sd tau, scatter sigma; n trials of a new campaign leave at least tau^2 of its own level. Figures of the design text of this
  // model, recomputed: six trials in six new campaigns do for the law what very many more in an old one do.
  test('new campaigns tell more than many trials in an old one', () => {
    const tau2 = 0.01;
    const v = 0.0025;
    const shrink = (s: number): number => tau2 / (1 + tau2 * s);
    const of = (n: number): number => n / v - shrink(n / v) * (n / v) ** 2;
    const base = 5 * of(6);
    const sixNew = 1 / (base + 6 * of(1));
    const manyOld = 1 / (base - of(6) + of(606));
    expect(sixNew).toBeLessThan(manyOld);
  });
});

const study = (rig: string, plant = 'plant: plant.csv\n'): Readonly<Record<string, string>> => ({
  'study.yaml': `pilotlaw: 1
title: next trials of an invented rig
transfer: heat
equipment: other
trials: {file: trials.csv, campaign: week}
groups: {Re: {column: Re}, Pr: {column: Pr}, Nu: {column: Nu}}
laws: [Nu = C * Re^a * Pr^b]
audit: none
${plant}rig: ${rig}
`,
  'trials.csv': `week,Re,Pr,Nu
${Array.from({ length: 16 }, (_, i) => {
  const [re, pr] = [3000 * 1.12 ** i, [3.1, 4.2, 3.6, 5.0][i % 4]!];
  const off = [0.04, -0.05, 0.02, -0.01][Math.floor(i / 4)]! + [0.01, -0.02, 0.015, -0.005][(i * 3) % 4]!;
  return `w${Math.floor(i / 4)},${re.toFixed(1)},${pr},${(0.03 * re ** 0.78 * pr ** 0.4 * Math.exp(off)).toFixed(3)}`;
}).join('\n')}
`,
  'plant.csv': 'case,Re,Pr\nP1,60000,8\n',
});

describe('next trials of a study', () => {
  test('lie in the box, narrow the case, and never below the floor', async () => {
    const { nextTrials } = await studyOf(study('{Re: [2000, 20000], Pr: {levels: [3, 5, 7]}}'));
    expect(nextTrials!.proposals).toHaveLength(3);
    for (const { settings, gain } of nextTrials!.proposals) {
      expect(settings.Re!.value).toBeGreaterThanOrEqual(2000);
      expect(settings.Re!.value).toBeLessThanOrEqual(20000 * (1 + 1e-12));
      expect([3, 5, 7]).toContain(settings.Pr!.value);
      expect(gain).toBeGreaterThan(0);
    }
    const [{ now, after, floor }] = nextTrials!.cases as [(typeof nextTrials & object)['cases'][number]];
    expect(after).toBeLessThan(now);
    expect(after).toBeGreaterThan(floor);
  });

  test('what trials cannot change is said: the floor', async () => {
    const { nextTrials } = await studyOf(study('{Re: [3000, 3100]}'));
    expect(nextTrials!.says).toMatch(/^Hardly anything narrows the plant prediction/);
    expect(nextTrials!.notes.find((note) => note.code === 'kept-at-middle')!.text).toContain('Pr');
  });

  test('a dear setting is changed less often', async () => {
    const levels = (rig: string) =>
      studyOf(study(rig)).then(({ nextTrials }) => new Set(nextTrials!.proposals.map((one) => one.settings.Pr!.value)).size);
    expect(await levels('{Re: [2000, 20000], Pr: {levels: [3, 5, 7], cost: 50}}')).toBe(1);
  });

  test('without plant cases the parameters are made certain together', async () => {
    const { nextTrials } = await studyOf(study('{Re: [2000, 20000], Pr: [3, 7]}', ''));
    expect(nextTrials!.cases).toEqual([]);
    expect(nextTrials!.notes.some((note) => note.code === 'no-plant')).toBe(true);
    expect(nextTrials!.proposals.every(({ gain }) => gain > 0)).toBe(true);
  });

  test('a setting that is no quantity is a fault with a suggestion', async () => {
    await expect(studyOf(study('{Ree: [2000, 20000]}'))).rejects.toMatchObject({
      messages: [expect.objectContaining({ code: 'unknown-setting', text: expect.stringContaining('did you mean "Re"') })],
    });
  });
});
