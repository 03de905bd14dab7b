/** What a property may depend on; the study says which of its quantities holds each. `bulk_temperature` is that of the bulk also at film and wall. */
export type Condition = 'temperature' | 'pressure' | 'mass_fraction' | 'relative_humidity' | 'bulk_temperature';

/** Where a model holds. `holds` gets the model's conditions in its own order and must be false for NaN. */
export interface Range {
  readonly holds: (...conditions: number[]) => boolean;
  /** `refuse`: there is no value outside. `warning`: there is one, and the reader is told. */
  readonly otherwise: 'refuse' | 'warning';
  /** What was read and what would be right, without the name of the property. */
  readonly says: (...conditions: number[]) => string;
}

/** One property of one fluid as a function of conditions in SI (K, Pa, mass fraction, relative humidity as a share of 1). */
export interface PropertyModel {
  /** Quantity name: `viscosity`. */
  readonly property: string;
  readonly from: readonly Condition[];
  /** Pure; NaN where the model does not hold. */
  readonly of: (...conditions: number[]) => number;
  readonly formula: string;
  readonly source: string;
  /** Standard uncertainty (k = 1) as a share of the value; left out where the source states none. */
  readonly share?: number;
  readonly ranges: readonly Range[];
  readonly assumes?: string;
}

/** A fluid by the name that a study calls it. */
export interface Fluid {
  readonly name: string;
  /** As the reader is told: `water (liquid)`. */
  readonly title: string;
  readonly properties: readonly PropertyModel[];
}
