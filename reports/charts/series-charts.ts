import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { along, axisOver, NUMBERS_EXTENT } from './axis.ts';
import { cut, inUnit } from './labels.ts';
import { config, palette, SCHEMA, type Spec } from './palette.ts';

/** Logged curves that are drawn; the page says how many are not. */
export const MOST_CURVES = 6;

/** One logged curve with what was fitted to it, or one column of a raw log with its steady windows and their means. */
export function seriesChart(series: StudyResult['series'][number]): Spec {
  const windows = series.windows ?? [];
  const points = series.t
    .map((t, i) => ({ t, value: series.value[i] ?? Number.NaN }))
    .filter((one) => Number.isFinite(one.t) && Number.isFinite(one.value));
  const line = series.t
    .map((t, i) => ({ t, fitted: series.fitted[i] ?? Number.NaN }))
    .filter((one) => Number.isFinite(one.t) && Number.isFinite(one.fitted));
  const x = axisOver(series.t, 't in s', false, 0.02);
  const y = axisOver(
    [...points.map((one) => one.value), ...line.map((one) => one.fitted)],
    inUnit(cut(series.quantity, 30), series.unit),
    false,
    0.05,
  );
  return {
    $schema: SCHEMA,
    width: 320,
    height: 200,
    config,
    layer: [
      ...(windows.length === 0 ? [] : [band(windows, x)]),
      {
        data: { values: line },
        mark: { type: 'line', color: palette.accent, strokeWidth: 1.6 },
        encoding: { x: along('t', x), y: along('fitted', y, NUMBERS_EXTENT) },
      },
      {
        data: { values: points },
        mark: { type: 'point', filled: true, size: points.length > 150 ? 6 : 16, color: palette.ink },
        encoding: { x: along('t', x), y: along('value', y, NUMBERS_EXTENT) },
      },
      ...(windows.length === 0 ? [] : [means(windows, x, y)]),
    ],
  };
}

type Axis = ReturnType<typeof axisOver>;
type Windows = NonNullable<StudyResult['series'][number]['windows']>;

const band = (windows: Windows, x: Axis): object => ({
  data: { values: windows.map(({ from, to }) => ({ from, to })) },
  mark: { type: 'rect', color: palette.band },
  encoding: { x: along('from', x), x2: { field: 'to' } },
});

const means = (windows: Windows, x: Axis, y: Axis): object => ({
  data: { values: windows.map(({ from, to, level }) => ({ from, to, level })) },
  mark: { type: 'rule', color: palette.accent, strokeWidth: 2 },
  encoding: { x: along('from', x), x2: { field: 'to' }, y: along('level', y, NUMBERS_EXTENT) },
});
