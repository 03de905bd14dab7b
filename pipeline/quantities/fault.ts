/** A text that cannot be taken, with the sentence for the user (what was read, what would be right); the caller knows the place. */
export interface Fault {
  readonly fault: true;
  /** Stable, kebab-case. */
  readonly code: string;
  readonly text: string;
}

export const fault = (code: string, text: string): Fault => ({ fault: true, code, text });

export const isFault = (value: object): value is Fault => 'fault' in value;
