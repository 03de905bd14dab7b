import { says } from '../base/says/cli.ts';
import { type PredictRequest, predictPlant } from '../batch/predict-plant.ts';
import { replaceFile } from '../files/write.ts';
import { casesTable } from '../results/tables.ts';
import { csvOf } from '../results/write-results.ts';
import { EXIT, type Exit } from './exit.ts';
import { fromHere } from './results-folders.ts';
import type { Terminal } from './terminal.ts';

export interface CasesRequest extends PredictRequest {
  readonly out?: string;
  readonly json: boolean;
}

/** Predicts every case: as sentences with notes, as the whole result in JSON, or as a table in a file. */
export function predictCases({ out, json, ...asked }: CasesRequest, terminal: Terminal): Exit {
  const plant = predictPlant(asked);
  if (out !== undefined) {
    replaceFile(out, csvOf(casesTable(plant)));
    if (!json) terminal.out(`${says.tableWritten(plant.cases.length, fromHere(out))}\n`);
  }
  if (json) terminal.out(`${JSON.stringify(plant)}\n`);
  else if (out === undefined) terminal.out(csvOf(casesTable(plant)));
  for (const { text, level } of plant.notes) if (level === 'warning') terminal.err(`${text}\n`);
  return EXIT.done;
}
