import { says } from '../../base/says/fluids.ts';
import type { Range } from '../property-model.ts';
import { freezingPoint, type SecondaryLiquid } from './secondary-liquids.ts';

/** Ranges of a solution's model over (temperature, mass fraction). */
export interface SolutionRange {
  /** K */
  readonly from: number;
  readonly to: number;
  /** Highest mass fraction of the solute. */
  readonly most: number;
  /** Whose freezing curve bounds it below. */
  readonly freezes?: SecondaryLiquid;
}

export const insideSolution = ({ from, to, most, freezes }: SolutionRange, T: number, w: number): boolean =>
  w >= 0 && w <= most && T >= from && T <= to && (freezes === undefined || T >= freezingPoint(freezes, w));

export function solutionRanges(range: SolutionRange): readonly Range[] {
  const { from, to, most, freezes } = range;
  const warm = (T: number): boolean => T >= from && T <= to;
  const known = (w: number): boolean => w >= 0 && w <= most;
  const ranges: Range[] = [
    { holds: (T) => warm(T!), otherwise: 'refuse', says: (T) => says.outsideTemperature(T!, from, to) },
    { holds: (_, w) => known(w!), otherwise: 'refuse', says: (_, w) => says.noMassFraction(w!, 0, most) },
  ];
  if (freezes !== undefined) {
    ranges.push({
      holds: (T, w) => !(warm(T!) && known(w!)) || T! >= freezingPoint(freezes, w!),
      otherwise: 'refuse',
      says: (T, w) => says.frozen(T!, freezingPoint(freezes, w!), w!),
    });
  }
  return ranges;
}
