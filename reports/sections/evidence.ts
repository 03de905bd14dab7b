import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { html, type Markup } from '../html.ts';
import { percent, percentOfLn, plainNumber } from '../numbers.ts';

/** Can these trials tell that? */
export function evidence(result: StudyResult, pictures: ReadonlyMap<string, Markup>): Markup {
  const own = result.identifiability.find((one) => one.law === result.chosen);
  const notes = result.notes.filter((note) => note.section === 'evidence');
  const relative = result.options.error === 'relative';
  const names = Object.keys(result.influence[0]?.values ?? {});
  return html`<section id="evidence"><h2>Can these trials tell that?</h2><p class="lead">${(own?.says ?? []).join(' ') || 'The law has no groups that vary.'}</p>
<ul>${notes.map((note) => html`<li>${note.level === 'warning' ? html`<strong>Warning.</strong> ` : ''}${note.text}</li>`)}</ul>
<figure>${pictures.get('parity')}<figcaption>Measured against fitted; the line is equality.</figcaption></figure>
<figure>${pictures.get('residuals')}<figcaption>Studentised residuals; beyond the outer lines one trial in twenty is expected.</figcaption></figure>
<div class="wide"><table><caption>Laws compared</caption><thead><tr><th scope="col">law</th><th scope="col" class="n">parameters</th><th scope="col" class="n">AICc</th><th scope="col" class="n">BIC</th><th scope="col" class="n">error on left-out trials</th><th scope="col">remark</th></tr></thead><tbody>
${result.choice.compared.map((row) => html`<tr><th scope="row">${row.law}</th><td class="n">${row.parameters}</td><td class="n">${plainNumber(row.aicc, 4)}</td><td class="n">${plainNumber(row.bic, 4)}</td><td class="n">${relative ? percentOfLn(row.cvRmsLn) : plainNumber(row.cvRmsLn)}</td><td>${row.says}</td></tr>`)}
</tbody></table></div>
<div class="wide"><table><caption>Which source carries the uncertainty of each parameter</caption><thead><tr><th scope="col">parameter</th><th scope="col">sources, largest first</th></tr></thead><tbody>
${result.budgets.map(
  (one) =>
    html`<tr><th scope="row">${one.of}</th><td>${one.shares
      .slice(0, 6)
      .map(({ source, kind, share }) => `${source} (${kind}) ${percent(share)}`)
      .join(', ')}</td></tr>`,
)}
</tbody></table></div>
${names.length > 0 && html`<div class="wide"><table><caption>The law without a campaign or an influential trial</caption><thead><tr><th scope="col">without</th>${names.map((name) => html`<th scope="col" class="n">${name}</th>`)}</tr></thead><tbody>${result.influence.map((row) => html`<tr><th scope="row">${row.kind} ${row.left}</th>${names.map((name) => html`<td class="n">${plainNumber(row.values[name] ?? Number.NaN)}</td>`)}</tr>`)}</tbody></table></div>`}
</section>`;
}
