import { type Axis, along } from './axis.ts';
import { rowNames, rowPlaces } from './named-rows.ts';
import { config, palette, SCHEMA, type Spec } from './palette.ts';

/** One row of a picture of intervals. Ends may be open: they are drawn to the edge. */
export interface IntervalMark {
  readonly name: string;
  readonly value: number;
  /** The thick part. */
  readonly lower: number;
  readonly upper: number;
  /** The thin part around it, where there is one. */
  readonly outerLower?: number;
  readonly outerUpper?: number;
  readonly hollow: boolean;
  readonly main: boolean;
  /** Said at the right end of the row. */
  readonly remark: string;
  /** Marks of their own kind: design values, theory. */
  readonly ticks?: readonly { readonly x: number; readonly text: string }[];
}

interface RowsPicture {
  readonly axis: Axis;
  readonly marks: readonly IntervalMark[];
  /** A band of the axis drawn behind (a tolerance), and lines across (a reference). */
  readonly band?: readonly [number, number];
  readonly lines?: readonly number[];
  /** Room for the names on the left, px. */
  readonly names: number;
}

const ROW = 26;

/** Intervals under one another on one axis: a dot, a thick and a thin bar, a remark at the right. */
export function intervalRows({ axis, marks, band, lines = [], names }: RowsPicture): Spec {
  const y = rowPlaces(marks.length, names);
  const ticks = marks.flatMap((one, row) => (one.ticks ?? []).map((tick) => ({ row, ...tick })));
  const colour = { condition: { test: 'datum.main', value: palette.ink }, value: palette.quiet };
  const bar = (from: string, to: string, strokeWidth: number, opacity: number) => ({
    data: { name: 'rows' },
    mark: { type: 'rule', strokeWidth, opacity },
    encoding: { y, x: along(from, axis), x2: { field: to }, color: colour },
  });
  return {
    $schema: SCHEMA,
    width: 330,
    height: Math.max(2, marks.length) * ROW,
    config,
    datasets: { rows: marks.flatMap((one, row) => rowOf(one, row, axis)) },
    layer: [
      ...behind(axis, band, lines),
      bar('outerLower', 'outerUpper', 1.2, 1),
      bar('lower', 'upper', 6, 0.55),
      {
        data: { name: 'rows' },
        transform: [{ filter: 'datum.shown' }],
        mark: { type: 'point', size: 60, strokeWidth: 1.6 },
        encoding: {
          y,
          x: along('value', axis),
          stroke: colour,
          fill: { condition: { test: 'datum.hollow', value: palette.page }, value: palette.ink },
          tooltip: [
            { field: 'name', type: 'nominal', title: 'row' },
            { field: 'value', type: 'quantitative', title: axis.title, format: '.4g' },
          ],
        },
      },
      ...(ticks.length === 0 ? [] : tickLayers(ticks, y, axis)),
      rowNames(
        marks.map((one) => one.name),
        names,
      ),
      {
        data: { name: 'rows' },
        mark: { type: 'text', align: 'left', x: { expr: 'width + 10' }, color: palette.quiet },
        encoding: { y, text: { field: 'remark', type: 'nominal' } },
      },
    ],
  };
}

/** A row within the axis; one without a value keeps its name and its remark only. */
function rowOf(one: IntervalMark, row: number, { domain: [low, high] }: Axis) {
  const within = (value: number | undefined): number => {
    const known = value === undefined || Number.isNaN(value) ? one.value : value;
    return Number.isNaN(known) ? low : Math.min(Math.max(known, low), high);
  };
  const { name, remark, hollow, main } = one;
  const ends = {
    lower: within(one.lower),
    upper: within(one.upper),
    outerLower: within(one.outerLower),
    outerUpper: within(one.outerUpper),
  };
  return [{ row, name, remark, hollow, main, value: within(one.value), ...ends, shown: one.value >= low && one.value <= high }];
}

function behind(axis: Axis, band: readonly [number, number] | undefined, lines: readonly number[]): readonly unknown[] {
  const [low, high] = axis.domain;
  const zone = band === undefined ? [] : [{ from: Math.max(band[0], low), to: Math.min(band[1], high) }];
  return [
    ...zone.map((one) => ({
      data: { values: [one] },
      mark: { type: 'rect', color: palette.grid },
      encoding: { x: along('from', axis), x2: { field: 'to' } },
    })),
    ...lines.map((value) => ({
      data: { values: [{ value }] },
      mark: { type: 'rule', color: palette.faint },
      encoding: { x: along('value', axis) },
    })),
  ];
}

function tickLayers(
  ticks: readonly { readonly row: number; readonly x: number; readonly text: string }[],
  y: unknown,
  axis: Axis,
): readonly unknown[] {
  const data = { values: ticks };
  return [
    { data, mark: { type: 'tick', thickness: 2.5, size: 16, color: palette.warm }, encoding: { y, x: along('x', axis) } },
    {
      data,
      mark: { type: 'text', dy: -13, fontSize: 11, color: palette.warm },
      encoding: { y, x: along('x', axis), text: { field: 'text', type: 'nominal' } },
    },
  ];
}
