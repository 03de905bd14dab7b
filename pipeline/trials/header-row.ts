import { isFault } from '../quantities/fault.ts';
import { parseUnit } from '../quantities/unit.ts';
import { headerText, splitHeader } from './header.ts';
import type { GridRow } from './table.ts';

const looked = 60;

/**
 * Which row is the header: the one that names most of the `expects` columns; with none named the first row that is about as full as the others.
 * Rows above it (a merged title, remarks of a logger) are no data.
 */
export function findHeaderRow(rows: readonly GridRow[], expects: readonly string[]): number {
  const head = rows.slice(0, looked);
  const wanted = new Set(expects.map(headerText));
  const named = head.map(({ cells }) => cells.filter((cell) => wanted.has(headerText(cell)) || wanted.has(splitHeader(cell).name)).length);
  const most = Math.max(0, ...named);
  return most > 0 ? named.indexOf(most) : fullRow(head);
}

const filled = ({ cells }: GridRow): number => cells.filter((cell) => cell.trim() !== '').length;

function fullRow(head: readonly GridRow[]): number {
  const counts = head.map(filled).sort((a, b) => a - b);
  const usual = counts[Math.floor(counts.length / 2)] ?? 0;
  return Math.max(
    0,
    head.findIndex((row) => filled(row) >= 0.6 * usual),
  );
}

const inBrackets = /^(?:\[(.*)\]|\((.*)\))$/u;

const bare = (cell: string): string => {
  const text = headerText(cell);
  const found = inBrackets.exec(text);
  return found === null ? text : (found[1] ?? found[2] ?? '').trim();
};

const looksLikeNumber = (text: string): boolean => /^[-+]?[\d.,]+(?:[eE][-+]?\d+)?$/u.test(text.trim());

/**
 * The unit texts of a units row below the header, or undefined where that row is none. It is one where two or more cells are filled and all of them
 * stand in brackets, or all are units (`-` or `1` for none), at least one of a dimension, each above a column of numbers. So `A;m;` stays a trial.
 */
export function unitsOf(row: GridRow | undefined, below: readonly GridRow[]): readonly string[] | undefined {
  if (row === undefined || row.broken !== undefined) return undefined;
  const filledCells = row.cells.map((cell, k) => ({ text: headerText(cell), k })).filter(({ text }) => text !== '');
  if (filledCells.length < 2) return undefined;
  const bracketed = filledCells.every(({ text }) => inBrackets.test(text));
  return bracketed ||
    (filledCells.every(({ text, k }) => isNoUnit(text) || isUnitAbove(text, below, k)) && filledCells.some(({ text }) => !isNoUnit(text)))
    ? row.cells.map(bare)
    : undefined;
}

const isNoUnit = (text: string): boolean => text === '-' || text === '1';

/** A unit, and a number in one of the rows below it. */
function isUnitAbove(text: string, below: readonly GridRow[], column: number): boolean {
  if (looksLikeNumber(text)) return false;
  const unit = parseUnit(text);
  if (isFault(unit) && !/^[CF]$/u.test(text)) return false;
  return below.some(({ cells }) => looksLikeNumber(cells[column] ?? ''));
}
