import { formatPlace, type Place } from './place.ts';

/** One thing the user must be told. `code` is stable and kebab-case; `text` comes from base/says. */
export interface Message {
  readonly code: string;
  readonly text: string;
  readonly place?: Place;
}

export type Section = 'answer' | 'audit' | 'plant' | 'evidence' | 'next-trials' | 'trials' | 'method' | 'cautions';

/** A message for the reader of the report, told where it stands. `warning` also counts in the list of warnings. */
export interface Note extends Message {
  readonly section: Section;
  readonly level: 'note' | 'warning';
  /** The law, correlation, plant case or trial it belongs to, where it belongs to one. */
  readonly about?: string;
}

/** Any stage may refuse a trial; the ledger is the fold of all refusals, made once, at the end. */
export interface Refusal extends Message {
  readonly trial: string;
}

export function formatMessage({ text, place }: Message): string {
  return place === undefined ? text : `${formatPlace(place)}: ${text}`;
}
