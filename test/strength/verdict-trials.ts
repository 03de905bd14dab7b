import { catalogue } from '../../correlations/catalogue.ts';
import type { Correlation } from '../../correlations/correlation.ts';
import { evaluate } from '../../pipeline/algebra/evaluate.ts';
import { judge } from '../../pipeline/audit/judge.ts';
import { compare } from '../../pipeline/audit/ratio.ts';
import type { VerdictWord } from '../../pipeline/audit/verdict.ts';
import { type Random, seeded } from '../../pipeline/numerics/random.ts';
import type { Observations } from '../../pipeline/observations/observation.ts';
import { options } from '../regression/laws.ts';

/** A power law of each family that has one, and the group whose exponent is changed. */
export const laws: readonly { readonly id: string; readonly lead: string }[] = [
  { id: 'dittus-boelter-1930-heating', lead: 'Re' },
  { id: 'pohlhausen-1921-mean', lead: 'Re' },
  { id: 'bedingfield-drew-1950', lead: 'Re' },
  { id: 'mcadams-1954-cylinder', lead: 'Ra' },
  { id: 'sherwood-pigford-wilke-1975', lead: 'Re' },
  { id: 'yagi-wakao-1959-high', lead: 'Re' },
  { id: 'chilton-1944-jacket-turbine', lead: 'Re' },
  { id: 'calderbank-moo-young-1961-turbulent', lead: 'Re' },
  { id: 'vant-riet-1979-coalescing', lead: 'power_per_volume' },
  { id: 'gilliland-sherwood-1934', lead: 'Re' },
  { id: 'shulman-1955-gas', lead: 'Re' },
  { id: 'eisenberg-tobias-wilke-1954', lead: 'Re' },
];

/** How synthetic trials are made; ln units. */
export interface Making {
  readonly factor: number;
  /** |da| ln(range) of the leading group: what the changed exponent amounts to over the trials. */
  readonly bend: number;
  readonly campaigns: number;
  readonly tau: number;
  /** Random standard uncertainty of the leading group's logarithm, stated as it is. */
  readonly uLead: number;
  /** Largest over smallest value of the leading group. */
  readonly range: number;
}

export const plain: Making = { factor: 1, bend: 0, campaigns: 1, tau: 0, uLead: 0, range: 10 };

const TRIALS = 30;
const SCATTER = 0.05;
const TOLERANCE = 0.2;

/** Where a group is drawn: within its own limits as far as they go. */
const middles: Readonly<Record<string, number>> = {
  Re: 3000,
  Pr: 5,
  Sc: 2.0,
  viscosity_ratio: 1.5,
  Ra: 3e6,
  power_per_volume: 2000,
  gas_velocity: 0.02,
  voidage: 0.4,
  particle_diameter: 0.01,
  vessel_diameter: 0.17,
};
const special: Readonly<Record<string, Readonly<Record<string, number>>>> = {
  'dittus-boelter-1930-heating': { Re: 4e4 },
  'pohlhausen-1921-mean': { Re: 5e4 },
  'bedingfield-drew-1950': { Sc: 1.25 },
  'sherwood-pigford-wilke-1975': { Re: 160 },
  'yagi-wakao-1959-high': { Re: 300 },
  'calderbank-moo-young-1961-turbulent': { Sc: 1000 },
  'gilliland-sherwood-1934': { Re: 8000, Sc: 1.2 },
  'shulman-1955-gas': { Re: 600 },
  'eisenberg-tobias-wilke-1954': { Sc: 2900, Re: 4000 },
};

export const entry = (id: string): Correlation => catalogue.find((one) => one.id === id)!;

/** Span of the groups that are not the leading one. */
const other = (id: string, name: string): number => (name === 'voidage' || id.startsWith('eisenberg') ? 1.2 : 2);

/** Thirty trials drawn from a published correlation that was changed as `making` says. Every group lies within its limits. */
function draw(correlation: Correlation, lead: string, making: Making, random: Random): Observations {
  const names = [...new Set([...correlation.form.groups, ...Object.keys(correlation.groups)])].filter(
    (name) => name !== correlation.form.response,
  );
  const middle = (name: string): number => special[correlation.id]?.[name] ?? middles[name]!;
  const x = new Map(
    names.map((name) => {
      const span = Math.log(name === lead ? making.range : other(correlation.id, name));
      // Ends of the range belong to the design: the leading group is spread evenly, in random order.
      const places = Array.from({ length: TRIALS }, (_, i) => i / (TRIALS - 1) - 0.5).sort(() => random.uniform() - 0.5);
      return [name, places.map((place) => Math.log(middle(name)) + span * (name === lead ? place : random.uniform() - 0.5))] as const;
    }),
  );
  const shifts = Array.from({ length: making.campaigns }, () => making.tau * random.normal());
  const campaign = Array.from({ length: TRIALS }, (_, i) => i % making.campaigns);
  const centre = Math.log(middle(lead));
  const bend = making.bend / Math.log(making.range);
  const y = Array.from({ length: TRIALS }, (_, i) => {
    const at = Object.fromEntries(names.map((name) => [name, Math.exp(x.get(name)![i]!)]));
    const published = Math.log(evaluate(correlation.form.tree, at, correlation.values));
    return published + Math.log(making.factor) + bend * (x.get(lead)![i]! - centre) + shifts[campaign[i]!]! + SCATTER * random.normal();
  });
  const read = new Map([...x].map(([name, values]) => [name, values.map((v) => v + (name === lead ? making.uLead * random.normal() : 0))]));
  const keys = [correlation.form.response, ...names];
  return {
    scale: 'relative',
    trials: y.map((_, i) => `T${i + 1}`),
    campaign,
    campaigns: shifts.map((_, c) => `week ${c + 1}`),
    keys,
    z: [Float64Array.from(y), ...names.map((name) => Float64Array.from(read.get(name)!))],
    randomInputs: [lead],
    random: y.map(() => Float64Array.from(keys, (key) => (key === lead ? making.uLead : 0))),
    sources: [],
    systematic: y.map(() => new Float64Array(0)),
  };
}

/** Shares of each verdict over many seeded repetitions; `trend` is the share in which the leading group has a wrong trend. */
export function verdicts(
  id: string,
  lead: string,
  making: Making,
  repetitions: number,
  seed: number,
): Readonly<Record<VerdictWord, number>> {
  const random = seeded(seed);
  const correlation = entry(id);
  const shares: Record<string, number> = {
    'fits as published': 0,
    'fits with a rig factor': 0,
    'wrong trend': 0,
    'not decided by these trials': 0,
    'outside its range': 0,
    'not comparable': 0,
  };
  for (let k = 0; k < repetitions; k++) {
    const observations = draw(correlation, lead, making, random);
    const keys = Object.fromEntries(observations.keys.map((key) => [key, key]));
    const comparison = compare(correlation, 'direct', keys, observations);
    const trials = comparison.inside.flatMap((inside, i) => (inside ? [i] : []));
    if (trials.length < TRIALS * 0.9) throw new Error(`${id}: only ${trials.length} trials in range`);
    const { verdict } = judge(comparison, observations, trials, TOLERANCE, options());
    shares[verdict]! += 1 / repetitions;
  }
  return shares as Record<VerdictWord, number>;
}
