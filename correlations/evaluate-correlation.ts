import { evaluate } from '../pipeline/algebra/evaluate.ts';
import type { Correlation } from './correlation.ts';

/** A correlation at one point: its value as published, and each limit with whether it holds. */
export interface EvaluatedCorrelation {
  readonly value: number;
  readonly limits: readonly { readonly says: string; readonly inside: boolean }[];
}

/** `at`: groups by the entry's own names. NaN where one is missing; then no limit that needs it holds. */
export function evaluateCorrelation({ form, values, limits }: Correlation, at: Readonly<Record<string, number>>): EvaluatedCorrelation {
  const held = limits.map(({ of, from = Number.NEGATIVE_INFINITY, to = Number.POSITIVE_INFINITY, says }) => {
    const value = evaluate(of, at);
    return { says, inside: value >= from && value <= to };
  });
  return { value: evaluate(form.tree, at, values), limits: held };
}
