import type { Note } from '../base/message.ts';
import * as says from '../base/says/robust.ts';
import type { Fit } from './fit.ts';
import type { RobustRefit } from './robust.ts';

/** A move of this many standard errors is a warning; below this weight a trial is named, at most so many of them. */
const LIMITS = { move: 1, weight: 0.5, named: 5 };

/** What the robust refits tell of a fit: one note each, a warning where a parameter moves by more than its standard error (random part). */
export function robustNotes(fit: Fit, refits: readonly RobustRefit[], trials: readonly string[]): readonly Note[] {
  return refits.map((refit): Note => {
    const about = { section: 'evidence', about: fit.name } as const;
    if (refit.stop !== 'converged')
      return { ...about, level: 'note', code: 'robust-not-made', text: says.notMade(fit.name, refit.method, refit.stop) };
    const moves = movesOf(fit, refit);
    const far = moves.filter(({ errors }) => errors > LIMITS.move);
    const light = lightTrials(refit, trials);
    return far.length > 0
      ? { ...about, level: 'warning', code: 'robust-moves', text: says.moved(fit.name, refit.method, far, light) }
      : {
          ...about,
          level: 'note',
          code: 'robust-agrees',
          text: says.agrees(fit.name, refit.method, Math.max(0, ...moves.map(({ errors }) => errors)), light),
        };
  });
}

const movesOf = (fit: Fit, { values }: RobustRefit) =>
  fit.parameters
    .filter((parameter) => !parameter.fixed && parameter.standardErrorRandom > 0)
    .map(({ name, estimate, standardErrorRandom }) => ({
      name,
      from: estimate,
      to: values[name]!,
      errors: Math.abs(values[name]! - estimate) / standardErrorRandom,
    }));

const lightTrials = ({ weights }: RobustRefit, trials: readonly string[]) =>
  trials
    .map((trial, i) => ({ trial, weight: weights[i]! }))
    .filter(({ weight }) => weight < LIMITS.weight)
    .sort((a, b) => a.weight - b.weight)
    .slice(0, LIMITS.named);
