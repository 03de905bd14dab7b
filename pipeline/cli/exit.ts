import { InputError } from '../base/input-error.ts';
import { formatMessage } from '../base/message.ts';
import { says } from '../base/says/cli.ts';
import type { Terminal } from './terminal.ts';

/** What the caller of the program reads from it. */
export const EXIT = {
  done: 0,
  /** A defect of ours. */
  defect: 1,
  /** The command line or a study file is wrong. */
  wrongInput: 2,
  /** Data that cannot be used. */
  unusableData: 3,
  /** Some of several studies failed; the others' results are written. */
  someFailed: 4,
} as const;

export type Exit = (typeof EXIT)[keyof typeof EXIT];

/** Tells what went wrong on standard error and says with which code to leave. The only place where that is decided for one study or command. */
export function tell(error: unknown, terminal: Terminal): Exit {
  if (error instanceof InputError) {
    for (const message of error.messages) terminal.err(`${formatMessage(message)}\n`);
    return error.exit;
  }
  const text = error instanceof Error ? error.message : String(error);
  terminal.err(`${says.defect(text.split('\n')[0]!)}\n`);
  if (terminal.debug && error instanceof Error) terminal.err(`${error.stack ?? ''}\n`);
  return EXIT.defect;
}

/** One code for several studies. */
export function together(exits: readonly Exit[]): Exit {
  const failed = exits.filter((exit) => exit !== EXIT.done);
  if (failed.length === 0) return EXIT.done;
  if (failed.length < exits.length) return EXIT.someFailed;
  if (failed.includes(EXIT.defect)) return EXIT.defect;
  return failed.includes(EXIT.unusableData) ? EXIT.unusableData : EXIT.wrongInput;
}
