import type { LawCurve, StudyResult } from '../../pipeline/results/study-result.ts';
import { type Axis, along, axisFrom, axisOver, NUMBERS_EXTENT, pixelOf } from './axis.ts';
import { type End, endLabels } from './end-labels.ts';
import { axisTitle, correlationLabels, cut } from './labels.ts';
import { config, palette, SCHEMA, type Spec } from './palette.ts';
import { errorBars, pickedTrial, shared, trialDots } from './trials.ts';

const WIDTH = 500;
const HEIGHT = 340;

/** Published lines that get a name in the picture; the others are in the table. */
const MOST_NAMED = 9;

/** Trials with both error bars, the law with its confidence and the range of a new trial, published lines named where they end. */
export function lawChart(result: StudyResult, curve: LawCurve): Spec {
  const fit = result.fits.find((one) => one.name === result.chosen)!;
  const log = fit.scale === 'relative';
  const xs = [...curve.x, ...curve.trials.flatMap((one) => [one.x, one.xLower, one.xUpper])];
  const x = axisOver(xs, axisTitle(curve.group, result.columns), log, 0.03);
  const y = axisFrom(heightOf(curve, log), axisTitle(fit.form.response, result.columns), log);
  const lines = curve.x.map((value, i) => ({
    x: value,
    fitted: curve.fitted[i]!,
    lawLower: inside(curve.lawLower[i]!, y),
    lawUpper: inside(curve.lawUpper[i]!, y),
    lower: inside(curve.lower[i]!, y),
    upper: inside(curve.upper[i]!, y),
  }));
  const at = (low: string, high?: string) => ({
    x: along('x', x),
    y: along(low, y, NUMBERS_EXTENT),
    ...(high === undefined ? {} : { y2: { field: high } }),
  });
  const n = curve.trials.length;
  const area = (low: string, high: string, color: string) => ({
    data: { name: 'law' },
    mark: { type: 'area', color, opacity: 1, clip: true },
    encoding: at(low, high),
  });
  return {
    $schema: SCHEMA,
    width: WIDTH,
    height: HEIGHT,
    config,
    params: shared,
    datasets: { law: lines, published: publishedPoints(result, curve), trials: trialPoints(curve) },
    layer: [
      area('lower', 'upper', palette.grid),
      area('lawLower', 'lawUpper', palette.band),
      {
        data: { name: 'published' },
        mark: { type: 'line', color: palette.faint, strokeWidth: 1.1, clip: true },
        encoding: {
          ...at('y'),
          detail: { field: 'label', type: 'nominal' },
          tooltip: { field: 'label', type: 'nominal', title: 'published' },
        },
      },
      { data: { name: 'law' }, mark: { type: 'line', color: palette.accent, strokeWidth: 2, clip: true }, encoding: at('fitted') },
      errorBars('trials', at('yLower', 'yUpper'), n),
      errorBars('trials', { ...at('y'), x: { ...along('x', x), field: 'xLower' }, x2: { field: 'xUpper' } }, n),
      trialDots('trials', at('y'), n, [
        { field: 'x', type: 'quantitative', title: x.title, format: '.4g' },
        { field: 'y', type: 'quantitative', title: y.title, format: '.4g' },
      ]),
      ...pickedTrial('trials', at('y')),
      ...endLabels(endsOf(result, curve, x, y), HEIGHT),
    ],
  };
}

const trialPoints = (curve: LawCurve) =>
  curve.trials.flatMap((one, row) => ([one.x, one.y].every(Number.isFinite) ? [{ row, ...one, ...bars(one) }] : []));

/** An error bar that is not known or has no end is not drawn. */
const bars = (one: LawCurve['trials'][number]) => ({
  xLower: Number.isFinite(one.xLower) ? one.xLower : one.x,
  xUpper: Number.isFinite(one.xUpper) ? one.xUpper : one.x,
  yLower: Number.isFinite(one.yLower) ? one.yLower : one.y,
  yUpper: Number.isFinite(one.yUpper) ? one.yUpper : one.y,
});

/** The range shown: trials, law and bands; published lines widen it by a factor of three at most (by their whole height on a linear axis). */
function heightOf(curve: LawCurve, log: boolean): readonly [number, number] {
  const trials = curve.trials.flatMap((one) => [one.y, one.yLower, one.yUpper]);
  const own = axisOver([...trials, ...curve.fitted], '', log, 0).domain;
  const bands = limited([...curve.lower, ...curve.upper], own, log);
  const lines = limited(
    curve.published.flatMap((line) => line.y),
    own,
    log,
  );
  return axisOver([...own, ...bands, ...lines], '', log, 0.03).domain;
}

function limited(values: readonly number[], [low, high]: readonly [number, number], log: boolean): readonly number[] {
  const room = log ? [low / 3, high * 3] : [low - (high - low), high + (high - low)];
  return values.filter((value) => value >= room[0]! && value <= room[1]!);
}

/** Bands may be open: they end at the edge of the picture. */
const inside = (value: number, { domain: [low, high] }: Axis): number | null =>
  Number.isNaN(value) ? null : Math.min(Math.max(value, low), high);

function publishedPoints(result: StudyResult, curve: LawCurve) {
  const labels = correlationLabels(result.audit?.rows ?? []);
  return curve.published.flatMap((line) =>
    line.x.flatMap((x, i) => (Number.isFinite(line.y[i]!) ? [{ label: labels.get(line.id) ?? line.label, x, y: line.y[i]! }] : [])),
  );
}

/** The law and the published lines that lie in the picture, the nearest first. */
function endsOf(result: StudyResult, curve: LawCurve, x: Axis, y: Axis): readonly End[] {
  const labels = correlationLabels(result.audit?.rows ?? []);
  const rank = new Map((result.audit?.rows ?? []).map((row, k) => [row.id, k]));
  const end = (label: string, xs: readonly number[], ys: readonly number[], colour: string): readonly End[] => {
    const [lastX, lastY] = [xs.at(-1) ?? Number.NaN, ys.at(-1) ?? Number.NaN];
    const [across, up] = [pixelOf(lastX, x, 1), pixelOf(lastY, y, HEIGHT)];
    return up >= 0 && up <= HEIGHT && across > 0 ? [{ label, across: Math.min(across, 1), y: HEIGHT - up, colour }] : [];
  };
  const published = [...curve.published]
    .sort((a, b) => (rank.get(a.id) ?? 0) - (rank.get(b.id) ?? 0))
    .flatMap((line) => end(labels.get(line.id) ?? line.label, line.x, line.y, palette.quiet));
  return [...end(`fitted: ${cut(result.chosen, 26)}`, curve.x, curve.fitted, palette.accent), ...published.slice(0, MOST_NAMED)];
}

/** How many published lines get their name beside their end. */
export function namedLines(result: StudyResult, curve: LawCurve): number {
  const log = result.fits.find((one) => one.name === result.chosen)?.scale === 'relative';
  const y = axisFrom(heightOf(curve, log), '', log);
  return Math.min(
    curve.published.filter((line) => (line.y.at(-1) ?? Number.NaN) >= y.domain[0] && line.y.at(-1)! <= y.domain[1]).length,
    MOST_NAMED,
  );
}
