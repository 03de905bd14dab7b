import { says } from '../base/says/begin.ts';
import { type Dimension, isDimensionless, sameDimension } from '../quantities/dimension.ts';
import { isFault } from '../quantities/fault.ts';
import { parseUnit } from '../quantities/unit.ts';
import { unitFor } from '../quantities/unit-for.ts';
import { type Quantity, quantities, quantityOf } from '../quantities/vocabulary.ts';
import type { BeginInput, ColumnGuess } from '../study/begin.ts';
import { campaignNames, groupNames, namePatterns, orderNames, plainWords, secondStream, trialNames } from './guess-names.ts';
import { splitHeader } from './header.ts';
import { cellReader } from './number-cell.ts';
import { orderOf } from './order.ts';
import type { Table } from './table.ts';
import { unitInName } from './unit-in-name.ts';

interface Column {
  readonly header: string;
  readonly name: string;
  readonly unit?: string;
  readonly cells: readonly string[];
  /** What the units row says where the header says another unit. */
  readonly below?: string;
  /** Share of its filled cells that are numbers. */
  readonly numeric: number;
}

/** What the columns of a table seem to be, by names and units in English and German; doubt becomes a question, never a silent choice. */
export function guessColumns(table: Table): BeginInput {
  const columns = columnsOf(table);
  const guesses = settleTwice(columns.map((column) => unclear(guess(column, table.decimal), column, columns)));
  const trial = guesses.findIndex(({ is }) => is === 'trial');
  const names = trial < 0 ? [] : columns[trial]!.cells;
  return {
    file: table.file,
    ...(table.sheet === undefined ? {} : { sheet: table.sheet }),
    columns: guesses,
    repeated: new Set(names).size < names.length,
    marks: marksOf(columns, table.decimal),
  };
}

function columnsOf({ header, unitsRow, rows, decimal }: Table): readonly Column[] {
  const { read } = cellReader({ decimal, missing: [] });
  return header.flatMap((text, k): Column[] => {
    const cells = rows.map((row) => row.cells[k]!.trim()).filter((cell) => cell !== '');
    if (text === '') return [];
    const split = splitHeader(text);
    const below = unitsRow?.[k] === '' ? undefined : unitsRow?.[k];
    const unit = split.unit ?? below;
    const numbers = cells.filter((cell) => typeof read(cell) === 'number').length;
    return [
      {
        header: text,
        name: split.name,
        ...(unit === undefined ? {} : { unit }),
        ...(split.unit === undefined || below === undefined || below === split.unit ? {} : { below }),
        cells,
        numeric: cells.length === 0 ? 0 : numbers / cells.length,
      },
    ];
  });
}

/** A header that stands twice, or one whose unit its units row contradicts, cannot be named in a study: a question, or nothing. */
function unclear(one: ColumnGuess, { header, unit, below }: Column, columns: readonly Column[]): ColumnGuess {
  const twice = columns.filter((other) => other.header === header).length > 1;
  if (!twice && below === undefined) return one;
  const question = twice ? says.sameHeader(header) : says.unitsDiffer(header, unit!, below!);
  return one.is === 'quantity' ? { ...one, question } : { header, is: 'text' };
}

function guess(column: Column, decimal: '.' | ','): ColumnGuess {
  const { header, name, cells, numeric, unit } = column;
  const words = plainWords(name);
  if (unit === undefined && trialNames.test(words)) return { header, is: 'trial' };
  if (unit === undefined && campaignNames.test(words)) return { header, is: new Set(cells).size === cells.length ? 'trial' : 'campaign' };
  const ordered = cells.length > 0 && cells.every((cell) => !Number.isNaN(orderOf(cell, decimal)));
  if (unit === undefined && ordered && (numeric < 0.5 || orderNames.test(words))) return { header, is: 'order' };
  if (numeric < 0.5) return { header, is: 'text' };
  const group = groupNames.find((known) => known === name);
  if (group !== undefined && (unit === undefined || isOne(unit))) return { header, is: 'group', key: group };
  return quantityGuess(column, words);
}

const isOne = (unit: string): boolean => {
  const read = parseUnit(unit);
  return !isFault(read) && isDimensionless(read.dimension);
};

function quantityGuess({ header, name, unit }: Column, words: string): ColumnGuess {
  if (unit !== undefined) return withUnit(header, words, unit);
  const inName = unitInName(name);
  const found = inName === undefined ? undefined : match(plainWords(inName.name), inName.unit);
  if (inName !== undefined && found !== undefined)
    return { ...streamed(header, plainWords(inName.name), found), unit: inName.unit, remark: says.unitFromName(inName.unit) };
  const known = byExactName(name) ?? plainNumber(words) ?? match(words, undefined);
  if (known === undefined) return { header, is: 'number', unitless: true };
  if (known.unit === '1') return { header, is: 'quantity', key: known.name };
  return {
    header,
    is: 'quantity',
    key: known.name,
    unit: known.unit,
    unitless: true,
    question: says.unitAsked(header, known.unit, known.says),
  };
}

