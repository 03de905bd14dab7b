import { resolve } from 'node:path';
import { says } from '../base/says/cli.ts';
import { standing } from '../batch/cache.ts';
import type { Outcome, Task } from '../batch/outcome.ts';
import { namedFolder } from '../batch/results-folder.ts';
import { runAll } from '../batch/run-all.ts';
import { SEED } from '../batch/seed.ts';
import { findStudies } from '../files/find-studies.ts';
import { EXIT, type Exit, tell, together } from './exit.ts';
import { fromHere, refuseShared, resultsFolders } from './results-folders.ts';
import type { Terminal } from './terminal.ts';
import { exitOf, Told } from './told.ts';

/** What `pilotlaw run` was asked for. */
export interface RunRequest {
  readonly studies: readonly string[];
  readonly out?: string;
  readonly jobs: number;
  readonly seed?: number;
  readonly fresh: boolean;
  readonly quiet: boolean;
  readonly json: boolean;
}

/** Runs every study that has changed, several at a time; one study's failure does not stop the others. Told in the order of the studies. */
export async function runStudies(asked: RunRequest, terminal: Terminal): Promise<Exit> {
  const tasks = await tasksOf(asked);
  const outcomes = await outcomesOf(tasks, asked, new Told(tasks.length, asked, terminal));
  const exits = outcomes.map(exitOf);
  const failed = exits.filter((exit) => exit !== EXIT.done).length;
  if (failed > 0 && exits.length > 1) terminal.err(`${says.failedStudies(failed, exits.length)}\n`);
  const exit = together(exits);
  if (asked.out === undefined || tasks.length === 1) return exit;
  const overview = await index(asked.out, tasks, outcomes, asked, terminal);
  return exit === EXIT.done ? overview : exit;
}

/** What has not changed at once, then the rest as its threads end it. */
async function outcomesOf(tasks: readonly FolderTask[], { fresh, seed, jobs }: RunRequest, told: Told): Promise<readonly Outcome[]> {
  const outcomes: Outcome[] = [];
  const changed: number[] = [];
  const take = (k: number, outcome: Outcome): void => {
    outcomes[k] = outcome;
    told.add(k, outcome);
  };
  for (const [k, { study, folder }] of tasks.entries()) {
    const summary = fresh || folder === undefined ? undefined : standing(study, folder, seed ?? SEED);
    if (summary === undefined) changed.push(k);
    else take(k, { kind: 'unchanged', summary });
  }
  const work = changed.map((k) => tasks[k]!);
  await runAll(work, { jobs }, (k, outcome) => take(changed[k]!, outcome));
  return outcomes;
}

async function index(
  out: string,
  tasks: readonly Task[],
  outcomes: readonly Outcome[],
  asked: RunRequest,
  terminal: Terminal,
): Promise<Exit> {
  try {
    const { writeIndex } = await import('../batch/write-index.ts');
    const path = writeIndex(out, tasks, outcomes);
    if (!asked.json && !asked.quiet) terminal.out(`${says.indexWritten(fromHere(resolve(path)))}\n`);
    return EXIT.done;
  } catch (error) {
    return tell(error, terminal);
  }
}

interface FolderTask extends Task {
  /** Where its results stand, where that is known before the study is read. */
  readonly folder?: string;
}

async function tasksOf({ studies: given, out, seed }: RunRequest): Promise<readonly FolderTask[]> {
  const studies = findStudies(given);
  const folders = resultsFolders(studies, out);
  const tasks: FolderTask[] = [];
  for (const study of studies) {
    const own = folders.get(study);
    const folder = own ?? (await namedFolder(study));
    tasks.push({
      study: fromHere(study),
      ...(own === undefined ? {} : { out: own }),
      ...(folder === undefined ? {} : { folder }),
      ...(seed === undefined ? {} : { seed }),
      ...(out === undefined || studies.length === 1 ? {} : { index: resolve(out) }),
    });
  }
  refuseShared(tasks);
  return tasks;
}
