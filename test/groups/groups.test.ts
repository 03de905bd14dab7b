import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { bases, lengthOf } from '../../pipeline/groups/basis.ts';
import { definitionText } from '../../pipeline/groups/definition.ts';
import { basesOf, groupNames, groupRules, groups } from '../../pipeline/groups/groups.ts';
import { groupKey } from '../../pipeline/groups/key.ts';
import { parseKey } from '../../pipeline/groups/parse-key.ts';
import { possibleBases } from '../../pipeline/groups/possible-bases.ts';
import type { Dimension } from '../../pipeline/quantities/dimension.ts';
import { quantityOf } from '../../pipeline/quantities/vocabulary.ts';
import { propertyIdentities } from '../../pipeline/rules/derived/properties.ts';
import { evaluate } from '../../pipeline/rules/evaluate.ts';
import { resolve, ruleBook } from '../../pipeline/rules/resolve.ts';
import type { Key, Rule } from '../../pipeline/rules/rule.ts';

const book = ruleBook([...propertyIdentities, ...groupRules]);

/** Value of one key from given quantities in SI. */
function had(key: Key, given: Readonly<Record<Key, number>>): number {
  const inputs = Object.entries(given).map(([name, constant]) => ({ key: name, constant, label: name }));
  const { recipe } = resolve(book, inputs, [key]);
  const nodes = new Float64Array(recipe.keys.length);
  evaluate(
    recipe,
    Float64Array.from(recipe.inputs, (input) => input.constant!),
    nodes,
  );
  const at = recipe.wanted[0]!;
  return at < 0 ? Number.NaN : nodes[at]!;
}

describe('numbers printed elsewhere', () => {
  test('tube: 0.05 kg/s of air in a 0.15 m duct, from mass flow alone', () => {
    // Incropera, DeWitt, Bergman & Lavine, 6th ed., Example 8.6: Re = 20,384 (value from memory)
    expect(Math.abs(had('Re@pipe', { mass_flow: 0.05, diameter: 0.15, viscosity: 208.2e-7 }) - 20_384)).toBeLessThan(1);
  });

  test('stirred vessel: Re and Pr of a baffled turbine', () => {
    // Geankoplis, 4th ed., Example 4.13-1: Re = 596, Pr = 14 450 with mu 1.0, N 1.667 1/s, D_a 0.61 m (value from memory)
    const given = {
      rotation_speed: 100 / 60,
      impeller_diameter: 0.61,
      density: 961,
      viscosity: 1,
      heat_capacity: 2500,
      thermal_conductivity: 0.173,
    };
    expect(had('Re@impeller', given)).toBeCloseTo(596, 0);
    expect(had('Pr', given)).toBeCloseTo(14_450, -1);
  });

  test('natural convection on a vertical plate: Rayleigh number', () => {
    // Incropera et al., 6th ed., Example 9.2: Ra = 1.813e9 (book, from memory); inputs from page: T_s 505 K, T_inf 296 K, L 0.71 m, beta 0.0025, nu 26.4e-6, alpha 38.3e-6
    const given = {
      'thermal_expansion@film': 0.0025,
      wall_temperature: 505,
      temperature: 296,
      length: 0.71,
      'kinematic_viscosity@film': 26.4e-6,
      'thermal_diffusivity@film': 38.3e-6,
    };
    expect(had('Ra@plate,film', given) / 1e9).toBeCloseTo(1.813, 2);
  });

  test('free fall of a benzoic acid sphere: Archimedes number', () => {
    // Tosun, Modelling in Transport Phenomena (2002), benzoic acid sphere in water: Ar = 5.68e6 (page; with g = 9.8); d 12 mm, rho_s 1267, rho 1000, mu 892e-6 (from memory)
    const ar = had('Ar@particle', { particle_diameter: 0.012, solid_density: 1267, density: 1000, viscosity: 892e-6 });
    expect(Math.abs((ar * 9.8) / 9.80665 / 1e6 - 5.68)).toBeLessThan(0.005);
  });
});

