import type { LawCurve } from '../../pipeline/results/study-result.ts';
import { config, palette, SCHEMA, type Spec } from './palette.ts';

/** Axis names and whether they are logarithmic. */
export interface LawAxes {
  readonly x: string;
  readonly y: string;
  readonly log: boolean;
}

/** Trials with both error bars, the law with its confidence and the range of a new trial, published lines named where they end. */
export function lawChart(curve: LawCurve, { x, y, log }: LawAxes): Spec {
  const scale = log ? { type: 'log', nice: false } : { zero: false, nice: true };
  const xs = [...curve.x, ...curve.trials.flatMap((one) => [one.xLower, one.xUpper])].filter(
    (one) => Number.isFinite(one) && (!log || one > 0),
  );
  const room = log
    ? [Math.min(...xs) / 1.04, Math.max(...xs) * (curve.published.length > 0 ? 1.55 : 1.04)]
    : [Math.min(...xs), Math.max(...xs) + (curve.published.length > 0 ? 0.28 : 0.03) * (Math.max(...xs) - Math.min(...xs))];
  const position = (low: string, high?: string) => ({
    x: { field: 'x', type: 'quantitative', scale: { ...scale, nice: false, domain: room }, title: x, axis: { tickCount: 6, format: '~g' } },
    y: { field: low, type: 'quantitative', scale, title: y, axis: { tickCount: 6, format: '~g' } },
    ...(high === undefined ? {} : { y2: { field: high } }),
  });
  const lines = curve.x.map((value, i) => ({
    x: value,
    fitted: curve.fitted[i]!,
    lawLower: curve.lawLower[i]!,
    lawUpper: curve.lawUpper[i]!,
    lower: curve.lower[i]!,
    upper: curve.upper[i]!,
  }));
  const published = curve.published.flatMap((line) => line.x.map((value, i) => ({ id: line.id, x: value, y: line.y[i]! })));
  const ends = curve.published.map((line) => ({
    label: `${line.label}${line.analogy ? ' (analogy)' : ''}`,
    x: line.x.at(-1)!,
    y: line.y.at(-1)!,
  }));
  return {
    $schema: SCHEMA,
    width: 620,
    height: 380,
    config,
    layer: [
      { data: { values: lines }, mark: { type: 'area', color: palette.grid, opacity: 1 }, encoding: position('lower', 'upper') },
      { data: { values: lines }, mark: { type: 'area', color: palette.band, opacity: 1 }, encoding: position('lawLower', 'lawUpper') },
      ...(published.length === 0
        ? []
        : [
            {
              data: { values: published },
              mark: { type: 'line', color: palette.faint, strokeWidth: 1.2 },
              encoding: { ...position('y'), detail: { field: 'id', type: 'nominal' } },
            },
            ...apart(ends, log).map((end) => ({
              data: { values: [end] },
              mark: { type: 'text', align: 'left', dx: 5, dy: end.dy, fontSize: 11, color: palette.quiet },
              encoding: { ...position('y'), text: { field: 'label', type: 'nominal' } },
            })),
          ]),
      { data: { values: lines }, mark: { type: 'line', color: palette.accent, strokeWidth: 2 }, encoding: position('fitted') },
      {
        data: { values: curve.trials },
        mark: { type: 'rule', color: palette.quiet, strokeWidth: 0.8 },
        encoding: position('yLower', 'yUpper'),
      },
      {
        data: { values: curve.trials },
        mark: { type: 'rule', color: palette.quiet, strokeWidth: 0.8 },
        encoding: { ...position('y'), x: { ...position('y').x, field: 'xLower' }, x2: { field: 'xUpper' } },
      },
      {
        data: { values: curve.trials },
        mark: { type: 'point', filled: true, color: palette.ink, size: 34, opacity: 1 },
        encoding: {
          ...position('y'),
          tooltip: [
            { field: 'trial', type: 'nominal' },
            { field: 'campaign', type: 'nominal' },
          ],
        },
      },
    ],
  };
}

interface End {
  readonly label: string;
  readonly x: number;
  readonly y: number;
}

/** Labels of lines that end close together are moved apart, 13 px at least. */
function apart(ends: readonly End[], log: boolean): readonly (End & { readonly dy: number })[] {
  if (ends.length === 0) return [];
  const scale = (y: number): number => (log ? Math.log(y) : y);
  const values = ends.map((end) => scale(end.y));
  const reach = Math.max(Math.max(...values) - Math.min(...values), log ? 1.5 : 1e-9);
  const pixels = ends.map((end, k) => ({ end, at: -(values[k]! / reach) * 240 })).sort((a, b) => a.at - b.at);
  let last = Number.NEGATIVE_INFINITY;
  return pixels.map(({ end, at }) => {
    const placed = Math.max(at, last + 13);
    last = placed;
    return { ...end, dy: Math.round(placed - at) };
  });
}
