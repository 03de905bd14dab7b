import { InputError } from '../base/input-error.ts';
import type { Place } from '../base/place.ts';
import type { Staged } from '../base/staged.ts';
import type { Plan } from '../plan/plan.ts';
import { quantities } from '../quantities/vocabulary.ts';
import type { SeriesReduction } from '../reduction/series/series.ts';
import { evaluate } from '../rules/evaluate.ts';
import { resolve } from '../rules/resolve.ts';
import type { Key } from '../rules/rule.ts';
import type { Trial } from '../trials/average.ts';
import { type TrialsWithCurves, withCurves } from '../trials/curve-readings.ts';
import type { LogSource } from '../trials/log-stream.ts';
import type { Trials } from '../trials/read-trials.ts';
import { readStudySeries } from '../trials/study-series.ts';
import type { Table } from '../trials/table.ts';

/** Trials with what their logged curves come down to, where the study has curves; the trials as they are where it has none. */
export async function curvesOf(
  plan: Plan,
  table: Table,
  read: Staged<Trials>,
  open: (file: string, place: Place) => LogSource,
): Promise<Staged<Trials | TrialsWithCurves>> {
  const entry = plan.study.coefficient?.series;
  if (entry === undefined || plan.curve === undefined) return read;
  const { missing } = plan.study.trials;
  const quantity = plan.curve.anyUnit === true ? undefined : quantities[plan.curve.value];
  const found = await readStudySeries({
    entry,
    table,
    trials: read.value.trials,
    missing,
    open,
    ...(quantity === undefined ? {} : { quantity }),
  });
  const made = withCurves(read.value, found.value, plan.curve, otherReadings(plan, plan.curve, read.value.keys));
  const refused = [...read.refused, ...found.refused, ...made.refused];
  if (made.value.trials.length === 0 && found.refused.length + made.refused.length > 0)
    throw new InputError(
      [...found.refused, ...made.refused].slice(0, 20).map(({ code, text, place }) => ({ code, text, place: place ?? entry.value.place })),
      3,
    );
  return { value: made.value, notes: [...read.notes, ...found.notes, ...made.notes], refused };
}

/** What else is known of a trial, given or derived from what is: undefined where it has none. */
function otherReadings(
  { book, recipe: { inputs } }: Plan,
  { gives, needs, optional }: SeriesReduction,
  columns: readonly string[],
): (trial: Trial) => (key: Key) => number | undefined {
  const own = inputs.filter(({ key }) => !gives.includes(key));
  const { recipe } = resolve(book, own, [...needs, ...optional]);
  const position = recipe.inputs.map((input) => columns.indexOf(input.key));
  return ({ values }) => {
    const given = Float64Array.from(recipe.inputs, (input, j) => input.constant ?? values[position[j]!] ?? Number.NaN);
    const nodes = new Float64Array(recipe.keys.length);
    evaluate(recipe, given, nodes);
    return (key) => {
      const value = nodes[recipe.keys.indexOf(key)];
      return value === undefined || Number.isNaN(value) ? undefined : value;
    };
  };
}
