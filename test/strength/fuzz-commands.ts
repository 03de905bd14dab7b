import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import fc from 'fast-check';
import { goodStudy, goodTrials } from '../dist/broken.ts';
import { targets } from './fuzz-targets.ts';
import { oddStudy } from './odd-study.ts';
import { pilotlaw } from './spawned.ts';

export interface Commanded {
  readonly studies: number;
  readonly done: number;
  readonly refused: number;
  /** What must not be: exit 1, a stack, a study of which nothing is told. */
  readonly faults: readonly string[];
}

interface Thrown {
  readonly study: string | Uint8Array;
  readonly trials: string | Uint8Array;
  readonly workbook: boolean;
}

const inputsOf = (name: string): fc.Arbitrary<string | Uint8Array> => targets.find((one) => one.name === name)!.inputs;

const lawsIn = (law: string | Uint8Array): string => goodStudy.replace('Nu = C * Re^a * Pr^0.4', JSON.stringify(String(law)));
const unitIn = (unit: string | Uint8Array): string => goodStudy.replace('unit: kg/s', `unit: ${JSON.stringify(String(unit))}`);

/** A study folder in which one thing is broken, or all is sound in form and odd in what it says. */
const thrown: fc.Arbitrary<Thrown> = fc.oneof(
  { weight: 1, arbitrary: inputsOf('study file').map((study) => ({ study, trials: goodTrials, workbook: false })) },
  { weight: 1, arbitrary: inputsOf('law text').map((law) => ({ study: lawsIn(law), trials: goodTrials, workbook: false })) },
  { weight: 1, arbitrary: inputsOf('units and amounts').map((unit) => ({ study: unitIn(unit), trials: goodTrials, workbook: false })) },
  { weight: 1, arbitrary: inputsOf('text table').map((trials) => ({ study: goodStudy, trials, workbook: false })) },
  {
    weight: 1,
    arbitrary: inputsOf('workbook').map((trials) => ({ study: goodStudy.replace('trials.csv', 'trials.xlsx'), trials, workbook: true })),
  },
  { weight: 5, arbitrary: oddStudy.map((odd) => ({ ...odd, workbook: false })) },
);

/** Runs folders of bent studies through the built program, `atOnce` in one command; none may end as a defect of ours. */
export async function fuzzCommands(studies: number, seed: number, atOnce: number): Promise<Commanded> {
  const all = fc.sample(thrown, { numRuns: studies, seed });
  const faults: string[] = [];
  let done = 0;
  for (let from = 0; from < all.length; from += atOnce) {
    const root = mkdtempSync(join(tmpdir(), 'pilotlaw-fuzz-'));
    try {
      const some = all.slice(from, from + atOnce);
      for (const [k, one] of some.entries()) write(join(root, `s${k}`), one);
      const { exit, out, err } = await pilotlaw(['run', root, '--json', '--out', join(root, 'results')]);
      const lines = out.split('\n').filter((line) => line !== '');
      done += lines.length;
      if (exit === 1 || exit === null || /This is a defect|\n\s+at .*:\d+:\d+/u.test(err))
        faults.push(`exit ${exit}: ${err.slice(Math.max(0, err.search(/This is a defect|\n\s+at /u))).slice(0, 2000)}`);
      for (let k = 0; k < some.length; k += 1)
        if (!`${out}${err}`.includes(join(root, `s${k}`, '/'))) faults.push(`nothing is told of study ${from + k}`);
    } finally {
      rmSync(root, { recursive: true, force: true });
    }
  }
  return { studies, done, refused: studies - done, faults };
}

function write(folder: string, { study, trials, workbook }: Thrown): void {
  mkdirSync(folder);
  writeFileSync(join(folder, 'study.yaml'), study);
  writeFileSync(join(folder, workbook ? 'trials.xlsx' : 'trials.csv'), trials);
}
