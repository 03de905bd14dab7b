import { InputError } from '../base/input-error.ts';
import type { Message } from '../base/message.ts';
import type { Place } from '../base/place.ts';

/** Collects what is wrong with a study, so that everything is told at once. */
export class Faults {
  readonly #messages: Message[] = [];

  add(code: string, text: string, place: Place): void {
    this.#messages.push({ code, text, place });
  }

  get any(): boolean {
    return this.#messages.length > 0;
  }

  /** Throws one InputError (exit 2) with all faults in the order of the file, where there are any. */
  throwIfAny(): void {
    if (!this.any) return;
    const position = ({ place }: Message): number => (place?.line ?? 0) * 1e6 + (place?.column ?? 0);
    throw new InputError([...this.#messages].sort((a, b) => position(a) - position(b)));
  }
}
