import type { Note } from '../base/message.ts';
import * as says from '../base/says/breaks.ts';
import type { BreakSearch } from './break-search.ts';

/** A break that chance alone matches less often than this is a warning. */
const LEVEL = 0.05;

/** One note for each look at a Re: a break, none, or why there was no look. */
export const breakNotes = (searches: readonly BreakSearch[]): readonly Note[] =>
  searches.map((one): Note => {
    const about = { section: 'evidence', about: one.law } as const;
    if (!one.looked) return { ...about, level: 'note', code: 'break-not-looked', text: says.notLooked(one.law, one.group, one.why) };
    return one.chance < LEVEL
      ? { ...about, level: 'warning', code: 'break-in-range', text: says.found(one) }
      : { ...about, level: 'note', code: 'no-break', text: says.notFound(one) };
  });
