import { says } from '../base/says/reduction.ts';
import type { Check, Key } from '../rules/rule.ts';

/** A driving difference or duty that is known worse than this share makes a coefficient that is no better. */
const POOR = 0.1;

/** Warns where a difference is known to no better than 10 %. */
export const wellKnown = (key: Key, what: string, unit: string): Check => ({
  code: 'uncertain-driving-force',
  from: [key, `u(${key})`],
  holds: (x, u) => u! <= POOR * Math.abs(x!),
  otherwise: 'warning',
  says: (x, u) => says.uncertainDifference(what, unit, x!, u!),
});

/** Refuses where a difference is zero. */
export const notZero = (key: Key, what: string): Check => ({
  code: 'no-driving-force',
  from: [key],
  holds: (x) => Math.abs(x!) > 0,
  otherwise: 'refuse',
  says: () => says.noDifference(what),
});

/** Warns where so little of the inlet difference is left that the outlet reading decides. */
export const farFromEquilibrium = (inlet: Key, outlet: Key, boundary: Key): Check => ({
  code: 'near-equilibrium',
  from: [inlet, outlet, boundary],
  holds: (a, b, s) => Math.abs((s! - b!) / (s! - a!)) >= 0.05,
  otherwise: 'warning',
  says: (a, b, s) => says.nearEquilibrium((s! - b!) / (s! - a!)),
});
