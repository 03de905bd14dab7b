import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { parseForm } from '../../pipeline/algebra/parse.ts';
import type { FitData, FitOptions } from '../../pipeline/regression/fit.ts';
import type { LawToFit } from '../../pipeline/regression/solve-law.ts';

/** A law from its text; every name in `groups` is a group, any other a parameter. */
export function law(text: string, groups: readonly string[], more: Partial<LawToFit> = {}): LawToFit {
  const parsed = parseForm(text, { known: groups, needsParameter: false });
  if (!('form' in parsed)) throw new Error(parsed.faults.map((fault) => fault.text).join('; '));
  const { form } = parsed;
  return { name: 'law', form, groups: Object.fromEntries([form.response, ...form.groups].map((name) => [name, name])), ...more };
}

export interface Raw {
  readonly y: ArrayLike<number>;
  readonly x: readonly ArrayLike<number>[];
  readonly campaign?: readonly number[];
  /** Per trial (1+g) x (1+g), nested or flat. */
  readonly sigma?: readonly (readonly (number | readonly number[])[])[];
  readonly sources?: readonly string[];
  /** Per trial (1+g) x s, row-major. */
  readonly systematic?: readonly ArrayLike<number>[];
  readonly weight?: ArrayLike<number>;
}

/** Values already on the scale of the fit. */
export function data(raw: Raw, scale: 'relative' | 'absolute' = 'relative'): FitData {
  const n = raw.y.length;
  const width = 1 + raw.x.length;
  const campaign = raw.campaign ?? new Array<number>(n).fill(0);
  const count = Math.max(...campaign) + 1;
  return {
    trials: Array.from({ length: n }, (_, i) => `T${i + 1}`),
    campaign,
    campaigns: Array.from({ length: count }, (_, c) => `week ${c + 1}`),
    y: Float64Array.from(raw.y),
    x: raw.x.map((column) => Float64Array.from(column)),
    sigma: Array.from({ length: n }, (_, i) =>
      raw.sigma === undefined ? new Float64Array(width * width) : Float64Array.from(raw.sigma[i]!.flat() as number[]),
    ),
    sources: raw.sources ?? [],
    systematic: Array.from({ length: n }, (_, i) => Float64Array.from(raw.systematic?.[i] ?? [])),
    ...(raw.weight === undefined ? {} : { weight: Float64Array.from(raw.weight) }),
    scale,
  };
}

export const options = (more: Partial<FitOptions> = {}): FitOptions => ({
  scale: 'relative',
  weights: 'uncertainty',
  scatter: 'estimate',
  campaignEffect: 'auto',
  confidence: 0.95,
  resamples: 0,
  seed: 1,
  ...more,
});

/** A stored output of another program. */
// biome-ignore lint/suspicious/noExplicitAny: the shape is that of the script that wrote it
export const fixture = (name: string): any => JSON.parse(readFileSync(join(import.meta.dirname, 'fixtures', name), 'utf8'));

/** Relative closeness to a number of digits. */
export function agree(got: number, want: number, digits: number): void {
  if (!(Math.abs(got - want) <= 10 ** -digits * Math.max(Math.abs(want), 1e-300)))
    throw new Error(`${got} is not ${want} to ${digits} digits`);
}
