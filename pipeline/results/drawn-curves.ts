import type { Plan } from '../plan/plan.ts';
import { fromSI } from '../quantities/unit.ts';
import type { TrialsWithCurves } from '../trials/curve-readings.ts';
import type { StudyResult } from './study-result.ts';

/** Points of a curve that are drawn: enough for the eye, evenly over its samples, both ends kept. */
const MOST_POINTS = 200;

/** Logged curves with what was fitted to them, thinned for drawing, in the unit they were logged in; time in s. */
export const drawnCurves = (curves: TrialsWithCurves['curves'], { curve: reduction }: Plan): StudyResult['series'] =>
  curves.map(({ trial, curve, fitted }) => {
    const places = thinned(curve.time.length);
    const drawn = (values: Float64Array): readonly number[] => places.map((k) => fromSI(values[k]!, curve.unit));
    return {
      trial,
      quantity: reduction?.value ?? '',
      unit: curve.unit.text,
      t: places.map((k) => curve.time[k]!),
      value: drawn(curve.value),
      fitted: drawn(fitted),
    };
  });

function thinned(length: number): readonly number[] {
  if (length <= MOST_POINTS) return Array.from({ length }, (_, k) => k);
  return Array.from({ length: MOST_POINTS }, (_, k) => Math.round((k * (length - 1)) / (MOST_POINTS - 1)));
}