test('Re of every basis on one set of quantities, each by its own words', () => {
  const given = {
    velocity: 2,
    voidage: 0.4,
    viscosity: 1e-3,
    density: 1000,
    diameter: 0.05,
    outer_diameter: 0.06,
    hydraulic_diameter: 0.02,
    particle_diameter: 0.004,
    length: 1.5,
    impeller_diameter: 0.1,
    rotation_speed: 5,
    film_flow_per_width: 0.3,
    power_per_mass: 0.5,
  };
  const nu = 1e-6;
  expect(had('Re@pipe', given)).toBeCloseTo((2 * 0.05) / nu, 3);
  expect(had('Re@hydraulic', given)).toBeCloseTo((2 * 0.02) / nu, 3);
  expect(had('Re@plate', given)).toBeCloseTo((2 * 1.5) / nu, 3);
  expect(had('Re@particle', given)).toBeCloseTo((2 * 0.004) / nu, 3);
  expect(had('Re@particle-interstitial', given)).toBeCloseTo((2 * 0.004) / 0.4 / nu, 3);
  expect(had('Re@cylinder', given)).toBeCloseTo((2 * 0.06) / nu, 3);
  expect(had('Re@tube-bank', given)).toBeCloseTo((2 * 0.06) / nu, 3);
  expect(had('Re@impeller', given)).toBeCloseTo((5 * 0.01) / nu, 3);
  expect(had('Re@film', given)).toBeCloseTo((4 * 0.3) / 1e-3, 6);
  expect(had('Re@disk', given)).toBeCloseTo((2 * Math.PI * 5 * 0.025 ** 2) / nu, 3);
  expect(had('Re@rotating-cylinder', given)).toBeCloseTo((Math.PI * 5 * 0.06 * 0.06) / nu, 3);
  expect(had('Re@energy-dissipation', given)).toBeCloseTo((0.5 ** (1 / 3) * 0.004 ** (4 / 3)) / nu, 6);
});

test('a kinematic viscosity that is given beats one from viscosity and density', () => {
  expect(had('Re@pipe', { velocity: 1, diameter: 0.1, kinematic_viscosity: 2e-6, viscosity: 1e-3, density: 1000 })).toBeCloseTo(5e4, 6);
});

test('particle bases take diameter where no particle_diameter is given', () => {
  expect(had('Sh@particle', { mass_transfer_coefficient: 1e-4, diameter: 0.01, diffusivity: 1e-9 })).toBeCloseTo(1000, 6);
});

describe('the Lewis, Peclet, Graetz and transfer numbers are what their parts make them', () => {
  const given = {
    velocity: 0.7,
    diameter: 0.03,
    length: 2,
    viscosity: 8e-4,
    density: 990,
    heat_capacity: 4180,
    thermal_conductivity: 0.62,
    diffusivity: 1.3e-9,
    heat_transfer_coefficient: 900,
    mass_transfer_coefficient: 3e-5,
  };
  const value = (key: Key): number => had(key, given);
  test.each([
    ['Le', value('Sc') / value('Pr')],
    ['Pe_heat@pipe', value('Re@pipe') * value('Pr')],
    ['Pe_mass@pipe', value('Re@pipe') * value('Sc')],
    ['Gz_heat@pipe', (value('Re@pipe') * value('Pr') * 0.03) / 2],
    ['St_heat', value('Nu@pipe') / (value('Re@pipe') * value('Pr'))],
    ['St_mass', value('Sh@pipe') / (value('Re@pipe') * value('Sc'))],
    ['j_heat', (value('Nu@pipe') / value('Re@pipe')) * value('Pr') ** (-1 / 3)],
    ['j_mass', (value('Sh@pipe') / value('Re@pipe')) * value('Sc') ** (-1 / 3)],
  ])('%s', (key, expected) => {
    expect(value(key) / expected).toBeCloseTo(1, 12);
  });
});

describe('every group is free of units', () => {
  const withGravity = new Set(['Gr', 'Ga', 'Ar', 'Bo', 'Fr']);
  const own: Readonly<Record<string, readonly [number, number, number, number]>> = {
    // m, kg, s, K
    thermal_diffusivity: [2, 0, -1, 0],
    characteristic_length: [1, 0, 0, 0],
    volume_per_area: [1, 0, 0, 0],
  };
  const baseName = (key: Key): string => key.split('@')[0]!;
  const dims = (key: Key): readonly [number, number, number, number] => {
    const name = baseName(key);
    if (groups.has(name)) return [0, 0, 0, 0];
    const known = own[name];
    if (known !== undefined) return known;
    const dimension: Dimension = quantityOf(name)!.dimension;
    return [dimension[0]!, dimension[1]!, dimension[2]!, dimension[4]!];
  };
  const numbers = groupRules.filter((rule) => groups.has(baseName(rule.gives)));

  test.each(numbers.map((rule) => [rule.gives, rule] as const))('%s', (_, rule: Rule) => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: 0.2, max: 5, noNaN: true }), { minLength: rule.from.length, maxLength: rule.from.length }),
        fc.tuple(...[0, 1, 2, 3].map(() => fc.double({ min: 0.3, max: 3, noNaN: true }))),
        (x, units) => {
          const scale = [...units];
          // with gravity in it only unit systems that keep g = 9.80665 may be tried
          if (withGravity.has(baseName(rule.gives))) scale[0] = scale[2]! ** 2;
          const there = x.map((value, i) => dims(rule.from[i]!).reduce((v, power, d) => v * scale[d]! ** power, value));
          const [here, moved] = [rule.of(...x), rule.of(...there)];
          expect(Math.abs(here) > 1e-9 ? moved / here : moved).toBeCloseTo(Math.abs(here) > 1e-9 ? 1 : 0, 6);
        },
      ),
      { numRuns: 20, seed: 7 },
    );
  });
});

