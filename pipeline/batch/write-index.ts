import { join, relative, resolve, sep } from 'node:path';
import { type IndexEntry, indexMark, indexPage } from '../../reports/index-page.ts';
import { InputError } from '../base/input-error.ts';
import { formatMessage } from '../base/message.ts';
import * as says from '../base/says/batch.ts';
import { fileExists, readBytes } from '../files/read.ts';
import { makeFolder, replaceFile } from '../files/write.ts';
import type { Outcome, Task } from './outcome.ts';

const MOST = 1 << 26;

/** Writes `index.html` of a batch into a folder and returns its path. A page there that is not ours is left alone: refused (exit 2). */
export function writeIndex(folder: string, tasks: readonly Task[], outcomes: readonly Outcome[]): string {
  const path = join(folder, 'index.html');
  if (fileExists(path) && !readBytes(path, { most: MOST }).includes(indexMark))
    throw new InputError([{ code: 'not-our-index', text: says.indexNotOurs(), place: { file: path } }]);
  makeFolder(folder);
  replaceFile(path, indexPage(tasks.map((task, k) => entryOf(task, outcomes[k]!, folder))));
  return path;
}

function entryOf({ study }: Task, outcome: Outcome, folder: string): IndexEntry {
  if (outcome.kind === 'refused') return { study, faults: outcome.messages.map(formatMessage) };
  if (outcome.kind === 'defect') return { study, faults: [says.defectOfOurs(outcome.text)] };
  const { title, text, trials, scatter, warnings, best_published, verdict } = outcome.summary;
  const report = relative(resolve(folder), join(resolve(outcome.summary.folder), 'report.html'))
    .split(sep)
    .map(encodeURIComponent)
    .join('/');
  const done = { title, report, text, used: trials.used, read: trials.read, scatter, warnings, bestPublished: best_published, verdict };
  return { study, faults: [], done };
}
