import type { Correlation } from '../../correlations/correlation.ts';
import type { Form } from '../algebra/form.ts';
import type { Note } from '../base/message.ts';
import type { Place } from '../base/place.ts';
import type { Unit } from '../quantities/unit.ts';
import type { SeriesReduction } from '../reduction/series/series.ts';
import type { RuleBook } from '../rules/resolve.ts';
import type { Key, Recipe } from '../rules/rule.ts';
import type { Study } from '../study/study.ts';
import type { OtherSide, OwnSide } from './other-side-plan.ts';
import type { PlantBasis } from './plant-basis.ts';
import type { PlantPlan } from './plant-plan.ts';
import type { RigPlan } from './rig-plan.ts';

/** A column of the trial table that a recipe's input is read from, its unit settled. */
export interface DeclaredColumn {
  readonly key: Key;
  /** The header's name of it, without the unit. */
  readonly column: string;
  /** Position in the table, from 0. */
  readonly index: number;
  readonly unit: Unit;
  readonly place: Place;
}

/** A law with its names settled. */
export interface PlannedLaw {
  readonly name: string;
  readonly form: Form;
  readonly groups: Readonly<Record<string, Key>>;
  readonly start: Readonly<Record<string, number>>;
  readonly bounds: Readonly<Record<string, readonly [number, number]>>;
  /** Names of quantities that enter in a unit of their own -> that unit. */
  readonly units: Readonly<Record<string, string>>;
  readonly place: Place;
  /** The law of one side that this one of the overall coefficient was made from. */
  readonly own?: OwnSide;
}

/** A published correlation as prepared for these trials. */
export interface Candidate {
  readonly correlation: Correlation;
  readonly basis: 'direct' | 'analogy';
  readonly own: boolean;
  readonly keys: Readonly<Record<string, Key>>;
  /** What it needs and cannot have, in words; empty where it is comparable. */
  readonly lacks: readonly string[];
  /** Every definition in words. */
  readonly definitions: Readonly<Record<string, string>>;
}

/** How a key is named and printed. */
export interface Naming {
  readonly name: string;
  readonly key: Key;
  readonly symbol: string;
  readonly unit: string;
  readonly text: string;
  readonly source: string;
}

/** Where names meet: study and table header settled into what will be computed. */
export interface Plan {
  readonly study: Study;
  readonly columns: readonly DeclaredColumn[];
  readonly book: RuleBook;
  readonly recipe: Recipe;
  readonly laws: readonly PlannedLaw[];
  /** Keys of all laws: a trial without one of them is refused. */
  readonly required: ReadonlySet<Key>;
  readonly candidates: readonly Candidate[];
  readonly namings: ReadonlyMap<Key, Naming>;
  readonly coefficient: { readonly key: Key; readonly symbol: string; readonly unit: string } | null;
  /** How a trial's logged curve becomes its readings, where the study has curves. */
  readonly curve?: SeriesReduction;
  /** Where laws of one side are fitted through overall coefficients. */
  readonly otherSide?: OtherSide;
  /** What a plant case takes over. */
  readonly basis: PlantBasis;
  /** Absent where the study names no plant. */
  readonly plant?: PlantPlan;
  /** Absent where the study has no rig section. */
  readonly rig?: RigPlan;
  /** Raw quantities of the trials that a plant case is held against: size, speed, power, time. */
  readonly tried: Recipe;
  /** Text quantities such as impeller_type. */
  readonly texts: Readonly<Record<string, string>>;
  readonly notes: readonly Note[];
}
