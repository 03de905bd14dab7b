import { says } from '../base/says/fluids.ts';
import type { Rule } from '../rules/rule.ts';
import { type Curve, interpolate, monotoneSlopes } from './interpolate.ts';
import type { Condition, Fluid, PropertyModel, Range } from './property-model.ts';
import { type Conditions, propertyRules, type Stream } from './property-rules.ts';
import { type Grid, grid } from './table-grid.ts';

/** A user's table of properties, parsed: every column in SI, all of one length. */
export interface PropertyTable {
  /** As the reader knows it: `glycol.csv`. */
  readonly file: string;
  readonly stream: Stream;
  /** The one or two columns that the table runs over. */
  readonly by: readonly string[];
  /** Column (a quantity's name) -> values. */
  readonly columns: Readonly<Record<string, readonly number[]>>;
  readonly at: Conditions;
}

/** What a table may run over. */
const tableConditions: readonly string[] = ['temperature', 'pressure', 'mass_fraction', 'relative_humidity'] satisfies readonly Condition[];

/** These run over orders of magnitude: their logarithm is interpolated. */
const IN_LOGARITHM = new Set(['viscosity', 'kinematic_viscosity', 'vapour_pressure', 'consistency', 'diffusivity']);

/**
 * Rules for every property column of a table at bulk, film and wall, interpolated by a cubic that keeps the order of the points; outside the table
 * a trial is refused, never extrapolated. `faults` says what is wrong with the table, then without rules.
 */
export function tableRules({ file, stream, by, columns, at }: PropertyTable): {
  readonly rules: readonly Rule[];
  readonly faults: readonly string[];
} {
  const wrong = [
    ...by.filter((name) => !tableConditions.includes(name)).map((name) => says.tableBy(name, tableConditions)),
    ...by.filter((name) => columns[name] === undefined).map(says.tableNoColumn),
  ];
  const broken = Object.keys(columns).filter((name) => !columns[name]!.every(Number.isFinite));
  if (wrong.length + broken.length > 0) return { rules: [], faults: [...wrong, ...broken.map(says.tableNotNumbers)] };
  const axes = by.map((name) => columns[name]!);
  const properties = Object.keys(columns).filter((name) => !by.includes(name));
  if (properties.length === 0) return { rules: [], faults: [says.tableEmpty(by)] };
  const made = properties.map((property) => ({ property, ...grid(axes, by, columns[property]!) }));
  const faults = [...new Set(made.flatMap((one) => one.faults))];
  const negative = properties.filter((name) => IN_LOGARITHM.has(name) && !columns[name]!.every((value) => value > 0));
  if (faults.length + negative.length > 0) return { rules: [], faults: [...faults, ...negative.map(says.tableNotPositive)] };
  const models = made.map((one) => tableModel(file, by as readonly Condition[], one.property, one.grid!));
  const fluid: Fluid = { name: file, title: file, properties: models };
  return { rules: propertyRules(fluid, stream, at), faults: [] };
}

function tableModel(file: string, by: readonly Condition[], property: string, table: Grid): PropertyModel {
  const logarithm = IN_LOGARITHM.has(property);
  const value = surface(logarithm ? { ...table, values: table.values.map((line) => line.map(Math.log)) } : table);
  return {
    property,
    from: by,
    of: logarithm ? (...x) => Math.exp(value(x)) : (...x) => value(x),
    formula: `interpolated in ${file} over ${by.join(' and ')}${logarithm ? ', in logarithms' : ''}`,
    source: file,
    ranges: by.map((condition, k) => axisRange(condition, k, table.axes[k]!)),
    assumes: says.accuracyNotStated(`${property.replaceAll('_', ' ')} in ${file}`),
  };
}

function axisRange(condition: Condition, k: number, axis: readonly number[]): Range {
  const low = axis[0]!;
  const high = axis.at(-1)!;
  return {
    holds: (...x) => x[k]! >= low && x[k]! <= high,
    otherwise: 'refuse',
    says: (...x) => says.outsideTable(condition, x[k]!, low, high),
  };
}

/** Along the first condition on every line of the second, then along the second. */
function surface({ axes, values }: Grid): (x: readonly number[]) => number {
  const [first, second] = axes as [readonly number[], (readonly number[])?];
  const lines = values.map((y) => ({ curve: { x: first, y }, slopes: monotoneSlopes({ x: first, y }) }));
  if (second === undefined) return ([a]) => interpolate(lines[0]!.curve, lines[0]!.slopes, a!);
  return ([a, b]) => {
    const across: Curve = { x: second, y: lines.map(({ curve, slopes }) => interpolate(curve, slopes, a!)) };
    return interpolate(across, monotoneSlopes(across), b!);
  };
}
