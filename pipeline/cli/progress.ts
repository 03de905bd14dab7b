import { says } from '../base/says/cli.ts';
import type { Terminal } from './terminal.ts';

const CLEAR = '\r\u001b[K';

/** How far a batch is, on one line of the terminal that is drawn over; silent where standard error is none, and for a single study. */
export class Progress {
  readonly #of: number;
  readonly #terminal: Terminal;
  readonly #now: () => number;
  readonly #since: number;
  #done = 0;
  #failed = 0;
  #free = 0;
  #drawn = false;

  constructor(of: number, terminal: Terminal, now: () => number = () => performance.now()) {
    this.#of = of;
    this.#terminal = terminal;
    this.#now = now;
    this.#since = now();
  }

  /** One more study has ended; `free` ones cost nothing and tell nothing of the time that is left. */
  step(well: boolean, free: boolean): void {
    this.#done += 1;
    if (!well) this.#failed += 1;
    if (free) this.#free += 1;
    if (!this.#terminal.interactive || this.#of === 1 || this.#done === this.#of) return;
    this.#drawn = true;
    this.#terminal.err(`${CLEAR}${says.progress(this.#done, this.#of, this.#failed, this.#left())}`);
  }

  /** Takes the line away, so that something else may be written. */
  clear(): void {
    if (this.#drawn) this.#terminal.err(CLEAR);
    this.#drawn = false;
  }

  #left(): string | undefined {
    const paid = this.#done - this.#free;
    return paid === 0 ? undefined : duration(((this.#now() - this.#since) / paid) * (this.#of - this.#done));
  }
}

/** Milliseconds as one would say them: 40 s, 3 min, 2 h 10 min. */
export function duration(ms: number): string {
  const s = Math.ceil(ms / 1000);
  if (s < 90) return `${s} s`;
  const min = Math.round(s / 60);
  return min < 90 ? `${min} min` : `${Math.floor(min / 60)} h ${min % 60} min`;
}
