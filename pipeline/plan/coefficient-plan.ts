import type { Place } from '../base/place.ts';
import * as says from '../base/says/plan.ts';
import { quantityOf } from '../quantities/vocabulary.ts';
import type { Route, RouteContext } from '../reduction/route.ts';
import { routes } from '../reduction/routes.ts';
import type { SeriesReduction } from '../reduction/series/series.ts';
import { sizeOf } from '../rules/evaluate.ts';
import type { Rule } from '../rules/rule.ts';
import type { Study } from '../study/study.ts';
import type { Faults } from './faults.ts';
import type { QuantityPlan } from './quantity-plan.ts';

/** The reduction route with its settings checked, and its rules. */
export interface CoefficientPlan {
  readonly route: Route;
  readonly settings: Readonly<Record<string, string>>;
  readonly context: RouteContext;
  readonly rules: readonly Rule[];
  /** How a logged curve becomes readings, where the study has curves. */
  readonly curve?: SeriesReduction;
  readonly place: Place;
}

export function planCoefficient(study: Study, quantities: QuantityPlan, faults: Faults): CoefficientPlan | undefined {
  const { coefficient } = study;
  if (coefficient === undefined) return undefined;
  const { is: name, place } = coefficient.route;
  const route = routes[name];
  if (route === undefined) {
    faults.add(
      'unknown-route',
      says.unknownRoute(
        name,
        Object.values(routes)
          .filter((one) => one.transfer === 'either' || one.transfer === study.transfer)
          .map((one) => one.name),
      ),
      place,
    );
    return undefined;
  }
  if (route.transfer !== 'either' && route.transfer !== study.transfer)
    faults.add('route-transfer', says.routeOfOtherTransfer(name, route.transfer), place);
  const settings = readSettings(route, study, faults);
  const context = contextOf(study, quantities);
  const curve = coefficient.series === undefined ? undefined : route.series?.(settings);
  if (coefficient.series !== undefined && study.trials.steady !== undefined)
    faults.add('steady-and-series', says.steadyAndSeries(), study.trials.steady.place);
  if (coefficient.series !== undefined && curve === undefined)
    faults.add(
      'route-without-curve',
      says.routeWithoutCurve(
        name,
        Object.values(routes)
          .filter((one) => one.series !== undefined)
          .map((one) => one.name),
      ),
      coefficient.series.value.place,
    );
  return { route, settings, context, rules: route.rules(settings, context), ...(curve === undefined ? {} : { curve }), place };
}

function readSettings(route: Route, study: Study, faults: Faults): Readonly<Record<string, string>> {
  const settings: Record<string, string> = {};
  for (const [key, { is, place }] of Object.entries(study.coefficient!.settings)) {
    const setting = route.settings[key];
    if (setting === undefined) faults.add('unknown-setting', says.unknownSetting(route.name, key, Object.keys(route.settings)), place);
    else if (setting.allowed !== undefined && !setting.allowed.includes(is))
      faults.add('wrong-setting', says.wrongSetting(key, is, setting.allowed), place);
    else if (setting.reads !== undefined && !setting.reads(is))
      faults.add('wrong-setting', says.unreadableSetting(key, is, setting.says), place);
    else settings[key] = is;
  }
  return settings;
}

/** What a route's rules may depend on beside its settings. */
function contextOf(study: Study, { dimensions, inputs }: QuantityPlan): RouteContext {
  const kind = (of: (key: string) => boolean): 'mass' | 'amount' => {
    const found = [...dimensions].find(([key]) => quantityOf(key)?.molar !== undefined && of(key));
    return found !== undefined && found[1][5] !== 0 ? 'amount' : 'mass';
  };
  return {
    transfer: study.transfer,
    equipment: study.equipment.is,
    concentrations: kind((key) => key.includes('concentration')),
    rates: kind((key) => !key.includes('concentration')),
    stated: (key) => {
      const input = inputs.find((one) => one.key === key);
      const spreads = [input?.random, ...(input?.systematic ?? []).map((one) => one.spread)].filter((one) => one !== undefined);
      if (spreads.length === 0) return undefined;
      if (spreads.every((one) => 'share' in one)) return { share: Math.hypot(...spreads.map((one) => sizeOf(one, 1))) };
      return spreads.every((one) => 'si' in one) ? { si: Math.hypot(...spreads.map((one) => sizeOf(one, 1))) } : spreads[0];
    },
  };
}
