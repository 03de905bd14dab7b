import { says } from '../base/says/reduction.ts';
import type { Check, Rule } from '../rules/rule.ts';
import { wellKnown } from './checks.ts';
import { where } from './defaults.ts';
import { integral } from './integral.ts';
import type { Need, Route, RouteContext } from './route.ts';
import { plainContext } from './route.ts';

const needs: readonly Need[] = [
  { key: 'particle_diameter', says: 'at the start; or initial_mass, particle_count and solid_density' },
  { key: 'solid_density', says: 'of the pellet' },
  { key: 'mass_loss', says: 'over the run' },
  { key: 'initial_mass', says: 'or particle_count, solid_density and particle_diameter' },
  { key: 'time', says: 'of the run' },
  { key: 'saturation_concentration', says: 'at the surface' },
  { key: 'bulk_concentration', says: 'at the start, or constant', without: 'zero' },
  { key: 'liquid_volume', says: 'lets the concentration rise with what dissolves', without: 'constant concentration' },
  { key: 'sphericity', says: 'with particle_diameter that of the sphere of equal volume', without: 'spheres' },
  { key: 'molar_mass', says: 'where concentrations are by amount of substance' },
];

/** Saturation less bulk at the start, kg/m3. */
const difference = ({ concentrations }: RouteContext): Rule => ({
  gives: 'concentration_difference',
  from: ['saturation_concentration', 'bulk_concentration', ...(concentrations === 'amount' ? ['molar_mass'] : [])],
  of: (s, b, molar = 1) => (s! - b!) * molar,
  formula: concentrations === 'amount' ? 'dc = (c_s - c) M' : 'dc = c_s - c',
  source: 'definition',
  ...(concentrations === 'amount' ? { assumes: says.byMolarMass } : {}),
});

const someLeft: Check = {
  code: 'nothing-left',
  from: ['mass_loss', 'initial_mass'],
  holds: (lost, m) => lost! < m! && lost! > 0,
  otherwise: 'refuse',
  says: (lost, m) => says.dissolvedShare(lost! / m!),
};

const undersaturated: Check = {
  code: 'no-driving-force',
  from: ['saturation_concentration', 'bulk_concentration'],
  holds: (s, b) => s! > b!,
  otherwise: 'refuse',
  says: (s, b) => says.notUndersaturated(s!, b!),
};

const notMuchSmaller: Check = {
  code: 'shrunk',
  from: ['final_diameter', 'particle_diameter'],
  holds: (end, start) => end! >= 0.8 * start!,
  otherwise: 'note',
  says: (end, start) => says.shrunk(end! / start!),
};

const lossKnown = wellKnown('mass_loss', 'the mass loss', ' kg');
const drivingKnown = wellKnown('concentration_difference', 'the driving concentration difference', ' kg/m^3');

const saturationAtEnd: Check = {
  code: 'near-saturation',
  from: ['mass_loss', 'liquid_volume', 'concentration_difference'],
  holds: (lost, volume, dc) => lost! / (volume! * dc!) <= 0.9,
  otherwise: 'warning',
  says: (lost, volume, dc) => says.nearSaturation(lost! / (volume! * dc!)),
};

const notBeyondSaturation: Check = {
  ...saturationAtEnd,
  code: 'beyond-saturation',
  holds: (lost, volume, dc) => lost! / (volume! * dc!) < 1,
  otherwise: 'refuse',
  says: () => says.saturates,
};

/** Integral of dy/(1 - rise (1 - y^3)) from the end's to the start's relative diameter; `rise` = initial mass over what the liquid can still take up. */
const slowing = (end: number, rise: number): number =>
  1 - rise * (1 - end ** 3) > 0 ? integral((y) => 1 / (1 - rise * (1 - y ** 3)), end, 1) : Number.NaN;

const rules = (context: RouteContext): readonly Rule[] => [
  where('bulk_concentration', 0, says.noSolute('bulk_concentration')),
  where('sphericity', 1, says.sphericalPellets),
  difference(context),
  {
    gives: 'final_diameter',
    from: ['particle_diameter', 'mass_loss', 'initial_mass'],
    of: (d, lost, m) => d! * Math.cbrt(1 - lost! / m!),
    formula: 'd1 = d0 (1 - mass_loss/initial_mass)^(1/3)',
    source: 'definition',
    checks: [someLeft],
  },
  {
    gives: 'mass_transfer_coefficient',
    from: [
      'solid_density',
      'particle_diameter',
      'final_diameter',
      'concentration_difference',
      'time',
      'sphericity',
      'initial_mass',
      'liquid_volume',
    ],
    of: (rho, start, end, dc, t, psi, m, volume) =>
      ((psi! * rho! * start!) / (2 * dc! * t!)) * slowing(end! / start!, m! / (volume! * dc!)),
    formula: 'k = rho_s/(2 t) integral from d1 to d0 of dd/(c_s - c(d)), c(d) by the mass balance of liquid_volume',
    source: 'definition',
    assumes: says.risingBulk,
    checks: [undersaturated, notBeyondSaturation, saturationAtEnd, notMuchSmaller, lossKnown, drivingKnown],
  },
  {
    gives: 'mass_transfer_coefficient',
    from: ['solid_density', 'particle_diameter', 'final_diameter', 'concentration_difference', 'time', 'sphericity'],
    of: (rho, start, end, dc, t, psi) => (psi! * rho! * (start! - end!)) / (2 * dc! * t!),
    formula: 'k = rho_s (d0 - d1)/(2 dc t)',
    source: 'definition',
    assumes: says.constantBulk,
    checks: [undersaturated, notMuchSmaller, lossKnown, drivingKnown],
  },
];

/** Pellets, crystals or tablets that dissolve, weighed before and after. */
export const pelletDissolution: Route = {
  name: 'pellet-dissolution',
  transfer: 'mass',
  title: 'Shrinking of dissolving pellets, by mass lost',
  formula: 'k = rho_s (d0 - d1)/(2 dc t), d1 = d0 (1 - mass_loss/initial_mass)^(1/3)',
  source: 'definition',
  settings: {},
  result: () => 'k',
  gives: () => 'mass_transfer_coefficient',
  needs: () => needs,
  rules: (_, context = plainContext) => rules(context),
  ledger: ['final_diameter', 'concentration_difference'],
  numbers: {
    final_diameter: { unit: 'm', symbol: 'd_1', says: 'diameter at the end' },
    concentration_difference: { unit: 'kg/m^3', symbol: 'dc', says: 'saturation less bulk concentration at the start' },
  },
  caution:
    'All pellets alike, shape kept, coefficient constant over the run. Groups on the particle use the diameter at the start; on the mean of start and end a stagnant sphere has Sh = 2 exactly. Porous, swelling or reacting solids dissolve by other laws.',
};
