import { describe, expect, test } from 'vitest';
import { groupRules } from '../../../pipeline/groups/groups.ts';
import { quantityOf } from '../../../pipeline/quantities/vocabulary.ts';
import { derivedRules, derivedRulesFor } from '../../../pipeline/rules/derived/derived-rules.ts';
import { gassedShare } from '../../../pipeline/rules/derived/gassed-power.ts';
import { otherKey } from '../../../pipeline/rules/derived/stream.ts';
import { evaluate } from '../../../pipeline/rules/evaluate.ts';
import { resolve, ruleBook } from '../../../pipeline/rules/resolve.ts';
import type { Key } from '../../../pipeline/rules/rule.ts';

/** A key from given quantities in SI, NaN where it cannot be had. */
function had(key: Key, given: Readonly<Record<Key, number>>, equipment = 'other'): number {
  const inputs = Object.entries(given).map(([name, constant]) => ({ key: name, constant, label: name }));
  const { recipe } = resolve(ruleBook([...derivedRulesFor(equipment), ...groupRules]), inputs, [key]);
  const nodes = new Float64Array(recipe.keys.length);
  evaluate(
    recipe,
    Float64Array.from(recipe.inputs, (input) => input.constant!),
    nodes,
  );
  const at = recipe.wanted[0]!;
  return at < 0 ? Number.NaN : nodes[at]!;
}

describe('flow', () => {
  test('velocity from mass flow, density and bore', () => {
    // Incropera et al., 6th ed., Example 8.6: 0.05 kg/s of air, 0.15 m; u = 4 m/(rho pi D^2) with rho 0.998: 2.835 m/s, by hand
    expect(had('velocity', { mass_flow: 0.05, density: 0.998, diameter: 0.15 }, 'tube')).toBeCloseTo(2.835, 3);
  });
  test('volume and mass flow from each other', () => {
    expect(had('mass_flow', { volume_flow: 2e-3, density: 998 })).toBeCloseTo(1.996, 12);
    expect(had('volume_flow', { mass_flow: 1.996, density: 998 })).toBeCloseTo(2e-3, 15);
    expect(had('mass_flow', { velocity: 2, cross_section: 1e-3, density: 998 })).toBeCloseTo(1.996, 12);
  });
  test('the second stream likewise', () => {
    expect(had('mass_flow_other', { volume_flow_other: 2e-3, density_other: 998 })).toBeCloseTo(1.996, 12);
    expect(had('mass_flow_other', { volume_flow_other: 2e-3, density: 998 })).toBeNaN();
    expect(otherKey('viscosity@wall')).toBe('viscosity_other@wall');
  });
  test('film flow per wetted width of a tube', () => {
    expect(had('film_flow_per_width', { mass_flow: 0.1, diameter: 0.05 }, 'wetted-wall')).toBeCloseTo(0.1 / (Math.PI * 0.05), 12);
    expect(had('film_flow_per_width', { mass_flow: 0.1, diameter: 0.05 }, 'tube')).toBeNaN();
  });
});

