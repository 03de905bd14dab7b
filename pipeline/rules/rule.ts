/**
 * The name of a number in the rule book: a quantity (`velocity`), a second stream's quantity (`velocity_other`), a property at a named temperature
 * (`viscosity@film`, `viscosity@wall`; bare `viscosity` is at bulk), or a group by definition: `Re@pipe`, `Re@cylinder,film`, `Nu@pipe`, `Pr@film`, `Pr`, `Gr@length,film`.
 * After the `@` stand the basis (where the group has one) and then the property temperature (bulk left out), separated by a comma.
 */
export type Key = string;

/** Systematic sources keep their identity from rig to plant: a property model's error cancels, an instrument's does not. */
export type SourceId = string;

/** Validity of a step, per trial. `holds` must be false for NaN. */
export interface Check {
  readonly code: string;
  /** Keys it looks at; `u(KEY)` is the combined standard uncertainty of that key in SI, 0 where none is stated. */
  readonly from: readonly Key[];
  readonly holds: (...x: number[]) => boolean;
  readonly otherwise: 'refuse' | 'note' | 'warning';
  /** The sentence, with the numbers in it. */
  readonly says: (...x: number[]) => string;
}

/** How one key is had from others: unit conversions, derived quantities, fluid properties, routes, groups and users' formulas are all this record. SI in, SI out. */
export interface Rule {
  readonly gives: Key;
  readonly from: readonly Key[];
  /** Pure; solves to machine precision where it solves; NaN where it has no answer. Never throws. */
  readonly of: (...x: number[]) => number;
  /** The formula as a reader writes it: `k = rho_s (d0 - d1)/(2 dc t)`. */
  readonly formula: string;
  /** Publication, standard, `definition` or `common practice, no source`. */
  readonly source: string;
  /** Stated standard uncertainty (k = 1) of a model, a share of the result, as a systematic source of its own. */
  readonly accuracy?: { readonly source: SourceId; readonly share: number };
  readonly checks?: readonly Check[];
  /** Said to the reader once when this rule is in force: what it assumes. */
  readonly assumes?: string;
}

/** Standard uncertainty, k = 1: a share of the value, or in SI. */
export type Spread = { readonly share: number } | { readonly si: number };

/** One place where a number enters a recipe. */
export interface Input {
  readonly key: Key;
  /** A fresh draw for each trial. */
  readonly random?: Spread;
  /** The recorded value is a set point: its spread belongs to the scatter, not to the error in x. */
  readonly set?: boolean;
  /** One draw for each source, or for each source and campaign. */
  readonly systematic?: readonly { readonly spread: Spread; readonly source: SourceId; readonly per: 'study' | 'campaign' }[];
  /** Where the same value holds for all trials. */
  readonly constant?: number;
  /** What the report calls this source of uncertainty. */
  readonly label: string;
}

/** Rules in working order: nodes are the inputs, then the steps; `wanted` are node indices. */
export interface Recipe {
  readonly inputs: readonly Input[];
  /** One key for each node. */
  readonly keys: readonly Key[];
  /** `factor` is the node of a model's relative error (value 1), if it has one. */
  readonly steps: readonly { readonly rule: Rule; readonly from: readonly number[]; readonly factor?: number }[];
  readonly wanted: readonly number[];
}

/** A wanted key that cannot be had: the rules that would give it and what each of them lacks. */
export interface Missing {
  readonly key: Key;
  readonly ways: readonly { readonly rule: Rule; readonly lacks: readonly Key[] }[];
}
