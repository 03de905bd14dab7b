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

/**
 * Variance of a stream's gain by what is stated of its flow and temperatures; NaN where nothing is stated. A volume flow's uncertainty in its own unit is carried over
 * as a share through the density, which is passed last.
 */
export function gainVariance(
  stream: StreamName,
  { stated }: RouteContext,
): (flow: number, c: number, a: number, b: number, rho: number) => number {
  const [flowKey, , inlet, outlet] = streamKeys(stream);
  const byMass = stated(flowKey);
  const byVolume = stated(`volume_flow${streams[stream]}`);
  const temperatures = [stated(inlet), stated(outlet)];
  if (byMass === undefined && byVolume === undefined && temperatures.every((one) => one === undefined)) return () => Number.NaN;
  return (flow, c, a, b, rho) => {
    const share =
      byMass !== undefined ? sizeOf(byMass, flow) / flow : byVolume !== undefined ? sizeOf(byVolume, flow / rho) / (flow / rho) : 0;
    const uT = temperatures.map((spread, k) => (spread === undefined ? 0 : sizeOf(spread, k === 0 ? a : b)));
    return (gain(flow, c, a, b) * share) ** 2 + (flow * c) ** 2 * (uT[0]! ** 2 + uT[1]! ** 2);
  };
}
