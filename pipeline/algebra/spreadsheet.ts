import type { Expr, Fn } from './form.ts';

const names: Readonly<Partial<Record<Fn, string>>> = {
  exp: 'EXP',
  ln: 'LN',
  log10: 'LOG10',
  sqrt: 'SQRT',
  tanh: 'TANH',
  sin: 'SIN',
  cos: 'COS',
  atan: 'ATAN',
  abs: 'ABS',
};

/**
 * An expression as a spreadsheet formula (OpenFormula), without the leading `=`; `cell` gives the reference of each name. Every power is POWER(), so that
 * no program's reading of -2^2 matters. Undefined where a function has no spreadsheet counterpart (the implicit friction factor).
 */
export function spreadsheetFormula(expr: Expr, cell: (name: string) => string): string | undefined {
  const parts = (of: readonly Expr[]): readonly string[] | undefined => {
    const read = of.map((part) => spreadsheetFormula(part, cell));
    return read.some((part) => part === undefined) ? undefined : (read as string[]);
  };
  const join = (of: readonly Expr[], make: (read: readonly string[]) => string): string | undefined => {
    const read = parts(of);
    return read === undefined ? undefined : make(read);
  };
  switch (expr.op) {
    case 'number':
      return expr.value < 0 ? `(${expr.value})` : String(expr.value).replace('e', 'E');
    case 'group':
    case 'constant':
      return cell(expr.name);
    case '+':
      return join(expr.of, ([a, b]) => `(${a}+${b})`);
    case '*':
      return join(expr.of, ([a, b]) => `${a}*${b}`);
    case '^':
      return join(expr.of, ([a, b]) => `POWER(${a},${b})`);
    case 'min':
    case 'max':
      return join(expr.of, ([a, b]) => `${expr.op.toUpperCase()}(${a},${b})`);
    case 'call': {
      const name = names[expr.fn];
      return name === undefined ? undefined : join(expr.of, (read) => `${name}(${read.join(',')})`);
    }
    case 'bands':
      return join([expr.on, ...expr.of], ([on, ...of]) =>
        expr.below.reduceRight((rest, limit, k) => `IF(${on}<${limit},${of[k]},${rest})`, of.at(-1)!),
      );
  }
}
