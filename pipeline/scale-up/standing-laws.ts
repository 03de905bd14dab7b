import type { Predictable } from '../regression/predict-ln.ts';

/** The chosen law first, then the other accepted ones in their order. */
export function standingLaws<T extends Predictable>(fits: readonly T[], accepted: readonly string[], chosen: string): readonly T[] {
  const named = (name: string): readonly T[] => fits.filter((fit) => fit.name === name);
  return [...named(chosen), ...fits.filter(({ name }) => name !== chosen && accepted.includes(name))];
}
