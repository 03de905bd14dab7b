/** One axis of a picture: its title with the unit, its kind, the range shown and where it is labelled. */
export interface Axis {
  readonly title: string;
  readonly log: boolean;
  readonly domain: readonly [number, number];
  readonly ticks: readonly number[];
}

const isShown = (value: number, log: boolean): boolean => Number.isFinite(value) && (!log || value > 0);

/** An axis over all values that can be drawn on it, with a margin as a share of the span; a single value gets room on both sides. */
export function axisOver(values: readonly number[], title: string, log: boolean, margin = 0.04): Axis {
  const shown = values.filter((value) => isShown(value, log)).map((value) => (log ? Math.log10(value) : value));
  let [low, high] = [log ? -1 : 0, log ? 0 : 1];
  if (shown.length > 0) [low, high] = shown.reduce(([a, b], v) => [Math.min(a, v), Math.max(b, v)], [shown[0]!, shown[0]!]);
  const least = log ? 0.04 : Math.max(Math.abs(low), Math.abs(high)) * 0.02 || 1;
  const span = high - low;
  const room = span > least ? span * margin : (least - span) / 2 + span * margin;
  const ends = [low - room, high + room].map((v) => bounded(log ? 10 ** v : v)) as [number, number];
  return axisFrom(ends, title, log);
}

/** An axis over a given range. */
export const axisFrom = (domain: readonly [number, number], title: string, log: boolean): Axis => ({
  title,
  log,
  domain,
  ticks: log ? logTicks(...domain) : linearTicks(...domain),
});

const bounded = (value: number): number => Math.min(Math.max(value, -Number.MAX_VALUE), Number.MAX_VALUE) || Number.MIN_VALUE;

/** Multiples of 1, 2 or 5 times a power of ten, about five of them. */
function linearTicks(low: number, high: number): readonly number[] {
  const rough = high / 5 - low / 5;
  if (!(rough > 0) || !Number.isFinite(rough)) return [low, high];
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = ([1, 2, 5, 10].find((m) => m * power >= rough) ?? 10) * power;
  const first = Math.ceil(low / step);
  const count = Math.floor(high / step) - first;
  return Array.from({ length: Math.max(0, count) + 1 }, (_, k) => Number(((first + k) * step).toPrecision(12))).filter(
    (v) => v >= low && v <= high,
  );
}

/** Powers of ten with as many steps between them as there is room for; linear steps under half a decade. */
function logTicks(low: number, high: number): readonly number[] {
  const [a, b] = [Math.log10(low), Math.log10(high)];
  const decades = b - a;
  if (decades < 0.5) return linearTicks(low, high);
  const every = Math.max(1, Math.ceil(decades / 8));
  const steps = decades > 3 ? [1] : decades > 1.3 ? [1, 2, 5] : [1, 1.5, 2, 3, 4, 5, 7];
  const first = Math.floor(a / every) * every;
  const powers = Array.from({ length: Math.ceil((b - first) / every) + 1 }, (_, k) => first + k * every);
  return powers.flatMap((power) => steps.map((step) => Number(`${step}e${power}`))).filter((v) => v >= low && v <= high);
}

/** Position of a value in pixels from the low end of an axis of a given length. */
export function pixelOf(value: number, { log, domain }: Axis, length: number): number {
  const [low, high] = domain;
  if (log) return (length * (Math.log10(value) - Math.log10(low))) / (Math.log10(high) - Math.log10(low));
  return length * ((value - low) / (high - low));
}

/** A field along an axis, for an encoding. */
export const along = (field: string, { title, log, domain, ticks }: Axis, extent?: number) => ({
  field,
  type: 'quantitative',
  title,
  scale: log ? { type: 'log', nice: false, domain } : { zero: false, nice: false, domain },
  axis: {
    values: ticks,
    format: '.9~g',
    labelExpr: "replace(datum.label, 'e+', 'e')",
    ...(extent === undefined ? {} : { minExtent: extent, maxExtent: extent }),
  },
});

/** Width kept free for the numbers on a vertical axis, so that static and live pictures lie alike. */
export const NUMBERS_EXTENT = 52;
