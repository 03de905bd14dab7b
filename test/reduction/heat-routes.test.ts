import { describe, expect, test } from 'vitest';
import { crossFlowEffectiveness, crossFlowUnits } from '../../pipeline/reduction/exchange/cross-flow.ts';
import { routes } from '../../pipeline/reduction/routes.ts';
import curves from './fixtures/curves.json' with { type: 'json' };
import streams from './fixtures/streams.json' with { type: 'json' };
import vessels from './fixtures/vessels.json' with { type: 'json' };
import { C, runRoute } from './run-route.ts';

describe('cross flow', () => {
  test.each(streams.crossflow)('effectiveness at N $N, R $R against a march over a grid', ({ N, R, effectiveness }) => {
    expect(Math.abs(crossFlowEffectiveness(N, R) - effectiveness)).toBeLessThan(2e-7);
  });

  test.each(streams.crossflow)('N $N comes back from the effectiveness at R $R', ({ N, R }) => {
    expect(crossFlowUnits(crossFlowEffectiveness(N, R), R)).toBeCloseTo(N, 10);
  });

  test('with one stream at constant temperature it is 1 - exp(-N)', () => {
    expect(crossFlowEffectiveness(1.3, 0)).toBeCloseTo(1 - Math.exp(-1.3), 14);
    expect(crossFlowEffectiveness(1.3, 1e-9)).toBeCloseTo(1 - Math.exp(-1.3), 8);
  });
});

describe('series-resistance', () => {
  const chained = { arrangement: 'counter', ...Object.fromEntries([['then', 'series-resistance']]) };
  const tube = {
    overall_coefficient: 1000,
    other_side_coefficient: 5000,
    fouling_resistance: 1e-4,
    diameter: 0.02,
    outer_diameter: 0.025,
    wall_conductivity: 16,
  };

  test('inside coefficient of a 20/25 mm tube', () => {
    // recomputed by hand: 1.25/(1e-3 - 2e-4 - 1e-4 - 0.025 ln 1.25/32) = 2377.9
    const { of, codes } = runRoute('series-resistance', { given: tube });
    expect(Math.round(of('heat_transfer_coefficient'))).toBe(2378);
    expect(codes).toEqual([]);
  });

  test('and back: from the inside to the outside coefficient', () => {
    const { of } = runRoute('series-resistance', { settings: { side: 'outside' }, given: { ...tube, other_side_coefficient: 2377.9 } });
    expect(of('heat_transfer_coefficient')).toBeCloseTo(5000, -1);
  });

  test('condenser tube: 1/U of a thin wall', () => {
    // Incropera et al., 6th ed., Example 11.5: h_i 7552, h_o 11 000, thin wall: U 4478 W/(m2 K) (from memory)
    const { of } = runRoute('series-resistance', { given: { overall_coefficient: 4478, other_side_coefficient: 11_000 } });
    expect(Math.abs(of('heat_transfer_coefficient') - 7552)).toBeLessThan(2);
  });

  test('a flat wall by thickness over conductivity, in a vessel whatever diameter is given', () => {
    const { of } = runRoute('series-resistance', {
      given: { ...tube, wall_thickness: 0.005 },
      context: { equipment: 'vessel' },
    });
    expect(of('heat_transfer_coefficient')).toBeCloseTo(1 / (1e-3 - 2e-4 - 1e-4 - 0.005 / 16), 6);
  });

  test('a wanted resistance below 30 % is told, one below zero refused', () => {
    expect(runRoute('series-resistance', { given: { ...tube, other_side_coefficient: 2000 } }).codes).toEqual(['small-resistance']);
    expect(runRoute('series-resistance', { given: { ...tube, other_side_coefficient: 1200 } }).refused).toBe(true);
  });

  test('in an annulus the own side is outside and the bore is that of the other stream', () => {
    const { diameter, ...rest } = tube;
    const { of } = runRoute('series-resistance', {
      given: { ...rest, diameter: 0.04, diameter_other: diameter, other_side_coefficient: 2377.9 },
      context: { equipment: 'annulus' },
    });
    expect(of('heat_transfer_coefficient')).toBeCloseTo(5000, -1);
  });

  test('as the second step of two streams: U on the outer area, then h, and the wall temperature between', () => {
    const given = {
      mass_flow: 0.2,
      heat_capacity: 4180,
      inlet_temperature: C(20),
      outlet_temperature: C(35),
      mass_flow_other: 0.15,
      heat_capacity_other: 4180,
      inlet_temperature_other: C(70),
      outlet_temperature_other: C(50),
      length: 6,
      diameter: 0.02,
      outer_diameter: 0.025,
      wall_conductivity: 16,
      other_side_coefficient: 5000,
    };
    const { of, assumes } = runRoute('log-mean-difference', {
      settings: chained,
      given,
      context: { equipment: 'tube' },
      also: ['wall_temperature'],
    });
    const U = of('overall_coefficient');
    const h = of('heat_transfer_coefficient');
    expect(U).toBeCloseTo(12540 / (Math.PI * 0.025 * 6 * (5 / Math.log(35 / 30))), 8);
    expect(1 / U).toBeCloseTo(1 / 5000 + (0.025 * Math.log(1.25)) / 32 + 1.25 / h, 12);
    // flux on the outer area from the own side's bulk to the wall
    expect((of('wall_temperature') - C(27.5)) * (h / 1.25)).toBeCloseTo(U * (60 - 27.5), 6);
    expect(assumes.join(' ')).toContain('none is taken off');
    expect(routes['log-mean-difference']!.gives(chained)).toBe('heat_transfer_coefficient');
  });
});