describe('keys', () => {
  test('every rule of a group has a key that parses back to itself and has a definition', () => {
    for (const { gives } of groupRules) {
      const parsed = parseKey(gives);
      if (gives.startsWith('characteristic_length')) expect(parsed).toBeUndefined();
      else {
        expect(groupKey(parsed!.name, parsed!.basis, parsed!.temperature)).toBe(gives);
        expect(definitionText(gives)!.text).toContain('=');
      }
    }
  });

  test('the film as a basis and as a temperature', () => {
    expect(parseKey('Re@film')).toEqual({ name: 'Re', basis: 'film', temperature: 'bulk' });
    expect(parseKey('Re@film,film')).toEqual({ name: 'Re', basis: 'film', temperature: 'film' });
    expect(parseKey('Pr@film')).toEqual({ name: 'Pr', temperature: 'film' });
  });

  test.each(['Re', 'Re@pip', 'Re@pipe,hot', 'Re@pipe,bulk', 'Re@pipe@film', 'Rey@pipe', 'Pr@pipe', 'viscosity_ratio@film', 'velocity', ''])(
    '"%s" is no complete group key',
    (key) => {
      expect(parseKey(key)).toBeUndefined();
      expect(definitionText(key)).toBeUndefined();
    },
  );

  test('a definition says velocity, length and property temperature', () => {
    expect(definitionText('Re@pipe')!.text).toBe('Re = rho u d/mu, u = mean velocity, d = bore diameter, properties at bulk temperature');
    expect(definitionText('Nu@cylinder,film')!.text).toBe(
      'Nu = h d/lambda, d = outer diameter of the cylinder, properties at film temperature',
    );
    expect(definitionText('Gr@plate,film')!.text).toContain('|T_w - T|');
  });

  test('names and bases for did-you-mean', () => {
    for (const name of ['Re', 'Nu', 'Sh', 'Le', 'Pe_heat', 'Pe_mass', 'Gr', 'Ra', 'Gz_heat', 'Gz_mass', 'Ga', 'Ar', 'Fr', 'We']) {
      expect(groupNames).toContain(name);
    }
    for (const name of ['St_heat', 'St_mass', 'j_heat', 'j_mass', 'Bi', 'Fo', 'viscosity_ratio']) expect(groupNames).toContain(name);
    expect(basesOf('Re')).toContain('energy-dissipation');
    expect(basesOf('Pr')).toEqual([]);
    expect(bases.every((basis) => lengthOf(basis) !== undefined)).toBe(true);
    expect(lengthOf('particle')!.from).toEqual(['particle_diameter', 'diameter']);
  });
});

describe('a length is taken without asking only where one could be meant', () => {
  const having =
    (...names: string[]) =>
    (key: Key): boolean =>
      names.includes(key);

  test('a tube with its bore', () => expect(possibleBases('Nu', 'tube', having('diameter'))).toEqual(['pipe']));
  test('pellets in a stirred vessel: two', () =>
    expect(possibleBases('Sh', 'suspended-solids', having('particle_diameter', 'impeller_diameter'))).toEqual(['particle', 'impeller']));
  test('a packed bed: two bases, one length', () =>
    expect(possibleBases('Sh', 'packed-bed', having('particle_diameter', 'voidage'))).toEqual(['particle']));
  test('the wall of a bed: two bases', () =>
    expect(possibleBases('Nu', 'bed-wall', having('particle_diameter', 'vessel_diameter'))).toEqual(['particle', 'vessel']));
  test('a disk of which only the diameter is known', () =>
    expect(possibleBases('Sh', 'rotating', having('diameter'))).toEqual(['disk', 'rotating-cylinder']));
  test('nothing given', () => expect(possibleBases('Nu', 'tube', having())).toEqual([]));
  test('other equipment: every basis that can be had', () =>
    expect(possibleBases('Nu', 'other', having('length', 'gap'))).toEqual(['plate', 'gap']));
});
