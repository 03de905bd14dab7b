import type { GibbsState } from './gibbs-state.ts';
import { region1 } from './region-1.ts';
import { region2 } from './region-2.ts';
import { boundary23, saturationPressure, saturationTemperature } from './saturation.ts';

/** How far beyond saturation, in K, the basic equations are carried: R7-97 calls them reasonable in metastable states close to saturation. */
export const METASTABLE = 5;

/** K by which liquid at T, p is hotter than saturation: above zero it may boil. Pressures below the triple point boil everywhere. */
export const superheat = (T: number, p: number): number =>
  T - (p < 611.213 ? 273.15 : saturationTemperature(p) || Number.POSITIVE_INFINITY);

export const isLiquidRange = (T: number, p: number): boolean => T >= 273.15 && T <= 623.15 && p > 0 && p <= 100e6;
export const isLiquid = (T: number, p: number): boolean => isLiquidRange(T, p) && superheat(T, p) <= METASTABLE;

export const isSteamRange = (T: number, p: number): boolean =>
  T >= 273.15 &&
  T <= 1073.15 &&
  p > 0 &&
  p <= 100e6 &&
  (T <= 623.15 || p <= boundary23(T)) &&
  (T > 623.15 || p <= saturationPressure(623.15));
export const isSteam = (T: number, p: number): boolean => isSteamRange(T, p) && (T > 623.15 || superheat(T, p) >= -METASTABLE);

/** Liquid water at T in K and p in Pa, or undefined where there is none. */
export const liquid = (T: number, p: number): GibbsState | undefined => (isLiquid(T, p) ? region1(T, p) : undefined);

/** Steam at T in K and p in Pa, or undefined where there is none. */
export const steam = (T: number, p: number): GibbsState | undefined => (isSteam(T, p) ? region2(T, p) : undefined);

/** Enthalpy of evaporation in J/kg at T in K (273.15 to 623.15 K; NaN elsewhere), from regions 1 and 2 on the saturation line. */
export function latentHeat(T: number): number {
  if (!(T >= 273.15 && T <= 623.15)) return Number.NaN;
  const p = saturationPressure(T);
  return region2(T, p).enthalpy - region1(T, p).enthalpy;
}
