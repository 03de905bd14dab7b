import type { Definition, StudyResult } from '../../pipeline/results/study-result.ts';
import { plainNumber } from '../numbers.ts';
import { along, axisOver } from './axis.ts';
import { cut, inUnit } from './labels.ts';
import { config, palette, SCHEMA, type Spec } from './palette.ts';
import { pickedTrial, shared, trialDots } from './trials.ts';

/** Cases that are named in the picture; more are told by their tooltips and the table. */
const MOST_NAMED = 6;

/** Where the trials lie in each group of the law and where the plant cases do, each group stretched to its tried range. Undefined where nothing varies. */
export function rangeMap(result: StudyResult): Spec | undefined {
  const fit = result.fits.find((one) => one.name === result.chosen);
  if (fit === undefined) return undefined;
  const log = fit.scale === 'relative';
  const groups = fit.form.groups.flatMap((name) => {
    const column = result.columns.findIndex((one) => one.key === fit.groups[name]);
    const [from, to] = fit.ranges[name] ?? [Number.NaN, Number.NaN];
    const place = (value: number): number => (log ? Math.log(value / from) / Math.log(to / from) : (value - from) / (to - from));
    return column >= 0 && to > from && Number.isFinite(place(to)) ? [{ name, column, from, to, place }] : [];
  });
  if (groups.length === 0) return undefined;
  const label = ({ name, column }: (typeof groups)[number]): string => nameWithUnit(name, result.columns[column]!);
  const trials = groups.flatMap((group) =>
    result.trials.flatMap((trial, row) => {
      const value = trial.values[group.column]!;
      const x = group.place(value);
      return Number.isFinite(x) ? [{ row, trial: trial.trial, campaign: trial.campaign, group: label(group), x, value }] : [];
    }),
  );
  const cases = groups.flatMap((group) =>
    (result.plant?.cases ?? []).flatMap((one) => {
      const value = one.groups[group.name] ?? Number.NaN;
      const x = group.place(value);
      if (!Number.isFinite(x)) return [];
      return [{ case: cut(one.name, 18), group: label(group), x, value, out: x < 0 || x > 1 }];
    }),
  );
  const ends = groups.flatMap((group) => [
    { group: label(group), x: 0, text: plainNumber(group.from) },
    { group: label(group), x: 1, text: plainNumber(group.to) },
  ]);
  const title = log
    ? 'place in the tried range (logarithmic): 0 lowest trial, 1 highest'
    : 'place in the tried range: 0 lowest trial, 1 highest';
  const x = axisOver([0, 1, ...cases.map((one) => one.x)], title, false, 0.07);
  const rows = groups.map(label);
  const at = {
    x: along('x', x),
    y: {
      field: 'group',
      type: 'nominal',
      sort: rows,
      title: null,
      axis: { domain: false, ticks: false, labelFontSize: 13, labelLimit: 0, minExtent: 90 },
    },
  };
  const text = (data: unknown, dy: number, field: string, color: string) => ({
    data,
    mark: { type: 'text', dy, color, fontSize: 11 },
    encoding: { ...at, text: { field, type: 'nominal' } },
  });
  const value = { field: 'value', type: 'quantitative', title: 'value', format: '.4g' };
  return {
    $schema: SCHEMA,
    width: 500,
    height: 62 * groups.length,
    config,
    params: shared,
    datasets: { trials, cases, ends },
    layer: [
      {
        data: { values: rows.map((group) => ({ group, from: 0, to: 1 })) },
        mark: { type: 'rule', strokeWidth: 10, color: palette.band },
        encoding: { ...at, x: along('from', x), x2: { field: 'to' } },
      },
      trialDots('trials', at, result.trials.length, [value]),
      ...pickedTrial('trials', at),
      text({ name: 'ends' }, 20, 'text', palette.quiet),
      ...(cases.length === 0
        ? []
        : [
            {
              data: { name: 'cases' },
              mark: { type: 'point', shape: 'diamond', size: 130, strokeWidth: 2, stroke: palette.warm },
              encoding: {
                ...at,
                fill: { condition: { test: 'datum.out', value: 'transparent' }, value: palette.warm },
                tooltip: [{ field: 'case', type: 'nominal', title: 'plant case' }, value],
              },
            },
            ...((result.plant?.cases.length ?? 0) <= MOST_NAMED ? [text({ name: 'cases' }, -16, 'case', palette.warm)] : []),
          ]),
    ],
  };
}

const nameWithUnit = (name: string, column: Definition): string => inUnit(cut(name, 24), column.unit);
