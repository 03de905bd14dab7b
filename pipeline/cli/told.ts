import { resolve } from 'node:path';
import { InputError } from '../base/input-error.ts';
import { says } from '../base/says/cli.ts';
import type { Outcome } from '../batch/outcome.ts';
import { EXIT, type Exit, tell } from './exit.ts';
import { Progress } from './progress.ts';
import { fromHere } from './results-folders.ts';
import type { Terminal } from './terminal.ts';

interface Manner {
  readonly json: boolean;
  readonly quiet: boolean;
}

/** The outcomes of a batch as they are told: in the order of the studies, whatever the order in which they end, beside the progress. */
export class Told {
  readonly #manner: Manner;
  readonly #terminal: Terminal;
  readonly #progress: Progress;
  readonly #waiting = new Map<number, Outcome>();
  #next = 0;

  constructor(of: number, manner: Manner, terminal: Terminal) {
    this.#manner = manner;
    this.#terminal = terminal;
    this.#progress = new Progress(of, manner.quiet ? { ...terminal, interactive: false } : terminal);
  }

  add(k: number, outcome: Outcome): void {
    this.#waiting.set(k, outcome);
    this.#progress.clear();
    for (let next = this.#waiting.get(this.#next); next !== undefined; next = this.#waiting.get(this.#next)) {
      this.#waiting.delete(this.#next);
      this.#next += 1;
      tellOutcome(next, this.#manner, this.#terminal);
    }
    this.#progress.step(exitOf(outcome) === EXIT.done, outcome.kind === 'unchanged');
  }
}

export function exitOf(outcome: Outcome): Exit {
  if (outcome.kind === 'refused') return outcome.exit;
  return outcome.kind === 'defect' ? EXIT.defect : EXIT.done;
}

/** One study's line on standard output, or its faults on standard error. */
function tellOutcome(outcome: Outcome, { json, quiet }: Manner, terminal: Terminal): void {
  if (outcome.kind === 'refused') tell(new InputError(outcome.messages, outcome.exit), terminal);
  else if (outcome.kind === 'defect') tell(Object.assign(new Error(outcome.text), { stack: outcome.stack }), terminal);
  else if (json) terminal.out(`${JSON.stringify(outcome.summary)}\n`);
  else if (!quiet) terminal.out(`${lineOf(outcome)}\n`);
}

function lineOf({ kind, summary: { text, folder, trials, warnings } }: Extract<Outcome, { readonly summary: object }>): string {
  const shown = fromHere(resolve(folder));
  return kind === 'unchanged' ? says.unchanged(text, shown) : says.done(text, shown, trials, warnings);
}
