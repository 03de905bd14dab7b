/** Library use: one study file to its result as plain JSON, nothing written; the report and the result files as text and bytes. No side effects on import. */
export { computeStudy } from './batch/run-study.ts';
export type { StudyResult } from './results/study-result.ts';
export { resultFiles } from './results/write-results.ts';