describe('heat-rate', () => {
  const surface = { heat_rate: 500, area: 0.1, wall_temperature: C(60), temperature: C(20) };
  const h = (change: Record<string, number>): number =>
    runRoute('heat-rate', { given: { ...surface, ...change } }).of('heat_transfer_coefficient');

  test('rate over area and difference, loss taken off', () => {
    expect(h({})).toBeCloseTo(125, 12);
    expect(h({ heat_loss: 20 })).toBeCloseTo(120, 12);
    expect(h({ loss_conductance: 0.5, ambient_temperature: C(20) })).toBeCloseTo(120, 10);
  });

  test('a stagnant slab, film or wall layer has Nu = 1, a straight profile', () => {
    // Q = lambda A dT/s, the definition of the conductivity
    const [lambda, s] = [0.2, 0.004];
    const { of } = runRoute('heat-rate', {
      given: { ...surface, heat_rate: (lambda * 0.1 * 40) / s, wall_thickness: s, thermal_conductivity: lambda },
      also: ['Nu@layer'],
    });
    expect(of('Nu@layer')).toBeCloseTo(1, 13);
  });

  test('heated cylinder in an air stream, measured', () => {
    // Incropera et al., 6th ed., Example 7.4: 46 W, 15 % lost, 12.7 mm x 94 mm, 128.4 against 26.2 degC: h 102 W/(m2 K) (from memory)
    const { of } = runRoute('heat-rate', {
      given: { heat_rate: 46, heat_loss: 6.9, outer_diameter: 0.0127, length: 0.094, wall_temperature: C(128.4), temperature: C(26.2) },
      context: { equipment: 'cylinder' },
    });
    expect(Math.round(of('heat_transfer_coefficient'))).toBe(102);
  });

  test('radiation of a pipe is what is left of its free convection', () => {
    // Incropera et al., 6th ed., Example 9.4: T_s 438 K, 296 K, D 0.1 m, e 0.85: radiation 441 W/m of 766 (from memory)
    const { of } = runRoute('heat-rate', {
      given: { heat_rate: 766, area: Math.PI * 0.1, wall_temperature: 438, temperature: 296, emissivity: 0.85 },
    });
    expect(Math.abs(of('radiation_loss') - 441)).toBeLessThan(3);
  });

  test('cooling by a colder wall counts by magnitude and says so', () => {
    const { of, codes } = runRoute('heat-rate', { given: { ...surface, wall_temperature: C(-20) } });
    expect(of('heat_transfer_coefficient')).toBeCloseTo(125, 10);
    expect(codes).toEqual(['heat-against-difference']);
  });

  test('losses that leave nothing, and no difference: refused; large losses and poor differences: told', () => {
    expect(runRoute('heat-rate', { given: { ...surface, heat_loss: 600 } }).refused).toBe(true);
    expect(runRoute('heat-rate', { given: { ...surface, wall_temperature: C(20) } }).refused).toBe(true);
    expect(runRoute('heat-rate', { given: { ...surface, heat_loss: 150 } }).codes).toEqual(['large-loss']);
    const poor = { ...surface, wall_temperature: C(21) };
    expect(runRoute('heat-rate', { given: poor, stated: { wall_temperature: { si: 0.3 } } }).codes).toContain('uncertain-driving-force');
  });
});

