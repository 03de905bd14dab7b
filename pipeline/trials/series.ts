import { InputError } from '../base/input-error.ts';
import type { Message, Refusal } from '../base/message.ts';
import type { Place } from '../base/place.ts';
import { says } from '../base/says/trials.ts';
import type { Staged } from '../base/staged.ts';
import { isFault } from '../quantities/fault.ts';
import { CurveBuilder, type LoggedCurve } from './curve-builder.ts';
import { findColumn } from './find-column.ts';
import { type LogCell, type LogColumn, timeCell, valueCell } from './log-columns.ts';
import { type LogHead, type LogSource, streamLog } from './log-stream.ts';
import { Skipped } from './skipped.ts';

/** Which columns of a log are whose curve. */
export interface SeriesSpec {
  /** Column that names the trial in one long file; without it the whole file is the curve of `name`. */
  readonly trial?: { readonly column: string; readonly place: Place };
  readonly name: string;
  readonly time: LogColumn;
  readonly value: LogColumn;
  /** From and to, s. */
  readonly window?: readonly [number, number];
  /** Marks of missing values besides the empty cell. */
  readonly missing: readonly string[];
}

export interface SeriesRead {
  readonly curves: ReadonlyMap<string, LoggedCurve>;
  /** rows = samples + rows skipped, which the notes tell. */
  readonly rows: number;
  readonly samples: number;
}

/**
 * One long log, or the log of one trial, to curves in SI by trial. Streams: memory holds the two columns only. Rows that are no samples are counted
 * and told; a curve whose time runs backwards or that has fewer than three samples in its window is refused, with its place.
 */
export async function readSeries(source: LogSource, spec: SeriesSpec): Promise<Staged<SeriesRead>> {
  const builders = new Map<string, CurveBuilder>();
  const skipped = new Skipped();
  let cells: SeriesCells | undefined;
  let samples = 0;
  const totals = await streamLog(source, [spec.time.column, spec.value.column], (head) => {
    const columns = seriesCells(head, spec);
    cells = columns;
    return (row, line) => {
      const sample = sampleOf(row, line, columns, skipped);
      if (sample === undefined) return;
      builderFor(builders, columns.trial === undefined ? spec.name : row[columns.trial]!.trim(), source.file, line).add(
        sample[0],
        sample[1],
        line,
      );
      samples += 1;
    };
  });
  if (totals.ragged.count > 0)
    for (let k = 0; k < totals.ragged.count; k++) skipped.add('log-ragged', totals.ragged.firstLine!, says.logRagged());
  const settled = [...builders].map(([trial, builder]) => ({
    trial,
    curve: builder.curve(spec.window, cells!.time.unit === undefined, cells!.value.unit!),
  }));
  return {
    value: {
      curves: new Map(settled.flatMap(({ trial, curve }) => ('code' in curve ? [] : [[trial, curve] as const]))),
      rows: totals.rows,
      samples,
    },
    notes: skipped.notes(source.file),
    refused: settled.flatMap(({ trial, curve }): Refusal[] => ('code' in curve ? [{ trial, ...curve }] : [])),
  };
}

interface SeriesCells {
  readonly trial?: number;
  readonly time: LogCell;
  readonly value: LogCell;
}

function seriesCells(head: LogHead, { trial, time, value, missing }: SeriesSpec): SeriesCells {
  const cells = { time: timeCell(head, time, missing), value: valueCell(head, value, missing) };
  if (trial === undefined) return cells;
  const found = findColumn(head, trial.column);
  if (isFault(found)) throw new InputError([{ code: found.code, text: found.text, place: trial.place } satisfies Message]);
  return { ...cells, trial: found.index };
}

/** Time and value in SI, or undefined where the row is no sample; that is counted. */
function sampleOf(row: readonly string[], line: number, cells: SeriesCells, skipped: Skipped): readonly [number, number] | undefined {
  if (cells.trial !== undefined && row[cells.trial]!.trim() === '') {
    skipped.add('log-unnamed', line, says.logUnnamed());
    return undefined;
  }
  const time = numberOf(row, line, cells.time, skipped);
  const value = numberOf(row, line, cells.value, skipped, time === undefined);
  return time === undefined || value === undefined ? undefined : [time, value];
}

/** A cell in SI; `quiet` where the row is counted already. */
function numberOf(row: readonly string[], line: number, cell: LogCell, skipped: Skipped, quiet = false): number | undefined {
  const read = cell.read(row[cell.index]!);
  if (typeof read === 'number') return read;
  if (!quiet) {
    if (read === 'missing') skipped.add('log-missing', line, says.emptyCell(cell.header, row[cell.index]!));
    else skipped.add(read.code, line, says.ofColumn(cell.header, read.text));
  }
  return undefined;
}

function builderFor(builders: Map<string, CurveBuilder>, trial: string, file: string, line: number): CurveBuilder {
  const known = builders.get(trial);
  if (known !== undefined) return known;
  const builder = new CurveBuilder(trial, file, line);
  builders.set(trial, builder);
  return builder;
}
