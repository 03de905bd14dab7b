import { describe, expect, test } from 'vitest';
import { C, runRoute } from './run-route.ts';

const along = {
  mass_flow: 0.1,
  heat_capacity: 4180,
  inlet_temperature: C(20),
  outlet_temperature: C(40),
  wall_temperature: C(80),
  diameter: 0.02,
  length: 2,
};

describe('against a wall', () => {
  test('water from 20 to 40 degC by a wall at 80 degC in 20 mm x 2 m', () => {
    // recomputed by hand: 8360 W / (0.12566 m2 * 20/ln(60/40) K) = 1348.7
    const { of, codes } = runRoute('log-mean-difference', { given: along });
    expect(of('heat_transfer_coefficient')).toBeCloseTo((0.1 * 4180 * Math.log(60 / 40)) / (Math.PI * 0.02 * 2), 8);
    expect(Math.round(of('heat_transfer_coefficient'))).toBe(1349);
    expect(codes).toEqual([]);
  });

  test('air over a bank of tubes: back from its outlet temperature to the coefficient it was computed with', () => {
    // Incropera, DeWitt, Bergman & Lavine, 6th ed., Example 7.7: h 135.6, 56 tubes of 16.4 mm, T_s 70, T_i 15, T_o 25.5 degC, q' 19.4 kW/m (book, from memory)
    const { of } = runRoute('log-mean-difference', {
      given: {
        mass_flow: 1.217 * 6 * 8 * 0.0313,
        heat_capacity: 1007,
        inlet_temperature: C(15),
        outlet_temperature: C(25.5),
        wall_temperature: C(70),
        area: 56 * Math.PI * 0.0164,
      },
    });
    expect(of('heat_duty') / 1000).toBeCloseTo(19.4, 0);
    expect(Math.abs(of('heat_transfer_coefficient') / 135.6 - 1)).toBeLessThan(0.01);
  });

  test('cooling against a colder wall gives the same as heating', () => {
    const given = { ...along, inlet_temperature: C(140), outlet_temperature: C(120) };
    expect(runRoute('log-mean-difference', { given }).of('heat_transfer_coefficient')).toBeCloseTo(1348.7, 0);
  });

  test.each([
    ['through the wall temperature', { outlet_temperature: C(81) }, 'temperatures-cross'],
    ['away from the wall', { outlet_temperature: C(15) }, 'away-from-wall'],
  ])('a stream that goes %s is refused', (_, change, code) => {
    const { refused, codes } = runRoute('log-mean-difference', { given: { ...along, ...change } });
    expect(refused).toBe(true);
    expect(codes).toContain(code);
  });

  test('an outlet that has nearly reached the wall is told', () => {
    const { codes, refused } = runRoute('log-mean-difference', { given: { ...along, outlet_temperature: C(78) } });
    expect(codes).toContain('near-equilibrium');
    expect(refused).toBe(false);
  });

  test('a duty known to 20 % is told', () => {
    const { codes, texts } = runRoute('log-mean-difference', { given: along, stated: { outlet_temperature: { si: 4 } } });
    expect(codes).toContain('uncertain-driving-force');
    expect(texts.join(' ')).toContain('20 %');
  });
});

// 0.2 kg/s of water warmed from 20 to 35 degC by 0.15 kg/s going from 70 to 50 degC: 12 540 W on both sides
const streams = {
  mass_flow: 0.2,
  heat_capacity: 4180,
  inlet_temperature: C(20),
  outlet_temperature: C(35),
  mass_flow_other: 0.15,
  heat_capacity_other: 4180,
  inlet_temperature_other: C(70),
  outlet_temperature_other: C(50),
  area: 0.5,
};

