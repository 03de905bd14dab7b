import type { Expr, Fn } from './form.ts';

const names: Readonly<Partial<Record<Fn, string>>> = {
  exp: 'math.exp',
  ln: 'math.log',
  log10: 'math.log10',
  sqrt: 'math.sqrt',
  tanh: 'math.tanh',
  sin: 'math.sin',
  cos: 'math.cos',
  atan: 'math.atan',
  abs: 'abs',
};

/** An expression as Python with the standard library's math; `variable` gives the text of each name. Undefined for the implicit friction factor. */
export function pythonExpression(expr: Expr, variable: (name: string) => string): string | undefined {
  const join = (of: readonly Expr[], make: (read: readonly string[]) => string): string | undefined => {
    const read = of.map((part) => pythonExpression(part, variable));
    return read.some((part) => part === undefined) ? undefined : make(read as string[]);
  };
  switch (expr.op) {
    case 'number':
      return expr.value < 0 ? `(${expr.value})` : String(expr.value);
    case 'group':
    case 'constant':
      return variable(expr.name);
    case '+':
      return join(expr.of, ([a, b]) => `(${a} + ${b})`);
    case '*':
      return join(expr.of, ([a, b]) => `${a} * ${b}`);
    case '^':
      return join(expr.of, ([a, b]) => `math.pow(${a}, ${b})`);
    case 'min':
    case 'max':
      return join(expr.of, ([a, b]) => `${expr.op}(${a}, ${b})`);
    case 'call': {
      const name = names[expr.fn];
      return name === undefined ? undefined : join(expr.of, (read) => `${name}(${read.join(', ')})`);
    }
    case 'bands':
      return join([expr.on, ...expr.of], ([on, ...of]) =>
        expr.below.reduceRight((rest, limit, k) => `(${of[k]} if ${on} < ${limit} else ${rest})`, of.at(-1)!),
      );
  }
}