function withUnit(header: string, words: string, unit: string): ColumnGuess {
  const found = byExactName(words.replace(/ /gu, '_'), unit) ?? match(words, unit);
  if (found !== undefined) return { ...streamed(header, words, found), ...asked(header, unit, found) };
  const read = parseUnit(unit);
  if (isFault(read) && !/^[CF]$/u.test(unit)) return { header, is: 'quantity', key: 'unknown', question: says.wrongUnit(header, unit) };
  const only = isFault(read)
    ? []
    : Object.values(quantities).filter((one) => one.kind !== 'text' && fits(one, read.dimension) && !isDimensionless(read.dimension));
  return only.length === 1
    ? { header, is: 'quantity', key: only[0]!.name, question: says.onlyUnit(header, only[0]!.says) }
    : { header, is: 'number' };
}

/** A plain number is only what its whole name says: `x` is a mass fraction, `slope x 4` is not. */
function plainNumber(words: string): Quantity | undefined {
  const found = namePatterns.find(({ key, name }) => quantities[key]!.unit === '1' && name.exec(words)?.[0] === words);
  return found === undefined ? undefined : quantities[found.key];
}

/** A normal volume without its condition must be asked for. */
function asked(header: string, unit: string, quantity: Quantity): Partial<ColumnGuess> {
  const read = unitFor(quantity, unit);
  return isFault(read) ? { unit: `${unit} (0 degC, 101.325 kPa)`, question: says.conditionAsked(header) } : {};
}

function streamed(header: string, words: string, { name }: Quantity): ColumnGuess {
  return { header, is: 'quantity', key: secondStream.test(words) && hasStreams(name) ? `${name}_other` : name };
}

const hasStreams = (name: string): boolean => /^(?:inlet|outlet)_|flow$/u.test(name);

const byExactName = (name: string, unit?: string): Quantity | undefined => {
  const found = quantityOf(name.toLowerCase());
  return found !== undefined && found.kind !== 'text' && (unit === undefined || !isFault(unitFor(found, unit))) ? found : undefined;
};

/** The first pattern that fits the words and, where there is one, the unit. */
function match(words: string, unit: string | undefined): Quantity | undefined {
  const found = namePatterns.find(
    ({ key, name }) => name.test(words) && (unit === undefined ? quantities[key]!.unit !== '1' : unitFits(quantities[key]!, unit)),
  );
  return found === undefined ? undefined : quantities[found.key];
}

/** Fits but for a reference condition that is not stated. */
function unitFits(quantity: Quantity, unit: string): boolean {
  const read = unitFor(quantity, unit);
  return !isFault(read) || read.code === 'unit-condition';
}

const fits = (quantity: Quantity, dimension: Dimension): boolean =>
  sameDimension(quantity.dimension, dimension) || (quantity.molar !== undefined && sameDimension(quantity.molar.dimension, dimension));

/** A second column of the same guess becomes a question; so does a second trial, campaign or order. */
function settleTwice(guesses: readonly ColumnGuess[]): readonly ColumnGuess[] {
  const first = new Map<string, string>();
  return guesses.map((one) => {
    if (one.is === 'number' || one.is === 'text') return one;
    const key = one.key ?? one.is;
    const other = first.get(key);
    if (other === undefined) {
      if (one.question === undefined) first.set(key, one.header);
      return one;
    }
    if (one.key === undefined) return { header: one.header, is: 'text' };
    return one.is === 'group'
      ? { header: one.header, is: 'number' }
      : { ...one, question: one.question ?? says.twoColumns(key, one.header, other) };
  });
}

const usualMarks = new Set(['n.d.', 'nd', 'n/a', 'na', 'n.a.', '-', '--', '---', 'k.a.', '-9999', '-999', '9999', 'nan', '?', 'x', '*']);

/** Texts that stand in columns of numbers as people mark a missing value. */
function marksOf(columns: readonly Column[], decimal: '.' | ','): readonly string[] {
  const { read } = cellReader({ decimal, missing: [] });
  const found = columns
    .filter(({ numeric }) => numeric >= 0.5)
    .flatMap(({ cells }) =>
      cells.filter((cell) => usualMarks.has(cell.toLowerCase()) && (typeof read(cell) !== 'number' || /^-?9{3,}$/u.test(cell))),
    );
  return [...new Set(found)].sort();
}
