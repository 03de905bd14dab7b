import type { Place } from '../base/place.ts';
import * as says from '../base/says/plan.ts';
import { type Route, routeNames, routes } from '../reduction/routes.ts';
import type { Rule } from '../rules/rule.ts';
import type { Study } from '../study/study.ts';
import type { Faults } from './faults.ts';

/** The reduction route with its settings checked, and its rules. */
export interface CoefficientPlan {
  readonly route: Route;
  readonly settings: Readonly<Record<string, string>>;
  readonly rules: readonly Rule[];
  readonly place: Place;
}

export function planCoefficient(study: Study, faults: Faults): CoefficientPlan | undefined {
  const { coefficient } = study;
  if (coefficient === undefined) return undefined;
  const { is: name, place } = coefficient.route;
  const route = routes[name];
  if (route === undefined) {
    faults.add('unknown-route', says.unknownRoute(name, routeNames(study.transfer)), place);
    return undefined;
  }
  if (route.transfer !== 'either' && route.transfer !== study.transfer)
    faults.add('route-transfer', says.routeOfOtherTransfer(name, route.transfer), place);
  const settings = readSettings(route, study, faults);
  return { route, settings, rules: route.rules(settings), place };
}

function readSettings(route: Route, study: Study, faults: Faults): Readonly<Record<string, string>> {
  const settings: Record<string, string> = {};
  for (const [key, { is, place }] of Object.entries(study.coefficient!.settings)) {
    const setting = route.settings[key];
    if (setting === undefined) faults.add('unknown-setting', says.unknownSetting(route.name, key, Object.keys(route.settings)), place);
    else if (setting.allowed !== undefined && !setting.allowed.includes(is))
      faults.add('wrong-setting', says.wrongSetting(key, is, setting.allowed), place);
    else settings[key] = is;
  }
  return settings;
}
