import type { Budget } from '../../pipeline/budget/budget.ts';
import type { Fit } from '../../pipeline/regression/fit.ts';
import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { percent } from '../numbers.ts';
import * as says from '../says/figures.ts';
import { along, axisFrom, axisOver } from './axis.ts';
import { type IntervalMark, intervalRows } from './interval-rows.ts';
import { cut } from './labels.ts';
import { inParts, MOST_ROWS, rowNames, rowPlaces } from './named-rows.ts';
import { config, palette, SCHEMA, type Spec } from './palette.ts';

/** Exponents that theory speaks of, with their intervals and the values of theory. Undefined where there is none. */
export function exponentChart(result: StudyResult): Spec | undefined {
  const tests = result.theory.filter((one) => Math.abs(one.value) <= 1);
  const marks = result.fits
    .flatMap((fit) =>
      fit.parameters.map(
        (parameter): IntervalMark => ({
          name: `${cut(parameter.name, 8)} in ${cut(fit.name, 20)}`,
          value: parameter.estimate,
          lower: parameter.lower,
          upper: parameter.upper,
          hollow: false,
          main: fit.name === result.chosen,
          remark: fit.name === result.chosen ? 'chosen law' : '',
          ticks: tests
            .filter((one) => one.law === fit.name && one.parameter === parameter.name)
            .map((one) => ({ x: one.value, text: one.theory })),
        }),
      ),
    )
    .filter((mark) => mark.ticks!.length > 0 && Number.isFinite(mark.value))
    .slice(0, MOST_ROWS);
  if (marks.length === 0) return undefined;
  const near = marks.flatMap((one) => [one.value, one.lower, one.upper].filter((v) => Math.abs(v) <= 4));
  const theory = marks.flatMap((one) => one.ticks!.map((tick) => tick.x));
  return intervalRows({ axis: axisOver([...near, ...theory], 'exponent; upright marks: theory', false, 0.06), marks, names: 190 });
}

/** Each free parameter of the chosen law by every method that made an interval, in standard errors from the estimate. Undefined where there is one method only. */
export function methodsChart(result: StudyResult, fit: Fit): Spec | undefined {
  const rows = result.intervals.filter((one) => one.law === fit.name);
  if (new Set(rows.map((one) => one.method)).size < 2) return undefined;
  const marks = rows
    .flatMap((row): readonly IntervalMark[] => {
      const parameter = fit.parameters.find((one) => one.name === row.parameter);
      const se = parameter?.standardError ?? Number.NaN;
      if (parameter === undefined || !(se > 0) || !Number.isFinite(se)) return [];
      const place = (value: number): number => (value - parameter.estimate) / se;
      const name = `${cut(row.parameter, 8)} by ${cut(row.method, 20)}`;
      return [{ name, value: 0, lower: place(row.lower), upper: place(row.upper), hollow: false, main: row.method === 't', remark: '' }];
    })
    .slice(0, MOST_ROWS);
  if (marks.length === 0) return undefined;
  const near = marks.flatMap((one) => [one.lower, one.upper].filter((v) => Math.abs(v) < 12));
  return intervalRows({ axis: axisOver([-2, 2, ...near], 'standard errors from the estimate', false), marks, lines: [0], names: 190 });
}

/** How far each parameter moves in robust refits and when a campaign or an influential trial is left out, in its standard errors; the letters are the parameters. */
export function influenceChart(result: StudyResult, fit: Fit): Spec | undefined {
  const rows = result.influence.slice(0, MOST_ROWS);
  const dots = rows.flatMap((one, row) =>
    fit.parameters.flatMap((parameter) => {
      const x = ((one.values[parameter.name] ?? Number.NaN) - parameter.estimate) / parameter.standardError;
      return !parameter.fixed && Number.isFinite(x) ? [{ row, x, parameter: parameter.name }] : [];
    }),
  );
  if (dots.length === 0) return undefined;
  const axis = axisOver([-1.2, 1.2, ...dots.map((one) => one.x)], 'move of a parameter, in its standard errors', false, 0.06);
  return {
    $schema: SCHEMA,
    width: 330,
    height: Math.max(2, rows.length) * 24,
    config,
    layer: [
      {
        data: { values: [{ x: -1 }, { x: 0 }, { x: 1 }] },
        mark: { type: 'rule', color: palette.faint },
        encoding: { x: along('x', axis) },
      },
      {
        data: { values: dots },
        mark: { type: 'text', fontSize: 13, fontWeight: 'bold', color: palette.ink },
        encoding: {
          y: rowPlaces(rows.length, 200),
          x: along('x', axis),
          text: { field: 'parameter', type: 'nominal' },
          tooltip: [
            { field: 'parameter', type: 'nominal', title: 'parameter' },
            { field: 'x', type: 'quantitative', title: 'standard errors', format: '.2f' },
          ],
        },
      },
      rowNames(
        rows.map((one) => cut(says.refitOf(one.kind, one.left), 28)),
        200,
      ),
    ],
  };
}

const SHOWN = 6;

interface Bar {
  readonly of: string;
  readonly source: string;
  readonly share: number;
}

/** Shares of a variance as bars, largest first; what is small is summed and counted. Several pictures where there are many rows. */
export function budgetCharts(budgets: readonly Budget[]): readonly Spec[] {
  const rows = budgets.flatMap(({ of, shares }): readonly Bar[] => {
    const known = shares.filter((one) => Number.isFinite(one.share));
    const small = known.slice(SHOWN);
    const rest = small.reduce((sum, one) => sum + one.share, 0);
    const shown = known.slice(0, SHOWN).map((one) => ({ of, source: cut(one.source, 30), share: one.share }));
    return [...shown, ...(small.length > 0 ? [{ of, source: `${small.length} smaller ones together`, share: rest }] : [])];
  });
  const several = budgets.length > 1;
  return inParts(rows).map((part) => bars(part, several));
}

function bars(rows: readonly Bar[], several: boolean): Spec {
  const data = rows.map((one, row) => ({ row, share: 100 * one.share, text: percent(one.share) }));
  const axis = axisFrom([0, 100], 'share of the variance in %', false);
  const y = rowPlaces(rows.length, 250);
  const at = { y, x: along('share', axis) };
  return {
    $schema: SCHEMA,
    width: 300,
    height: Math.max(2, rows.length) * 22,
    config,
    datasets: { shares: data },
    layer: [
      { data: { name: 'shares' }, mark: { type: 'bar', color: palette.accent, height: 11 }, encoding: at },
      {
        data: { name: 'shares' },
        mark: { type: 'text', align: 'left', dx: 6 },
        encoding: { ...at, text: { field: 'text', type: 'nominal' } },
      },
      rowNames(
        rows.map((one) => (several ? `${cut(one.of, 14)}: ${one.source}` : one.source)),
        250,
      ),
    ],
  };
}
