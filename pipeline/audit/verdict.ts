import type { Note } from '../base/message.ts';

export type VerdictWord =
  | 'fits as published'
  | 'fits with a rig factor'
  | 'wrong trend'
  | 'not decided by these trials'
  | 'outside its range'
  | 'not comparable';

/** measured/predicted against one group: slope of ln q over ln x with its interval. */
export interface Trend {
  readonly group: string;
  readonly slope: number;
  readonly lower: number;
  readonly upper: number;
  readonly pHolm: number;
  /** |slope| ln(max/min): what the trend amounts to over the trials. */
  readonly span: number;
}

/** One published correlation against the trials. NaN where a number does not exist; `verdict` says why. */
export interface AuditRow {
  readonly id: string;
  readonly title: string;
  readonly authors: string;
  readonly year: number;
  readonly text: string;
  readonly source: string;
  readonly basis: 'direct' | 'analogy';
  readonly own: boolean;
  readonly reads: 'mean line' | 'lower bound' | 'upper bound';
  readonly accuracy: string;
  readonly definitions: Readonly<Record<string, string>>;
  readonly verdict: VerdictWord;
  readonly why: string;
  /** Keys it needs and cannot have, where not comparable. */
  readonly lacks: readonly string[];
  readonly n: number;
  readonly nInRange: number;
  /** Per limit: how many trials hold it. */
  readonly limits: readonly { readonly says: string; readonly inside: number }[];
  /** Geometric mean of measured/predicted over in-range trials. */
  readonly bias: number;
  readonly scatterLn: number;
  readonly rmsLn: number;
  /** Shares, 0 to 1. */
  readonly within20: number;
  readonly within30: number;
  readonly rigFactor: number;
  readonly rigFactorLower: number;
  readonly rigFactorUpper: number;
  /** Same left-out trials for all three; NaN where too few. */
  readonly cvRmsLnAsPublished: number;
  readonly cvRmsLnWithFactor: number;
  readonly cvRmsLnFittedLaw: number;
  readonly trends: readonly Trend[];
  /** Per trial: predicted response (as published) and whether all limits hold. */
  readonly predicted: readonly number[];
  readonly inside: readonly boolean[];
}

export interface AuditResult {
  readonly tolerance: number;
  readonly rows: readonly AuditRow[];
  readonly notes: readonly Note[];
  /** One sentence for the head of the section. */
  readonly says: string;
}
