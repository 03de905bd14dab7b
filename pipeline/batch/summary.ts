import { exprText } from '../algebra/print.ts';
import type { StudyResult } from '../results/study-result.ts';

/** One line of a batch: what `run --json` prints and the index shows. */
export interface StudySummary {
  readonly study: string;
  readonly title: string;
  readonly folder: string;
  readonly law: string;
  readonly text: string;
  readonly trials: { readonly read: number; readonly used: number; readonly left_out: number; readonly refused: number };
  /** Scatter beyond the stated uncertainties, ln (or the response's unit). */
  readonly scatter: number;
  readonly warnings: number;
  readonly best_published: string | null;
  readonly verdict: string | null;
}

/** All of it that does not depend on where the study lies. */
export function summaryOf(result: StudyResult): Omit<StudySummary, 'study' | 'folder'> {
  const fit = result.fits.find((one) => one.name === result.chosen)!;
  const best = result.audit?.rows[0];
  const { read, used, leftOut, refused } = result.ledger;
  const short = (value: number): string => String(Number(value.toPrecision(4)));
  return {
    title: result.study.title,
    law: fit.name,
    text: `${fit.form.response} = ${exprText(fit.form.tree, fit.values, short)}`,
    trials: { read, used, left_out: leftOut, refused },
    scatter: fit.statistics.residualSd,
    warnings: result.notes.filter((note) => note.level === 'warning').length,
    best_published: best?.id ?? null,
    verdict: best?.verdict ?? null,
  };
}
