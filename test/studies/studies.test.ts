import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { checkStudy, computeStudy } from '../../pipeline/batch/run-study.ts';
import type { StudyResult } from '../../pipeline/results/study-result.ts';

/** What the script beside a study computed without this project; `made_by` and versions stand in the file. */
interface Expected {
  readonly made_by: string;
  readonly versions: Readonly<Record<string, string>>;
  /** Coefficient, columns of the result by name, and steps on the way by key. */
  readonly trials: Readonly<Record<string, Readonly<Record<string, number>>>>;
  readonly law?: {
    readonly values: Readonly<Record<string, number>>;
    readonly standard_errors?: Readonly<Record<string, number>>;
    readonly residual_sd?: number;
  };
  /** Trial -> words of the reason. */
  readonly refused?: Readonly<Record<string, string>>;
  /** Words of notes that must be told. */
  readonly notes?: readonly string[];
  readonly series?: number;
  /** Campaign -> resistance of all else, m^2 K/W. */
  readonly sides?: Readonly<Record<string, number>>;
  /** Relative, by name; `law` for the law, 1e-9 where nothing is said. */
  readonly tolerance?: Readonly<Record<string, number>>;
}

const studies = readdirSync(import.meta.dirname, { withFileTypes: true })
  .filter((one) => one.isDirectory() && existsSync(join(import.meta.dirname, one.name, 'expected.json')))
  .map((one) => one.name);

function numberOf(result: StudyResult, trial: string, name: string): number {
  const row = result.trials.find((one) => one.trial === trial)!;
  if (name === 'coefficient') return row.coefficient;
  const column = result.columns.findIndex((one) => one.name === name);
  return column >= 0 ? row.values[column]! : (row.trace.find((step) => step.key === name)?.value ?? row.raw[name] ?? Number.NaN);
}

const near = (value: number, wanted: number, share: number, what: string): void =>
  expect(Math.abs(value - wanted), `${what}: ${value} beside ${wanted}`).toBeLessThanOrEqual(share * Math.abs(wanted));

describe.each(studies)('%s', (name) => {
  const folder = join(import.meta.dirname, name);
  const read = JSON.parse(readFileSync(join(folder, 'expected.json'), 'utf8')) as Expected;
  const share = (key: string): number => read.tolerance?.[key] ?? 1e-9;
  const result = computeStudy(join(folder, 'study.yaml'));

  test('coefficients and groups are those of the independent computation', async () => {
    const found = await result;
    expect(found.trials.map(({ trial }) => trial)).toEqual(Object.keys(read.trials));
    for (const [trial, wanted] of Object.entries(read.trials))
      for (const [key, value] of Object.entries(wanted)) near(numberOf(found, trial, key), value, share(key), `${trial} ${key}`);
  });

  test('the law is', async () => {
    const found = await result;
    const fit = found.fits.find((one) => one.name === found.chosen)!;
    for (const [key, value] of Object.entries(read.law?.values ?? {})) near(fit.values[key]!, value, share('law'), key);
    for (const [key, value] of Object.entries(read.law?.standard_errors ?? {}))
      near(fit.parameters.find((one) => one.name === key)!.standardErrorRandom, value, 10 * share('law'), `standard error of ${key}`);
    if (read.law?.residual_sd !== undefined)
      near(fit.statistics.residualSd, read.law.residual_sd, 10 * share('law'), 'residual standard deviation');
  });

  test('both sides are', async () => {
    const { sides } = await result;
    expect(sides?.others.map(({ campaign }) => campaign) ?? []).toEqual(Object.keys(read.sides ?? {}));
    for (const { campaign, resistance, lower, upper } of sides?.others ?? []) {
      near(resistance, read.sides![campaign]!, share('law'), campaign);
      expect(lower < resistance && resistance < upper).toBe(true);
    }
  });

  test('rows, refusals, curves and notes are as told', async () => {
    const { ledger, notes, series, trials, study } = await result;
    expect(study.invented).toBe(true);
    expect(ledger.read).toBe(ledger.used + ledger.leftOut + ledger.refused);
    const refused = ledger.rows.filter((row) => row.status === 'refused');
    expect(refused.map((row) => row.trial)).toEqual(Object.keys(read.refused ?? {}));
    for (const row of refused) expect(row.reason).toContain(read.refused![row.trial]!);
    expect(series).toHaveLength(read.series ?? 0);
    const told = [...notes.map(({ text }) => text), ...trials.flatMap((trial) => trial.notes)].join('\n');
    for (const words of read.notes ?? []) expect(told).toContain(words);
  });

  test('check accepts it', async () => expect(await checkStudy(join(folder, 'study.yaml'))).toContain('derived'));
});