describe('vessel-heating', () => {
  const vessel = {
    liquid_volume: 0.06,
    density: 990,
    heat_capacity: 4180,
    area: 1,
    initial_temperature: C(20),
    final_temperature: C(60),
    time: 584.4,
    temperature_other: C(90),
  };

  test('60 L from 20 to 60 degC in 584 s by a jacket at 90 degC: UA 360', () => {
    // recomputed by hand: 248 292 J/K ln(70/30)/584.4 s = 360.0
    const { of } = runRoute('vessel-heating', { given: vessel, also: ['temperature'] });
    expect(of('overall_coefficient')).toBeCloseTo(360, 1);
    // time mean of the exponential, by quadrature of 90 - 70 exp(-rate t)
    const rate = Math.log(70 / 30) / 584.4;
    expect(of('temperature')).toBeCloseTo(C(90 - (70 * (1 - Math.exp(-rate * 584.4))) / (rate * 584.4)), 8);
  });

  test('0.5 kg/s entering at 90 degC: an effective 331 W/K is 360 W/K of UA', () => {
    expect(2090 * (1 - Math.exp(-360 / 2090))).toBeCloseTo(331, 0);
    const { of } = runRoute('vessel-heating', {
      settings: { jacket: 'flowing' },
      given: {
        ...vessel,
        time: (248_292 * Math.log(70 / 30)) / (2090 * (1 - Math.exp(-360 / 2090))),
        inlet_temperature_other: C(90),
        mass_flow_other: 0.5,
        heat_capacity_other: 4180,
      },
    });
    expect(Math.round(of('effective_conductance'))).toBe(331);
    expect(of('overall_coefficient')).toBeCloseTo(360, 8);
  });

  const givenOf = (run: (typeof vessels.cases)[number]): Record<string, number> => ({
    area: 1,
    liquid_volume: 0.06,
    density: 990,
    heat_capacity: 4180,
    equipment_heat_capacity: run.C - 0.06 * 990 * 4180,
    ...(run.flow === undefined
      ? { temperature_other: C(run.Tj) }
      : { inlet_temperature_other: C(run.Tj), mass_flow_other: run.flow, heat_capacity_other: 4180 }),
    ...(run.loss === undefined ? {} : { heat_loss: run.loss }),
    ...(run.G === undefined ? {} : { loss_conductance: run.G, ambient_temperature: C(run.Ta) }),
  });
  const settingsOf = ({ flow }: (typeof vessels.cases)[number]): Record<string, string> => ({
    jacket: flow === undefined ? 'isothermal' : 'flowing',
  });

  test.each(vessels.cases)('UA $UA of an ODE run comes back from its two ends (flow $flow, loss $loss, G $G)', (run) => {
    const { of } = runRoute('vessel-heating', {
      settings: settingsOf(run),
      given: { ...givenOf(run), initial_temperature: C(run.T0), final_temperature: C(run.curve.at(-1)!), time: run.t },
    });
    expect(of('overall_coefficient') / run.UA).toBeCloseTo(1, 9);
  });

  test.each(vessels.cases)('UA $UA comes back from the logged curve (flow $flow, loss $loss, G $G)', (run) => {
    const settings = settingsOf(run);
    const curve = { time: Float64Array.from(run.curve, (_, i) => (i * run.t) / 120), value: Float64Array.from(run.curve, C) };
    const reduced = routes['vessel-heating']!.series!(settings).reduce(curve, () => C(run.Tj));
    if ('refused' in reduced) throw new Error(reduced.refused.text);
    const readings = Object.fromEntries(Object.entries(reduced.readings).map(([key, { value }]) => [key, value]));
    const { of } = runRoute('vessel-heating', { settings, given: { ...givenOf(run), ...readings } });
    // a loss moves the temperature approached: what the slope and curvature of the rate carry over
    expect(Math.abs(of('overall_coefficient') / run.UA - 1)).toBeLessThan(run.loss === undefined && run.G === undefined ? 1e-8 : 0.005);
  });

  test.each([
    ['contents beyond the jacket', { final_temperature: C(95) }],
    ['contents that cool under a hot jacket', { final_temperature: C(15) }],
    ['a loss conductance without ambient temperature', { loss_conductance: 5 }],
  ])('%s: refused', (_, change) => {
    expect(runRoute('vessel-heating', { given: { ...vessel, ...change } }).refused).toBe(true);
  });

  test('a jacket stream that gives up nearly all it could is told', () => {
    const { codes } = runRoute('vessel-heating', {
      settings: { jacket: 'flowing' },
      given: { ...vessel, inlet_temperature_other: C(90), mass_flow_other: 0.1, heat_capacity_other: 4180 },
    });
    expect(codes).toContain('jacket-spent');
  });
});

