import type { Fit } from '../../../pipeline/regression/fit.ts';
import type { NextTrialsResult, PlantCase, PlantResult } from '../../../pipeline/scale-up/plant-result.ts';

/** Made-up plant cases, the second and every further one beyond the trials. */
export function madePlant(fit: Fit, count: number, name: (plain: string) => string): PlantResult {
  const cases = Array.from({ length: count }, (_, k) => madeCase(fit, k, name));
  const [first] = cases;
  return {
    coefficient: { key: 'heat_transfer_coefficient', symbol: 'h', unit: 'W/(m^2 K)' },
    cases,
    criteria: [
      {
        of: name('vessel of 2 m'),
        rows: [
          {
            criterion: 'equal power per volume',
            rotationSpeed: 1.4,
            power: 3100,
            powerPerVolume: 700,
            tipSpeed: 2.9,
            coefficient: 2400,
            lower: 1900,
            upper: 3000,
          },
          {
            criterion: 'equal tip speed',
            rotationSpeed: 0.9,
            power: 850,
            powerPerVolume: 190,
            tipSpeed: 1.9,
            coefficient: 1700,
            lower: 1300,
            upper: 2200,
          },
        ],
      },
    ],
    notes: [],
    says: `At case ${first!.name}: h = 4200 W/(m² K) (3500 to 5000); it lies inside the trials.`,
  };
}

function madeCase(fit: Fit, k: number, name: (plain: string) => string): PlantCase {
  const Re = fit.ranges.Re![1] * (k === 0 ? 0.8 : 2 + k);
  const h = 4200 * (1 + 0.5 * k);
  const by = (who: string, f: number, kind: 'fitted law' | 'published with rig factor', inRange: boolean) => ({
    by: who,
    kind,
    coefficient: h * f,
    lawLower: h * f * 0.93,
    lawUpper: h * f * 1.08,
    lower: h * f * 0.83,
    upper: k === 3 ? Number.POSITIVE_INFINITY : h * f * 1.2,
    degreesOfFreedom: 24.3,
    shares: [
      { source: name('volume_flow'), share: 0.6 },
      { source: 'scatter', share: 0.4 },
    ],
    inRange,
  });
  return {
    name: name(`P${k + 1}`),
    values: { diameter: 0.05 },
    groups: { Re, Pr: 4.2 },
    predictions: [by(fit.name, 1, 'fitted law', k === 0), by('Invented A 1900', 1.12, 'published with rig factor', true)],
    spread: 1.12,
    wider: 'interval',
    design: { coefficient: h * 0.86, side: 'low', confidence: 0.95 },
    target: { find: 'area', unit: 'm^2', nominal: 1.98, design: 2.31, formula: 'A = Q/(h dT)' },
    overall: {
      nominal: 1400,
      lower: 1250,
      upper: 1550,
      resistances: [
        { name: 'inside', value: 2.4e-4 },
        { name: 'wall', value: 6e-5 },
        { name: name('fouling'), value: 2e-4 },
      ],
    },
    extrapolation: [
      {
        of: 'Re',
        kind: 'group',
        unit: '1',
        value: Re,
        from: fit.ranges.Re![0],
        to: fit.ranges.Re![1],
        beyond: Math.max(1, Re / fit.ranges.Re![1]),
      },
      { of: 'diameter', kind: 'raw', unit: 'm', value: 0.05, from: 0.0158, to: 0.0158, beyond: 3.16 },
    ],
    floors: [{ says: 'laminar flow, fully developed', value: 120 }],
    verdict: k === 0 ? 'inside the trials' : name('extrapolation in Re'),
  };
}

/** Made-up proposals. */
export const madeNextTrials = (name: (plain: string) => string): NextTrialsResult => ({
  proposals: [1, 2, 3].map((k) => ({
    settings: { volume_flow: { value: 12 * k, unit: 'L/min' }, [name('temperature')]: { value: 20 + 10 * k, unit: 'degC' } },
    campaign: name('a new one'),
    groups: { Re: 2e4 * k, Pr: 6 - k },
    gain: 0.3 / k,
  })),
  cases: [1, 2].map((k) => ({ name: name(`P${k}`), now: 0.38, after: 0.22, floor: 0.11 })),
  notes: [],
  says: 'Three further trials would narrow case P2 from ±38 % to ±22 %.',
});
