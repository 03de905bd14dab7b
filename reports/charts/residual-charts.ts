import type { Fit } from '../../pipeline/regression/fit.ts';
import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { type Axis, along, axisFrom, axisOver, NUMBERS_EXTENT } from './axis.ts';
import { axisTitle } from './labels.ts';
import { config, palette, SCHEMA, type Spec } from './palette.ts';
import { isDrawn, pickedTrial, shared, trialDots } from './trials.ts';

interface Dot {
  readonly row: number;
  readonly trial: string;
  readonly campaign: string;
  readonly x: number;
  readonly y: number;
}

const WIDTH = 320;
const BROKEN = { strokeDash: [4, 4] };

/** Dots of the trials over two axes, with lines behind them. */
function dotsChart(
  dots: readonly Dot[],
  { x, y, height }: { readonly x: Axis; readonly y: Axis; readonly height: number },
  behind: readonly unknown[],
  front: readonly unknown[] = [],
): Spec {
  const at = { x: along('x', x), y: along('y', y, NUMBERS_EXTENT) };
  const tooltip = [
    { field: 'x', type: 'quantitative', title: x.title, format: '.4g' },
    { field: 'y', type: 'quantitative', title: y.title, format: '.4g' },
  ];
  return {
    $schema: SCHEMA,
    width: WIDTH,
    height,
    config,
    params: shared,
    datasets: { trials: dots },
    layer: [...behind, trialDots('trials', at, dots.length, tooltip), ...front, ...pickedTrial('trials', at)],
  };
}

/** One dot for each trial where both numbers exist (and are above zero, on logarithmic axes). */
function dotsOf(result: StudyResult, x: (row: number) => number, y: (row: number) => number, log = false): readonly Dot[] {
  return result.trials.flatMap(({ trial, campaign }, row) => {
    const one = { row, trial, campaign, x: x(row), y: y(row) };
    return isDrawn(one.x, one.y) && (!log || (one.x > 0 && one.y > 0)) ? [one] : [];
  });
}

/** Measured against fitted, with the line of equality and those of 20 % either way. */
export function parityChart(result: StudyResult, fit: Fit): Spec {
  const column = result.columns.findIndex((one) => one.key === result.response.key);
  const log = fit.scale === 'relative';
  const dots = dotsOf(
    result,
    (row) => fit.diagnostics.fitted[row] ?? Number.NaN,
    (row) => result.trials[row]!.values[column] ?? Number.NaN,
    log,
  );
  const name = axisTitle(fit.form.response, result.columns);
  const { domain } = axisOver(
    dots.flatMap((one) => [one.x, one.y]),
    '',
    log,
    0.06,
  );
  const [x, y] = [axisFrom(domain, `fitted ${name}`, log), axisFrom(domain, `measured ${name}`, log)];
  const line = (factor: number, dash: object = {}) => ({
    data: { values: domain.map((v) => ({ x: v, y: v * factor })) },
    mark: { type: 'line', color: palette.faint, strokeWidth: 1, ...dash, clip: true },
    encoding: { x: along('x', x), y: along('y', y, NUMBERS_EXTENT) },
  });
  return dotsChart(dots, { x, y, height: WIDTH }, [line(1), ...(log ? [line(1.2, BROKEN), line(1 / 1.2, BROKEN)] : [])]);
}

/** Studentised residuals against anything, with the lines of none and of two standard deviations. */
function residualChart(result: StudyResult, fit: Fit, x: (row: number) => number, title: string, log: boolean): Spec {
  const dots = dotsOf(result, x, (row) => fit.diagnostics.studentised[row] ?? Number.NaN).filter((one) => !log || one.x > 0);
  const across = axisOver(
    dots.map((one) => one.x),
    title,
    log,
    0.06,
  );
  const up = axisOver([-2.6, 2.6, ...dots.map((one) => one.y)], 'studentised residual', false, 0.05);
  const rule = (value: number, dash: object = {}) => ({
    data: { values: [{ y: value }] },
    mark: { type: 'rule', color: palette.faint, ...dash },
    encoding: { y: along('y', up, NUMBERS_EXTENT) },
  });
  return dotsChart(dots, { x: across, y: up, height: 190 }, [rule(0), rule(2, BROKEN), rule(-2, BROKEN)]);
}

/** Residuals against one group of the law. */
export function residualsAgainst(result: StudyResult, fit: Fit, group: string): Spec {
  const column = result.columns.findIndex((one) => one.key === fit.groups[group]);
  return residualChart(
    result,
    fit,
    (row) => result.trials[row]!.values[column] ?? Number.NaN,
    axisTitle(group, result.columns),
    fit.scale === 'relative',
  );
}

/** Residuals in the order of the table of trials. */
export const residualsInOrder = (result: StudyResult, fit: Fit): Spec =>
  residualChart(result, fit, (row) => row + 1, 'order in the table of trials', false);

/** Residuals against the fitted value. */
export const residualsAgainstFitted = (result: StudyResult, fit: Fit): Spec =>
  residualChart(
    result,
    fit,
    (row) => fit.diagnostics.fitted[row] ?? Number.NaN,
    `fitted ${axisTitle(fit.form.response, result.columns)}`,
    fit.scale === 'relative',
  );

const NAMED = 3;

/** Leverage against residual: far right and far from zero moves the law most; the three trials with the largest Cook's distance are named. */
export function leverageChart(result: StudyResult, fit: Fit): Spec {
  const dots = dotsOf(
    result,
    (row) => fit.diagnostics.leverage[row] ?? Number.NaN,
    (row) => fit.diagnostics.studentised[row] ?? Number.NaN,
  );
  const cook = (one: Dot): number => fit.diagnostics.cook[one.row] ?? 0;
  const named = [...dots].sort((a, b) => cook(b) - cook(a)).slice(0, dots.length > 6 ? NAMED : 0);
  const x = axisOver([0, ...dots.map((one) => one.x)], 'leverage', false, 0.08);
  const y = axisOver([-2.6, 2.6, ...dots.map((one) => one.y)], 'studentised residual', false, 0.05);
  const names = {
    data: { values: named },
    mark: { type: 'text', dy: -11, color: palette.quiet },
    encoding: { x: along('x', x), y: along('y', y, NUMBERS_EXTENT), text: { field: 'trial', type: 'nominal' } },
  };
  const zero = {
    data: { values: [{ y: 0 }] },
    mark: { type: 'rule', color: palette.faint },
    encoding: { y: along('y', y, NUMBERS_EXTENT) },
  };
  return dotsChart(dots, { x, y, height: 240 }, [zero], [names]);
}
