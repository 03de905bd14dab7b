import type { Plan } from '../plan/plan.ts';
import { quantities } from '../quantities/vocabulary.ts';
import type { TrialsWithCurves } from '../trials/curve-readings.ts';
import type { StudyResult } from './study-result.ts';

/** Points of a curve that are drawn: enough for the eye, evenly over its samples, both ends kept. */
const MOST_POINTS = 200;

/** Logged curves with what was fitted to them, thinned for drawing; SI. */
export const drawnCurves = (curves: TrialsWithCurves['curves'], { curve: reduction }: Plan): StudyResult['series'] =>
  curves.map(({ trial, curve, fitted }) => {
    const places = thinned(curve.time.length);
    const quantity = reduction?.value ?? '';
    const pick = (values: Float64Array): readonly number[] => places.map((k) => values[k]!);
    return {
      trial,
      quantity,
      unit: quantities[quantity]?.unit ?? '1',
      t: pick(curve.time),
      value: pick(curve.value),
      fitted: pick(fitted),
    };
  });

function thinned(length: number): readonly number[] {
  if (length <= MOST_POINTS) return Array.from({ length }, (_, k) => k);
  return Array.from({ length: MOST_POINTS }, (_, k) => Math.round((k * (length - 1)) / (MOST_POINTS - 1)));
}
