import type { AuditResult, AuditRow, VerdictWord } from '../../../pipeline/audit/verdict.ts';
import type { Fit } from '../../../pipeline/regression/fit.ts';

const verdicts: readonly VerdictWord[] = [
  'fits as published',
  'fits with a rig factor',
  'wrong trend',
  'not decided by these trials',
  'outside its range',
  'not comparable',
];

/** Made-up correlations of every verdict; none of them is anybody's. */
export function madeAudit(fit: Fit, rows: readonly (readonly number[])[], count: number, name: (plain: string) => string): AuditResult {
  const table = Array.from({ length: count }, (_, k) => madeRow(k, fit, rows, name));
  return {
    tolerance: 0.2,
    rows: table,
    notes: [],
    says: count === 0 ? 'No published correlation applies.' : `${table[0]!.authors} (${table[0]!.year}) fits as published.`,
  };
}

function madeRow(k: number, fit: Fit, rows: readonly (readonly number[])[], name: (plain: string) => string): AuditRow {
  const verdict = verdicts[k % verdicts.length]!;
  const none = verdict === 'not comparable';
  const outside = none || verdict === 'outside its range';
  const n = rows.length;
  const bias = outside ? Number.NaN : 1 + 0.07 * ((k % 7) - 2);
  const known = (value: number): number => (outside ? Number.NaN : value);
  return {
    id: `invented-${1900 + k}`,
    title: 'Invented correlation',
    authors: name(`Invented and Made-Up ${String.fromCharCode(65 + (k % 26))}`),
    year: 1900 + k,
    text: 'Nu = 0.02 * Re^0.8 * Pr^0.4',
    source: name(`Invented Journal ${k} (${1900 + k}) 1-2`),
    basis: k % 3 === 1 ? 'analogy' : 'direct',
    own: k % 5 === 4,
    reads: k % 4 === 3 ? 'lower bound' : 'mean line',
    accuracy: 'within 20 %',
    definitions: { Nu: 'Nu on the bore' },
    verdict,
    why: name('In words why.'),
    lacks: none ? [name('viscosity@wall')] : [],
    n,
    nInRange: outside ? 0 : n,
    limits: [{ says: 'Re >= 1e4', inside: outside ? 0 : n }],
    bias,
    scatterLn: known(0.05),
    rmsLn: known(0.06),
    within20: known(0.9),
    within30: known(1),
    rigFactor: bias,
    rigFactorLower: bias * 0.95,
    rigFactorUpper: bias * 1.06,
    cvRmsLnAsPublished: known(0.08),
    cvRmsLnWithFactor: known(0.05),
    cvRmsLnFittedLaw: known(0.05),
    trends: outside ? [] : [{ group: 'Re', slope: 0.02, lower: -0.01, upper: 0.05, pHolm: 0.3, span: 0.05 }],
    predicted: fit.diagnostics.fitted.map((v) => v / bias),
    inside: rows.map(() => !outside),
  };
}
