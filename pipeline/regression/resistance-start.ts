import type { Form } from '../algebra/form.ts';
import type { FitData, FitOptions } from './fit.ts';
import { fitLaw } from './fit-law.ts';

/** A law f of one term in 1/y = R + 1/(s f): what its parts are called in the law of y. */
export interface ResistanceParts {
  readonly form: Form;
  readonly groups: Readonly<Record<string, string>>;
  /** The group s. */
  readonly scale: string;
  readonly resistances: readonly string[];
}

/**
 * Where to start a law 1/y = R + 1/(s f): R is half of the smallest 1/y, and f is fitted to what that leaves. A start only; values that are given
 * win over it. `law` is the law of y, whose groups the columns of `data` are.
 */
export function resistanceStart(
  law: {
    readonly form: Form;
    readonly start?: Readonly<Record<string, number>>;
    readonly bounds?: Readonly<Record<string, readonly [number, number]>>;
  },
  own: ResistanceParts,
  data: FitData,
  options: FitOptions,
): Readonly<Record<string, number>> {
  const natural = (column: Float64Array): Float64Array => (data.scale === 'relative' ? column.map(Math.exp) : column);
  const y = natural(data.y);
  const s = natural(data.x[law.form.groups.indexOf(own.scale)]!);
  const R = 0.5 / Math.max(...y);
  const columns = own.form.groups.map((name) => natural(data.x[law.form.groups.indexOf(name)]!).map(Math.log));
  const width = 1 + columns.length;
  const fit = fitLaw(
    { name: 'start', form: own.form, groups: own.groups, start: law.start ?? {}, bounds: only(law.bounds ?? {}, own.form.constants) },
    {
      ...data,
      scale: 'relative',
      y: y.map((value, i) => -Math.log((1 / value - R) * s[i]!)),
      x: columns,
      sigma: data.trials.map(() => new Float64Array(width * width)),
      sources: [],
      systematic: data.trials.map(() => new Float64Array(0)),
    },
    { ...options, scale: 'relative', weights: 'equal', scatter: 'estimate', campaignEffect: 'none', resamples: 0 },
    'values',
  );
  const values = Object.fromEntries(Object.entries(fit.values).filter(([, value]) => Number.isFinite(value)));
  return { ...Object.fromEntries(own.resistances.map((name) => [name, R])), ...values, ...law.start };
}

const only = <T>(record: Readonly<Record<string, T>>, names: readonly string[]): Record<string, T> =>
  Object.fromEntries(Object.entries(record).filter(([name]) => names.includes(name)));
