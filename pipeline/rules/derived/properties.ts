import type { Key, Rule } from '../rule.ts';

const suffixes = ['', '@film', '@wall'];

const definition = (gives: Key, from: readonly Key[], of: Rule['of'], formula: string): Rule => ({
  gives,
  from,
  of,
  formula,
  source: 'definition',
});

/** Identities between properties at one temperature. */
const identities = (at: string): readonly Rule[] => [
  definition(`kinematic_viscosity${at}`, [`viscosity${at}`, `density${at}`], (mu, rho) => mu! / rho!, 'nu = mu/rho'),
  definition(
    `thermal_diffusivity${at}`,
    [`thermal_conductivity${at}`, `density${at}`, `heat_capacity${at}`],
    (lambda, rho, c) => lambda! / (rho! * c!),
    'a = lambda/(rho c_p)',
  ),
];

/** Mean temperatures that stand for a stream where none is given. */
const meanTemperatures: readonly Rule[] = [
  {
    ...definition('temperature', ['inlet_temperature', 'outlet_temperature'], (a, b) => (a! + b!) / 2, 'T = (T_in + T_out)/2'),
    assumes: 'Bulk temperature is the mean of inlet and outlet temperature.',
  },
  definition('film_temperature', ['temperature', 'wall_temperature'], (a, b) => (a! + b!) / 2, 'T_f = (T + T_w)/2'),
];

/** Properties from properties: kinematic viscosity, thermal diffusivity, wall viscosity as given, apparent viscosity of a power-law liquid, mean temperatures. */
export const propertyIdentities: readonly Rule[] = [
  ...suffixes.flatMap(identities),
  definition('viscosity@wall', ['wall_viscosity'], (mu) => mu!, 'mu_w = wall_viscosity'),
  {
    gives: 'viscosity',
    from: ['consistency', 'flow_index', 'shear_constant', 'rotation_speed'],
    of: (consistency, n, shear, speed) => consistency! * (shear! * speed!) ** (n! - 1),
    formula: 'mu = K (k_s N)^(n - 1)',
    source: 'Metzner & Otto 1957',
    assumes: 'The viscosity of the power-law liquid is the apparent one at the mean shear rate of the impeller.',
  },
  definition('viscosity', ['kinematic_viscosity', 'density'], (nu, rho) => nu! * rho!, 'mu = nu rho'),
  ...meanTemperatures,
];
