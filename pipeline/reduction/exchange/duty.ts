import { sizeOf } from '../../rules/evaluate.ts';
import type { Key } from '../../rules/rule.ts';
import type { RouteContext } from '../route.ts';

const streams = { own: '', other: '_other' } as const;
export type StreamName = keyof typeof streams;

/** Keys of a stream's flow, heat capacity, inlet and outlet temperature. */
export const streamKeys = (stream: StreamName): readonly [Key, Key, Key, Key] => {
  const end = streams[stream];
  return [`mass_flow${end}`, `heat_capacity${end}`, `inlet_temperature${end}`, `outlet_temperature${end}`];
};

/** Heat taken up by a stream, W, negative where it gives heat. */
export const gain = (flow: number, c: number, inlet: number, outlet: number): number => flow * c * (outlet - inlet);

/** Variance of a stream's gain by what is stated of its flow and temperatures. */
export interface GainVariance {
  /** NaN where nothing is stated. */
  readonly of: (flow: number, c: number, inlet: number, outlet: number, density: number) => number;
  /** A volume flow's uncertainty in its own unit is carried over through the density; otherwise `of` does not look at it. */
  readonly needsDensity: boolean;
}

export function gainVariance(stream: StreamName, { stated }: RouteContext): GainVariance {
  const [flowKey, , inlet, outlet] = streamKeys(stream);
  const byMass = stated(flowKey);
  const byVolume = byMass === undefined ? stated(`volume_flow${streams[stream]}`) : undefined;
  const temperatures = [stated(inlet), stated(outlet)];
  if ([byMass, byVolume, ...temperatures].every((one) => one === undefined)) return { of: () => Number.NaN, needsDensity: false };
  const shareOf = (flow: number, rho: number): number =>
    byMass !== undefined ? sizeOf(byMass, flow) / flow : byVolume !== undefined ? sizeOf(byVolume, flow / rho) / (flow / rho) : 0;
  return {
    of: (flow, c, a, b, rho) => {
      const [uIn, uOut] = temperatures.map((spread, k) => (spread === undefined ? 0 : sizeOf(spread, k === 0 ? a : b)));
      return (gain(flow, c, a, b) * shareOf(flow, rho)) ** 2 + (flow * c) ** 2 * (uIn! ** 2 + uOut! ** 2);
    },
    needsDensity: byVolume !== undefined && 'si' in byVolume,
  };
}