describe('one exponential from a logged curve', () => {
  const reduce = (run: (typeof curves.relaxation)[number]) => {
    const result = routes['sphere-cooling']!.series!({}).reduce(
      { time: Float64Array.from(run.time), value: Float64Array.from(run.value, C) },
      () => C(run.bath),
    );
    if ('refused' in result) throw new Error(result.refused.text);
    return result;
  };

  test.each(curves.relaxation)('rate and its uncertainty as scipy.optimize.curve_fit finds them (rate $rate)', (run) => {
    const { readings, notes } = reduce(run);
    expect(readings.curve_rate!.value / run.rate).toBeCloseTo(1, 7);
    // independent noise: the widening by correlation is at most what chance makes of it
    expect(readings.curve_rate!.u / run.u).toBeGreaterThan(0.999);
    expect(readings.curve_rate!.u / run.u).toBeLessThan(1.5);
    expect(notes).toEqual([]);
  });

  test('lumped and exact coefficient from the rate; the bath uncertainty reaches it', () => {
    const run = curves.relaxation[0]!;
    const { readings } = reduce(run);
    const given = Object.fromEntries(Object.entries(readings).map(([key, { value }]) => [key, value]));
    const body = { diameter: 0.03, solid_density: 2700, solid_heat_capacity: 900, temperature: C(20) };
    const lumped = runRoute('sphere-cooling', { given: { ...given, ...body } });
    expect(lumped.of('heat_transfer_coefficient')).toBeCloseTo(run.rate * 2700 * 900 * 0.005, 5);
    const warmer = runRoute('sphere-cooling', { given: { ...given, ...body, temperature: C(21) } });
    expect(warmer.of('heat_transfer_coefficient')).toBeGreaterThan(lumped.of('heat_transfer_coefficient') * 1.005);
    const exact = runRoute('sphere-cooling', { given: { ...given, ...body, solid_conductivity: 200 } });
    expect(exact.of('heat_transfer_coefficient') / lumped.of('heat_transfer_coefficient')).toBeGreaterThan(1);
    expect(exact.of('heat_transfer_coefficient') / lumped.of('heat_transfer_coefficient')).toBeLessThan(1.001);
  });

  test("the cannon's curve is not one exponential, and that is told", () => {
    // Rumford 1798, as printed by Bates & Watts 1988, App. A1.2: minutes and degF in surroundings of 60 degF; published rate 0.0094155 per min (130 degF at the start held)
    const minutes = [4, 5, 7, 12, 14, 16, 20, 24, 28, 31, 34, 37.5, 41];
    const fahrenheit = [126, 125, 123, 120, 119, 118, 116, 115, 114, 113, 112, 111, 110];
    const K = (f: number): number => (f - 32) / 1.8 + 273.15;
    const result = routes['sphere-cooling']!.series!({}).reduce(
      { time: Float64Array.from(minutes, (m) => 60 * m), value: Float64Array.from(fahrenheit, K) },
      () => K(60),
    );
    if ('refused' in result) throw new Error(result.refused.text);
    expect(result.notes.map(({ code }) => code)).toEqual(['correlated-residuals']);
    expect(result.readings.curve_rate!.value * 60).toBeGreaterThan(0.006);
    expect(result.readings.curve_rate!.value * 60).toBeLessThan(0.0094155);
  });

  test('a straight line or noise gives no rate', () => {
    const time = Float64Array.from({ length: 50 }, (_, i) => i);
    const series = routes['sphere-cooling']!.series!({});
    expect(series.reduce({ time, value: time.map((t) => 300 + t) }, () => 290)).toHaveProperty('refused');
    expect(series.reduce({ time: time.slice(0, 5), value: time.slice(0, 5) }, () => 290)).toHaveProperty('refused');
  });
});
