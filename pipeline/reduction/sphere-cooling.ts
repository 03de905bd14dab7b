import { says } from '../base/says/reduction.ts';
import type { Check, Key, Rule } from '../rules/rule.ts';
import { wellKnown } from './checks.ts';
import { type Body, type BodyName, bodies, type Where } from './conduction/body.ts';
import { biotFrom, biotFromRate } from './conduction/remaining.ts';
import type { Need, Route, Settings } from './route.ts';
import { settingOf } from './route.ts';
import { rateAtBath, relaxation } from './series/relaxation.ts';

const bodyOf = (settings: Settings): Body => bodies[settingOf(sphereCooling, settings, 'body') as BodyName];
const whereOf = (settings: Settings): Where => settingOf(sphereCooling, settings, 'read') as Where;

/** Quantities that may hold the size of a body, and how many times V/A it is. */
const sizes: Readonly<Record<BodyName, { readonly from: readonly Key[]; readonly over: number }>> = {
  sphere: { from: ['diameter', 'particle_diameter'], over: 6 },
  cylinder: { from: ['diameter', 'outer_diameter'], over: 4 },
  slab: { from: ['wall_thickness', 'length'], over: 2 },
};

const sizeRules = ({ name }: Body): readonly Rule[] =>
  sizes[name].from.map((from) => ({
    gives: 'volume_per_area',
    from: [from],
    of: (d) => d! / sizes[name].over,
    formula: `V/A = ${from}/${sizes[name].over}`,
    source: 'definition',
    ...(name === 'sphere' ? {} : { assumes: says.longBody(name) }),
  }));

const solid: readonly Key[] = ['volume_per_area', 'solid_density', 'solid_heat_capacity'];

const insideGoverns: Check = {
  code: 'inside-governs',
  from: ['Bi'],
  holds: (bi) => bi! <= 3,
  otherwise: 'warning',
  says: (bi) => says.insideGoverns(bi!),
};

const progress: Check = {
  code: 'no-progress',
  from: ['remaining_share'],
  holds: (theta) => theta! > 0 && theta! < 1,
  otherwise: 'refuse',
  says: (theta) => says.noProgress(theta!),
};

const conductionAllows: Check = {
  code: 'faster-than-conduction',
  from: ['remaining_share', 'heat_transfer_coefficient'],
  holds: (theta, h) => Number.isFinite(h) || !(theta! > 0 && theta! < 1),
  otherwise: 'refuse',
  says: (theta) => says.fasterThanConduction(theta!),
};

const rateAllowed: Check = {
  code: 'faster-than-conduction',
  from: ['relaxation_rate', 'heat_transfer_coefficient'],
  holds: (_, h) => Number.isFinite(h),
  otherwise: 'refuse',
  says: (rate) => says.rateBeyondConduction(rate!),
};

/** Radius or half thickness over V/A times V/A. */
const radius = (body: Body, size: number): number => body.shape * size;

const lateWindow = (body: Body): Check => ({
  code: 'early-window',
  from: ['window_start', ...solid, 'solid_conductivity'],
  holds: (t, size, rho, c, lambda) => (lambda! * t!) / (rho! * c! * radius(body, size!) ** 2) >= 0.2,
  otherwise: 'warning',
  says: (t, size, rho, c, lambda) => says.earlyWindow((lambda! * t!) / (rho! * c! * radius(body, size!) ** 2)),
});

/** From a logged curve: the rate of its last exponential. */
const byCurve = (body: Body): readonly Rule[] => [
  {
    gives: 'heat_transfer_coefficient',
    from: ['relaxation_rate', ...solid, 'solid_conductivity'],
    of: (rate, size, rho, c, lambda) => {
      const R = radius(body, size!);
      return (biotFromRate(body, (rate! * R * R * rho! * c!) / lambda!) * lambda!) / R;
    },
    formula: `zeta^2 = rate R^2/a, h = Bi(zeta) lambda_s/R, first root of the ${body.name}`,
    source: 'Carslaw & Jaeger 1959',
    assumes: says.exactSeries(body.name),
    checks: [rateAllowed, insideGoverns, lateWindow(body), wellKnown('relaxation_rate', 'the rate of the curve', ' 1/s')],
  },
  {
    gives: 'heat_transfer_coefficient',
    from: ['relaxation_rate', ...solid],
    of: (rate, size, rho, c) => rate! * rho! * c! * size!,
    formula: 'h = rate rho_s c_s V/A',
    source: 'definition',
    assumes: says.lumped,
    checks: [wellKnown('relaxation_rate', 'the rate of the curve', ' 1/s')],
  },
];

