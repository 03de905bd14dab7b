import { formatMessage, type Message } from './message.ts';

/** 2: the command line or a study file is wrong. 3: data that cannot be used. */
export type ExitCode = 2 | 3;

/** The one error class that a user can act on; anything else that is thrown is a defect of ours (exit 1). */
export class InputError extends Error {
  readonly messages: readonly Message[];
  readonly exit: ExitCode;

  constructor(messages: readonly Message[], exit: ExitCode = 2) {
    super(messages.map(formatMessage).join('\n'));
    this.name = 'InputError';
    this.messages = messages;
    this.exit = exit;
  }
}
