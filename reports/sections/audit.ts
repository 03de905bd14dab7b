import type { AuditRow } from '../../pipeline/audit/verdict.ts';
import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { type Pictures, picturesOf } from '../figure.ts';
import { type Child, html, type Markup } from '../html.ts';
import { percent, percentOfLn, plainNumber, roundedLike, valueBy, withInterval } from '../numbers.ts';
import * as says from '../says/sections.ts';
import { columns, table } from '../table.ts';
import { notesOf, section } from './section.ts';

/** Why not a published one? */
export function audit(result: StudyResult, pictures: Pictures): Markup {
  const found = result.audit;
  if (found === null) return section('audit', says.noAudit(), notesOf(result, 'audit'));
  const compared = found.rows.filter((row) => row.verdict !== 'not comparable');
  const others = found.rows.filter((row) => row.verdict === 'not comparable');
  return section(
    'audit',
    found.rows.length === 0 ? says.noRows() : found.says,
    html`${picturesOf(pictures, 'audit-bias')}
${compared.length > 0 && html`${verdicts(compared, found.tolerance)}<p class="fine">${says.measuredOver()}</p>${ranges(compared)}`}
${others.length > 0 && lacking(others)}
${found.notes.map((note) => html`<p class="fine">${note.text}</p>`)}
${notesOf(result, 'audit', (note) => found.notes.some((one) => one.text === note.text))}`,
  );
}

/** Who, with all that changes how the line reads. */
const who = (row: AuditRow): Markup =>
  html`${row.authors} (${row.year})${row.basis === 'analogy' && ', by analogy'}${row.own && ', your own'}${row.reads !== 'mean line' && `, ${row.reads}`}<br><span class="fine">${row.title}<br><span class="formula">${row.text}</span></span>`;

const number = (value: number, text: (v: number) => Child): Child => (Number.isFinite(value) ? text(value) : '–');

const verdicts = (rows: readonly AuditRow[], tolerance: number): Markup =>
  table(
    `Published correlations against the trials; tolerance ${percent(tolerance)}`,
    columns(
      '~correlation',
      '~verdict',
      '#in range',
      '#bias',
      '#scatter',
      '#rig factor',
      '#error on left-out trials: as published',
      '#with factor',
      '#fitted law',
    ),
    rows.map((row) => [
      who(row),
      html`${row.verdict}<br><span class="fine">${row.why}</span>`,
      `${row.nInRange} of ${row.n}`,
      number(row.bias, plainNumber),
      row.nInRange > 1 ? number(row.scatterLn, percentOfLn) : '–',
      number(row.rigFactor, (v) => factor(v, row)),
      number(row.cvRmsLnAsPublished, percentOfLn),
      number(row.cvRmsLnWithFactor, percentOfLn),
      number(row.cvRmsLnFittedLaw, percentOfLn),
    ]),
  );

const factor = (value: number, { rigFactorLower: lower, rigFactorUpper: upper }: AuditRow): Markup =>
  html`${valueBy(value, lower, upper)}<br><span class="fine">${roundedLike(lower, value, lower, upper)} to ${roundedLike(upper, value, lower, upper)}</span>`;

/** Ranges, trends and what each claims for itself: the fine print of the comparison. */
const ranges = (rows: readonly AuditRow[]): Markup =>
  table(
    'Their ranges, trends and sources',
    columns(
      '~correlation',
      '~limits, and trials inside',
      '~trend of measured over predicted',
      '#within 20 %',
      '#within 30 %',
      '~source and its stated accuracy',
    ),
    rows.map((row) => [
      `${row.authors} (${row.year})`,
      row.limits.length === 0 ? 'none stated' : row.limits.map((limit) => `${limit.says}: ${limit.inside} of ${row.n}`).join('; '),
      row.trends.length === 0
        ? '–'
        : row.trends.map((one) => `${one.group}: power ${withInterval(one.slope, one.lower, one.upper)}`).join('; '),
      number(row.within20, percent),
      number(row.within30, percent),
      html`${row.source}<br><span class="fine">${row.accuracy}</span>`,
    ]),
  );

const lacking = (rows: readonly AuditRow[]): Markup =>
  html`<h3>${says.notCompared()}</h3>${table(
    says.notCompared(),
    columns('~correlation', '~what it lacks here', '~why'),
    rows.map((row) => [who(row), row.lacks.join(', ') || '–', row.why]),
  )}`;