describe('geometry by what the letters stand for', () => {
  const flow = { volume_flow: 1e-3, diameter: 0.05 };
  test('a bore makes a cross section, a sphere does not', () => {
    expect(had('velocity', flow, 'tube')).toBeCloseTo(1e-3 / ((Math.PI / 4) * 0.0025), 10);
    expect(had('velocity', flow, 'sphere')).toBeNaN();
    expect(had('velocity', flow, 'packed-bed')).toBeNaN();
    expect(had('velocity', { ...flow, vessel_diameter: 0.1 }, 'packed-bed')).toBeCloseTo(1e-3 / ((Math.PI / 4) * 0.01), 10);
  });
  test('annulus: cross section, hydraulic diameter, gap and inner mantle', () => {
    const annulus = { diameter: 0.05, outer_diameter: 0.03, length: 2 };
    expect(had('cross_section', annulus, 'annulus')).toBeCloseTo((Math.PI / 4) * (0.0025 - 0.0009), 12);
    expect(had('hydraulic_diameter', annulus, 'annulus')).toBeCloseTo(0.02, 12);
    expect(had('gap', annulus, 'annulus')).toBeCloseTo(0.01, 12);
    expect(had('area', annulus, 'annulus')).toBeCloseTo(Math.PI * 0.03 * 2, 12);
    // four times the cross section over the wetted perimeter
    expect(had('hydraulic_diameter', annulus, 'annulus')).toBeCloseTo(
      (4 * had('cross_section', annulus, 'annulus')) / (Math.PI * 0.08),
      12,
    );
  });
  test('the other stream of a tube runs in its annulus, that of an annulus in the tube', () => {
    expect(had('hydraulic_diameter_other', { diameter: 0.02, outer_diameter: 0.025, diameter_other: 0.04 }, 'tube')).toBeCloseTo(0.015, 12);
    expect(had('cross_section_other', { diameter: 0.04, outer_diameter: 0.025, diameter_other: 0.02 }, 'annulus')).toBeCloseTo(
      (Math.PI / 4) * 4e-4,
      12,
    );
  });
  test('specific area of a bed: 6 (1 - voidage)/d', () => {
    // Benitez, 2nd ed., Example 2.13: d_p 3.5 mm, voidage 0.485: 883 1/m, by hand
    expect(had('specific_area', { voidage: 0.485, particle_diameter: 0.0035 })).toBeCloseTo(882.9, 1);
    expect(had('specific_area', { voidage: 0.485, particle_diameter: 0.0035, sphericity: 0.5 })).toBeCloseTo(1765.7, 1);
  });
  test('areas of one sphere, of pellets, of a cylinder', () => {
    expect(had('area', { diameter: 0.01 }, 'sphere')).toBeCloseTo(Math.PI * 1e-4, 14);
    expect(had('area', { particle_diameter: 0.01, particle_count: 7 }, 'suspended-solids')).toBeCloseTo(7 * Math.PI * 1e-4, 14);
    expect(had('area', { outer_diameter: 0.01, length: 0.2 }, 'cylinder')).toBeCloseTo(Math.PI * 2e-3, 14);
    expect(had('area', { vessel_diameter: 0.05, length: 0.2 }, 'bed-wall')).toBeCloseTo(Math.PI * 1e-2, 14);
    expect(had('area', { vessel_diameter: 0.05, length: 0.2 }, 'packed-bed')).toBeNaN();
    expect(had('area', { diameter: 0.01, length: 0.2 }, 'other')).toBeNaN();
  });
  test('interface of bubbles per clear liquid', () => {
    // 6 e/d per dispersion, over 1 - e of liquid
    expect(had('interfacial_area', { gas_holdup: 0.2, bubble_diameter: 0.003 })).toBeCloseTo((6 * 0.2) / 0.003 / 0.8, 9);
    expect(had('mass_transfer_coefficient', { volumetric_coefficient: 0.1, gas_holdup: 0.2, bubble_diameter: 0.003 })).toBeCloseTo(
      2e-4,
      12,
    );
  });
});

