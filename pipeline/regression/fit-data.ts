import type { Observations } from '../observations/observation.ts';
import type { Key } from '../rules/rule.ts';
import type { FitData } from './fit.ts';

/** D D^T of a row-major block of `rows` rows, row-major. */
export function outerProduct(block: Float64Array, rows: number): Float64Array {
  const width = block.length / rows;
  const out = new Float64Array(rows * rows);
  for (let a = 0; a < rows; a++) {
    for (let b = 0; b <= a; b++) {
      let sum = 0;
      for (let j = 0; j < width; j++) sum += block[a * width + j]! * block[b * width + j]!;
      out[a * rows + b] = sum;
      out[b * rows + a] = sum;
    }
  }
  return out;
}

/** Rows of a row-major block, in the order asked for. */
function rowsOf(block: Float64Array, width: number, rows: readonly number[]): Float64Array {
  const out = new Float64Array(rows.length * width);
  rows.forEach((row, k) => {
    out.set(block.subarray(row * width, (row + 1) * width), k * width);
  });
  return out;
}

/** What one law sees of the observations: its response, then its groups, by their keys. Every trial must have them. */
export function fitData(observations: Observations, keys: readonly Key[], weight?: Float64Array): FitData {
  const rows = keys.map((key) => observations.keys.indexOf(key));
  const missing = keys.filter((_, k) => rows[k]! < 0);
  if (missing.length > 0) throw new Error(`observations lack ${missing.join(', ')}`);
  const { z, random, randomInputs, systematic, sources, trials, campaign, campaigns, scale } = observations;
  return {
    trials,
    campaign,
    campaigns,
    y: z[rows[0]!]!,
    x: rows.slice(1).map((row) => z[row]!),
    sigma: random.map((block) => outerProduct(rowsOf(block, randomInputs.length, rows), rows.length)),
    sources,
    systematic: systematic.map((block) => rowsOf(block, sources.length, rows)),
    ...(weight === undefined ? {} : { weight }),
    scale,
  };
}

/** The same data for some of the trials; campaigns are numbered anew. */
export function subset(data: FitData, trials: readonly number[]): FitData {
  const present = [...new Set(trials.map((i) => data.campaign[i]!))].sort((a, b) => a - b);
  const pick = <T>(values: readonly T[]): T[] => trials.map((i) => values[i]!);
  const column = (values: Float64Array): Float64Array => Float64Array.from(trials, (i) => values[i]!);
  return {
    ...data,
    trials: pick(data.trials),
    campaign: trials.map((i) => present.indexOf(data.campaign[i]!)),
    campaigns: present.map((c) => data.campaigns[c]!),
    y: column(data.y),
    x: data.x.map(column),
    sigma: pick(data.sigma),
    systematic: pick(data.systematic),
    ...(data.weight === undefined ? {} : { weight: column(data.weight) }),
  };
}
