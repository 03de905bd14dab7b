import { InputError } from '../base/input-error.ts';
import type { Message, Note, Refusal } from '../base/message.ts';
import type { Place } from '../base/place.ts';
import { says } from '../base/says/trials.ts';
import type { Staged } from '../base/staged.ts';
import { parseAmount } from '../quantities/amount.ts';
import { isFault } from '../quantities/fault.ts';
import { type Quantity, quantities } from '../quantities/vocabulary.ts';
import type { SeriesEntry } from '../study/study.ts';
import type { Trial } from './average.ts';
import type { LoggedCurve } from './curve-builder.ts';
import { findColumn } from './find-column.ts';
import type { LogSource } from './log-stream.ts';
import { readSeries, type SeriesSpec } from './series.ts';
import type { Table } from './table.ts';

/** What a study says of its logged curves, and where they are to be had. */
export interface StudySeries {
  readonly entry: SeriesEntry;
  readonly table: Table;
  readonly trials: readonly Trial[];
  /** What the curve holds, where it is known. */
  readonly quantity?: Quantity;
  readonly missing: readonly string[];
  /** Opens a file that the study or its table names, inside the study's folder; `place` is where it is named. */
  readonly open: (file: string, place: Place) => LogSource;
}

type Curves = ReadonlyMap<string, LoggedCurve>;

/**
 * The curve of each trial: from one long file with a trial column, or from the file that a column of the table names for each trial.
 * A trial without a curve is refused; a curve without a trial is told.
 */
export async function readStudySeries(series: StudySeries): Promise<Staged<Curves>> {
  const read =
    series.entry.file === undefined ? await fromFiles(series) : await fromOneFile(series, series.entry.file.is, series.entry.file.place);
  const told = new Set(read.refused.map(({ trial }) => trial));
  const without = series.trials.filter(({ trial }) => !read.value.has(trial) && !told.has(trial));
  return {
    ...read,
    refused: [
      ...read.refused,
      ...without.map(({ trial, file, line }): Refusal => ({ trial, code: 'no-curve', text: says.noCurve(trial), place: { file, line } })),
    ],
  };
}

async function fromOneFile(series: StudySeries, file: string, place: Place): Promise<Staged<Curves>> {
  const { trial } = series.entry;
  const [only] = series.trials;
  if (trial === undefined && series.trials.length > 1) throw stop('series-trial', says.seriesTrial(), place);
  const spec = specOf(series, only?.trial ?? '', trial === undefined ? {} : { trial: { column: trial.is, place: trial.place } });
  const read = await readSeries(series.open(file, place), spec);
  const known = new Set(series.trials.map((one) => one.trial));
  const strangers = [...read.value.curves.keys()].filter((name) => !known.has(name));
  const notes: Note[] =
    strangers.length === 0
      ? []
      : [{ section: 'trials', level: 'note', code: 'curve-without-trial', text: says.curveWithoutTrial(strangers), place: { file } }];
  return {
    value: new Map([...read.value.curves].filter(([name]) => known.has(name))),
    notes: [...read.notes, ...notes],
    refused: read.refused.filter((one) => known.has(one.trial)),
  };
}

async function fromFiles(series: StudySeries): Promise<Staged<Curves>> {
  const column = series.entry.files!;
  const found = findColumn(series.table, column.is);
  if (isFault(found)) throw stop(found.code, found.text, column.place);
  const rows = new Map(series.table.rows.map((row) => [row.line, row.cells[found.index]!.trim()]));
  const curves = new Map<string, LoggedCurve>();
  const notes: Note[] = [];
  const refused: Refusal[] = [];
  for (const { trial, file, line, lines } of series.trials) {
    const names = [...new Set(lines.map((one) => rows.get(one) ?? ''))];
    const place = { file, line, key: found.header, trial };
    if (names.length > 1 || names[0] === '') {
      refused.push({ trial, code: 'no-curve', text: names.length > 1 ? says.severalCurves(trial, names) : says.noCurve(trial), place });
      continue;
    }
    const read = await readSeries(series.open(names[0]!, place), specOf(series, trial, {}));
    for (const [name, curve] of read.value.curves) curves.set(name, curve);
    notes.push(...read.notes);
    refused.push(...read.refused);
  }
  return { value: curves, notes, refused };
}

function specOf({ entry, quantity, missing }: StudySeries, name: string, trial: Pick<SeriesSpec, 'trial'>): SeriesSpec {
  const window = entry.window?.map(({ is, place }) => secondsOf(is, place)) as [number, number] | undefined;
  if (window !== undefined && !(window[0] < window[1])) throw stop('window-reversed', says.windowReversed(), entry.window![0].place);
  return {
    name,
    ...trial,
    time: { column: entry.time.is, place: entry.time.place },
    value: { column: entry.value.is, place: entry.value.place, ...(quantity === undefined ? {} : { quantity }) },
    ...(window === undefined ? {} : { window }),
    missing,
  };
}

function secondsOf(text: string, place: Place): number {
  const amount = parseAmount(text, quantities.time);
  if (isFault(amount)) throw stop(amount.code, amount.text, place);
  return amount.si;
}

const stop = (code: string, text: string, place: Place): InputError => new InputError([{ code, text, place } satisfies Message]);
