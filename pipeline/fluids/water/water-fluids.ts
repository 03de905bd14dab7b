import { says } from '../../base/says/fluids.ts';
import type { Fluid, PropertyModel, Range } from '../property-model.ts';
import type { GibbsState } from './gibbs-state.ts';
import { CRITICAL, saturationPressure } from './saturation.ts';
import { waterSurfaceTension } from './surface-tension.ts';
import { conductivityOf, viscosityOf } from './transport.ts';
import { isLiquid, isLiquidRange, isSteam, isSteamRange, latentHeat, liquid, METASTABLE, steam, superheat } from './water-state.ts';

const IF97 = 'IAPWS R7-97(2012), industrial formulation IF97';
const R12 = 'IAPWS R12-08, Formulation 2008 for the viscosity of ordinary water substance';
const R15 = 'IAPWS R15-11, Formulation 2011 for the thermal conductivity of ordinary water substance';
const R1 = 'IAPWS R1-76(2014), surface tension of ordinary water substance';

/** Standard uncertainties: half the expanded figures (k = 2) that the formulations give for the region, taken from memory of the releases' diagrams. */
const SHARES = {
  liquid: { density: 1e-4, heat_capacity: 1e-3, viscosity: 5e-3, thermal_conductivity: 7.5e-3 },
  steam: { density: 5e-4, heat_capacity: 2e-3, viscosity: 1e-2, thermal_conductivity: 1e-2 },
};

const liquidRanges: readonly Range[] = [
  { holds: isLiquidRange, otherwise: 'refuse', says: says.outsideLiquidWater },
  {
    holds: (T, p) => !isLiquidRange(T!, p!) || isLiquid(T!, p!),
    otherwise: 'refuse',
    says: (T, p) => says.boils(T!, p!, superheat(T!, p!)),
  },
  {
    holds: (T, p) => !isLiquid(T!, p!) || superheat(T!, p!) <= 0.1,
    otherwise: 'warning',
    says: (T, p) => says.mayBoil(T!, p!, superheat(T!, p!), METASTABLE),
  },
];

const steamRanges: readonly Range[] = [
  { holds: isSteamRange, otherwise: 'refuse', says: says.outsideSteam },
  {
    holds: (T, p) => !isSteamRange(T!, p!) || isSteam(T!, p!),
    otherwise: 'refuse',
    says: (T, p) => says.condenses(T!, p!, -superheat(T!, p!)),
  },
  {
    holds: (T, p) => !isSteam(T!, p!) || T! > 623.15 || superheat(T!, p!) >= -0.1,
    otherwise: 'warning',
    says: (T, p) => says.mayCondense(T!, p!, -superheat(T!, p!), METASTABLE),
  },
];

type Phase = 'liquid' | 'steam';

function stateProperties(
  phase: Phase,
  at: (T: number, p: number) => GibbsState | undefined,
  ranges: readonly Range[],
): readonly PropertyModel[] {
  const shared = { from: ['temperature', 'pressure'], ranges } as const;
  const region = phase === 'liquid' ? 'region 1' : 'region 2';
  const share = SHARES[phase];
  return [
    {
      ...shared,
      property: 'density',
      of: (T, p) => at(T!, p!)?.density ?? Number.NaN,
      formula: `1/v, v from g(p, T) of ${region}`,
      source: IF97,
      share: share.density,
    },
    {
      ...shared,
      property: 'heat_capacity',
      of: (T, p) => at(T!, p!)?.heatCapacity ?? Number.NaN,
      formula: `-T d2g/dT2, g(p, T) of ${region}`,
      source: IF97,
      share: share.heat_capacity,
    },
    {
      ...shared,
      property: 'thermal_expansion',
      of: (T, p) => at(T!, p!)?.thermalExpansion ?? Number.NaN,
      formula: `(dv/dT)/v, v from g(p, T) of ${region}`,
      source: IF97,
      assumes: says.accuracyNotStated('thermal expansion of water'),
    },
    {
      ...shared,
      property: 'viscosity',
      of: (T, p) => viscosityOf(T!, at(T!, p!)),
      formula: 'mu0(T) mu1(T, rho), without critical term',
      source: R12,
      share: share.viscosity,
    },
    {
      ...shared,
      property: 'thermal_conductivity',
      of: (T, p) => conductivityOf(T!, at(T!, p!)),
      formula: 'lambda0(T) lambda1(T, rho) + lambda2, critical term in its industrial form',
      source: R15,
      share: share.thermal_conductivity,
    },
  ];
}

const onSaturationLine = (to: number): readonly Range[] => [
  { holds: (T) => T! >= 273.15 && T! <= to, otherwise: 'refuse', says: (T) => says.outsideTemperature(T!, 273.15, to) },
];

/** What water has on its saturation line, whatever the phase around it. */
export const saturationProperties: readonly PropertyModel[] = [
  {
    property: 'vapour_pressure',
    from: ['temperature'],
    of: (T) => saturationPressure(T!),
    formula: 'p_s(T) of region 4',
    source: IF97,
    share: 2.5e-4,
    ranges: onSaturationLine(CRITICAL.T),
  },
  {
    property: 'latent_heat',
    from: ['temperature'],
    of: (T) => latentHeat(T!),
    formula: "h''(T) - h'(T) of regions 2 and 1 at p_s(T)",
    source: IF97,
    share: 1e-3,
    ranges: onSaturationLine(623.15),
  },
  {
    property: 'surface_tension',
    from: ['temperature'],
    of: (T) => (T! >= 273.15 && T! <= CRITICAL.T ? waterSurfaceTension(T!) : Number.NaN),
    formula: 'B tau^1.256 (1 + b tau), tau = 1 - T/T_c',
    source: R1,
    share: 2.5e-3,
    ranges: onSaturationLine(CRITICAL.T),
  },
];

export const water: Fluid = {
  name: 'water',
  title: 'water',
  properties: [...stateProperties('liquid', liquid, liquidRanges), ...saturationProperties],
};

export const steamFluid: Fluid = {
  name: 'steam',
  title: 'steam',
  properties: [...stateProperties('steam', steam, steamRanges), ...saturationProperties],
};
