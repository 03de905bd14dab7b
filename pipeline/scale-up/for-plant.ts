import type { PlantBasis } from '../plan/plant-basis.ts';
import type { Anchor } from './criteria.ts';
import type { Tried } from './extrapolation.ts';

/** What a later prediction needs beside the laws themselves, as plain data: `laws.json` carries it. */
export interface ForPlant {
  readonly basis: PlantBasis;
  readonly tried: readonly Tried[];
  readonly anchor: Anchor;
  /** Law -> largest random standard deviation among the trials. */
  readonly largestSpreads: Readonly<Record<string, number>>;
  /** Laws that stand beside the chosen one. */
  readonly accepted: readonly string[];
}
