import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { html, type Markup } from '../html.ts';
import { percent, percentOfLn, plainNumber, withInterval } from '../numbers.ts';

/** Why not a published one? */
export function audit(result: StudyResult): Markup {
  const found = result.audit;
  if (found === null)
    return html`<section id="audit"><h2>Why not a published one?</h2><p>The study asks for no comparison with published correlations.</p></section>`;
  return html`<section id="audit"><h2>Why not a published one?</h2><p class="lead">${found.says}</p>
<div class="wide"><table><caption>Published correlations against the trials, tolerance ${percent(found.tolerance)}; bias is measured over predicted</caption><thead><tr><th scope="col">correlation</th><th scope="col">verdict</th><th scope="col" class="n">in range</th><th scope="col" class="n">bias</th><th scope="col" class="n">scatter</th><th scope="col" class="n">rig factor</th><th scope="col" class="n">error on left-out trials, as published</th><th scope="col" class="n">with factor</th><th scope="col" class="n">fitted law, same trials</th></tr></thead><tbody>
${found.rows.map((row) => html`<tr><th scope="row">${row.authors} (${row.year})${row.basis === 'analogy' ? ', by analogy' : ''}${row.reads === 'mean line' ? '' : `, ${row.reads}`}<br><span class="fine">${row.text}</span></th><td>${row.verdict}<br><span class="fine">${row.why}</span></td><td class="n">${row.nInRange} of ${row.n}</td><td class="n">${plainNumber(row.bias)}</td><td class="n">${percentOfLn(row.scatterLn)}</td><td class="n">${Number.isFinite(row.rigFactor) ? withInterval(row.rigFactor, row.rigFactorLower, row.rigFactorUpper) : ''}</td><td class="n">${percentOfLn(row.cvRmsLnAsPublished)}</td><td class="n">${percentOfLn(row.cvRmsLnWithFactor)}</td><td class="n">${percentOfLn(row.cvRmsLnFittedLaw)}</td></tr>`)}
</tbody></table></div>
${found.notes.map((note) => html`<p class="fine">${note.text}</p>`)}</section>`;
}
