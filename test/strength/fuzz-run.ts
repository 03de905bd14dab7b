import fc from 'fast-check';
import type { Target } from './fuzz-targets.ts';

export interface Fuzzed {
  readonly read: number;
  readonly refused: number;
  /** Longest time of one input, ms. */
  readonly slowest: number;
  /** The smallest input that broke a promise, and which; nothing where none did. */
  readonly defect?: string;
}

/** No input of this size may take longer, ms; a loaded machine is allowed for. */
export const HANG = 5_000;

/** Throws inputs at a target until one breaks a promise. */
export function fuzz({ inputs, run }: Target, runs: number, seed: number): Fuzzed {
  let [read, refused, slowest] = [0, 0, 0];
  const once = (input: string | Uint8Array): void => {
    const since = performance.now();
    const end = run(input);
    const took = performance.now() - since;
    slowest = Math.max(slowest, took);
    if (took > HANG) throw new Error(`took ${took.toFixed(0)} ms`);
    if (end === 'read') read += 1;
    else refused += 1;
  };
  const told = fc.check(fc.property(inputs, once), { seed, numRuns: runs });
  if (!told.failed) return { read, refused, slowest };
  const [input] = told.counterexample!;
  const shown = typeof input === 'string' ? JSON.stringify(input) : Buffer.from(input!).toString('base64');
  const why = told.errorInstance instanceof Error ? (told.errorInstance.stack ?? '') : String(told.errorInstance);
  return { read, refused, slowest, defect: `${shown}\n${why.split('\n').slice(0, 6).join('\n')}` };
}
