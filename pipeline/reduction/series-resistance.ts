import { says } from '../base/says/reduction.ts';
import type { Check, Key, Rule } from '../rules/rule.ts';
import { where } from './defaults.ts';
import type { Need, Route, RouteContext, RouteSetting, Settings } from './route.ts';
import { plainContext } from './route.ts';

const side: RouteSetting = {
  says: 'where the wanted coefficient is: inside the tube (or on the near side of a flat wall), or outside',
  allowed: ['inside', 'outside'],
};

/** Own stream inside the tube, except where the equipment says otherwise. */
export const sideOf = (settings: Settings, { equipment }: RouteContext): 'inside' | 'outside' =>
  (settings.side as 'inside' | 'outside' | undefined) ?? (equipment === 'annulus' || equipment === 'cylinder' ? 'outside' : 'inside');

/** Bore of the tube between the streams. `diameter` is another thing in an annulus and in a vessel. */
const boreOf = ({ equipment }: RouteContext): Key => (equipment === 'annulus' ? 'diameter_other' : 'diameter');

/** Resistance of the wall on the outer area, and outer over inner area. */
function wallRules(context: RouteContext): readonly Rule[] {
  const bore = boreOf(context);
  const source = 'definition';
  const tubular = (from: readonly Key[]): readonly Rule[] =>
    context.equipment === 'vessel' || context.equipment === 'plate-exchanger'
      ? []
      : [
          { gives: 'area_ratio', from, of: (outer, inner) => outer! / inner!, formula: 'A_o/A_i = d_o/d_i', source },
          {
            gives: 'wall_resistance',
            from: [...from, 'wall_conductivity'],
            of: (outer, inner, lambda) => (outer! * Math.log(outer! / inner!)) / (2 * lambda!),
            formula: 'R_w = d_o ln(d_o/d_i)/(2 lambda_w), on the outer area',
            source,
          },
        ];
  return [
    ...tubular(['outer_diameter', bore]),
    where('area_ratio', 1, says.flatWall),
    {
      gives: 'wall_resistance',
      from: ['wall_thickness', 'wall_conductivity'],
      of: (s, lambda) => s! / lambda!,
      formula: 'R_w = s/lambda_w',
      source,
    },
    where('wall_resistance', 0, says.noWall),
    where('fouling_resistance', 0, says.noFouling),
  ];
}

const largeEnough: Check = {
  code: 'small-resistance',
  from: ['own_resistance', 'overall_coefficient'],
  holds: (own, U) => own! * U! >= 0.3,
  otherwise: 'note',
  says: (own, U) => says.smallShare(own! * U!),
};

const somethingLeft: Check = {
  code: 'nothing-left',
  from: ['own_resistance', 'overall_coefficient'],
  holds: (own) => own! > 0,
  otherwise: 'refuse',
  says: (own, U) => says.nothingLeft(1 / U!, 1 / U! - own!),
};

/** U on the outer area -> the coefficient of one side, the other resistances taken off. */
export function seriesResistanceRules(settings: Settings, context: RouteContext = plainContext): readonly Rule[] {
  const inside = sideOf(settings, context) === 'inside';
  const source = 'definition';
  return [
    ...wallRules(context),
    {
      gives: 'own_resistance',
      from: ['overall_coefficient', 'other_side_coefficient', 'fouling_resistance', 'wall_resistance', 'area_ratio'],
      of: (U, other, fouling, wall, ratio) => 1 / U! - (inside ? 1 : ratio!) / other! - fouling! - wall!,
      formula: inside ? '1/U - 1/h_o - R_f - R_w, on the outer area' : '1/U - (A_o/A_i)/h_i - R_f - R_w, on the outer area',
      source,
    },
    {
      gives: 'heat_transfer_coefficient',
      from: ['own_resistance', 'area_ratio'],
      of: (own, ratio) => (inside ? ratio! : 1) / own!,
      formula: inside ? 'h_i = (A_o/A_i)/(1/U - 1/h_o - R_f - R_w)' : 'h_o = 1/(1/U - (A_o/A_i)/h_i - R_f - R_w)',
      source,
      checks: [somethingLeft, largeEnough],
    },
    {
      gives: 'wall_temperature',
      from: ['temperature', 'temperature_other', 'overall_coefficient', 'own_resistance'],
      of: (own, other, U, resistance) => own! + U! * resistance! * (other! - own!),
      formula: 'T_w = T + (U/h, on one area) (T_other - T), on the own side',
      source,
      assumes: says.wallByResistances,
    },
  ];
}

const needs: readonly Need[] = [
  { key: 'overall_coefficient', says: 'on the outer area' },
  { key: 'other_side_coefficient', says: 'on its own area' },
  { key: 'fouling_resistance', says: 'on the outer area', without: 'none' },
  { key: 'outer_diameter', says: 'of the tube, with its bore diameter', without: 'a flat wall' },
  { key: 'wall_thickness', says: 'of a flat wall', without: 'no resistance of a flat wall' },
  { key: 'wall_conductivity', says: 'of the wall', without: 'no resistance of the wall' },
];

/** The coefficient of one side from an overall one. */
export const seriesResistance: Route = {
  name: 'series-resistance',
  transfer: 'heat',
  title: 'One resistance out of several in series',
  formula: '1/U = 1/h_o + R_f + d_o ln(d_o/d_i)/(2 lambda_w) + (d_o/d_i)/h_i, on the outer area',
  source: 'definition',
  settings: { side },
  result: () => 'h',
  gives: () => 'heat_transfer_coefficient',
  needs: () => needs,
  rules: seriesResistanceRules,
  ledger: ['overall_coefficient', 'own_resistance'],
  numbers: {
    own_resistance: { unit: 'm^2 K/W', symbol: '1/h', says: 'wanted resistance, on the outer area' },
    wall_resistance: { unit: 'm^2 K/W', symbol: 'R_w', says: 'resistance of the wall, on the outer area' },
    area_ratio: { unit: '1', symbol: 'A_o/A_i', says: 'outer over inner area' },
  },
  caution: 'Rests on how well the other side is known; its coefficient is usually a correlation, with the uncertainty of one.',
};

/** A route that gives U, with `then: series-resistance` among its settings. */
export const thenSeriesResistance = (route: Route): Route => {
  const then = (settings: Settings): boolean => settings.then === 'series-resistance';
  return {
    ...route,
    settings: {
      ...route.settings,
      // biome-ignore lint/suspicious/noThenProperty: the study file's own word
      then: { says: 'take the other resistances out of an overall coefficient', allowed: ['series-resistance'] },
      side,
    },
    result: (settings, context) => (then(settings) ? 'h' : route.result(settings, context)),
    gives: (settings, context) => (then(settings) ? 'heat_transfer_coefficient' : route.gives(settings, context)),
    needs: (settings) => [...route.needs(settings), ...(then(settings) ? needs.slice(1) : [])],
    rules: (settings, context) => [...route.rules(settings, context), ...(then(settings) ? seriesResistanceRules(settings, context) : [])],
    ledger: [...route.ledger, ...seriesResistance.ledger],
    numbers: { ...route.numbers, ...seriesResistance.numbers },
  };
};
