import type { Given } from './arguments.ts';
import type { Exit } from './exit.ts';
import type { Terminal } from './terminal.ts';

/** One command: what it takes, and what it does. What it needs beyond that it imports when it runs, so that `--help` stays fast. */
export interface Command {
  readonly name: string;
  readonly about: string;
  readonly takes: readonly Argument[];
  readonly options: readonly Option[];
  readonly run: (given: Given, terminal: Terminal) => Promise<Exit>;
}

interface Argument {
  /** As the help writes it: `STUDY`; in lower case the key under which it is given. */
  readonly name: string;
  readonly about: string;
  readonly many?: boolean;
  readonly optional?: boolean;
}

interface Option {
  readonly name: string;
  /** What follows it: `DIR`; left out for a flag. */
  readonly value?: string;
  readonly about: string;
}

/** `pilotlaw run STUDY... [options]` */
export function usage({ name, takes, options }: Command): string {
  const words = takes.map((argument) => `${argument.optional ? `[${argument.name}]` : argument.name}${argument.many ? '...' : ''}`);
  return ['pilotlaw', name, ...words, ...(options.length === 0 ? [] : ['[options]'])].join(' ');
}
