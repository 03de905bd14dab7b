import { InputError } from '../base/input-error.ts';
import type { Place } from '../base/place.ts';
import type { Staged } from '../base/staged.ts';
import type { Plan } from '../plan/plan.ts';
import { quantities } from '../quantities/vocabulary.ts';
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
  const quantity = quantities[plan.curve.value];
  const found = await readStudySeries({
    entry,
    table,
    trials: read.value.trials,
    missing,
    open,
    ...(quantity === undefined ? {} : { quantity }),
  });
  const constants = Object.fromEntries(
    plan.recipe.inputs.flatMap(({ key, constant }) => (constant === undefined ? [] : [[key, constant]])),
  );
  const made = withCurves(read.value, found.value, plan.curve, constants);
  const refused = [...read.refused, ...found.refused, ...made.refused];
  if (made.value.trials.length === 0 && found.refused.length + made.refused.length > 0)
    throw new InputError(
      [...found.refused, ...made.refused].slice(0, 20).map(({ code, text, place }) => ({ code, text, place: place ?? entry.value.place })),
      3,
    );
  return { value: made.value, notes: [...read.notes, ...found.notes, ...made.notes], refused };
}
