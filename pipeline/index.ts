import type { StudyResult } from './results/study-result.ts';

/** What a program may settle beside the study file. */
export interface AnalyseOptions {
  /** Seed of the random numbers, a whole number from 0; 1 where left out. */
  readonly seed?: number;
  /** Further trials to propose where the study has a rig; 3 where left out. */
  readonly proposals?: number;
}

/**
 * One study file to its result as plain JSON, as `pilotlaw run` computes it; nothing is written. Throws InputError, whose `messages` have code, text and
 * place, where the study file (exit 2) or its data (exit 3) cannot be used. Importing this module does nothing.
 */
export async function analyse(study: string, { seed, proposals }: AnalyseOptions = {}): Promise<StudyResult> {
  const { computeStudy } = await import('./batch/run-study.ts');
  return computeStudy(study, seed, proposals);
}

/** The report of a result as one HTML page. */
export async function report(result: StudyResult): Promise<string> {
  const { renderReport } = await import('../reports/page.ts');
  return (await renderReport(result)).html;
}

export { InputError } from './base/input-error.ts';
export type { Message } from './base/message.ts';
export { resultFiles } from './results/write-results.ts';
export type { StudyResult };
