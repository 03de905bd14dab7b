import * as says from '../base/says/plant.ts';
import type { Input, Key, Recipe } from '../rules/rule.ts';
import type { Table } from '../trials/table.ts';
import type { PlantQuantities } from './plant-quantities.ts';

/** One plant condition: a case, or one end of a case that is stated as a range. */
export interface PlantCase {
  readonly name: string;
  /** Name of the case as the table has it. */
  readonly of: string;
  /** Line in the plant table, where there is one. */
  readonly line?: number;
  /** SI, one for each input of the recipe; NaN where the case states none. */
  readonly inputs: Float64Array;
}

const MOST_RANGES = 3;

/** Cases in the order of the table. A case with ranges becomes its middle and every corner of up to three of them (of more, the ends together). */
export function plantCases({ rows, columns, ranges }: PlantQuantities, recipe: Recipe, table: Table | undefined): readonly PlantCase[] {
  const stated = table === undefined ? [{ name: says.theCase(), line: undefined, values: [] }] : rows;
  return stated.flatMap(({ name, line, values }) => {
    const spans = new Map<Key, { readonly from: number; readonly to: number }>([
      ...columns.map((column, k) => [column.key, values[k]!] as const),
      ...ranges,
    ]);
    const open = [...spans].filter(([, { from, to }]) => to > from).map(([key]) => key);
    return placesOf(open).map(({ at, says: where }) => ({
      name: where === '' ? name : `${name}, ${where}`,
      of: name,
      ...(line === undefined ? {} : { line }),
      inputs: Float64Array.from(recipe.inputs, (input) => valueAt(input, spans, at)),
    }));
  });
}

type Where = 'low' | 'middle' | 'high';

/** Geometric middle, of temperatures too: the difference is small and the sign never matters. */
function valueAt(
  input: Input,
  spans: ReadonlyMap<Key, { readonly from: number; readonly to: number }>,
  at: ReadonlyMap<Key, Where>,
): number {
  const span = spans.get(input.key);
  if (span === undefined) return input.constant ?? Number.NaN;
  const where = at.get(input.key);
  if (where === undefined || where === 'low') return span.from;
  if (where === 'high') return span.to;
  return span.from > 0 ? Math.sqrt(span.from * span.to) : (span.from + span.to) / 2;
}

function placesOf(open: readonly Key[]): readonly { readonly at: ReadonlyMap<Key, Where>; readonly says: string }[] {
  if (open.length === 0) return [{ at: new Map(), says: '' }];
  const all = (where: Where): { at: ReadonlyMap<Key, Where>; says: string } => ({
    at: new Map(open.map((key) => [key, where])),
    says: says.endOf(
      open,
      open.map(() => where),
    ),
  });
  if (open.length > MOST_RANGES) return [all('middle'), all('low'), all('high')];
  const corners = Array.from({ length: 2 ** open.length }, (_, bits) => {
    const ends = open.map((_, k): Where => ((bits >> k) & 1 ? 'high' : 'low'));
    return { at: new Map(open.map((key, k) => [key, ends[k]!])), says: says.endOf(open, ends) };
  });
  return [all('middle'), ...corners];
}
