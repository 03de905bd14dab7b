import type { Place } from '../base/place.ts';
import * as says from '../base/says/plant.ts';
import { parseAmount } from '../quantities/amount.ts';
import { type Dimension, sameDimension } from '../quantities/dimension.ts';
import { isFault } from '../quantities/fault.ts';
import { parseUnit } from '../quantities/unit.ts';
import { quantityOf } from '../quantities/vocabulary.ts';
import type { Placed, Study } from '../study/study.ts';
import type { Faults } from './faults.ts';

const finds = ['area', 'length', 'liquid_volume', 'particle_count', 'time'] as const;
type Find = (typeof finds)[number];

/** What the plant unit must do, SI. `rate`: W, kg/s or mol/s; `amount`: J, kg or mol, for a time; `difference`: K, kg/m^3 or mol/m^3. */
export interface PlantTarget {
  readonly find: Find;
  readonly rate?: number;
  readonly amount?: number;
  readonly difference: number;
  /** Concentrations and rates are by amount of substance. */
  readonly molar: boolean;
}

interface Meaning {
  readonly as: 'rate' | 'amount' | 'difference';
  readonly units: readonly string[];
}

const meanings: Readonly<Record<Study['transfer'], Readonly<Record<string, Meaning>>>> = {
  heat: {
    heat_rate: { as: 'rate', units: ['W'] },
    heat: { as: 'amount', units: ['J'] },
    driving_difference: { as: 'difference', units: ['K'] },
  },
  mass: {
    mass_rate: { as: 'rate', units: ['kg/s', 'mol/s'] },
    mass: { as: 'amount', units: ['kg', 'mol'] },
    driving_difference: { as: 'difference', units: ['kg/m^3', 'mol/m^3'] },
  },
};

/** `target: {heat_rate: 250 kW, driving_difference: 30 K, find: area}`; a time asks for `heat` or `mass` in place of the rate. */
export function planTarget(
  target: Readonly<Record<string, Placed<string>>> | undefined,
  transfer: Study['transfer'],
  faults: Faults,
): PlantTarget | undefined {
  if (target === undefined) return undefined;
  const known = meanings[transfer];
  const values: { rate?: number; amount?: number; difference?: number } = {};
  const molar = new Set<boolean>();
  for (const [key, { is, place }] of Object.entries(target)) {
    if (key === 'find') continue;
    const meaning = known[key];
    if (meaning === undefined) {
      faults.add('unknown-target', says.unknownTarget(key, [...Object.keys(known), 'find']), place);
      continue;
    }
    const read = amountOf(key, is, meaning, place, faults);
    if (read === undefined) continue;
    values[meaning.as] = read.si;
    if (meaning.units.length > 1) molar.add(read.which === 1);
  }
  const place = target.find?.place ?? Object.values(target)[0]?.place ?? { file: '' };
  const find = finds.find((one) => one === target.find?.is);
  if (find === undefined) faults.add('target-find', says.targetFind(target.find?.is ?? '', finds), place);
  const rate = find === 'time' ? values.amount : values.rate;
  if (find !== undefined && (rate === undefined || values.difference === undefined))
    faults.add(
      'target-lacks',
      says.targetLacks(find, find === 'time' ? (transfer === 'heat' ? 'heat' : 'mass') : `${transfer}_rate`),
      place,
    );
  if (molar.size > 1) faults.add('target-kinds', says.targetKinds(), place);
  if (find === undefined || values.difference === undefined) return undefined;
  return { find, ...values, difference: values.difference, molar: molar.has(true) };
}

function amountOf(
  key: string,
  text: string,
  { units }: Meaning,
  place: Place,
  faults: Faults,
): { readonly si: number; readonly which: number } | undefined {
  const amount = parseAmount(text, quantityOf(key));
  if (isFault(amount)) {
    faults.add(amount.code, `target.${key}: ${amount.text}`, place);
    return undefined;
  }
  const which = units.findIndex((unit) => sameDimension(dimension(unit), amount.unit.dimension));
  if (which < 0 || amount.unit.offset !== 0 || !(amount.si > 0)) {
    faults.add('target-amount', says.targetAmount(key, text, units), place);
    return undefined;
  }
  return { si: amount.si, which };
}

function dimension(text: string): Dimension {
  const unit = parseUnit(text);
  if (isFault(unit)) throw new Error(unit.text);
  return unit.dimension;
}
