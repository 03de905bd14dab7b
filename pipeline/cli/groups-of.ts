import type { Expr } from '../algebra/form.ts';

/** Names of the groups that an expression looks at, in order, possibly repeated. */
export function groupsOf(expr: Expr): readonly string[] {
  if (expr.op === 'group') return [expr.name];
  if (expr.op === 'number' || expr.op === 'constant') return [];
  const inside = expr.of.flatMap(groupsOf);
  return expr.op === 'bands' ? [...groupsOf(expr.on), ...inside] : inside;
}
