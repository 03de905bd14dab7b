import { says } from '../base/says/quantities.ts';
import { dimensionText, isDimensionless, sameDimension } from './dimension.ts';
import { type Fault, fault, isFault } from './fault.ts';
import { parseUnit, plainText, type Unit } from './unit.ts';
import { type Quantity, quantities } from './vocabulary.ts';

const degrees: Readonly<Record<string, string>> = { C: 'degC', F: 'degF' };

/**
 * The unit of a quantity, ready for `toSI`: dimension checked, `C` and `F` read as degrees where a temperature is meant, rad/s of a rotation speed
 * turned to revolutions. Left as a `reference` for the caller: gauge pressures, gas volumes at their stated reference condition.
 * Without a quantity (the user's own name) every unit is allowed.
 */
export function unitFor(quantity: Quantity | undefined, text: string): Unit | Fault {
  if (quantity?.kind === 'text') return fault('unit-of-text', says.unitOfText(quantity.name, text));
  const degree = quantity?.kind === 'temperature' ? degrees[plainText(text)] : undefined;
  const unit = parseUnit(degree ?? text);
  if (isFault(unit)) return unit;
  const read =
    degree === undefined
      ? unit
      : { ...unit, text, notes: [...unit.notes, { code: 'unit-meaning', text: says.unitMeaning(text, `temperature unit ${degree}`) }] };
  return unclearReference(read) ?? (quantity === undefined ? read : fitted(quantity, read));
}

function unclearReference(unit: Unit): Fault | undefined {
  if (unit.reference?.kind === 'normal' && unit.reference.temperature === undefined)
    return fault('unit-condition', says.conditionAsked(unit.text));
  return undefined;
}

function fitted(quantity: Quantity, unit: Unit): Unit | Fault {
  if (!sameDimension(unit.dimension, quantity.dimension) && !isMolar(quantity, unit))
    return fault('unit-dimension', says.wrongDimension(unit.text, dimensionText(unit.dimension), quantity, namesWith(unit)));
  if (quantity.kind === 'temperature difference' && unit.offset !== 0)
    return fault('unit-difference', says.differenceWanted(quantity.name, unit.text));
  return wrongReference(quantity, unit) ?? (quantity.revolutions ? perRevolution(unit) : unit);
}

/** A concentration or a rate by amount of substance where its mass is the first choice. */
export const isMolar = (quantity: Quantity, unit: Unit): boolean =>
  quantity.molar !== undefined && sameDimension(unit.dimension, quantity.molar.dimension);

function wrongReference(quantity: Quantity, unit: Unit): Fault | undefined {
  const { reference } = unit;
  if (reference?.kind === 'differential') return fault('unit-reference', says.differentialPressure(quantity.name, unit.text));
  if (reference?.kind === 'gauge' && quantity.name.startsWith('ambient'))
    return fault('unit-reference', says.gaugeAmbient(quantity.name, unit.text));
  if (reference?.kind !== 'share') return undefined;
  const of = shareOfQuantity(quantity.name);
  return of === undefined || of === reference.of ? undefined : fault('unit-reference', says.wrongShare(quantity.name, unit.text, of));
}

function shareOfQuantity(name: string): 'mass' | 'volume' | undefined {
  if (name.startsWith('mass_fraction')) return 'mass';
  return name.startsWith('voidage') || name.startsWith('gas_holdup') ? 'volume' : undefined;
}

/** rad/s to revolutions per second. */
function perRevolution(unit: Unit): Unit {
  if (unit.angle === 0) return unit;
  return { ...unit, over: unit.over * (2 * Math.PI) ** unit.angle, angle: 0 };
}

/** Names of quantities that have this unit's dimension. */
const namesWith = (unit: Unit): readonly string[] =>
  isDimensionless(unit.dimension)
    ? []
    : Object.values(quantities)
        .filter((one) => one.kind !== 'text' && sameDimension(one.dimension, unit.dimension))
        .map((one) => one.name);
