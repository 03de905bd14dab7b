#!/usr/bin/env node
import { EXIT, tell } from './exit.ts';
import { processTerminal } from './terminal.ts';

const terminal = processTerminal();

// A reader that has seen enough (`pilotlaw correlations | head`) is no defect.
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  process.exit(error.code === 'EPIPE' ? EXIT.done : tell(error, terminal));
});
for (const event of ['uncaughtException', 'unhandledRejection'] as const) {
  process.on(event, (error: unknown) => {
    process.exit(tell(error, terminal));
  });
}

const { commandLine } = await import('./command-line.ts');
process.exitCode = await commandLine(process.argv.slice(2), terminal);
