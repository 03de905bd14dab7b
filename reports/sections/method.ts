import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { html, type Markup } from '../html.ts';

/** How was this computed? */
export function method(result: StudyResult): Markup {
  const notes = result.notes.filter((note) => note.section === 'method');
  const { provenance } = result;
  return html`<section id="method"><h2>How was this computed?</h2>${result.method.statements.map((text) => html`<p>${text}</p>`)}
<div class="wide"><table><caption>Definitions in force</caption><thead><tr><th scope="col">name</th><th scope="col">definition</th><th scope="col">unit</th><th scope="col">source</th></tr></thead><tbody>${result.columns.map((one) => html`<tr><th scope="row">${one.name}</th><td>${one.text}</td><td>${one.unit}</td><td>${one.source}</td></tr>`)}</tbody></table></div>
<div class="wide"><table><caption>Inputs and their standard uncertainties (k = 1)</caption><thead><tr><th scope="col">quantity</th><th scope="col">from</th><th scope="col">random</th><th scope="col">systematic</th></tr></thead><tbody>${result.method.inputs.map((one) => html`<tr><th scope="row">${one.key}</th><td>${one.from}</td><td>${one.random}</td><td>${one.systematic}</td></tr>`)}</tbody></table></div>
${notes.length > 0 && html`<ul>${notes.map((note) => html`<li>${note.text}</li>`)}</ul>`}
<h3>Sources</h3><ul>${result.method.references.map((text) => html`<li>${text}</li>`)}</ul>
<p class="fine">Numbers are rounded by JCGM 100:2008, 7.2.6: an uncertainty to two digits, its value to the same place. Version ${provenance.version}, seed ${provenance.seed}, Node ${provenance.node}.</p>
<div class="wide"><table><caption>Input files</caption><thead><tr><th scope="col">file</th><th scope="col">SHA-256</th></tr></thead><tbody>${provenance.files.map((one) => html`<tr><th scope="row">${one.file}</th><td>${one.sha256}</td></tr>`)}</tbody></table></div></section>`;
}
