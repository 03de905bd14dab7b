import { bandOf, functions } from './evaluate.ts';
import type { Expr, Fn } from './form.ts';

/**
 * Expressions as a list of columnar steps over n rows: parts that do not depend on parameters are computed once, common parts once.
 * `load()` after the columns have changed, `run(theta)` for new parameters (in the order of `constants`); results stand in `out`, one column of n each,
 * overwritten by the next run.
 */
export interface Tape {
  readonly out: readonly Float64Array[];
  load(): void;
  run(theta: Float64Array): void;
}

/** A value that is the same in all rows (a scalar slot) or one of its own in each (a column). */
type Ref = { readonly kind: 'scalar' | 'column'; readonly at: number; readonly open: boolean };
type Step = () => void;

/** Loops of their own for what most laws are made of: a function called through a variable is not inlined. */
const loops: Readonly<Record<string, (out: Float64Array, x: Float64Array) => Step>> = {
  exp: (out, x) => () => {
    for (let i = 0; i < out.length; i++) out[i] = Math.exp(x[i]!);
  },
  ln: (out, x) => () => {
    for (let i = 0; i < out.length; i++) out[i] = Math.log(x[i]!);
  },
  inverse: (out, x) => () => {
    for (let i = 0; i < out.length; i++) out[i] = 1 / x[i]!;
  },
  square: (out, x) => () => {
    for (let i = 0; i < out.length; i++) out[i] = x[i]! * x[i]!;
  },
};

class Builder {
  readonly scalars: number[] = [];
  readonly columns: Float64Array[];
  readonly hoisted: Step[] = [];
  readonly inner: Step[] = [];
  readonly #known = new Map<string, Ref>();
  readonly #n: number;
  readonly #groups: ReadonlyMap<string, number>;
  readonly #constants: ReadonlyMap<string, number>;

  constructor(groups: readonly string[], constants: readonly string[], columns: readonly Float64Array[]) {
    this.columns = [...columns];
    this.#n = columns[0]?.length ?? 1;
    this.#groups = new Map(groups.map((name, k) => [name, k]));
    this.#constants = new Map(constants.map((name, k) => [name, k]));
    for (const _ of constants) this.scalars.push(Number.NaN);
  }

  visit(e: Expr): Ref {
    switch (e.op) {
      case 'number':
        return this.#number(e.value);
      case 'group':
        return this.#leaf('column', this.#groups.get(e.name), e.name);
      case 'constant':
        return this.#leaf('scalar', this.#constants.get(e.name), e.name);
      case '+':
        return this.#binary('+', e.of, (a, b) => a + b);
      case '*':
        return this.#binary('*', e.of, (a, b) => a * b);
      case 'min':
        return this.#binary('min', e.of, Math.min);
      case 'max':
        return this.#binary('max', e.of, Math.max);
      case '^':
        return this.#power(e.of[0], e.of[1]);
      case 'call':
        return this.#call(e.fn, e.of);
      case 'bands':
        return this.#bands(e.on, e.below, e.of);
    }
  }

