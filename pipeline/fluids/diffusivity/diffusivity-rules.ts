import { says } from '../../base/says/fluids.ts';
import type { Check, Key, Rule } from '../../rules/rule.ts';
import { type Conditions, pressureKey, type Stream } from '../property-rules.ts';
import { fuller, haydukLaudie, stokesEinstein, wilkeChang } from './estimators.ts';

/** What the solute moves in. */
export type Solvent = 'water' | 'liquid' | 'gas';

/** Film and wall values follow the film and wall temperature. */
const STATES = [
  { suffix: '', temperature: undefined },
  { suffix: '@film', temperature: 'film_temperature' },
  { suffix: '@wall', temperature: 'wall_temperature' },
] as const;

/**
 * Rules that estimate `diffusivity` (and `@film`, `@wall`, `_other`) from quantities of the solute, which the study gives under these names:
 * `solute_molar_volume` m^3/mol at its normal boiling point, `solvent_molar_mass` kg/mol, `association_factor` (2.6 water, 1.9 methanol, 1.5 ethanol, 1 others),
 * `solute_radius` m; in gases `molar_mass` and `carrier_molar_mass` kg/mol, `diffusion_volume` and `carrier_diffusion_volume` (Fuller's sums).
 * A measured `diffusivity` always goes before them.
 */
export function diffusivityRules(stream: Stream, solvent: Solvent, at: Conditions): readonly Rule[] {
  const key = (name: Key): Key => (stream === 'own' ? name : `${name}_other`);
  return STATES.flatMap(({ suffix, temperature }) => {
    const T = temperature === undefined ? (at.temperature ?? key('temperature')) : key(temperature);
    const gives = `${key('diffusivity')}${suffix}`;
    const viscosity = `${key('viscosity')}${suffix}`;
    if (solvent === 'gas') return [fullerRule(gives, T, pressureKey(stream), key)];
    const rules = [wilkeChangRule(gives, T, viscosity, key)];
    if (solvent === 'water') rules.push(haydukLaudieRule(gives, viscosity, key));
    return [...rules, stokesEinsteinRule(gives, T, viscosity, key)];
  });
}

type Named = (name: Key) => Key;

const positive = (gives: Key, from: readonly Key[]): Check => ({
  code: 'no-diffusivity',
  from,
  holds: (...x) => x.every((value) => value > 0 && value < Number.POSITIVE_INFINITY),
  otherwise: 'refuse',
  says: (...x) => says.needsPositive(gives, from, x),
});

function wilkeChangRule(gives: Key, T: Key, viscosity: Key, key: Named): Rule {
  const from = [T, viscosity, key('solute_molar_volume'), key('solvent_molar_mass'), key('association_factor')];
  return {
    gives,
    from,
    of: (t, mu, v, m, phi) => wilkeChang(t!, mu!, v!, m!, phi!),
    formula: 'D = 7.4e-8 (phi M)^0.5 T/(mu V^0.6), in cm^2/s with cP, g/mol and cm^3/mol',
    source: 'Wilke and Chang 1955, doi 10.1002/aic.690010222',
    accuracy: { source: 'property: diffusivity (Wilke and Chang 1955)', share: 0.1 },
    checks: [positive(gives, from), ...dilute(gives, key)],
    assumes: says.diluteSolute,
  };
}

function haydukLaudieRule(gives: Key, viscosity: Key, key: Named): Rule {
  const from = [viscosity, key('solute_molar_volume')];
  return {
    gives,
    from,
    of: (mu, v) => haydukLaudie(mu!, v!),
    formula: 'D = 13.26e-5/(mu^1.14 V^0.589), in cm^2/s with cP and cm^3/mol',
    source: 'Hayduk and Laudie 1974, doi 10.1002/aic.690200329',
    accuracy: { source: 'property: diffusivity (Hayduk and Laudie 1974)', share: 0.06 },
    checks: [positive(gives, from), ...dilute(gives, key)],
    assumes: says.diluteSolute,
  };
}

function stokesEinsteinRule(gives: Key, T: Key, viscosity: Key, key: Named): Rule {
  const from = [T, viscosity, key('solute_radius')];
  return {
    gives,
    from,
    of: (t, mu, r) => stokesEinstein(t!, mu!, r!),
    formula: 'D = k T/(6 pi mu r)',
    source: 'Einstein 1905, doi 10.1002/andp.19053220806',
    // Common practice, no source: for molecules well above the solvent's size.
    accuracy: { source: 'property: diffusivity (Stokes and Einstein)', share: 0.2 },
    checks: [
      positive(gives, from),
      {
        code: 'small-for-stokes-einstein',
        from: [key('solute_radius')],
        holds: (r) => r! >= 0.5e-9,
        otherwise: 'warning',
        says: (r) => says.smallSolute(gives, r!),
      },
    ],
    assumes: says.largeSolute,
  };
}

function fullerRule(gives: Key, T: Key, p: Key, key: Named): Rule {
  const from = [T, p, key('molar_mass'), key('carrier_molar_mass'), key('diffusion_volume'), key('carrier_diffusion_volume')];
  return {
    gives,
    from,
    of: (t, pressure, ma, mb, va, vb) => fuller(t!, pressure!, ma!, mb!, va!, vb!),
    formula: 'D = 0.00143 T^1.75/(p M^0.5 (V_A^(1/3) + V_B^(1/3))^2), in cm^2/s with bar and g/mol, M = 2/(1/M_A + 1/M_B)',
    source: 'Fuller, Schettler and Giddings 1966, doi 10.1021/ie50677a007; Fuller, Ensley, Giddings 1969',
    accuracy: { source: 'property: diffusivity (Fuller, Schettler and Giddings 1966)', share: 0.05 },
    checks: [
      positive(gives, from),
      {
        code: 'high-pressure-diffusivity',
        from: [p],
        holds: (pressure) => pressure! <= 1e6,
        otherwise: 'warning',
        says: (pressure) => says.denseDiffusion(gives, pressure!),
      },
    ],
  };
}

/** Molar volumes that liquid estimators were fitted to: about 20 to 500 cm^3/mol (common practice, no source). */
const dilute = (gives: Key, key: Named): readonly Check[] => [
  {
    code: 'unusual-molar-volume',
    from: [key('solute_molar_volume')],
    holds: (v) => v! >= 14e-6 && v! <= 500e-6,
    otherwise: 'warning',
    says: (v) => says.unusualVolume(gives, v!),
  },
];
