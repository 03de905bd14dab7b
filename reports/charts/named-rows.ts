import { palette } from './palette.ts';

/** Vertical places of rows by number, with room for their names on the left. */
export const rowPlaces = (count: number, room: number) => ({
  field: 'row',
  type: 'nominal',
  sort: Array.from({ length: count }, (_, k) => k),
  title: null,
  axis: { domain: false, ticks: false, labels: false, minExtent: room, maxExtent: room },
});

/** Names of the rows, right-aligned beside the plot. Names may repeat: rows are told apart by their number. */
export const rowNames = (names: readonly string[], room: number) => ({
  data: { values: names.map((name, row) => ({ row, name })) },
  mark: { type: 'text', align: 'right', x: -10, color: palette.ink },
  encoding: { y: rowPlaces(names.length, room), text: { field: 'name', type: 'nominal' } },
});

/** Pictures hold at most this many rows, so that none is cut by the end of a printed page. */
export const MOST_ROWS = 26;

/** A list in parts of at most `MOST_ROWS`. */
export const inParts = <T>(rows: readonly T[], most = MOST_ROWS): readonly (readonly T[])[] =>
  Array.from({ length: Math.ceil(rows.length / most) }, (_, k) => rows.slice(k * most, (k + 1) * most));
