import type { Correlation } from '../../correlations/correlation.ts';
import { call, group } from '../algebra/build.ts';
import { derivative } from '../algebra/derivative.ts';
import type { Expr } from '../algebra/form.ts';
import { compile } from '../algebra/tape.ts';
import type { Observations } from '../observations/observation.ts';
import type { Key } from '../rules/rule.ts';

/** A correlation laid beside the trials by its own definitions. n trials of the observations, in their order. */
export interface Comparison {
  readonly correlation: Correlation;
  readonly basis: 'direct' | 'analogy';
  readonly keys: Readonly<Record<string, Key>>;
  /** Rows of the observations: response, then the form's groups. */
  readonly rows: readonly number[];
  /** ln measured - ln predicted as published; NaN where a group is missing. */
  readonly lnRatio: Float64Array;
  readonly predicted: Float64Array;
  /** One column of n for each of the form's groups: d ln f/d ln x. */
  readonly slopes: readonly Float64Array[];
  /** Per limit and trial, whether it holds. */
  readonly holds: readonly (readonly boolean[])[];
  readonly inside: readonly boolean[];
}

/** All groups by the names a limit may use, in natural scale. */
function columnsOf(keys: readonly Key[], observations: Observations): readonly Float64Array[] {
  return keys.map((key) => {
    const column = observations.z[observations.keys.indexOf(key)]!;
    return observations.scale === 'relative' ? column.map(Math.exp) : column;
  });
}

/** Every key of the correlation must be among the observations'. */
export function compare(
  correlation: Correlation,
  basis: 'direct' | 'analogy',
  keys: Readonly<Record<string, Key>>,
  observations: Observations,
): Comparison {
  const { form } = correlation;
  const n = observations.trials.length;
  const names = Object.keys(keys).filter((name) => name !== form.response);
  const columns = columnsOf(
    names.map((name) => keys[name]!),
    observations,
  );
  const constants = Float64Array.from(form.constants, (name) => correlation.values[name]!);
  const run = (outputs: readonly Expr[]): readonly Float64Array[] => {
    const tape = compile(outputs, names, form.constants, columns);
    tape.load();
    tape.run(constants);
    return tape.out;
  };
  const lnForm = call('ln', form.tree);
  const outputs = run([form.tree, ...form.groups.map((name) => ({ op: '*', of: [group(name), derivative(lnForm, name)] }) as Expr)]);
  const rows = [form.response, ...form.groups].map((name) => observations.keys.indexOf(keys[name]!));
  const measured = observations.z[rows[0]!]!;
  const predicted = outputs[0]!.slice();
  const lnRatio = predicted.map(
    (value, i) => (observations.scale === 'relative' ? measured[i]! : Math.log(measured[i]!)) - Math.log(value),
  );
  const limits = run(correlation.limits.map((limit) => limit.of)).map((values, k) => {
    const { from = Number.NEGATIVE_INFINITY, to = Number.POSITIVE_INFINITY } = correlation.limits[k]!;
    return Array.from(values, (value) => value >= from && value <= to);
  });
  const inside = Array.from({ length: n }, (_, i) => Number.isFinite(lnRatio[i]!) && limits.every((holds) => holds[i]!));
  return {
    correlation,
    basis,
    keys,
    rows,
    lnRatio,
    predicted,
    slopes: outputs.slice(1).map((column) => column.slice()),
    holds: limits,
    inside,
  };
}
