import type { Key, Rule, Spread } from '../rules/rule.ts';
import type { SeriesReduction } from './series/series.ts';

/** Settings of a route as written in the study file under `coefficient`, checked against `Route.settings`. */
export type Settings = Readonly<Record<string, string>>;

/** What the study says that a route's rules may depend on. */
export interface RouteContext {
  readonly transfer: 'heat' | 'mass';
  /** Family of equipment: what `diameter` is. */
  readonly equipment: string;
  /** kg/m^3 or mol/m^3. */
  readonly concentrations: 'mass' | 'amount';
  /** kg/s or mol/s. */
  readonly rates: 'mass' | 'amount';
  /** Combined standard uncertainty stated for a given quantity; undefined where none is stated or the quantity is not given. */
  readonly stated: (key: Key) => Spread | undefined;
}

/** Context where nothing is known of the study. */
export const plainContext: RouteContext = {
  transfer: 'heat',
  equipment: 'other',
  concentrations: 'mass',
  rates: 'mass',
  stated: () => undefined,
};

/** One setting of a route. */
export interface RouteSetting {
  readonly says: string;
  /** Where there is a choice. Otherwise `reads` says whether the text is right. */
  readonly allowed?: readonly string[];
  readonly default?: string;
  readonly reads?: (text: string) => boolean;
}

/** A quantity a route needs, for documentation; what is missing in a study, and from what it could be had, is told by `resolve`. */
export interface Need {
  readonly key: Key;
  readonly says: string;
  /** What is done where it is not given; without this it must be had. */
  readonly without?: string;
}

/** A number a route works with that is no quantity of the study file: how it is printed. */
interface RouteNumber {
  readonly unit: string;
  readonly symbol: string;
  readonly says: string;
}

/** From readings to a coefficient. */
export interface Route {
  readonly name: string;
  readonly transfer: 'heat' | 'mass' | 'either';
  readonly title: string;
  /** As a reader writes it. */
  readonly formula: string;
  readonly source: string;
  /** Name in the study file -> setting. */
  readonly settings: Readonly<Record<string, RouteSetting>>;
  /** Key of the result. */
  readonly gives: (settings: Settings, context?: RouteContext) => Key;
  /** h, k, U or kLa. U and kLa never enter Nu or Sh. */
  readonly result: (settings: Settings, context?: RouteContext) => 'h' | 'k' | 'U' | 'kLa';
  readonly needs: (settings: Settings) => readonly Need[];
  /** Rules from readings to the result, with checks per trial; they go before derived quantities and groups in the rule book. */
  readonly rules: (settings: Settings, context?: RouteContext) => readonly Rule[];
  /** Keys worth a column beside the trial: heat balance, Bi, NTU ... */
  readonly ledger: readonly Key[];
  readonly numbers: Readonly<Record<Key, RouteNumber>>;
  /** How a logged curve becomes readings, where the route takes one. */
  readonly series?: (settings: Settings) => SeriesReduction;
  /** What the route does not see, in a sentence or two. */
  readonly caution: string;
}

/** The setting as written, or its default, or an empty text. */
export const settingOf = (route: Pick<Route, 'settings'>, settings: Settings, key: string): string =>
  settings[key] ?? route.settings[key]?.default ?? '';
