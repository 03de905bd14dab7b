import { seeded } from '../../pipeline/numerics/random.ts';
import { inverse } from '../../pipeline/regression/dense.ts';
import { fitLaw } from '../../pipeline/regression/fit-law.ts';
import { bestPlan, type Candidate } from '../../pipeline/scale-up/next/design.ts';
import { problemIn, standingOf } from '../../pipeline/scale-up/next/problem.ts';
import { data, law, options } from '../regression/laws.ts';

/** One kind of rig. All invented: ln Nu = ln C + a ln Re + b ln Pr, scatter 0.05. */
export interface Rig {
  readonly name: string;
  readonly campaigns: number;
  readonly perCampaign: number;
  readonly tau: number;
  readonly count: number;
  readonly into: 'new' | 'existing';
}

export const rigs: readonly Rig[] = [
  { name: '16 trials in 4 campaigns, 4 more in a new one', campaigns: 4, perCampaign: 4, tau: 0.1, count: 4, into: 'new' },
  { name: '16 trials in 4 campaigns, 4 more in the last', campaigns: 4, perCampaign: 4, tau: 0.1, count: 4, into: 'existing' },
  { name: '15 trials in 5 campaigns, 8 more in a new one', campaigns: 5, perCampaign: 3, tau: 0.05, count: 8, into: 'new' },
  { name: '12 trials in 1 campaign, 4 more', campaigns: 1, perCampaign: 12, tau: 0, count: 4, into: 'existing' },
];

const SIGMA = 0.05;
const RE = [Math.log(3e3), Math.log(6e4)] as const;
const PR = [Math.log(2), Math.log(9)] as const;
const level = ([low, high]: readonly [number, number], k: number, n: number): number => low + ((high - low) * k) / (n - 1);

type Point = readonly [number, number];
const grid: readonly Point[] = Array.from({ length: 28 }, (_, k) => [level(RE, k % 7, 7), level(PR, Math.floor(k / 7), 4)] as const);
const corners: readonly Point[] = [
  [RE[0], PR[0]],
  [RE[1], PR[0]],
  [RE[0], PR[1]],
  [RE[1], PR[1]],
];
const gradient = ([re, pr]: Point): readonly number[] => [1, re, pr];

/** Ratio of the law variance at the plant after following the proposals to that after other plans of the same size and campaign, all at the true variances. */
export interface PlanRatios {
  readonly factorial: number;
  /** To the best of twenty random plans. */
  readonly random: number;
}

/** One synthetic rig: narrow trials, a plant three times beyond the box in Re. Seeded. */
export function planRatios(rig: Rig, seed: number): PlanRatios {
  const random = seeded(seed);
  const truth = { lnC: Math.log(0.02 + 0.02 * random.uniform()), a: 0.6 + 0.25 * random.uniform(), b: 0.3 + 0.15 * random.uniform() };
  const points: Point[] = [];
  const campaign: number[] = [];
  const y: number[] = [];
  for (let c = 0; c < rig.campaigns; c++) {
    const shift = rig.tau * random.normal();
    for (let k = 0; k < rig.perCampaign; k++) {
      const re = RE[0] + (RE[1] - RE[0]) * (0.25 + 0.5 * random.uniform());
      const pr = PR[0] + (PR[1] - PR[0]) * (0.3 + 0.4 * random.uniform());
      points.push([re, pr]);
      campaign.push(c);
      y.push(truth.lnC + truth.a * re + truth.b * pr + shift + SIGMA * random.normal());
    }
  }
  const trials = data({ y, x: [points.map(([re]) => re), points.map(([, pr]) => pr)], campaign });
  const fit = fitLaw(law('Nu = C * Re^a * Pr^b', ['Nu', 'Re', 'Pr']), trials, options());
  const standing = standingOf(fit, trials);
  const plant = gradient([RE[1] + Math.log(3), (PR[0] + PR[1]) / 2]);
  const c = fit.values.C!;
  const scaled = (x: readonly number[]): readonly number[] => [x[0]! / c, x[1]!, x[2]!].map((value, k) => value * standing.scale[k]!);
  const candidates: readonly Candidate[] = grid.map((point) => ({ x: scaled(gradient(point)), d: [] }));
  const problem = problemIn(standing, rig.into, { candidates, asked: [{ w: scaled(plant), plant: [] }] });
  const proposed = bestPlan(problem, rig.count, seeded(seed)).map((index) => grid[index]!);
  const variance = (more: readonly Point[]): number => trueVariance(rig, points, campaign, more, plant);
  const ours = variance(proposed);
  const factorial = variance(Array.from({ length: rig.count }, (_, k) => corners[k % 4]!));
  const randoms = Array.from({ length: 20 }, () => variance(Array.from({ length: rig.count }, () => grid[random.integer(grid.length)]!)));
  return { factorial: ours / factorial, random: ours / Math.min(...randoms) };
}

/** w^T (X^T V^-1 X)^-1 w by the matrix V itself, at the true scatter and campaign variance. */
function trueVariance(
  rig: Rig,
  points: readonly Point[],
  campaign: readonly number[],
  more: readonly Point[],
  w: readonly number[],
): number {
  const into = rig.into === 'new' ? rig.campaigns : rig.campaigns - 1;
  const all = [...points, ...more];
  const of = [...campaign, ...more.map(() => into)];
  const n = all.length;
  const v = Array.from({ length: n * n }, (_, k) => {
    const [i, j] = [Math.floor(k / n), k % n];
    return (i === j ? SIGMA ** 2 : 0) + (of[i] === of[j] ? rig.tau ** 2 : 0);
  });
  const inverted = inverse(v, n);
  const x = all.map(gradient);
  const p = w.length;
  const information = Array.from({ length: p * p }, (_, k) => {
    const [a, b] = [Math.floor(k / p), k % p];
    let sum = 0;
    for (let i = 0; i < n; i++) for (let j = 0; j < n; j++) sum += x[i]![a]! * inverted[i * n + j]! * x[j]![b]!;
    return sum;
  });
  const phi = inverse(information, p);
  return w.reduce((sum, wi, i) => sum + w.reduce((inner, wj, j) => inner + wi * phi[i * p + j]! * wj, 0), 0);
}

export const share = (ratios: readonly number[]): number => ratios.filter((ratio) => ratio <= 1.02).length / ratios.length;
