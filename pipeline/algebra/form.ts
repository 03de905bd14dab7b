/** Functions a law may call. `log10` and `sqrt` stand for themselves in print; `friction` is the implicit Colebrook factor of the catalogue. */
export type Fn = 'exp' | 'ln' | 'log10' | 'sqrt' | 'tanh' | 'sin' | 'cos' | 'atan' | 'abs' | 'friction';

/**
 * The algebra of a law as plain data (JSON): it crosses workers, StudyResult, laws.json and the page unchanged.
 * A `group` is an independent variable (group or quantity) by the law's own name of it; a `constant` is a parameter, published, fixed or fitted.
 */
export type Expr =
  | { readonly op: 'number'; readonly value: number }
  | { readonly op: 'group'; readonly name: string }
  | { readonly op: 'constant'; readonly name: string }
  | { readonly op: '+' | '*'; readonly of: readonly [Expr, Expr] }
  | { readonly op: 'min' | 'max'; readonly of: readonly [Expr, Expr] }
  | { readonly op: '^'; readonly of: readonly [Expr, Expr] }
  | { readonly op: 'call'; readonly fn: Fn; readonly of: readonly Expr[] }
  /** of[k] while on < below[k], the last one above all: bands of Re in published tables. */
  | { readonly op: 'bands'; readonly on: Expr; readonly below: readonly number[]; readonly of: readonly Expr[] };

/** RESPONSE = tree; free of the values of its constants, so that the regression re-fits exactly what the catalogue evaluates. */
export interface Form {
  readonly response: string;
  readonly tree: Expr;
  /** Independent variables in order of first appearance. */
  readonly groups: readonly string[];
  /** Parameters in order of first appearance. */
  readonly constants: readonly string[];
}

/** A law: a form, values for its constants, and what its names mean. */
export interface Law {
  readonly name: string;
  readonly form: Form;
  /** Every constant of the form -> its value. */
  readonly values: Readonly<Record<string, number>>;
  /** The law's name of the response or of a group -> the key of its definition: `Nu` -> `Nu@cylinder,film`. */
  readonly groups: Readonly<Record<string, string>>;
}
