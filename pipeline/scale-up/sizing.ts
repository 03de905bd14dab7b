import type { PlantTarget } from '../plan/plant-target.ts';
import type { Key } from '../rules/rule.ts';

type Value = (key: Key) => number;

/** Resistances beside the coefficient, per outer area: m^2 K/W. */
export interface Series {
  /** Outer area over the area of the coefficient. */
  readonly areaRatio: number;
  readonly others: readonly { readonly name: string; readonly value: number }[];
  readonly basis: 'outer area' | 'plane wall';
}

/** Equipment whose coefficient belongs to the inside of the tube. */
const inside: ReadonlySet<string> = new Set(['tube', 'coil', 'membrane', 'plate-exchanger']);

/** Wall, fouling and other side as the case states them; undefined where it states none of them. */
export function seriesOf(value: Value, equipment: string): Series | undefined {
  const [thickness, conductivity] = [value('wall_thickness'), value('wall_conductivity')];
  const [fouling, other] = [value('fouling_resistance'), value('other_side_coefficient')];
  const [bore, outer] = [value('diameter'), value('outer_diameter')];
  const tube = outer > bore && bore > 0;
  const wall = tube ? (outer * Math.log(outer / bore)) / (2 * conductivity) : thickness / conductivity;
  const own = inside.has(equipment);
  const parts = [
    { name: 'wall', value: wall },
    { name: 'fouling', value: fouling },
    { name: 'other side', value: (tube && !own ? outer / bore : 1) / other },
  ].filter((part) => Number.isFinite(part.value));
  if (parts.length === 0) return undefined;
  return { areaRatio: tube && own ? outer / bore : 1, others: parts, basis: tube ? 'outer area' : 'plane wall' };
}

/** 1/U = ratio/h + sum of the others: a rising function of h, so that ends of an interval go over into ends. */
export const overallOf = ({ areaRatio, others }: Series, coefficient: number): number =>
  1 / (areaRatio / coefficient + others.reduce((sum, part) => sum + part.value, 0));

/** What the target needs, from a coefficient: value, unit and the formula in words. Undefined where the case lacks what the formula takes. */
export function sizeOf(
  target: PlantTarget,
  coefficient: number,
  value: Value,
  kind: 'surface' | 'volumetric',
  symbol: string,
): { readonly value: number; readonly unit: string; readonly formula: string; readonly lacks?: string } {
  const { find, rate = Number.NaN, amount = Number.NaN, difference } = target;
  const need = rate / (coefficient * difference);
  if (kind === 'volumetric') return volumeFor(target, coefficient, value, symbol);
  const [d, dp, a] = [
    value('outer_diameter') > 0 ? value('outer_diameter') : value('diameter'),
    value('particle_diameter'),
    value('specific_area'),
  ];
  const area = value('area') > 0 ? value('area') : value('particle_count') * Math.PI * dp ** 2;
  switch (find) {
    case 'area':
      return { value: need, unit: 'm^2', formula: `A = rate/(${symbol} difference)` };
    case 'length':
      return lacking({ value: need / (Math.PI * d), unit: 'm', formula: `L = rate/(${symbol} difference pi d), one tube` }, d, 'diameter');
    case 'liquid_volume': {
      const density = value('interfacial_area') > 0 ? value('interfacial_area') : a;
      return lacking(
        { value: need / density, unit: 'm^3', formula: `V = rate/(${symbol} difference a)` },
        density,
        'interfacial_area or specific_area',
      );
    }
    case 'particle_count':
      return lacking(
        { value: need / (Math.PI * dp ** 2), unit: '1', formula: `N = rate/(${symbol} difference pi d_p^2)` },
        dp,
        'particle_diameter',
      );
    case 'time':
      return lacking(
        { value: amount / (coefficient * difference * area), unit: 's', formula: `t = amount/(${symbol} difference A)` },
        area,
        'area, or particle_count and particle_diameter',
      );
  }
}

type Size = { readonly value: number; readonly unit: string; readonly formula: string; readonly lacks?: string };

const lacking = (size: Size, needed: number, lacks: string): Size => (needed > 0 ? size : { ...size, value: Number.NaN, lacks });

function volumeFor(
  { find, rate = Number.NaN, amount = Number.NaN, difference }: PlantTarget,
  coefficient: number,
  value: Value,
  symbol: string,
): Size {
  if (find === 'liquid_volume')
    return { value: rate / (coefficient * difference), unit: 'm^3', formula: `V = rate/(${symbol} difference)` };
  if (find === 'time')
    return lacking(
      { value: amount / (coefficient * difference * value('liquid_volume')), unit: 's', formula: `t = amount/(${symbol} difference V)` },
      value('liquid_volume'),
      'liquid_volume',
    );
  return { value: Number.NaN, unit: '1', formula: '', lacks: `a volumetric coefficient gives liquid_volume or time, not ${find}` };
}
