import { says } from '../base/says/reduction.ts';
import type { Key, Rule } from '../rules/rule.ts';

/** A quantity that counts as a fixed value where it is not given; the reader is told. */
export const where = (gives: Key, value: number, assumes: string): Rule => ({
  gives,
  from: [],
  of: () => value,
  formula: `${gives} = ${value}`,
  source: 'not given',
  assumes,
});

/** Loss to the surroundings of a stream at `temperature`: by a conductance, else none. */
export const heatLoss = (temperature: Key): readonly Rule[] => [
  {
    gives: 'heat_loss',
    from: ['loss_conductance', temperature, 'ambient_temperature'],
    of: (g, t, ambient) => g! * (t! - ambient!),
    formula: 'heat_loss = loss_conductance (T - T_amb)',
    source: 'definition',
    assumes: says.lossByConductance,
  },
  where('heat_loss', 0, says.noLoss),
];
