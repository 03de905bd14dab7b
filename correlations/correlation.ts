import type { Expr, Law } from '../pipeline/algebra/form.ts';

export type Family =
  | 'tube'
  | 'annulus'
  | 'coil'
  | 'plate'
  | 'cylinder'
  | 'tube-bank'
  | 'sphere'
  | 'natural-convection'
  | 'packed-bed'
  | 'fluidised-bed'
  | 'bed-wall'
  | 'vessel'
  | 'suspended-solids'
  | 'gas-liquid'
  | 'wetted-wall'
  | 'packed-column'
  | 'rotating'
  | 'membrane'
  | 'plate-exchanger'
  | 'impinging-jet'
  | 'layer'
  | 'other';

/** A limit as its authors state it; evaluated and shown, never enforced by clamping. Both ends belong to the range. */
export interface Limit {
  /** An expression in the entry's own groups (`Re * Pr`) or a quantity ratio it names. */
  readonly of: Expr;
  readonly from?: number;
  readonly to?: number;
  /** As printed beside the number: `Re Pr >= 0.2`. */
  readonly says: string;
}

/** A check from outside: printed worked example or table, an analytic limit, a stored page that prints the constants. Never a neighbour's agreement. */
interface Printed {
  readonly kind: 'worked example' | 'table' | 'analytic limit' | 'constants on a page';
  readonly at: Readonly<Record<string, number>>;
  readonly value: number;
  /** Half a unit of the last printed digit, or the tolerance of an analytic limit, absolute. */
  readonly tolerance: number;
  readonly source: string;
  readonly where: string;
}

/** A published correlation: a law with values, every group defined, bounded, sourced and checked. Plain data. */
export interface Correlation extends Law {
  /** `author-year` or `author-year-variant`; also the file's name. */
  readonly id: string;
  readonly authors: string;
  readonly year: number;
  /** What it describes, in words: `Circular cylinder in cross flow`. */
  readonly title: string;
  readonly family: Family;
  readonly transfer: 'heat' | 'mass';
  readonly average: 'mean' | 'local' | 'fully developed';
  readonly reads: 'mean line' | 'lower bound' | 'upper bound';
  readonly limits: readonly Limit[];
  /** Stated by its authors or by the book that prints it, in words (`within 20 %`), or `not stated`. */
  readonly accuracy: string;
  /** Full reference, with DOI where known. */
  readonly source: string;
  /** Equation, page or table in the source or in the book read. */
  readonly where: string;
  /** `page read` or `memory`: where the constants come from. */
  readonly constantsFrom: 'page read' | 'memory';
  /** One line on when to use it and when not. */
  readonly use: string;
  /** False where the heat-mass analogy must not be applied (viscosity ratios of heated walls, radiation, ...). */
  readonly analogy: boolean;
  readonly printed: readonly Printed[];
}
