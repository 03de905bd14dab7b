import { InputError } from '../base/input-error.ts';
import { nearest } from '../base/nearest.ts';
import { says } from '../base/says/trials.ts';
import type { Study } from '../study/study.ts';
import type { TrialReading } from './read-row.ts';

/** Rows that the study leaves out, with the reason. A name that no row has is a fault of the study file: a slip of the pen would leave the wrong trial in. */
export function leaveOut(rows: readonly TrialReading[], declared: Study['trials']['leaveOut']): ReadonlyMap<TrialReading, string> {
  const names = new Set(rows.map((row) => row.trial));
  const unknown = declared.filter(({ trial }) => !names.has(trial.is));
  if (unknown.length > 0)
    throw new InputError(
      unknown.map(({ trial }) => ({
        code: 'no-such-trial',
        text: says.noSuchTrial(trial.is, nearest(trial.is, names)),
        place: trial.place,
      })),
    );
  const reasons = new Map(declared.map(({ trial, reason }) => [trial.is, reason]));
  return new Map(rows.flatMap((row) => (reasons.has(row.trial) ? [[row, reasons.get(row.trial)!] as const] : [])));
}
