import { says } from '../base/says/fluids.ts';
import type { Check, Key, Rule } from '../rules/rule.ts';
import type { Condition, Fluid, PropertyModel } from './property-model.ts';

export type Stream = 'own' | 'other';

/** Bulk, film and wall: the suffix of the property's key and the quantity that holds its temperature (undefined: the one the study names). */
const STATES = [
  { suffix: '', temperature: undefined },
  { suffix: '@film', temperature: 'film_temperature' },
  { suffix: '@wall', temperature: 'wall_temperature' },
] as const;

/** Keys of the quantities that hold the conditions, where a study names others than the usual ones. */
export type Conditions = Readonly<Partial<Record<Exclude<Condition, 'bulk_temperature'>, Key>>>;

const defaultKeys: Record<Exclude<Condition, 'bulk_temperature'>, Key> = {
  temperature: 'temperature',
  pressure: 'pressure',
  mass_fraction: 'mass_fraction',
  relative_humidity: 'relative_humidity',
};

const ofStream = (key: Key, stream: Stream): Key => (stream === 'own' ? key : `${key}_other`);

/** Key of the pressure at which a stream's properties are taken. */
export const pressureKey = (stream: Stream): Key => ofStream('fluid_pressure', stream);

/** The pressure where none is given; said to the reader. */
const ATMOSPHERIC = 101_325; // Pa, standard atmosphere, ISO 2533

/** Every property of a fluid at bulk, film and wall conditions of one stream. */
export function propertyRules(fluid: Fluid, stream: Stream, at: Conditions): readonly Rule[] {
  const rules = STATES.flatMap(({ suffix, temperature }) =>
    fluid.properties.map((model) =>
      propertyRule(fluid, model, `${ofStream(model.property, stream)}${suffix}`, conditionKeys(model, stream, at, temperature)),
    ),
  );
  return fluid.properties.some(({ from }) => from.includes('pressure')) ? [...rules, ...pressureRules(fluid, stream, at)] : rules;
}

function conditionKeys(model: PropertyModel, stream: Stream, at: Conditions, temperature: Key | undefined): readonly Key[] {
  return model.from.map((condition) => {
    if (condition === 'pressure') return pressureKey(stream);
    if (condition === 'temperature' && temperature !== undefined) return ofStream(temperature, stream);
    const held = condition === 'bulk_temperature' ? 'temperature' : condition;
    return at[held] ?? ofStream(defaultKeys[held], stream);
  });
}

function propertyRule(fluid: Fluid, model: PropertyModel, gives: Key, from: readonly Key[]): Rule {
  const { of, formula, source, share, assumes } = model;
  return {
    gives,
    from,
    of,
    formula,
    source,
    checks: model.ranges.map(
      ({ holds, otherwise, says: text }): Check => ({
        code: otherwise === 'refuse' ? 'outside-property-range' : 'near-property-range',
        from,
        holds,
        otherwise,
        says: (...x) => says.property(gives, fluid.title, text(...x)),
      }),
    ),
    ...(share === undefined ? {} : { accuracy: { source: accuracySource(model.property, fluid, source), share } }),
    ...(assumes === undefined ? {} : { assumes }),
  };
}

/** `property: viscosity of water (IAPWS R12-08)`: the same at the rig and at the plant, in bulk, film and at the wall. */
const accuracySource = (property: string, fluid: Fluid, source: string): string =>
  `property: ${property.replaceAll('_', ' ')} of ${fluid.title} (${source.split(',')[0]})`;

/** The pressure given, else the ambient pressure given, else the standard atmosphere, which is said. */
export function pressureRules(fluid: Pick<Fluid, 'title'>, stream: Stream, at: Conditions): readonly Rule[] {
  const gives = pressureKey(stream);
  const same = (from: Key): Rule => ({ gives, from: [from], of: (p) => p!, formula: `p = ${from}`, source: 'definition' });
  return [
    same(at.pressure ?? ofStream(defaultKeys.pressure, stream)),
    { ...same('ambient_pressure'), assumes: says.pressureAmbient(fluid.title, ofStream('pressure', stream)) },
    {
      gives,
      from: [],
      of: () => ATMOSPHERIC,
      formula: 'p = 101.325 kPa',
      source: 'standard atmosphere, ISO 2533',
      assumes: says.pressureAssumed(fluid.title, ofStream('pressure', stream)),
    },
  ];
}
