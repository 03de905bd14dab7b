import { commandLine } from '../../pipeline/cli/command-line.ts';
import type { Terminal } from '../../pipeline/cli/terminal.ts';

/** A terminal that keeps what is said. */
export function captured(debug = false): Terminal & { readonly output: () => string; readonly messages: () => string } {
  const out: string[] = [];
  const err: string[] = [];
  return {
    out: (text) => void out.push(text),
    err: (text) => void err.push(text),
    interactive: false,
    debug,
    output: () => out.join(''),
    messages: () => err.join(''),
  };
}

/** Exit code, standard output and standard error of the program for these words. */
export async function pilotlaw(...words: readonly string[]) {
  const terminal = captured();
  const exit = await commandLine(words, terminal);
  return { exit, out: terminal.output(), err: terminal.messages() };
}
