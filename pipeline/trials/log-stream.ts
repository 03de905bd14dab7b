import { isUtf8 } from 'node:buffer';
import { once } from 'node:events';
import { CsvError, type Parser, parse } from 'csv-parse';
import { InputError } from '../base/input-error.ts';
import { says } from '../base/says/trials.ts';
import { decodeText, encodingOf } from '../files/decode.ts';
import { caps } from './caps.ts';
import { readDelimited } from './delimited.ts';
import { tableOf } from './read-table.ts';
import { recogniseSeparator } from './separator.ts';
import type { Table } from './table.ts';

/** A log that is read once, piece by piece; `readPieces` of files gives the pieces. */
export interface LogSource {
  readonly file: string;
  readonly pieces: Iterable<Uint8Array>;
}

/** What is known of a log before its rows: as of a table, without rows. */
export type LogHead = Pick<Table, 'file' | 'header' | 'headerLine' | 'unitsRow' | 'decimal' | 'remarks'>;

/** Takes one row of the header's width. */
export type RowTaker = (cells: readonly string[], line: number) => void;

export interface LogTotals {
  /** Rows below the header that hold anything. */
  readonly rows: number;
  /** Rows of another width than the header. */
  readonly ragged: { readonly count: number; readonly firstLine?: number };
}

/**
 * Streams a delimited log: `open` gets the head and returns what takes each row. Memory stays flat. Header, separator and decimal mark are recognised
 * on the first piece. Broken encoding, unclosed quotes and a headless file stop with InputError (exit 3).
 */
export async function streamLog(
  { file, pieces }: LogSource,
  expects: readonly string[],
  open: (head: LogHead) => RowTaker,
): Promise<LogTotals> {
  const chunks = characters(pieces, file);
  const first = chunks.next().value ?? Buffer.alloc(0);
  const start = first.toString();
  const head = tableOf(readDelimited(start, file), expects);
  const counter = new RowCounter(head, open(head));
  const parser = parse({
    delimiter: recogniseSeparator(start.replace(/\r\n?/gu, '\n')),
    record_delimiter: ['\r\n', '\n', '\r'],
    relax_column_count: true,
    max_record_size: caps.recordCharacters,
  });
  parser.on('data', (cells: readonly string[]) => counter.take(cells));
  const failed = new Promise<never>((_, reject) => parser.on('error', (error) => reject(faultOf(error, file))));
  failed.catch(() => {});
  await Promise.race([feed(parser, first, chunks, counter), failed]);
  return counter.totals();
}

/** The head of a log as a table without rows; nothing beyond its first piece is looked at. */
export function readLogHead({ file, pieces }: LogSource, expects: readonly string[]): Table {
  const first = characters(pieces, file).next().value ?? Buffer.alloc(0);
  return { ...tableOf(readDelimited(first.toString(), file), expects), rows: [], badRows: [] };
}

async function feed(parser: Parser, first: Buffer, rest: Iterator<Buffer>, counter: RowCounter): Promise<void> {
  const ended = once(parser, 'end');
  for (let chunk: Buffer | undefined = first; chunk !== undefined; chunk = rest.next().value) {
    counter.quoted ||= chunk.includes(quote);
    if (!parser.write(chunk)) await once(parser, 'drain');
  }
  parser.end();
  await ended;
}

const quote = 0x22;
const lineFeed = 0x0a;
const headBytes = 1 << 18;

/** The log as UTF-8 in whole lines, whatever its encoding. */
function* characters(pieces: Iterable<Uint8Array>, file: string): Generator<Buffer, undefined> {
  let line = 1;
  for (const chunk of inWholeLines(utf8(startingLarge(pieces), file), file)) {
    if (!isUtf8(chunk)) throw decodeFault(chunk, file, line);
    line += countLines(chunk);
    yield chunk;
  }
  return undefined;
}

/** The first piece holds enough to recognise the header by, however small the pieces come. */
function* startingLarge(pieces: Iterable<Uint8Array>): Generator<Uint8Array> {
  let first: Uint8Array[] | undefined = [];
  let size = 0;
  for (const piece of pieces) {
    if (first === undefined) {
      yield piece;
      continue;
    }
    first.push(piece);
    size += piece.length;
    if (size < headBytes) continue;
    yield Buffer.concat(first);
    first = undefined;
  }
  if (first !== undefined) yield Buffer.concat(first);
}

