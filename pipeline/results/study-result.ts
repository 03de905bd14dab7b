import type { AuditResult } from '../audit/verdict.ts';
import type { Note } from '../base/message.ts';
import type { Budget } from '../budget/budget.ts';
import type { BreakSearch } from '../regression/break-search.ts';
import type { Choice } from '../regression/choose.ts';
import type { Identifiability, InfluenceRow, TheoryTest } from '../regression/evidence.ts';
import type { Fit } from '../regression/fit.ts';
import type { IntervalRow } from '../regression/intervals.ts';
import type { RobustRefit } from '../regression/robust.ts';
import type { ForPlant } from '../scale-up/for-plant.ts';
import type { NextTrialsResult, PlantResult } from '../scale-up/plant-result.ts';
import type { BothSides } from './both-sides.ts';
import type { LawCurve } from './curves.ts';

/** A group or quantity that appears in a law, as the report names it. */
export interface Definition {
  /** As the law writes it: `Re`. */
  readonly name: string;
  readonly key: string;
  /** ISO 80000 symbol or the name itself. */
  readonly symbol: string;
  readonly unit: string;
  /** `Re = u d rho/mu, d = bore, properties at bulk temperature` */
  readonly text: string;
  readonly source: string;
}

export interface LedgerRow {
  readonly trial: string;
  readonly campaign: string;
  readonly file: string;
  readonly line: number;
  readonly status: 'used' | 'left out' | 'refused';
  /** In words; empty for a plain used row. */
  readonly reason: string;
}

/** One number on the way from readings to the coefficient, for the walk by hand. */
export interface TraceStep {
  readonly key: string;
  readonly value: number;
  readonly unit: string;
  readonly formula: string;
  readonly source: string;
}

/** One trial that was used. Arrays run over `StudyResult.columns`. */
export interface TrialRow {
  readonly trial: string;
  readonly campaign: string;
  readonly line: number;
  readonly setting?: string;
  readonly readings: number;
  readonly coefficient: number;
  /** Values of columns, and standard uncertainty of their ln (random part). */
  readonly values: readonly number[];
  readonly uLn: readonly number[];
  /** What was read, in SI, for tooltips and the walk by hand. */
  readonly raw: Readonly<Record<string, number>>;
  readonly trace: readonly TraceStep[];
  readonly notes: readonly string[];
}

/** The whole result of one study: plain JSON, the only thing that reports and the writers see. */
export interface StudyResult {
  readonly format: 1;
  readonly study: {
    readonly title: string;
    readonly transfer: 'heat' | 'mass';
    readonly equipment: string;
    readonly file: string;
    readonly invented: boolean;
    readonly fluid: string;
    readonly route: string;
  };
  readonly options: {
    readonly error: 'relative' | 'absolute';
    readonly weights: string;
    readonly scatter: string;
    readonly campaignEffect: string;
    readonly confidence: number;
    readonly resamples: number;
    readonly tolerance: number;
  };
  /** What the laws give and the coefficient behind it. */
  readonly response: Definition;
  readonly coefficient: { readonly key: string; readonly symbol: string; readonly unit: string } | null;
  /** Response and all groups of all laws: the columns of the trial table. */
  readonly columns: readonly Definition[];
  readonly ledger: {
    readonly read: number;
    readonly used: number;
    readonly leftOut: number;
    readonly refused: number;
    readonly trials: number;
    readonly rows: readonly LedgerRow[];
  };
  readonly campaigns: readonly string[];
  readonly trials: readonly TrialRow[];
  readonly fits: readonly Fit[];
  readonly chosen: string;
  readonly choice: Choice;
  readonly theory: readonly TheoryTest[];
  readonly intervals: readonly IntervalRow[];
  readonly influence: readonly InfluenceRow[];
  /** The chosen law with less weight on trials far from it. */
  readonly robust: readonly RobustRefit[];
  /** Whether one exponent of Re holds for the chosen law. */
  readonly breaks: readonly BreakSearch[];
  readonly identifiability: readonly Identifiability[];
  readonly audit: AuditResult | null;
  readonly plant: PlantResult | null;
  readonly nextTrials: NextTrialsResult | null;
  /** What `predict` needs beside the laws. */
  readonly forPlant: ForPlant;
  readonly budgets: readonly Budget[];
  /** The chosen law against each group that varies. */
  readonly curves: readonly LawCurve[];
  /** Both sides of the chosen law, where it was fitted through overall coefficients. */
  readonly sides: BothSides | null;
  /** Logged curves behind a coefficient, thinned for drawing: t in s. */
  readonly series: readonly {
    readonly trial: string;
    readonly quantity: string;
    readonly unit: string;
    readonly t: readonly number[];
    readonly value: readonly number[];
    readonly fitted: readonly number[];
    /** Steady windows of a raw log and the mean in each. */
    readonly windows?: readonly { readonly trial: string; readonly from: number; readonly to: number; readonly level: number }[];
  }[];
  readonly notes: readonly Note[];
  readonly method: {
    readonly rules: readonly { readonly gives: string; readonly formula: string; readonly source: string }[];
    readonly inputs: readonly { readonly key: string; readonly from: string; readonly random: string; readonly systematic: string }[];
    readonly references: readonly string[];
    readonly statements: readonly string[];
  };
  readonly cautions: readonly string[];
  readonly provenance: {
    readonly version: string;
    readonly node: string;
    readonly seed: number;
    readonly files: readonly { readonly file: string; readonly sha256: string }[];
  };
}

export type { Identifiability, LawCurve };
