import { isFault } from '../quantities/fault.ts';
import { unitFor } from '../quantities/unit-for.ts';
import type { Study } from '../study/study.ts';
import type { Faults } from './faults.ts';
import type { Header } from './header.ts';
import type { DeclaredColumn } from './plan.ts';

/** Key under which the column of prior weights is read. */
export const weightKey = 'weight of the fit';

/** `fit.weights: COLUMN` -> that column, plain numbers; none for the two words that are no column. */
export function planWeights({ fit: { weights } }: Study, header: Header, faults: Faults): readonly DeclaredColumn[] {
  if (weights.is === 'uncertainty' || weights.is === 'equal') return [];
  const found = header.find(weights.is, weights.place, faults);
  const unit = unitFor(undefined, '1');
  return found === undefined || isFault(unit)
    ? []
    : [{ key: weightKey, column: found.name, index: found.index, unit, place: weights.place }];
}
