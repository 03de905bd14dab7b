import { distance } from 'fastest-levenshtein';

/** The known name most like `name`, if it is like enough to be meant: at most a third of its letters differ, two at least. */
export function nearest(name: string, known: Iterable<string>): string | undefined {
  const limit = Math.max(2, Math.floor(name.length / 3));
  let best: string | undefined;
  let least = limit + 1;
  for (const candidate of known) {
    const d = distance(name.toLowerCase(), candidate.toLowerCase());
    if (d < least) {
      least = d;
      best = candidate;
    }
  }
  return best;
}

/** ` did you mean "rpm"?` or nothing. */
export function didYouMean(name: string, known: Iterable<string>): string {
  const meant = nearest(name, known);
  return meant === undefined ? '' : `; did you mean "${meant}"?`;
}
