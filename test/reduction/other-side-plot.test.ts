import { describe, expect, test } from 'vitest';
import { evaluate as value } from '../../pipeline/algebra/evaluate.ts';
import { otherSideLaw } from '../../pipeline/reduction/other-side-plot.ts';
import { runRoute } from './run-route.ts';

const form = {
  response: 'Nu',
  tree: {
    op: '*',
    of: [
      { op: 'constant', name: 'C' },
      {
        op: '^',
        of: [
          { op: 'group', name: 'Re' },
          { op: 'constant', name: 'a' },
        ],
      },
    ],
  },
  groups: ['Re'],
  constants: ['C', 'a'],
} as const;
const law = { form, groups: { Nu: 'Nu@pipe', Re: 'Re@pipe' } };

describe('a law of one side as a law of U', () => {
  test('1/U = R + 1/h by hand', () => {
    const { form: whole, groups, rules, resistances } = otherSideLaw(law, 1)!;
    expect(resistances).toEqual(['other_side_resistance']);
    expect(groups).toEqual({ U: 'overall_coefficient', Re: 'Re@pipe', side_conductance: 'side_conductance@pipe' });
    const scale = rules[0]!.of(0.6, 0.02, 1.25);
    expect(scale).toBeCloseTo((0.6 / 0.02) * 0.8, 12);
    const U = value(whole.tree, { Re: 2e4, side_conductance: scale }, { C: 0.02, a: 0.8, other_side_resistance: 3e-4 });
    const h = 0.02 * 2e4 ** 0.8 * (0.6 / 0.02);
    expect(1 / U).toBeCloseTo(3e-4 + 1.25 / h, 14);
  });

  test('one resistance for each campaign, chosen by its number', () => {
    const { form: whole, groups, resistances } = otherSideLaw(law, 3, { side: 'outside' })!;
    expect(resistances).toEqual([1, 2, 3].map((k) => `other_side_resistance_${k}`));
    expect(groups.campaign_number).toBe('campaign_number');
    const at = (campaign: number): number =>
      1 /
      value(
        whole.tree,
        { Re: 1e4, side_conductance: 30, campaign_number: campaign },
        { C: 0.02, a: 0.8, other_side_resistance_1: 1e-4, other_side_resistance_2: 2e-4, other_side_resistance_3: 4e-4 },
      );
    expect(at(2) - at(1)).toBeCloseTo(1e-4, 14);
    expect(at(3) - at(2)).toBeCloseTo(2e-4, 14);
  });

  test('film temperature, a law of h itself, and responses that have no side', () => {
    expect(otherSideLaw({ form, groups: { ...law.groups, Nu: 'Nu@pipe,film' } }, 1)!.rules[0]!.from).toEqual([
      'thermal_conductivity@film',
      'characteristic_length@pipe',
      'area_ratio',
    ]);
    expect(otherSideLaw({ form, groups: { ...law.groups, Nu: 'heat_transfer_coefficient' } }, 1)!.rules[0]!.of(1.25)).toBeCloseTo(0.8, 14);
    expect(otherSideLaw({ form, groups: { ...law.groups, Nu: 'Sh@pipe' } }, 1)).toBeUndefined();
    expect(otherSideLaw({ form, groups: { ...law.groups, Nu: 'j_heat' } }, 1)).toBeUndefined();
  });
});

test('the route gives U, by duty or as given, and the ratio of areas', () => {
  const { of } = runRoute('other-side-plot', {
    given: { overall_coefficient: 900, diameter: 0.02, outer_diameter: 0.025 },
    also: ['area_ratio'],
  });
  expect(of('overall_coefficient')).toBe(900);
  expect(of('area_ratio')).toBeCloseTo(1.25, 12);
});
