import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { plainNumber } from '../numbers.ts';
import { along, axisOver, NUMBERS_EXTENT } from './axis.ts';
import { type IntervalMark, intervalRows } from './interval-rows.ts';
import { axisTitle, cut, inUnit } from './labels.ts';
import { inParts, rowNames, rowPlaces } from './named-rows.ts';
import { config, palette, SCHEMA, type Spec } from './palette.ts';
import { pickedTrial, shared, trialDots } from './trials.ts';

/** Every case by every accepted law and factored correlation: interval of the law thick, of a prediction thin; out of range hollow; the design value upright. */
export function plantCharts(result: StudyResult): readonly Spec[] {
  const { plant } = result;
  if (plant === null) return [];
  const several = plant.cases.length > 1;
  const marks = plant.cases.flatMap((one) =>
    one.predictions.map(
      (by, k): IntervalMark => ({
        name: `${several ? `${cut(one.name, 14)} · ` : ''}${cut(by.by, 34)}`,
        value: by.coefficient,
        lower: by.lawLower,
        upper: by.lawUpper,
        outerLower: by.lower,
        outerUpper: by.upper,
        hollow: !by.inRange,
        main: by.by === result.chosen,
        remark: `${plainNumber(by.coefficient)}${by.inRange ? '' : ', out of range'}`,
        ticks: k === 0 && Number.isFinite(one.design.coefficient) ? [{ x: one.design.coefficient, text: 'design' }] : [],
      }),
    ),
  );
  const middle = marks.map((mark) => mark.value).filter((v) => Number.isFinite(v) && v !== 0);
  const positive = middle.every((v) => v > 0);
  const near = (v: number): boolean => Number.isFinite(v) && (!positive || (v > Math.min(...middle) / 20 && v < Math.max(...middle) * 20));
  const ends = marks.flatMap((mark) => [
    mark.value,
    mark.lower,
    mark.upper,
    mark.outerLower!,
    mark.outerUpper!,
    ...mark.ticks!.map((one) => one.x),
  ]);
  const axis = axisOver(ends.filter(near), inUnit(plant.coefficient.symbol, plant.coefficient.unit), positive, 0.05);
  return inParts(marks).map((part) =>
    intervalRows({ axis, names: 200, marks: part.map((mark) => ({ ...mark, ticks: mark.ticks!.filter((one) => near(one.x)) })) }),
  );
}

/** Proposed trials among those done, over the first two groups of the law (or the first and the order of proposals). Undefined without proposals or groups. */
export function proposalMap(result: StudyResult): Spec | undefined {
  const fit = result.fits.find((one) => one.name === result.chosen);
  const { nextTrials } = result;
  if (fit === undefined || nextTrials === null || nextTrials.proposals.length === 0) return undefined;
  const names = fit.form.groups.filter((name) => nextTrials.proposals.some((one) => Number.isFinite(one.groups[name] ?? Number.NaN)));
  const [first, second] = names;
  if (first === undefined) return undefined;
  const log = fit.scale === 'relative';
  const column = (name: string): number => result.columns.findIndex((one) => one.key === fit.groups[name]);
  const place = (name: string | undefined, groups: (name: string) => number, fallback: number): number =>
    name === undefined ? fallback : groups(name);
  const done = result.trials.flatMap((trial, row) => {
    const group = (name: string): number => trial.values[column(name)] ?? Number.NaN;
    const one = { row, trial: trial.trial, campaign: trial.campaign, x: group(first), y: place(second, group, 0) };
    return Number.isFinite(one.x) && Number.isFinite(one.y) ? [one] : [];
  });
  const proposed = together(
    nextTrials.proposals.flatMap((proposal, k) => {
      const group = (name: string): number => proposal.groups[name] ?? Number.NaN;
      const one = { number: String(k + 1), x: group(first), y: place(second, group, 1) };
      return Number.isFinite(one.x) && Number.isFinite(one.y) ? [one] : [];
    }),
  );
  const all = [...done, ...proposed];
  const x = axisOver(
    all.map((one) => one.x),
    axisTitle(first, result.columns),
    log,
    0.08,
  );
  const y =
    second === undefined
      ? axisOver([-0.5, 1.5], 'done (0) and proposed (1)', false)
      : axisOver(
          all.map((one) => one.y),
          axisTitle(second, result.columns),
          log,
          0.12,
        );
  const at = { x: along('x', x), y: along('y', y, NUMBERS_EXTENT) };
  return {
    $schema: SCHEMA,
    width: 440,
    height: second === undefined ? 120 : 260,
    config,
    params: shared,
    datasets: { trials: done, proposed },
    layer: [
      trialDots('trials', at, done.length),
      ...pickedTrial('trials', at),
      { data: { name: 'proposed' }, mark: { type: 'point', filled: false, stroke: palette.warm, strokeWidth: 2, size: 190 }, encoding: at },
      {
        data: { name: 'proposed' },
        mark: { type: 'text', fontSize: 11, fontWeight: 'bold', color: palette.warm, align: 'left', dx: 11 },
        encoding: { ...at, text: { field: 'number', type: 'nominal' } },
      },
    ],
  };
}

interface Proposed {
  readonly number: string;
  readonly x: number;
  readonly y: number;
}

/** Proposals at one place get one ring with all their numbers. */
function together(proposed: readonly Proposed[]): readonly Proposed[] {
  const places = new Map<string, Proposed>();
  for (const one of proposed) {
    const at = `${one.x.toPrecision(6)} ${one.y.toPrecision(6)}`;
    const there = places.get(at);
    places.set(at, there === undefined ? one : { ...there, number: `${there.number}, ${one.number}` });
  }
  return [...places.values()];
}

/** Interval of each case now, after the proposals, and the floor that no trial can pass, in % of half-width. */
export function narrowingChart(result: StudyResult): Spec | undefined {
  const cases = (result.nextTrials?.cases ?? []).filter((one) => [one.now, one.after].every(Number.isFinite)).slice(0, 26);
  if (cases.length === 0) return undefined;
  const rows = cases.map((one, row) => ({ row, now: 100 * one.now, after: 100 * one.after, floor: 100 * one.floor }));
  const axis = axisOver(
    [0, ...rows.flatMap((one) => [one.now, one.after, one.floor])],
    'half-width of the prediction interval in %',
    false,
    0.06,
  );
  const y = rowPlaces(rows.length, 200);
  const dot = (field: string, fill: string, colour: string) => ({
    data: { name: 'rows' },
    mark: { type: 'point', size: 70, strokeWidth: 1.8, fill, stroke: colour },
    encoding: { y, x: along(field, axis) },
  });
  return {
    $schema: SCHEMA,
    width: 330,
    height: Math.max(2, rows.length) * 30,
    config,
    datasets: { rows },
    layer: [
      {
        data: { name: 'rows' },
        mark: { type: 'rule', color: palette.faint, strokeWidth: 2 },
        encoding: { y, x: along('after', axis), x2: { field: 'now' } },
      },
      {
        data: { name: 'rows' },
        mark: { type: 'tick', thickness: 2.5, size: 16, color: palette.warm },
        encoding: { y, x: along('floor', axis) },
      },
      dot('now', palette.page, palette.ink),
      dot('after', palette.accent, palette.accent),
      rowNames(
        cases.map((one) => cut(one.name, 26)),
        200,
      ),
    ],
  };
}
