import { basename, dirname, join, relative, resolve, sep } from 'node:path';
import { analyse, type RunFacts } from '../analyse.ts';
import { InputError } from '../base/input-error.ts';
import type { Place } from '../base/place.ts';
import { version } from '../base/version.ts';
import { decodeText } from '../files/decode.ts';
import { sha256, sha256OfFile } from '../files/hash.ts';
import { newPathInside, pathInside } from '../files/inside.ts';
import { fileExists, readBytes, readPieces } from '../files/read.ts';
import { makeFolder, replaceFile } from '../files/write.ts';
import { explain } from '../plan/explain.ts';
import { makePlan } from '../plan/make-plan.ts';
import { ownCorrelations } from '../plan/own-correlations.ts';
import type { Plan } from '../plan/plan.ts';
import type { StudyResult } from '../results/study-result.ts';
import { resultFiles, writeResults } from '../results/write-results.ts';
import { parseOwnCorrelations } from '../study/own-correlations.ts';
import { parseStudy } from '../study/parse-study.ts';
import type { Placed, Study } from '../study/study.ts';
import { caps } from '../trials/caps.ts';
import { type LogSource, readLogHead } from '../trials/log-stream.ts';
import { readTable } from '../trials/read-table.ts';
import { readTrials } from '../trials/read-trials.ts';
import type { Table } from '../trials/table.ts';
import { SEED } from './seed.ts';
import { steadyWindowsOf } from './steady-log.ts';
import { curvesOf } from './study-curves.ts';
import { type StudySummary, summaryOf } from './summary.ts';

export interface RunOptions {
  /** Folder of the results; what the study file says where left out. */
  readonly out?: string;
  readonly seed?: number;
  /** Folder of the batch's index, where there is one: shared assets stand there. */
  readonly index?: string;
}

const MOST_STUDY = 1 << 20;

/** A study read from disk with all it names. */
interface Loaded {
  readonly plan: Plan;
  readonly trials: Table;
  readonly files: RunFacts['files'];
  /** Opens a log that the study or its table names; its hash joins the others. */
  readonly open: (file: string, place: Place) => LogSource;
}

/** Reads the study file and everything it names; throws one InputError with all faults. Nothing of the path typed goes into the plan. */
async function loadStudy(path: string): Promise<Loaded> {
  const folder = dirname(resolve(path));
  const file = basename(path);
  const files: { file: string; sha256: string }[] = [];
  const bytesOf = (name: string, path: string, place?: Placed<string>['place'], most: number = caps.tableBytes): Buffer => {
    const bytes = readBytes(path, { most, name, ...(place === undefined ? {} : { place }) });
    files.push({ file: name, sha256: sha256(bytes) });
    return bytes;
  };
  const inside = ({ is, place }: Placed<string>): Buffer => bytesOf(is, pathInside(folder, is, place), place);
  const open = (name: string, place: Place): LogSource => {
    const path = pathInside(folder, name, place);
    if (!files.some((one) => one.file === name))
      files.push({ file: name, sha256: sha256OfFile(path, { most: caps.logBytes, name, place }) });
    return { file: name, pieces: readPieces(path, { most: caps.logBytes, name, place }) };
  };
  const study = parseStudy(studyText(bytesOf(file, path, undefined, MOST_STUDY), file), file);
  const trials =
    study.trials.steady !== undefined
      ? readLogHead(open(study.trials.file.is, study.trials.file.place), columnsAsked(study))
      : readTable(inside(study.trials.file), {
          file: study.trials.file.is,
          ...(study.trials.sheet === undefined ? {} : { sheet: study.trials.sheet.is }),
          expects: columnsAsked(study),
        });
  const tables = new Map<string, Table>();
  for (const entry of [study.fluid?.own, study.fluid?.other, study.plant?.fluid?.own, study.plant?.fluid?.other]) {
    const table = entry?.is.table;
    if (table !== undefined && !tables.has(table.is)) tables.set(table.is, readTable(inside(table), { file: table.is }));
  }
  const plant =
    study.plant?.file === undefined
      ? undefined
      : readTable(inside(study.plant.file), {
          file: study.plant.file.is,
          ...(study.plant.sheet === undefined ? {} : { sheet: study.plant.sheet.is }),
        });
  const { catalogue } = study.audit === undefined ? { catalogue: [] } : await import('../../correlations/catalogue.ts');
  const own =
    study.audit?.own === undefined
      ? []
      : ownCorrelations(parseOwnCorrelations(decodeText(inside(study.audit.own), study.audit.own.is), study.audit.own.is), study);
  return { plan: makePlan(study, { trials, tables, catalogue, own, ...(plant === undefined ? {} : { plant }) }), trials, files, open };
}

