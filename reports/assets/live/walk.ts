import type { LiveData } from '../../live-data.ts';
import { type Walk, walkMarkup } from '../../sections/walk.ts';
import type { Store } from './state.ts';

/** The walk by hand follows the trial picked. */
export function liveWalk(data: LiveData, store: Store): void {
  const place = document.getElementById('walk');
  if (place === null) return;
  store.listen(({ picked }, change) => {
    const trial = data.trials[picked];
    if (change.picked === undefined || trial === undefined || trial.steps.length === 0) return;
    const walk: Walk = {
      trial: trial.trial,
      raw: data.rawKeys.flatMap(({ key, unit }, k) => (typeof trial.raw[k] === 'number' ? [{ key, unit, value: trial.raw[k]! }] : [])),
      steps: data.ways[trial.way]!.map((step, k) => ({ ...step, value: trial.steps[k]! })),
    };
    place.innerHTML = walkMarkup(walk).markup;
  });
}
