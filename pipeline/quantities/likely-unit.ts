import { distance } from 'fastest-levenshtein';
import { knownSymbols } from './unit-symbols.ts';

const letters = (name: string): string => [...name.toLowerCase()].sort().join('');

/** The symbol that was probably meant: other capitals, letters swapped, or one letter off; undefined where nothing is that near. */
export function likelyUnit(name: string): string | undefined {
  const otherCase = knownSymbols.find((known) => known.toLowerCase() === name.toLowerCase());
  if (otherCase !== undefined) return otherCase;
  if (name.length < 3) return undefined;
  const swapped = knownSymbols.find((known) => letters(known) === letters(name));
  return swapped ?? knownSymbols.find((known) => known.length >= 3 && distance(known.toLowerCase(), name.toLowerCase()) <= 1);
}
