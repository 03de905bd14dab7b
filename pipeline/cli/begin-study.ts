import { basename, dirname, join } from 'node:path';
import { InputError } from '../base/input-error.ts';
import { says } from '../base/says/cli.ts';
import { fileExists, readBytes } from '../files/read.ts';
import { replaceFile } from '../files/write.ts';
import { beginStudy as begin } from '../study/begin.ts';
import { caps } from '../trials/caps.ts';
import { guessColumns } from '../trials/guess-columns.ts';
import { readTable } from '../trials/read-table.ts';
import { EXIT, type Exit } from './exit.ts';
import type { Terminal } from './terminal.ts';

/** What `pilotlaw begin` was asked for. */
export interface BeginRequest {
  readonly trials: string;
  readonly sheet?: string;
  readonly force: boolean;
}

/** Writes study.yaml beside the table, guessed from its headers; its open questions are printed. An existing one is only replaced with --force. */
export async function beginStudy({ trials, sheet, force }: BeginRequest, terminal: Terminal): Promise<Exit> {
  const target = join(dirname(trials), 'study.yaml');
  if (!force && fileExists(target)) throw new InputError([{ code: 'study-exists', text: says.studyExists(), place: { file: target } }]);
  const table = readTable(readBytes(trials, { most: caps.tableBytes }), {
    file: basename(trials),
    ...(sheet === undefined ? {} : { sheet }),
  });
  const { yaml, questions } = begin(guessColumns(table));
  replaceFile(target, yaml);
  terminal.out(`${says.begun(target, questions.length)}\n`);
  for (const question of questions) terminal.out(`  ${question}\n`);
  return EXIT.done;
}