/** A study file that is no text is a wrong study file (exit 2), not data that cannot be used. */
function studyText(bytes: Buffer, file: string): string {
  try {
    return decodeText(bytes, file);
  } catch (error) {
    throw error instanceof InputError ? new InputError(error.messages) : error;
  }
}

const columnsAsked = (study: Study): readonly string[] =>
  [
    study.trials.trial,
    study.trials.campaign,
    study.trials.setting,
    study.trials.order,
    study.trials.steady?.time,
    ['uncertainty', 'equal'].includes(study.fit.weights.is) ? undefined : study.fit.weights,
    ...Object.values(study.quantities).map(({ is }) => is.column),
    ...Object.values(study.groups).map(({ is }) => is.column),
  ].flatMap((one) => (one === undefined ? [] : [one.is]));

/** One study to its result, nothing written. */
export const computeStudy = async (file: string, seed = SEED, proposals?: number): Promise<StudyResult> =>
  (await computed(file, seed, proposals)).result;

const computed = (file: string, seed = SEED, proposals?: number): Promise<{ readonly plan: Plan; readonly result: StudyResult }> =>
  withPlacesFrom(file, async () => {
    const { plan, trials, files, open } = await loadStudy(file);
    const { steady } = plan.study.trials;
    const read =
      steady === undefined
        ? await curvesOf(plan, trials, readTrials(trials, plan.study.trials, plan.columns), open)
        : await steadyWindowsOf(plan, steady, open);
    const facts = { version, node: process.versions.node, seed, files, ...(proposals === undefined ? {} : { proposals }) };
    return { plan, result: analyse(plan, read, facts) };
  });

/** The main job: one study file to its results on disk. */
export async function runStudy(file: string, { out, seed, index }: RunOptions = {}): Promise<StudySummary> {
  const { plan, result } = await computed(file, seed);
  const { is, place } = plan.study.output.folder;
  const folder = out ?? newPathInside(dirname(resolve(file)), is, place);
  const script = plan.study.output.assets === 'shared' ? await shareScript(index ?? folder, folder) : undefined;
  const { renderReport } = await import('../../reports/page.ts');
  const { html, charts } = await renderReport(result, script);
  const written = new Map(resultFiles(result));
  written.set('report.html', html);
  for (const [name, spec] of Object.entries(charts)) written.set(`charts/${name}.vl.json`, `${JSON.stringify(spec, null, 2)}\n`);
  const summary = summaryOf(result);
  writeResults(folder, written, result, summary);
  return { study: file, folder, ...summary };
}

const MOST_SCRIPT = 1 << 24;

/** Puts the script that reports share beside the index (or the report, where there is none) and returns how a report names it. */
async function shareScript(home: string, folder: string): Promise<string> {
  const { SHARED_SCRIPT, sharedScript } = await import('../../reports/dress.ts');
  const path = join(resolve(home), SHARED_SCRIPT);
  const text = sharedScript();
  makeFolder(home);
  if (!(fileExists(path) && readBytes(path, { most: MOST_SCRIPT, name: SHARED_SCRIPT }).toString('utf8') === text)) replaceFile(path, text);
  return relative(resolve(folder), path).split(sep).map(encodeURIComponent).join('/');
}

/** What is given, what is derived from what, what is missing; computes nothing. */
export const checkStudy = (file: string): Promise<string> => withPlacesFrom(file, async () => explain((await loadStudy(file)).plan, file));

/** Inside a study files are named from its folder; a fault is told with the path that was typed, so that it can be found among several studies. */
async function withPlacesFrom<T>(typed: string, work: () => Promise<T>): Promise<T> {
  try {
    return await work();
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    const messages = error.messages.map((message) => ({
      ...message,
      place: message.place === undefined ? { file: typed } : { ...message.place, file: join(dirname(typed), message.place.file) },
    }));
    throw new InputError(messages, error.exit);
  }
}
