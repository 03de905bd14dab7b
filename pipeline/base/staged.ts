import type { Note, Refusal } from './message.ts';

/** What every stage returns: its value, what the reader must be told of it, and the trials it refuses. */
export interface Staged<T> {
  readonly value: T;
  readonly notes: readonly Note[];
  readonly refused: readonly Refusal[];
}
