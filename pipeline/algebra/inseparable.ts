import { derivative } from './derivative.ts';
import { evaluate } from './evaluate.ts';
import type { Form } from './form.ts';

/** Points at which the derivatives are looked at, and the share of a column that must stand apart from the others. */
const POINTS = 24;
const APART = 1e-9;

/** Numbers spread over (0, 1) without a pattern that laws could share (golden-ratio sequence). */
const spread = (k: number): number => (0.5 + k * 0.6180339887498949) % 1;

/** Every other point near one, the rest over six decades, so that both branches of a piecewise law are met. */
const pointAt = (i: number, share: number): number => (i % 2 === 0 ? 0.5 + 2 * share : 10 ** (6 * share - 2));

/**
 * Parameters that no data could tell apart, such as C and D of `C * D * Re^a`: the columns d f/d parameter are linearly dependent at points without pattern.
 * One alone where the law does not depend on it. Empty where all can be told apart. A law that has no value at any such point is left to the data.
 */
export function inseparable(form: Form): readonly string[] {
  const { constants, groups } = form;
  const slopes = constants.map((name) => derivative(form.tree, name));
  const theta = Object.fromEntries(constants.map((name, k) => [name, 0.3 + spread(k + 1)]));
  const columns: number[][] = constants.map(() => []);
  let flat = 0;
  for (let i = 0; i < POINTS * 4 && columns[0]!.length < POINTS; i++) {
    const at = Object.fromEntries(groups.map((name, k) => [name, pointAt(i, spread(7 * i + 3 * k + 2))]));
    const row = slopes.map((slope) => evaluate(slope, at, theta));
    const size = Math.max(...row.map(Math.abs));
    if (size === 0 && row.every(Number.isFinite)) flat += 1;
    if (size > 0 && row.every(Number.isFinite)) for (const [k, value] of row.entries()) columns[k]!.push(value / size);
  }
  if (flat === POINTS * 4) return constants.slice(0, 1);
  if (columns[0]!.length < POINTS) return [];
  const dependent = firstDependent(columns);
  return dependent < 0 ? [] : partnersOf(columns, dependent).map((k) => constants[k]!);
}

const dot = (a: readonly number[], b: readonly number[]): number => a.reduce((sum, v, i) => sum + v * b[i]!, 0);
const length = (a: readonly number[]): number => Math.sqrt(dot(a, a));

/** Twice-run Gram-Schmidt; the first column of which nothing is left beside the ones before it. */
function firstDependent(columns: readonly (readonly number[])[]): number {
  const basis: number[][] = [];
  for (const [k, column] of columns.entries()) {
    const size = length(column);
    const rest = without(without(column, basis), basis);
    if (!(length(rest) > APART * size)) return k;
    const scale = length(rest);
    basis.push(rest.map((v) => v / scale));
  }
  return -1;
}

const without = (column: readonly number[], basis: readonly (readonly number[])[]): number[] =>
  basis.reduce<number[]>(
    (rest, one) => {
      const share = dot(rest, one);
      return rest.map((v, i) => v - share * one[i]!);
    },
    [...column],
  );

/** The dependent column and the fewest earlier ones it depends on: those without which it would stand apart. */
function partnersOf(columns: readonly (readonly number[])[], dependent: number): readonly number[] {
  const needed = Array.from({ length: dependent }, (_, k) => k).filter(
    (k) => firstDependent([...columns.slice(0, k), ...columns.slice(k + 1, dependent + 1)]) < 0,
  );
  return [...needed, dependent];
}
