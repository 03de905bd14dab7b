import type { Rule } from '../rules/rule.ts';
import { logMeanDifference } from './log-mean-difference.ts';
import { measured } from './measured.ts';
import { pelletDissolution } from './pellet-dissolution.ts';
import type { Route, RouteContext, Settings } from './route.ts';
import { sphereCooling } from './sphere-cooling.ts';

export type { Route, RouteContext, Settings } from './route.ts';

const list: readonly Route[] = [measured, logMeanDifference, sphereCooling, pelletDissolution];

/** Every route by name. */
export const routes: Readonly<Record<string, Route>> = Object.fromEntries(list.map((route) => [route.name, route]));

/** Names of the routes for one kind of transfer. */
export const routeNames = (transfer: 'heat' | 'mass'): readonly string[] =>
  list.filter((route) => route.transfer === transfer || route.transfer === 'either').map(({ name }) => name);

/** All rules of a route with its settings, those of `then` included. */
export const routeRules = (route: Route, settings: Settings, context: RouteContext): readonly Rule[] => route.rules(settings, context);
