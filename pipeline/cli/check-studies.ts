import { checkStudy } from '../batch/run-study.ts';
import { findStudies } from '../files/find-studies.ts';
import { EXIT, type Exit, tell, together } from './exit.ts';
import { fromHere } from './results-folders.ts';
import type { Terminal } from './terminal.ts';

/** Explains every study, or tells its faults; computes nothing. */
export async function checkStudies(given: readonly string[], terminal: Terminal): Promise<Exit> {
  const exits: Exit[] = [];
  for (const study of findStudies(given)) exits.push(await checkOne(study, terminal));
  return together(exits);
}

async function checkOne(study: string, terminal: Terminal): Promise<Exit> {
  try {
    terminal.out(`${(await checkStudy(fromHere(study))).trimEnd()}\n`);
    return EXIT.done;
  } catch (error) {
    return tell(error, terminal);
  }
}
