import type { Key } from '../../rules/rule.ts';

/** A logged curve of one trial in SI, times ascending, already cut to its window. */
export interface Curve {
  readonly time: Float64Array;
  readonly value: Float64Array;
}

/** A reading with its standard uncertainty (random, k = 1) as found in the curve itself. */
interface CurveReading {
  readonly value: number;
  readonly u: number;
}

/** What a curve comes down to, or why it does not. */
export type CurveResult =
  | {
      readonly readings: Readonly<Record<Key, CurveReading>>;
      /** The fitted curve at the times given, for the chart. */
      readonly fitted: Float64Array;
      readonly notes: readonly { readonly code: string; readonly text: string }[];
    }
  | { readonly refused: { readonly code: string; readonly text: string } };

/** How a logged curve becomes readings of a trial. */
export interface SeriesReduction {
  /** The quantity that the curve holds, for its unit: `temperature`, `bulk_concentration`. */
  readonly value: Key;
  /** The curve may hold anything that is linear in that quantity, in any unit. */
  readonly anyUnit?: true;
  /** Keys it gives, as readings of the trial. */
  readonly gives: readonly Key[];
  /** Values of the trial that it looks at, SI; those in `optional` may be missing. */
  readonly needs: readonly Key[];
  readonly optional: readonly Key[];
  readonly reduce: (curve: Curve, given: (key: Key) => number | undefined) => CurveResult;
}
