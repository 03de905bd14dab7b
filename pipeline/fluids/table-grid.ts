import { says } from '../base/says/fluids.ts';

/** A property on a full grid of one or two conditions; `values[i]` runs over the first condition at the i-th value of the second. */
export interface Grid {
  readonly axes: readonly (readonly number[])[];
  readonly values: readonly (readonly number[])[];
}

const sortedDistinct = (values: readonly number[]): readonly number[] => [...new Set(values)].sort((a, b) => a - b);

/** Rows of a table in any order -> full grid, or what is wrong with them. One or two columns `by`, all of one length and finite. */
export function grid(
  by: readonly (readonly number[])[],
  names: readonly string[],
  property: readonly number[],
): { readonly grid?: Grid; readonly faults: readonly string[] } {
  const axes = by.map(sortedDistinct);
  const short = axes.flatMap((axis, k) => (axis.length < 2 ? [says.tableShort(names[k]!)] : []));
  if (short.length > 0) return { faults: short };
  const [first, second = [0]] = axes as [readonly number[], (readonly number[])?];
  const at = new Map(first.map((value, k) => [value, k]));
  const line = new Map(second.map((value, k) => [value, k]));
  const values = second.map(() => first.map(() => Number.NaN));
  const faults: string[] = [];
  for (let row = 0; row < property.length; row++) {
    const i = by.length === 2 ? line.get(by[1]![row]!)! : 0;
    const k = at.get(by[0]![row]!)!;
    if (!Number.isNaN(values[i]![k]!))
      faults.push(
        says.tableTwice(
          names,
          by.map((column) => column[row]!),
        ),
      );
    values[i]![k] = property[row]!;
  }
  const holes = values.flatMap((one, i) =>
    one.flatMap((value, k) => (Number.isNaN(value) ? [by.length === 2 ? [first[k]!, second[i]!] : [first[k]!]] : [])),
  );
  if (holes.length > 0) faults.push(says.tableHole(names, holes[0]!, holes.length));
  return faults.length > 0 ? { faults } : { grid: { axes, values }, faults };
}
