import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { html, type Markup } from '../html.ts';
import { plainNumber } from '../numbers.ts';
import * as says from '../says/sections.ts';
import { columns, table } from '../table.ts';
import { prettyUnit } from '../units.ts';
import { notesOf, section } from './section.ts';

/** How was this computed? */
export function method(result: StudyResult): Markup {
  const { provenance } = result;
  return section(
    'method',
    says.inputLead(provenance.version, provenance.seed),
    html`${result.method.statements.map((text) => html`<p>${text}</p>`)}
<p>${says.rounding()}</p>
${notesOf(result, 'method')}
${table(
  'Definitions in force',
  columns('name', 'definition', 'unit', 'source'),
  result.columns.map((one) => [one.name, one.text, prettyUnit(one.unit), one.source]),
)}
${table(
  'Inputs and their standard uncertainties (k = 1)',
  columns('quantity', 'from', 'random', 'systematic'),
  result.method.inputs.map((one) => [one.key, one.from, one.random || 'none stated', one.systematic || 'none stated']),
)}
${
  result.method.rules.length > 0 &&
  table(
    'Formulas in force, in working order',
    columns('gives', 'formula', 'source'),
    result.method.rules.map((one) => [one.gives, html`<span class="formula">${one.formula}</span>`, one.source]),
  )
}
${fits(result)}
${table(
  'Options in force',
  columns('option', 'value'),
  Object.entries(result.options).map(([name, value]) => [
    name,
    typeof value === 'number' ? (Number.isNaN(value) ? 'not in force' : String(value)) : value,
  ]),
)}
${result.method.references.length > 0 && html`<h3>Sources</h3><ul>${result.method.references.map((text) => html`<li>${text}</li>`)}</ul>`}
${table(
  'Input files',
  columns('file', 'SHA-256'),
  provenance.files.map((one) => [one.file, html`<span class="hash">${one.sha256}</span>`]),
)}
<p class="fine">Computed on Node ${provenance.node}.</p>`,
  );
}

/** Each fit with why it stopped, and its numbers as they are. */
const fits = (result: StudyResult): Markup =>
  table(
    says.fullText(),
    columns('law', 'at full precision', 'the fit ended', '#trials', '#rms error, ln', '#R²'),
    result.fits.map((fit) => [
      fit.name,
      html`<span class="formula">${fit.text}</span>`,
      `${fit.stop.why} after ${fit.stop.iterations} iterations (${plainNumber(fit.stop.value)} against ${plainNumber(fit.stop.limit)})`,
      fit.statistics.n,
      plainNumber(fit.statistics.rmsLn),
      plainNumber(fit.statistics.rSquared, 4),
    ]),
  );
