import type { Place } from '../base/place.ts';

/** A value as the user wrote it, and where; its meaning is settled in plan/, its fault is told at the place. */
export interface Placed<T> {
  readonly is: T;
  readonly place: Place;
}

/** `value`, `column` or `formula` of one quantity with its uncertainty, every text still as written. */
export interface QuantityEntry {
  readonly column?: Placed<string>;
  readonly value?: Placed<string>;
  readonly formula?: Placed<string>;
  readonly unit?: Placed<string>;
  readonly random?: Placed<string>;
  readonly systematic?: Placed<string>;
  readonly accuracy?: Placed<string>;
  readonly expanded?: Placed<string>;
  readonly k?: Placed<number>;
  readonly per?: Placed<'study' | 'campaign'>;
  readonly instrument?: Placed<string>;
  readonly kind?: Placed<'reading' | 'set'>;
}

export interface FluidEntry {
  readonly name?: Placed<string>;
  readonly table?: Placed<string>;
  readonly by?: readonly Placed<string>[];
  /** Further keys: temperature, pressure, mass_fraction, relative_humidity ... -> the quantity that holds it. */
  readonly at: Readonly<Record<string, Placed<string>>>;
}

export interface LawEntry {
  readonly name: Placed<string>;
  readonly form: Placed<string>;
  readonly parameters?: readonly Placed<string>[];
  readonly start: Readonly<Record<string, Placed<number>>>;
  readonly bounds: Readonly<Record<string, Placed<readonly [number, number]>>>;
  readonly in: Readonly<Record<string, Placed<string>>>;
}

export interface GroupEntry {
  readonly basis?: Placed<string>;
  readonly at?: Placed<string>;
  readonly formula?: Placed<string>;
  readonly column?: Placed<string>;
  readonly random?: Placed<string>;
  readonly systematic?: Placed<string>;
}

/** A user's own published correlation, as written. */
export interface OwnCorrelationEntry {
  readonly id: Placed<string>;
  readonly authors: string;
  readonly year: number;
  readonly gives: Placed<string>;
  readonly family?: Placed<string>;
  readonly title?: string;
  readonly form: Placed<string>;
  readonly groups: Readonly<Record<string, Placed<string>>>;
  readonly at: Readonly<Record<string, Placed<string>>>;
  readonly in: Readonly<Record<string, Placed<string>>>;
  readonly limits: readonly Placed<string>[];
  readonly accuracy?: string;
  readonly reads?: Placed<string>;
  readonly source?: string;
}

export interface SteadyEntry {
  readonly time: Placed<string>;
  /** Least length, as written. */
  readonly window: Placed<string>;
  readonly share: number;
  readonly significance: number;
  readonly place: Place;
}

export interface SeriesEntry {
  readonly file?: Placed<string>;
  readonly files?: Placed<string>;
  readonly trial?: Placed<string>;
  readonly time: Placed<string>;
  readonly value: Placed<string>;
  readonly window?: readonly [Placed<string>, Placed<string>];
}

/** Syntax with places; no meaning yet. Keys of records are quantity or group names as written. */
export interface Study {
  readonly file: string;
  readonly title: string;
  readonly transfer: 'heat' | 'mass';
  readonly equipment: Placed<string>;
  /** The data are invented, as in a demo; the report says so. */
  readonly invented: boolean;
  readonly trials: {
    readonly file: Placed<string>;
    readonly sheet?: Placed<string>;
    readonly trial?: Placed<string>;
    readonly campaign?: Placed<string>;
    readonly readings?: Placed<'average'>;
    readonly setting?: Placed<string>;
    readonly order?: Placed<string>;
    /** The file is a raw log; its steady windows are the trials. */
    readonly steady?: SteadyEntry;
    readonly missing: readonly string[];
    readonly leaveOut: readonly { readonly trial: Placed<string>; readonly reason: string }[];
  };
  readonly quantities: Readonly<Record<string, Placed<QuantityEntry>>>;
  /** One stream, or `own` and `other`. */
  readonly fluid?: { readonly own?: Placed<FluidEntry>; readonly other?: Placed<FluidEntry> };
  readonly coefficient?: {
    readonly route: Placed<string>;
    /** Further settings of the route as written: arrangement, duty, body, read, side, balance, then ... */
    readonly settings: Readonly<Record<string, Placed<string>>>;
    readonly series?: SeriesEntry;
    readonly place: Place;
  };
  readonly groups: Readonly<Record<string, Placed<GroupEntry>>>;
  readonly laws: readonly LawEntry[];
  readonly fit: {
    readonly error: 'relative' | 'absolute';
    readonly weights: Placed<string>;
    readonly scatter: 'estimate' | 'none';
    readonly campaignEffect: 'auto' | 'none' | 'intercept';
    readonly confidence: number;
    readonly resamples: number;
    readonly monteCarlo: boolean;
  };
  /** Absent where the study asks for no audit (`audit: none`); `against: applicable` otherwise. */
  readonly audit?: {
    readonly against: Placed<string | readonly string[]>;
    readonly analogy: boolean;
    readonly tolerance: number;
    readonly own?: Placed<string>;
  };
  readonly plant?: {
    readonly file?: Placed<string>;
    readonly sheet?: Placed<string>;
    readonly case?: Placed<string>;
    readonly conservative: 'low' | 'high';
    readonly target?: Readonly<Record<string, Placed<string>>>;
    readonly quantities: Readonly<Record<string, Placed<QuantityEntry>>>;
    readonly fluid?: { readonly own?: Placed<FluidEntry>; readonly other?: Placed<FluidEntry> };
  };
  readonly rig?: {
    readonly settings: Readonly<
      Record<
        string,
        { readonly from?: Placed<string>; readonly to?: Placed<string>; readonly levels?: readonly Placed<string>[]; readonly cost: number }
      >
    >;
    readonly campaigns: 'new' | 'existing' | 'either';
    readonly place: Place;
  };
  readonly output: { readonly folder: Placed<string>; readonly assets: 'inline' | 'shared' };
}
