import { InputError } from '../base/input-error.ts';
import type { Message } from '../base/message.ts';
import type { StudySummary } from './summary.ts';

/** One study of a batch; everything in it can be sent to another thread. */
export interface Task {
  /** The study file as the user would name it. */
  readonly study: string;
  /** Folder of the results; what the study file says where left out. */
  readonly out?: string;
  readonly seed?: number;
  /** Folder of the batch's index, where there is one. */
  readonly index?: string;
}

/** What became of it. */
export type Outcome =
  | { readonly kind: 'done'; readonly summary: StudySummary }
  | { readonly kind: 'unchanged'; readonly summary: StudySummary }
  | { readonly kind: 'refused'; readonly messages: readonly Message[]; readonly exit: 2 | 3 }
  | { readonly kind: 'defect'; readonly text: string; readonly stack?: string };

/** A thrown value as an outcome: what a user can act on, or a defect of ours. */
export function outcomeOf(error: unknown): Outcome {
  if (error instanceof InputError) return { kind: 'refused', messages: error.messages, exit: error.exit };
  return error instanceof Error
    ? { kind: 'defect', text: error.message, ...(error.stack === undefined ? {} : { stack: error.stack }) }
    : { kind: 'defect', text: String(error) };
}