/** From the temperatures at start and end. */
const byTwoTemperatures = (body: Body, where: Where): readonly Rule[] => [
  {
    gives: 'remaining_share',
    from: ['initial_temperature', 'final_temperature', 'temperature'],
    of: (start, end, fluid) => (end! - fluid!) / (start! - fluid!),
    formula: 'theta = (T_1 - T)/(T_0 - T)',
    source: 'definition',
    checks: [progress],
  },
  {
    gives: 'heat_transfer_coefficient',
    from: ['remaining_share', 'time', ...solid, 'solid_conductivity'],
    of: (theta, t, size, rho, c, lambda) => {
      const R = radius(body, size!);
      return (biotFrom(body, where, theta!, (lambda! * t!) / (rho! * c! * R * R)) * lambda!) / R;
    },
    formula: `theta = sum of the exact series of the ${body.name} (${where}) at Bi = h R/lambda_s, solved for h`,
    source: 'Carslaw & Jaeger 1959',
    assumes: says.exactSeries(body.name),
    checks: [conductionAllows, insideGoverns, wellKnown('remaining_share', 'the remaining share of the difference', '')],
  },
  {
    gives: 'heat_transfer_coefficient',
    from: ['remaining_share', 'time', ...solid],
    of: (theta, t, size, rho, c) => (-Math.log(theta!) * rho! * c! * size!) / t!,
    formula: 'h = -ln(theta) rho_s c_s (V/A)/t',
    source: 'definition',
    assumes: says.lumped,
    checks: [wellKnown('remaining_share', 'the remaining share of the difference', '')],
  },
];

const temperatures: readonly Rule[] = [
  {
    gives: 'temperature',
    from: ['ambient_temperature'],
    of: (t) => t!,
    formula: 'T = ambient_temperature',
    source: 'definition',
    assumes: says.fluidIsAmbient,
  },
  ...[
    ['curve_start', 'curve_end'],
    ['initial_temperature', 'final_temperature'],
  ].map(
    (from): Rule => ({
      gives: 'wall_temperature',
      from,
      of: (a, b) => (a! + b!) / 2,
      formula: 'T_w = (T_0 + T_1)/2',
      source: 'common practice, no source',
      assumes: says.meanSurface,
    }),
  ),
];

const needs: readonly Need[] = [
  { key: 'initial_temperature', says: 'of the body, uniform; not needed with a logged curve' },
  { key: 'final_temperature', says: 'where `read` says; not needed with a logged curve' },
  { key: 'time', says: 'between the two; not needed with a logged curve' },
  { key: 'temperature', says: 'of the fluid, or ambient_temperature' },
  { key: 'diameter', says: 'or particle_diameter; wall_thickness of a slab, cooled from both sides' },
  { key: 'solid_density', says: 'of the body' },
  { key: 'solid_heat_capacity', says: 'of the body' },
  { key: 'solid_conductivity', says: 'of the body', without: 'the lumped form, its Bi unchecked' },
];

/** A body of simple shape that cools or warms in a fluid of constant temperature. */
export const sphereCooling: Route = {
  name: 'sphere-cooling',
  transfer: 'heat',
  title: 'Cooling or warming of a sphere, long cylinder or slab',
  formula: 'theta = exact series at Bi and Fo; small Bi: h = -ln(theta) rho_s c_s (V/A)/t',
  source: 'Carslaw & Jaeger 1959',
  settings: {
    body: { says: 'shape of the body', allowed: ['sphere', 'cylinder', 'slab'], default: 'sphere' },
    read: { says: 'what final_temperature is a reading of', allowed: ['centre', 'mean', 'surface'], default: 'centre' },
  },
  result: () => 'h',
  gives: () => 'heat_transfer_coefficient',
  needs: () => needs,
  rules: (settings) => [
    ...sizeRules(bodyOf(settings)),
    ...temperatures,
    rateAtBath('temperature'),
    ...byCurve(bodyOf(settings)),
    ...byTwoTemperatures(bodyOf(settings), whereOf(settings)),
  ],
  series: () => relaxation(['temperature'], ['ambient_temperature']),
  ledger: ['remaining_share', 'relaxation_rate', 'Bi', 'Fo'],
  numbers: {
    remaining_share: { unit: '1', symbol: 'theta', says: 'share of the temperature difference that is left' },
    relaxation_rate: { unit: '1/s', symbol: 'r', says: 'rate at which the difference dies away' },
    volume_per_area: { unit: 'm', symbol: 'V/A', says: 'volume over surface of the body' },
  },
  caution:
    'Constant coefficient and properties; no radiation, evaporation or condensation at the surface unless they are meant to be in the coefficient.',
};