  #number(value: number): Ref {
    return this.#once(`n${value}`, () => {
      this.scalars.push(value);
      return { kind: 'scalar', at: this.scalars.length - 1, open: false };
    });
  }

  #leaf(kind: 'scalar' | 'column', at: number | undefined, name: string): Ref {
    if (at === undefined) throw new Error(`the tape has no column or parameter ${name}`);
    return { kind, at, open: kind === 'scalar' };
  }

  #once(key: string, make: () => Ref): Ref {
    const known = this.#known.get(key);
    if (known !== undefined) return known;
    const made = make();
    this.#known.set(key, made);
    return made;
  }

  /** A step of its own result slot: a column if any argument is one. */
  #step(key: string, args: readonly Ref[], build: (to: number, kind: 'scalar' | 'column') => Step): Ref {
    return this.#once(`${key}(${args.map((ref) => `${ref.kind[0]}${ref.at}`).join()})`, () => {
      const kind = args.some((ref) => ref.kind === 'column') ? 'column' : 'scalar';
      const open = args.some((ref) => ref.open);
      const at = kind === 'column' ? this.columns.push(new Float64Array(this.#n)) - 1 : this.scalars.push(Number.NaN) - 1;
      (open ? this.inner : this.hoisted).push(build(at, kind));
      return { kind, at, open };
    });
  }

  #binary(key: '+' | '*' | 'min' | 'max', of: readonly [Expr, Expr], fn: (a: number, b: number) => number): Ref {
    const [a, b] = [this.visit(of[0]), this.visit(of[1])];
    return this.#step(key, [a, b], (to, kind) =>
      kind === 'scalar'
        ? this.#scalarStep(to, a, b, fn)
        : key === '+'
          ? this.#sum(to, a, b)
          : key === '*'
            ? this.#product(to, a, b)
            : this.#each(to, a, b, fn),
    );
  }

  #scalarStep(to: number, a: Ref, b: Ref, fn: (a: number, b: number) => number): Step {
    const s = this.scalars;
    return () => {
      s[to] = fn(s[a.at]!, s[b.at]!);
    };
  }

  #sum(to: number, a: Ref, b: Ref): Step {
    const [out, x, y] = [this.columns[to]!, this.#column(a), this.#column(b)];
    const s = this.scalars;
    if (x !== undefined && y !== undefined)
      return () => {
        for (let i = 0; i < out.length; i++) out[i] = x[i]! + y[i]!;
      };
    const [column, scalar] = x === undefined ? [y!, a.at] : [x, b.at];
    return () => {
      const c = s[scalar]!;
      for (let i = 0; i < out.length; i++) out[i] = column[i]! + c;
    };
  }

  #product(to: number, a: Ref, b: Ref): Step {
    const [out, x, y] = [this.columns[to]!, this.#column(a), this.#column(b)];
    const s = this.scalars;
    if (x !== undefined && y !== undefined)
      return () => {
        for (let i = 0; i < out.length; i++) out[i] = x[i]! * y[i]!;
      };
    const [column, scalar] = x === undefined ? [y!, a.at] : [x, b.at];
    return () => {
      const c = s[scalar]!;
      for (let i = 0; i < out.length; i++) out[i] = column[i]! * c;
    };
  }

  #each(to: number, a: Ref, b: Ref, fn: (a: number, b: number) => number): Step {
    const [out, x, y] = [this.columns[to]!, this.#column(a), this.#column(b)];
    const s = this.scalars;
    return () => {
      for (let i = 0; i < out.length; i++) out[i] = fn(x === undefined ? s[a.at]! : x[i]!, y === undefined ? s[b.at]! : y[i]!);
    };
  }

  /** x^theta over fixed columns goes through a hoisted ln x; where that does not exist the power itself is taken. */
  #power(base: Expr, exponent: Expr): Ref {
    const [a, b] = [this.visit(base), this.visit(exponent)];
    if (exponent.op === 'number' && exponent.value === -1) return this.#unary('inverse', a, (x) => 1 / x);
    if (exponent.op === 'number' && exponent.value === 2) return this.#unary('square', a, (x) => x * x);
    if (a.kind === 'column' && !a.open && b.kind === 'scalar' && b.open) return this.#openPower(a, b);
    return this.#step('^', [a, b], (to, kind) =>
      kind === 'scalar' ? this.#scalarStep(to, a, b, Math.pow) : this.#each(to, a, b, Math.pow),
    );
  }

  #openPower(a: Ref, b: Ref): Ref {
    const ln = this.#unary('ln', a, Math.log);
    return this.#step('^', [a, b, ln], (to) => {
      const [out, x, logs] = [this.columns[to]!, this.columns[a.at]!, this.columns[ln.at]!];
      const s = this.scalars;
      let sound = false;
      this.hoisted.push(() => {
        sound = logs.every(Number.isFinite);
      });
      return () => {
        const power = s[b.at]!;
        if (sound) {
          for (let i = 0; i < out.length; i++) out[i] = Math.exp(power * logs[i]!);
          return;
        }
        for (let i = 0; i < out.length; i++) {
          const l = logs[i]!;
          out[i] = Number.isFinite(l) ? Math.exp(power * l) : x[i]! ** power;
        }
      };
    });
  }

  #call(fn: Fn, of: readonly Expr[]): Ref {
    const args = of.map((part) => this.visit(part));
    return args.length === 1
      ? this.#unary(fn, args[0]!, functions[fn] as (x: number) => number)
      : this.#step(fn, args, (to, kind) =>
          kind === 'scalar' ? this.#scalarStep(to, args[0]!, args[1]!, functions[fn]) : this.#each(to, args[0]!, args[1]!, functions[fn]),
        );
  }

  #unary(key: string, a: Ref, fn: (x: number) => number): Ref {
    return this.#step(key, [a], (to, kind) => {
      const s = this.scalars;
      if (kind === 'scalar')
        return () => {
          s[to] = fn(s[a.at]!);
        };
      const [out, x] = [this.columns[to]!, this.columns[a.at]!];
      return (
        loops[key]?.(out, x) ??
        (() => {
          for (let i = 0; i < out.length; i++) out[i] = fn(x[i]!);
        })
      );
    });
  }

  #bands(on: Expr, below: readonly number[], of: readonly Expr[]): Ref {
    const args = [on, ...of].map((part) => this.visit(part));
    return this.#step(`bands${below.join()}`, args, (to, kind) => {
      const s = this.scalars;
      const columns = args.map((ref) => this.#column(ref));
      const read = (k: number, i: number): number => columns[k]?.[i] ?? s[args[k]!.at]!;
      const choose = (i: number): number => {
        const band = bandOf(read(0, i), below);
        return band < 0 ? Number.NaN : read(band + 1, i);
      };
      if (kind === 'scalar')
        return () => {
          s[to] = choose(0);
        };
      const out = this.columns[to]!;
      return () => {
        for (let i = 0; i < out.length; i++) out[i] = choose(i);
      };
    });
  }

  #column(ref: Ref): Float64Array | undefined {
    return ref.kind === 'column' ? this.columns[ref.at]! : undefined;
  }

  /** Results that are the same in all rows are spread over a column. */
  output(ref: Ref): Float64Array {
    if (ref.kind === 'column') return this.columns[ref.at]!;
    const spread = new Float64Array(this.#n);
    const s = this.scalars;
    (ref.open ? this.inner : this.hoisted).push(() => {
      spread.fill(s[ref.at]!);
    });
    return spread;
  }
}

export function compile(
  outputs: readonly Expr[],
  groups: readonly string[],
  constants: readonly string[],
  columns: readonly Float64Array[],
): Tape {
  const builder = new Builder(groups, constants, columns);
  const out = outputs.map((e) => builder.visit(e)).map((ref) => builder.output(ref));
  const { hoisted, inner, scalars } = builder;
  const load = (): void => {
    for (const step of hoisted) step();
  };
  return {
    out,
    load,
    run: (theta) => {
      for (let k = 0; k < constants.length; k++) scalars[k] = theta[k]!;
      for (const step of inner) step();
    },
  };
}