describe('two streams', () => {
  const U = (settings: Record<string, string>, given: Record<string, number> = streams): number =>
    runRoute('log-mean-difference', { settings, given }).of('overall_coefficient');
  const lm = (a: number, b: number): number => (a - b) / Math.log(a / b);

  test('counter and parallel flow by the definition of the log mean', () => {
    expect(U({ arrangement: 'counter' })).toBeCloseTo(12540 / (0.5 * lm(30, 35)), 8);
    expect(U({ arrangement: 'parallel' })).toBeCloseTo(12540 / (0.5 * lm(50, 15)), 8);
  });

  test('contents that are well stirred are at their outlet temperature', () => {
    expect(U({ arrangement: 'well-stirred' })).toBeCloseTo(12540 / (0.5 * lm(35, 15)), 8);
  });

  test('unmixed cross flow: correction factor as charted', () => {
    // Incropera et al., 6th ed., Example 11.4 restated as F: P = (125-35)/(300-35) = 0.34, R = (300-100)/(125-35) = 2.22; chart F about 0.87 (from memory)
    const given = {
      ...streams,
      inlet_temperature: C(35),
      outlet_temperature: C(125),
      inlet_temperature_other: C(300),
      outlet_temperature_other: C(100),
      mass_flow: 1,
      heat_capacity: 4197,
      mass_flow_other: 1,
      heat_capacity_other: (4197 * 90) / 200,
      area: 1,
    };
    const F = U({ arrangement: 'counter' }, given) / U({ arrangement: 'cross' }, given);
    expect(Math.abs(F - 0.87)).toBeLessThan(0.01);
  });

  test('equal differences at both ends: the log mean is the arithmetic one', () => {
    expect(U({ arrangement: 'counter' }, { ...streams, outlet_temperature_other: C(55), mass_flow_other: 0.2 })).toBeCloseTo(
      12540 / (0.5 * 35),
      8,
    );
  });

  test('the duty may be that of either stream or their mean, the imbalance is kept', () => {
    const given = { ...streams, mass_flow_other: 0.16 };
    const own = runRoute('log-mean-difference', { settings: { arrangement: 'counter', duty: 'own' }, given });
    const other = runRoute('log-mean-difference', { settings: { arrangement: 'counter', duty: 'other' }, given });
    const mean = runRoute('log-mean-difference', { settings: { arrangement: 'counter' }, given });
    expect(own.of('heat_duty')).toBeCloseTo(12540, 8);
    expect(other.of('heat_duty')).toBeCloseTo(13376, 8);
    expect(mean.of('heat_duty')).toBeCloseTo(12958, 8);
    expect(own.of('imbalance')).toBeCloseTo((12540 - 13376) / 12958, 10);
    expect(mean.codes).toEqual(['imbalance']);
    expect(mean.refused).toBe(false);
  });

  test('the weighted duty leans to the stream that is known better', () => {
    // u_own = 1 % of flow, u_other = 3 %: weights by inverse variance 1/125.4^2 and 1/(0.03*13376)^2
    const stated = { mass_flow: { share: 0.01 }, mass_flow_other: { share: 0.03 } };
    const given = { ...streams, mass_flow_other: 0.16 };
    const { of } = runRoute('log-mean-difference', { settings: { arrangement: 'counter', duty: 'weighted' }, given, stated });
    const [p, q] = [1 / 125.4 ** 2, 1 / (0.03 * 13376) ** 2];
    expect(of('heat_duty')).toBeCloseTo((p * 12540 + q * 13376) / (p + q), 6);
  });

  test('a volume flow known in its own unit is weighed through the density', () => {
    const { mass_flow: _, ...rest } = { ...streams, mass_flow_other: 0.16, volume_flow: 2e-4, density: 1000 };
    const stated = { volume_flow: { si: 2e-6 }, mass_flow_other: { share: 0.03 } };
    const { of } = runRoute('log-mean-difference', { settings: { arrangement: 'counter', duty: 'weighted' }, given: rest, stated });
    const [p, q] = [1 / 125.4 ** 2, 1 / (0.03 * 13376) ** 2];
    expect(of('heat_duty')).toBeCloseTo((p * 12540 + q * 13376) / (p + q), 6);
  });

  test('weighted without any stated uncertainty is the mean, and says so', () => {
    const { of, assumes } = runRoute('log-mean-difference', {
      settings: { arrangement: 'counter', duty: 'weighted' },
      given: { ...streams, mass_flow_other: 0.16 },
    });
    expect(of('heat_duty')).toBeCloseTo(12958, 8);
    expect(assumes.join(' ')).toContain('count equally');
  });

  describe('the heat balance against its own uncertainty', () => {
    const settings = { arrangement: 'counter' };
    // imbalance 6.45 %
    const given = { ...streams, mass_flow_other: 0.16 };
    const withFlowsAt = (share: number, more: Record<string, number> = {}) =>
      runRoute('log-mean-difference', {
        settings,
        given: { ...given, ...more },
        stated: { mass_flow: { share }, mass_flow_other: { share } },
      });

    test('within 2 u: nothing to say', () => expect(withFlowsAt(0.03).codes).toEqual([]));
    test('beyond 2 u: a note', () => {
      const { codes, refused } = withFlowsAt(0.015);
      expect(codes).toEqual(['imbalance']);
      expect(refused).toBe(false);
    });
    test('beyond 4 u: refused', () => expect(withFlowsAt(0.01).refused).toBe(true));
    test('beyond 4 u, but a loss is stated: a note', () => {
      const { codes, refused } = withFlowsAt(0.01, { heat_loss: 1 });
      expect(codes).toEqual(['imbalance']);
      expect(refused).toBe(false);
    });
    test('none stated: a note, refused only beyond balance', () => {
      expect(runRoute('log-mean-difference', { settings, given }).codes).toEqual(['imbalance']);
      expect(runRoute('log-mean-difference', { settings: { ...settings, balance: '5 %' }, given }).refused).toBe(true);
      expect(runRoute('log-mean-difference', { settings, given: { ...streams, mass_flow_other: 0.2 } }).refused).toBe(true);
    });
  });

  test('a loss of the outer stream closes the balance', () => {
    const { of } = runRoute('log-mean-difference', {
      settings: { arrangement: 'counter' },
      given: { ...streams, mass_flow_other: 0.16, heat_loss: 836 },
    });
    expect(of('imbalance')).toBeCloseTo(0, 12);
    expect(of('heat_duty')).toBeCloseTo(12540, 8);
  });

  test('own duty alone needs no flow of the second stream, and says that the balance is not tested', () => {
    const { mass_flow_other: _, ...given } = streams;
    const { of, assumes, codes } = runRoute('log-mean-difference', { settings: { arrangement: 'counter', duty: 'own' }, given });
    expect(of('overall_coefficient')).toBeCloseTo(12540 / (0.5 * lm(30, 35)), 8);
    expect(assumes.join(' ')).toContain('not tested');
    expect(codes).toEqual([]);
  });

  test.each([
    ['streams swapped', { inlet_temperature_other: C(10), outlet_temperature_other: C(5) }],
    ['cold stream warmer than the hot one', { outlet_temperature: C(72) }],
  ])('%s: refused', (_, change) => {
    expect(runRoute('log-mean-difference', { settings: { arrangement: 'counter' }, given: { ...streams, ...change } }).refused).toBe(true);
  });
});