describe('agitation', () => {
  const stirred = { power_number: 5, density: 1000, rotation_speed: 2, impeller_diameter: 0.5, liquid_volume: 2 };
  test('power from the power number, per mass and volume', () => {
    expect(had('power', stirred)).toBeCloseTo(5 * 1000 * 8 * 0.5 ** 5, 9);
    expect(had('power_per_volume', stirred)).toBeCloseTo(625, 9);
    expect(had('power_per_mass', stirred)).toBeCloseTo(0.625, 12);
    expect(had('Re@energy-dissipation', { ...stirred, particle_diameter: 1e-3, viscosity: 1e-3 })).toBeCloseTo(0.625 ** (1 / 3) * 100, 9);
    expect(had('tip_speed', stirred)).toBeCloseTo(Math.PI, 12);
  });
  test('a measured shaft power goes before any estimate', () => {
    expect(had('power_per_volume', { ...stirred, power: 900, gas_velocity: 0.02, vessel_diameter: 1.5 })).toBeCloseTo(450, 12);
  });
  test('under gas the power falls as the published formula says, and never above that without gas', () => {
    // Hughmark 1980: 0.10 (Q/(N V))^-0.25 (N^2 d^4/(g W V^(2/3)))^-0.2, W = d/5 (constants from memory)
    const by = 0.1 * (0.02 / 4) ** -0.25 * ((4 * 0.5 ** 4) / (9.80665 * 0.1 * 2 ** (2 / 3))) ** -0.2;
    expect(gassedShare(0.02, 2, 0.5, 2)).toBeCloseTo(by, 12);
    const gassed = { ...stirred, vessel_diameter: 1.5, gas_velocity: 0.02 / ((Math.PI / 4) * 2.25) };
    expect(had('power', gassed)).toBeCloseTo(1250 * by, 6);
    expect(had('power', { ...gassed, gas_velocity: 1e-6 })).toBeCloseTo(1250, 9);
  });
  test('gas velocity from the gas flow of a gas-liquid vessel', () => {
    const section = (Math.PI / 4) * 2.25;
    expect(had('gas_velocity', { volume_flow_other: 0.02, volume_flow: 1, vessel_diameter: 1.5 }, 'gas-liquid')).toBeCloseTo(
      0.02 / section,
      12,
    );
    expect(had('gas_velocity', { volume_flow: 0.02, vessel_diameter: 1.5 }, 'gas-liquid')).toBeCloseTo(0.02 / section, 12);
    expect(had('gas_velocity', { volume_flow: 0.02, vessel_diameter: 1.5 }, 'vessel')).toBeNaN();
  });
  test('a power-law liquid: apparent viscosity at the mean shear rate', () => {
    // Metzner & Otto 1957: K (k_s N)^(n - 1); n 0.5, K 2, k_s 11.5, N 4 1/s: 2/sqrt(46)
    const given = { consistency: 2, flow_index: 0.5, shear_constant: 11.5, rotation_speed: 4 };
    expect(had('viscosity', given)).toBeCloseTo(2 / Math.sqrt(46), 12);
    expect(had('viscosity', { ...given, flow_index: 1 })).toBeCloseTo(2, 12);
  });
});

describe('properties and temperatures', () => {
  test('identities in the bulk, film and at the wall', () => {
    expect(had('kinematic_viscosity@film', { 'viscosity@film': 1e-3, 'density@film': 800 })).toBeCloseTo(1.25e-6, 15);
    expect(had('viscosity', { kinematic_viscosity: 1.25e-6, density: 800 })).toBeCloseTo(1e-3, 15);
    expect(had('viscosity_ratio', { viscosity: 2e-3, wall_viscosity: 1e-3 })).toBeCloseTo(2, 14);
  });
  test('bulk is the mean of inlet and outlet, film the mean of bulk and wall; given goes before', () => {
    expect(had('film_temperature', { inlet_temperature: 300, outlet_temperature: 320, wall_temperature: 350 })).toBe(330);
    expect(had('film_temperature', { temperature: 300, inlet_temperature: 310, outlet_temperature: 320, wall_temperature: 350 })).toBe(325);
    expect(had('temperature_other', { inlet_temperature_other: 300, outlet_temperature_other: 320 })).toBe(310);
  });
});

describe('the list', () => {
  test('every key is a quantity of the study file, its property at a temperature, or named here', () => {
    const own = ['thermal_diffusivity', 'tip_speed', 'volume_per_area'];
    for (const { gives } of derivedRules) {
      const name = gives.split('@')[0]!;
      expect(quantityOf(name) !== undefined || own.includes(name.replace(/_other$/, '')), gives).toBe(true);
    }
  });
  test('says for everything that is no definition whose it is', () => {
    for (const { source, formula } of derivedRules) {
      expect(source).toMatch(/definition|\d{4}|common practice, no source/);
      expect(formula.length).toBeGreaterThan(3);
    }
  });
  test('no rule gives a key from the same quantities twice', () => {
    for (const equipment of ['tube', 'annulus', 'packed-bed', 'packed-column', 'gas-liquid', 'cylinder', 'sphere', 'other']) {
      const seen = derivedRulesFor(equipment).map(({ gives, from }) => `${gives} <- ${from.join()}`);
      expect(new Set(seen).size).toBe(seen.length);
    }
  });
});
