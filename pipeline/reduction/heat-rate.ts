import { says } from '../base/says/reduction.ts';
import type { Check, Rule } from '../rules/rule.ts';
import { notZero, wellKnown } from './checks.ts';
import { heatLoss, where } from './defaults.ts';
import type { Need, Route } from './route.ts';
import { plainContext } from './route.ts';
import { tubeArea } from './tube-area.ts';

const STEFAN_BOLTZMANN = 5.670374419e-8; // W/(m2 K4), CODATA 2018

const radiation = (gives: string, surroundings: string, assumes?: string): Rule => ({
  gives,
  from: ['emissivity', 'area', 'wall_temperature', surroundings],
  of: (e, area, wall, around) => e! * STEFAN_BOLTZMANN * area! * (wall! ** 4 - around! ** 4),
  formula: `Q_rad = e sigma A (T_w^4 - ${surroundings}^4)`,
  source: 'Stefan-Boltzmann law',
  ...(assumes === undefined ? {} : { assumes }),
});

const sameDirection: Check = {
  code: 'heat-against-difference',
  from: ['heat_rate', 'wall_excess'],
  holds: (q, dT) => q! * dT! > 0,
  otherwise: 'note',
  says: (q, dT) => says.heatAgainstDifference(q!, dT!),
};

const losses: readonly Check[] = [
  {
    code: 'losses-exceed',
    from: ['net_heat_rate', 'heat_rate'],
    holds: (net) => net! > 0,
    otherwise: 'refuse',
    says: (net, q) => says.lossesExceed(Math.abs(q!), Math.abs(q!) - net!),
  },
  {
    code: 'large-loss',
    from: ['net_heat_rate', 'heat_rate'],
    holds: (net, q) => Math.abs(q!) - net! <= 0.2 * Math.abs(q!),
    otherwise: 'warning',
    says: (net, q) => says.largeLoss(1 - net! / Math.abs(q!)),
  },
];

const rules: readonly Rule[] = [
  ...heatLoss('wall_temperature'),
  radiation('radiation_loss', 'ambient_temperature'),
  radiation('radiation_loss', 'temperature', says.surroundingsLikeFluid),
  where('radiation_loss', 0, says.noRadiation),
  {
    gives: 'wall_excess',
    from: ['wall_temperature', 'temperature'],
    of: (wall, fluid) => wall! - fluid!,
    formula: 'dT = T_w - T',
    source: 'definition',
  },
  {
    gives: 'net_heat_rate',
    from: ['heat_rate', 'heat_loss', 'radiation_loss'],
    of: (q, loss, rad) => Math.abs(q!) - loss! - rad!,
    formula: 'Q = |heat_rate| - heat_loss - Q_rad',
    source: 'definition',
  },
  {
    gives: 'heat_transfer_coefficient',
    from: ['net_heat_rate', 'area', 'wall_excess'],
    of: (q, area, dT) => q! / (area! * Math.abs(dT!)),
    formula: 'h = (Q - loss)/(A |T_w - T|)',
    source: 'definition',
    checks: [
      notZero('wall_excess', 'the difference of wall and fluid temperature'),
      sameDirection,
      ...losses,
      wellKnown('wall_excess', 'the difference of wall and fluid temperature', ' K'),
      wellKnown('net_heat_rate', 'the heat rate less losses', ' W'),
    ],
  },
];

const needs: readonly Need[] = [
  { key: 'heat_rate', says: 'electrical or condensate, by magnitude' },
  { key: 'area', says: 'of transfer; of a tube, cylinder or sphere from its size' },
  { key: 'wall_temperature', says: 'of the surface' },
  { key: 'temperature', says: 'of the fluid; or inlet_temperature and outlet_temperature' },
  { key: 'heat_loss', says: 'or loss_conductance and ambient_temperature', without: 'no loss' },
  { key: 'emissivity', says: 'takes radiation off, to ambient_temperature or that of the fluid', without: 'no radiation taken off' },
];

/** A heated or cooled surface: heat rate over area and temperature difference. */
export const heatRate: Route = {
  name: 'heat-rate',
  transfer: 'heat',
  title: 'Heat rate over area and temperature difference',
  formula: 'h = (Q - loss)/(A |T_w - T|)',
  source: 'definition',
  settings: {},
  result: () => 'h',
  gives: () => 'heat_transfer_coefficient',
  needs: () => needs,
  rules: (_, context = plainContext) => [...rules, ...(context.equipment === 'other' ? [] : tubeArea(context.equipment, false))],
  ledger: ['net_heat_rate', 'wall_excess'],
  numbers: {
    net_heat_rate: { unit: 'W', symbol: 'Q', says: 'heat rate less losses' },
    wall_excess: { unit: 'K', symbol: 'dT', says: 'wall less fluid temperature' },
    radiation_loss: { unit: 'W', symbol: 'Q_rad', says: 'heat lost by radiation' },
  },
  caution:
    'The wall temperature must be that of the surface itself: a sensor in the wall reads warmer by the heat flux over the metal before it.',
};
