import type { Note } from '../base/message.ts';
import { says } from '../base/says/trials.ts';

/** Rows of a log that were not read, counted by kind, with the place and words of the first of each. */
export class Skipped {
  private readonly kinds = new Map<string, { count: number; readonly line: number; readonly text: string }>();

  add(code: string, line: number, text: string): void {
    const kind = this.kinds.get(code);
    if (kind === undefined) this.kinds.set(code, { count: 1, line, text });
    else kind.count += 1;
  }

  get rows(): number {
    return [...this.kinds.values()].reduce((sum, { count }) => sum + count, 0);
  }

  notes(file: string): readonly Note[] {
    return [...this.kinds].map(([code, { count, line, text }]) => ({
      section: 'trials',
      level: 'warning',
      code,
      text: says.logRowsSkipped(count, text),
      place: { file, line },
    }));
  }
}
