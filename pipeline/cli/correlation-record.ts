import type { Correlation } from '../../correlations/correlation.ts';

/** What `pilotlaw correlations --json` prints of one entry. */
export interface CorrelationRecord {
  readonly id: string;
  readonly authors: string;
  readonly year: number;
  readonly title: string;
  readonly family: string;
  readonly gives: string;
  readonly needs: readonly string[];
  readonly limits: readonly string[];
  readonly accuracy: string;
  readonly source: string;
  readonly reads: string;
}

export const correlationRecord = (entry: Correlation): CorrelationRecord => ({
  id: entry.id,
  authors: entry.authors,
  year: entry.year,
  title: entry.title,
  family: entry.family,
  gives: entry.form.response,
  needs: entry.form.groups,
  limits: entry.limits.map(({ says }) => says),
  accuracy: entry.accuracy,
  source: entry.source,
  reads: entry.reads,
});

/** Which entries to show; every given condition must hold. */
export interface Wanted {
  readonly family?: string;
  readonly gives?: string;
  /** Words, all of which stand somewhere in id, authors, title, use or source; case does not matter. */
  readonly search?: string;
}

export function matching(entries: readonly Correlation[], { family, gives, search }: Wanted): readonly Correlation[] {
  const words = (search ?? '')
    .toLowerCase()
    .split(/\s+/)
    .filter((word) => word !== '');
  return entries.filter((entry) => {
    const text = [entry.id, entry.authors, entry.year, entry.title, entry.use, entry.source].join(' ').toLowerCase();
    return (
      (family === undefined || entry.family === family) &&
      (gives === undefined || entry.form.response === gives) &&
      words.every((word) => text.includes(word))
    );
  });
}
