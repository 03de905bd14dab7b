import type { Note } from '../base/message.ts';

/** What one law (fitted, or published with its rig factor) says for one plant case. Coefficient in SI. */
export interface CasePrediction {
  readonly by: string;
  readonly kind: 'fitted law' | 'published with rig factor' | 'published as it stands';
  readonly coefficient: number;
  readonly lawLower: number;
  readonly lawUpper: number;
  readonly lower: number;
  readonly upper: number;
  readonly degreesOfFreedom: number;
  /** Shares of the prediction variance of ln coefficient, summing to 1, largest first. */
  readonly shares: readonly { readonly source: string; readonly share: number }[];
  readonly inRange: boolean;
}

export interface Extrapolation {
  readonly of: string;
  readonly kind: 'group' | 'raw' | 'joint';
  readonly unit: string;
  readonly value: number;
  readonly from: number;
  readonly to: number;
  /** 1 inside; otherwise value/to or from/value. */
  readonly beyond: number;
}

export interface PlantCase {
  readonly name: string;
  readonly values: Readonly<Record<string, number>>;
  readonly groups: Readonly<Record<string, number>>;
  /** First the chosen law. */
  readonly predictions: readonly CasePrediction[];
  /** Largest over smallest coefficient among the predictions. */
  readonly spread: number;
  /** Which of prediction interval and spread is wider, hence the one to use. */
  readonly wider: 'interval' | 'spread between laws';
  readonly design: { readonly coefficient: number; readonly side: 'low' | 'high'; readonly confidence: number };
  readonly target?: {
    readonly find: string;
    readonly unit: string;
    readonly nominal: number;
    readonly design: number;
    readonly formula: string;
  };
  readonly overall?: {
    readonly nominal: number;
    readonly lower: number;
    readonly upper: number;
    readonly resistances: readonly { readonly name: string; readonly value: number }[];
  };
  readonly extrapolation: readonly Extrapolation[];
  readonly floors: readonly { readonly says: string; readonly value: number }[];
  readonly verdict: string;
}

export interface CriterionRow {
  readonly criterion: string;
  readonly rotationSpeed: number;
  readonly power: number;
  readonly powerPerVolume: number;
  readonly tipSpeed: number;
  readonly coefficient: number;
  readonly lower: number;
  readonly upper: number;
}

export interface PlantResult {
  readonly coefficient: { readonly key: string; readonly symbol: string; readonly unit: string };
  readonly cases: readonly PlantCase[];
  readonly criteria: readonly { readonly of: string; readonly rows: readonly CriterionRow[] }[];
  readonly notes: readonly Note[];
  readonly says: string;
}

export interface NextTrialsResult {
  readonly proposals: readonly {
    readonly settings: Readonly<Record<string, { readonly value: number; readonly unit: string }>>;
    readonly campaign: string;
    readonly groups: Readonly<Record<string, number>>;
    readonly gain: number;
  }[];
  /** Half-width of the prediction interval as a factor minus 1, now and after all proposals, and the floor that no trial can pass. */
  readonly cases: readonly { readonly name: string; readonly now: number; readonly after: number; readonly floor: number }[];
  readonly notes: readonly Note[];
  readonly says: string;
}
