import type { Key } from '../rules/rule.ts';
import type { Basis } from './basis.ts';

/** Temperature at which a group's properties are taken. */
export type PropertyTemperature = 'bulk' | 'film' | 'wall';

export const propertyTemperatures: readonly PropertyTemperature[] = ['bulk', 'film', 'wall'];

/** What a definition needs to write its keys: a property at the temperature in force, and the length of the basis in force. */
export interface Setting {
  readonly at: (property: string) => Key;
  readonly temperature: PropertyTemperature;
  /** Key and symbol of the length; a group without basis does not look at them. */
  readonly length: Key;
  readonly symbol: string;
  readonly basis: string;
}

/** One way to compute a group: SI in, number out. */
export interface Way {
  readonly from: readonly Key[];
  readonly of: (...x: number[]) => number;
  /** `Re = rho u d/mu` */
  readonly formula: string;
}

/** A dimensionless group: a record; its rules and definition texts follow from it for every basis and property temperature. */
export interface Group {
  readonly name: string;
  /** `_` starts a subscript. */
  readonly symbol: string;
  readonly title: string;
  /** Names of the bases it may stand on; none for a group without a length. */
  readonly bases: readonly string[];
  /** False where the group has no fluid property in it. */
  readonly properties: boolean;
  /** In order of preference; the first is the definition as printed. Empty where the group has no meaning on this basis. */
  readonly ways: (setting: Setting) => readonly Way[];
  /** What the letters mean, beside the length: `u = superficial velocity`. */
  readonly where?: (basis: Basis | undefined) => string;
  readonly source: string;
}