/** UTF-16 is decoded here; UTF-8 passes as it is. */
function* utf8(pieces: Iterable<Uint8Array>, file: string): Generator<Uint8Array> {
  let wide: InstanceType<typeof TextDecoder> | undefined;
  let started = false;
  for (const piece of pieces) {
    const { encoding, skip } = started ? { encoding: 'utf-8', skip: 0 } : encodingOf(piece);
    if (!started && encoding !== 'utf-8') wide = new TextDecoder(encoding, { fatal: true, ignoreBOM: true });
    started = true;
    yield wide === undefined ? piece.subarray(skip) : widePiece(wide, piece.subarray(skip), file, true);
  }
  if (wide !== undefined) yield widePiece(wide, new Uint8Array(0), file, false);
}

function widePiece(decoder: InstanceType<typeof TextDecoder>, piece: Uint8Array, file: string, stream: boolean): Uint8Array {
  try {
    return Buffer.from(decoder.decode(piece, { stream }));
  } catch {
    throw new InputError([{ code: 'encoding-broken', text: says.logEncoding(), place: { file } }], 3);
  }
}

/** Pieces cut after a line feed, so that no character and no row is cut; the last one goes to the end of the log. */
function* inWholeLines(pieces: Iterable<Uint8Array>, file: string): Generator<Buffer> {
  let lines = Buffer.alloc(0);
  let rest: Uint8Array = new Uint8Array(0);
  for (const piece of pieces) {
    const end = piece.lastIndexOf(lineFeed) + 1;
    if (end === 0) {
      rest = Buffer.concat([rest, piece]);
      if (rest.length > caps.tableBytes) throw new InputError([{ code: 'field-too-long', text: says.noLineFeed(), place: { file } }], 3);
      continue;
    }
    if (lines.length > 0) yield lines;
    lines = Buffer.concat([rest, piece.subarray(0, end)]);
    rest = piece.subarray(end);
  }
  if (lines.length + rest.length > 0) yield Buffer.concat([lines, rest]);
}

/** The fault of `decodeText`, its line counted from the start of the log. */
function decodeFault(chunk: Buffer, file: string, line: number): unknown {
  try {
    decodeText(chunk, file);
  } catch (error) {
    if (!(error instanceof InputError)) return error;
    return new InputError(
      error.messages.map((message) => ({ ...message, place: { ...message.place!, line: (message.place!.line ?? 1) + line - 1 } })),
      3,
    );
  }
  return new InputError([{ code: 'encoding-broken', text: says.logEncoding(), place: { file, line } }], 3);
}

function countLines(piece: Uint8Array): number {
  let count = 0;
  for (let at = piece.indexOf(lineFeed); at >= 0; at = piece.indexOf(lineFeed, at + 1)) count += 1;
  return count;
}

/** Rows below the header (and its units row) by line; a line break inside quotes is a line too. */
class RowCounter {
  /** A quote has been seen, so that a cell may hold a line break. */
  quoted = false;
  private line = 0;
  private rows = 0;
  private ragged = 0;
  private firstRagged: number | undefined;
  private readonly lastHeadLine: number;
  private readonly width: number;
  private readonly takeRow: RowTaker;

  constructor(head: LogHead, takeRow: RowTaker) {
    this.lastHeadLine = head.headerLine + (head.unitsRow === undefined ? 0 : 1);
    this.width = head.header.length;
    this.takeRow = takeRow;
  }

  take(cells: readonly string[]): void {
    const at = this.line + 1;
    this.line = this.quoted ? at + breaksInside(cells) : at;
    if (at <= this.lastHeadLine || isBlank(cells)) return;
    this.rows += 1;
    if (cells.length === this.width) {
      this.takeRow(cells, at);
      return;
    }
    this.ragged += 1;
    this.firstRagged ??= at;
  }

  totals(): LogTotals {
    return { rows: this.rows, ragged: { count: this.ragged, ...(this.firstRagged === undefined ? {} : { firstLine: this.firstRagged }) } };
  }
}

function breaksInside(cells: readonly string[]): number {
  let breaks = 0;
  for (const cell of cells) for (let at = cell.indexOf('\n'); at >= 0; at = cell.indexOf('\n', at + 1)) breaks += 1;
  return breaks;
}

const isBlank = (cells: readonly string[]): boolean => cells[0]!.trim() === '' && cells.every((cell) => cell.trim() === '');

function faultOf(error: unknown, file: string): unknown {
  if (!(error instanceof CsvError)) return error;
  const line = Number(error.lines);
  const text = error.code === 'CSV_MAX_RECORD_SIZE' ? says.fieldTooLong(caps.recordCharacters, undefined) : says.logQuote();
  return new InputError(
    [{ code: error.code === 'CSV_MAX_RECORD_SIZE' ? 'field-too-long' : 'stray-quote', text, place: { file, line } }],
    3,
  );
}
