import type { Note, Refusal } from '../base/message.ts';
import { says } from '../base/says/trials.ts';
import type { Staged } from '../base/staged.ts';
import type { CurveResult, SeriesReduction } from '../reduction/series/series.ts';
import type { Trial } from './average.ts';
import type { LoggedCurve } from './curve-builder.ts';
import type { Trials } from './read-trials.ts';

/** Trials with what their curves came down to, and each curve with the one fitted to it. */
export interface TrialsWithCurves extends Trials {
  readonly curves: readonly { readonly trial: string; readonly curve: LoggedCurve; readonly fitted: Float64Array }[];
}

/**
 * Each trial's curve to readings of the trial with their statistical uncertainty. `given` are the trial's other values, SI.
 * A trial whose curve does not come down to a reading is refused with the reduction's reason; one without a curve is left out here, because
 * reading the curves has refused it.
 */
export function withCurves(
  trials: Trials,
  curves: ReadonlyMap<string, LoggedCurve>,
  reduction: SeriesReduction,
  given: (trial: Trial) => (key: string) => number | undefined,
): Staged<TrialsWithCurves> {
  const notes: Note[] = [];
  const refused: Refusal[] = [];
  const kept: { readonly trial: Trial; readonly curve: LoggedCurve; readonly fitted: Float64Array }[] = [];
  for (const trial of trials.trials) {
    const curve = curves.get(trial.trial);
    if (curve === undefined) continue;
    const result = reduction.reduce(curve, given(trial));
    const place = { file: curve.file, line: curve.line, trial: trial.trial };
    if ('refused' in result) {
      refused.push({ trial: trial.trial, ...result.refused, place });
      continue;
    }
    for (const note of result.notes) notes.push({ section: 'trials', level: 'note', ...note, about: trial.trial, place });
    kept.push({ trial: withReadings(trial, reduction.gives, result.readings), curve, fitted: result.fitted });
  }
  return {
    value: {
      keys: [...trials.keys, ...reduction.gives],
      trials: kept.map(({ trial }) => trial),
      ledger: trials.ledger,
      curves: kept.map(({ trial, curve, fitted }) => ({ trial: trial.trial, curve, fitted })),
    },
    notes: kept.length === 0 ? notes : [curvesRead(kept.map(({ curve }) => curve)), ...notes],
    refused,
  };
}

const curvesRead = (curves: readonly LoggedCurve[]): Note => ({
  section: 'trials',
  level: 'note',
  code: 'curves-read',
  text: says.curvesRead(
    curves.length,
    curves.reduce((sum, { time }) => sum + time.length, 0),
  ),
});

type Readings = Extract<CurveResult, { readings: unknown }>['readings'];

function withReadings(trial: Trial, gives: readonly string[], readings: Readings): Trial {
  return {
    ...trial,
    values: Float64Array.from([...trial.values, ...gives.map((key) => readings[key]?.value ?? Number.NaN)]),
    statistical: { ...trial.statistical, ...Object.fromEntries(Object.entries(readings).map(([key, { u }]) => [key, u])) },
  };
}
