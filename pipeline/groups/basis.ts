import { STANDARD_GRAVITY } from '../rules/derived/physical-constants.ts';
import type { Key, Rule } from '../rules/rule.ts';
import { type PropertyTemperature, propertyTemperatures } from './group.ts';

/** What a group is built on: where its length comes from, and what its velocity is. */
export interface Basis {
  readonly name: string;
  /** Letter of the length in formulas. */
  readonly symbol: string;
  /** The length in words. */
  readonly says: string;
  /** Quantities that hold the length, in order of preference. */
  readonly from: readonly Key[];
  /** From the quantity to the length; the quantity itself where left out. */
  readonly length?: { readonly of: (x: number) => number; readonly formula: string };
  /** What the velocity is; none for bases whose Re has a definition of its own. */
  readonly velocity?: string;
}

const plain = (name: string, symbol: string, says: string, from: readonly Key[], velocity = 'velocity'): Basis => ({
  name,
  symbol,
  says,
  from,
  velocity,
});

const particle: readonly Key[] = ['particle_diameter', 'diameter'];
const outer: readonly Key[] = ['outer_diameter', 'diameter'];

const list: readonly Basis[] = [
  plain('pipe', 'd', 'bore diameter', ['diameter'], 'mean velocity'),
  plain('hydraulic', 'd_h', 'hydraulic diameter', ['hydraulic_diameter'], 'mean velocity'),
  plain('plate', 'L', 'length of the plate in flow direction, or its height', ['length'], 'free-stream velocity'),
  plain('length', 'L', 'length', ['length']),
  plain('particle', 'd_p', 'particle diameter', particle, 'velocity, superficial in a bed'),
  plain('particle-interstitial', 'd_p', 'particle diameter', particle, 'superficial velocity over voidage'),
  plain('cylinder', 'd', 'outer diameter of the cylinder', outer, 'approach velocity'),
  plain('tube-bank', 'd', 'outer diameter of the tubes', outer, 'largest velocity, between the tubes'),
  plain('jet', 'd', 'diameter of the nozzle', ['diameter'], 'velocity in the nozzle'),
  plain('bubble', 'd_b', 'bubble diameter', ['bubble_diameter']),
  plain('vessel', 'D', 'inner diameter of the vessel', ['vessel_diameter'], 'superficial velocity'),
  plain('gap', 's', 'width of the gap', ['gap'], 'mean velocity'),
  plain('layer', 's', 'thickness of the layer', ['wall_thickness']),
  {
    ...plain('packing', '1/a', 'inverse of the specific area of the packing', ['specific_area'], 'superficial velocity'),
    length: { of: (a) => 1 / a, formula: 'L = 1/a' },
  },
  { name: 'impeller', symbol: 'd', says: 'impeller diameter', from: ['impeller_diameter'] },
  {
    name: 'disk',
    symbol: 'r',
    says: 'radius of the disk',
    from: ['diameter'],
    length: { of: (d) => d / 2, formula: 'r = d/2' },
  },
  { name: 'rotating-cylinder', symbol: 'd', says: 'diameter of the rotating cylinder', from: outer },
  { name: 'energy-dissipation', symbol: 'd_p', says: 'particle diameter', from: particle },
  { name: 'film', symbol: '(nu^2/g)^(1/3)', says: 'viscous length of the falling film', from: [] },
];

/** Every basis by name. */
export const basisRecords: ReadonlyMap<string, Basis> = new Map(list.map((basis) => [basis.name, basis]));

/** Names of all bases, in the order in which they are offered. */
export const bases: readonly string[] = list.map(({ name }) => name);

/** Bases whose Re is velocity times length over kinematic viscosity. */
export const flowBases: readonly string[] = list.filter(({ velocity }) => velocity !== undefined).map(({ name }) => name);

/** Key of the characteristic length of a basis; the film's depends on its properties, hence on their temperature. */
export const lengthKey = (basis: string, temperature: PropertyTemperature): Key =>
  `characteristic_length@${basis}${basis === 'film' && temperature !== 'bulk' ? `,${temperature}` : ''}`;

/** Where a basis takes its length from: symbol, words, and the quantities in order of preference. Undefined for an unknown basis. */
export const lengthOf = (basis: string): { readonly symbol: string; readonly says: string; readonly from: readonly Key[] } | undefined =>
  basisRecords.get(basis);

/** Characteristic lengths as rules. */
export const lengthRules: readonly Rule[] = [...list.flatMap(rulesOf), ...propertyTemperatures.map(filmLength)];

function rulesOf({ name, symbol, from, length }: Basis): readonly Rule[] {
  return from.map((quantity) => ({
    gives: lengthKey(name, 'bulk'),
    from: [quantity],
    of: length?.of ?? ((x: number) => x),
    formula: length?.formula ?? `${symbol} = ${quantity}`,
    source: 'definition',
  }));
}

function filmLength(temperature: PropertyTemperature): Rule {
  return {
    gives: lengthKey('film', temperature),
    from: [temperature === 'bulk' ? 'kinematic_viscosity' : `kinematic_viscosity@${temperature}`],
    of: (nu) => Math.cbrt((nu! * nu!) / STANDARD_GRAVITY),
    formula: 'L = (nu^2/g)^(1/3)',
    source: 'definition',
  };
}
