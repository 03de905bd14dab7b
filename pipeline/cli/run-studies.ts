import { resolve } from 'node:path';
import { says } from '../base/says/cli.ts';
import { runStudy } from '../batch/run-study.ts';
import { findStudies } from '../files/find-studies.ts';
import { EXIT, type Exit, tell, together } from './exit.ts';
import { fromHere, resultsFolders } from './results-folders.ts';
import type { Terminal } from './terminal.ts';

/** What `pilotlaw run` was asked for. */
export interface RunRequest {
  readonly studies: readonly string[];
  readonly out?: string;
  readonly jobs?: number;
  readonly seed?: number;
  readonly fresh: boolean;
  readonly quiet: boolean;
  readonly json: boolean;
}

/** Runs every study; one study's failure does not stop the others. */
export async function runStudies(asked: RunRequest, terminal: Terminal): Promise<Exit> {
  const studies = findStudies(asked.studies);
  const folders = resultsFolders(studies, asked.out);
  const exits: Exit[] = [];
  for (const study of studies) exits.push(await runOne(study, folders.get(study), asked, terminal));
  const failed = exits.filter((exit) => exit !== EXIT.done).length;
  if (failed > 0 && exits.length > 1) terminal.err(`${says.failedStudies(failed, exits.length)}\n`);
  return together(exits);
}

async function runOne(study: string, out: string | undefined, { seed, quiet, json }: RunRequest, terminal: Terminal): Promise<Exit> {
  try {
    const summary = await runStudy(fromHere(study), { out, seed });
    if (json) terminal.out(`${JSON.stringify(summary)}\n`);
    else if (!quiet) terminal.out(`${says.done(summary.text, fromHere(resolve(summary.folder)), summary.trials, summary.warnings)}\n`);
    return EXIT.done;
  } catch (error) {
    return tell(error, terminal);
  }
}
