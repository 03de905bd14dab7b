import { InputError } from '../base/input-error.ts';
import { nearest } from '../base/nearest.ts';
import { says } from '../base/says/trials.ts';
import type { Study } from '../study/study.ts';
import type { SteadyTrials } from './steady.ts';

/** Windows that the study leaves out by name, with the reason; they stay drawn and in the ledger. A name that no window has is a fault of the study file. */
export function leaveWindowsOut(found: SteadyTrials, declared: Study['trials']['leaveOut']): SteadyTrials {
  const names = found.trials.map(({ trial }) => trial);
  const unknown = declared.filter(({ trial }) => !names.includes(trial.is));
  if (unknown.length > 0)
    throw new InputError(
      unknown.map(({ trial }) => ({
        code: 'no-such-trial',
        text: says.noSuchTrial(trial.is, nearest(trial.is, names)),
        place: trial.place,
      })),
    );
  const reasons = new Map(declared.map(({ trial, reason }) => [trial.is, reason]));
  return {
    ...found,
    trials: found.trials.filter(({ trial }) => !reasons.has(trial)),
    ledger: found.ledger.map((entry) =>
      entry.status === 'used' && reasons.has(entry.trial) ? { ...entry, status: 'left out', reason: reasons.get(entry.trial)! } : entry,
    ),
  };
}
