import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { html, type Markup } from '../html.ts';

/** Before anybody builds on it. */
export const cautions = (
  result: StudyResult,
): Markup => html`<section id="cautions"><h2>Before anybody builds on it</h2><ul>${result.cautions.map((text) => html`<li>${text}</li>`)}</ul>
<table class="sign"><thead><tr><th scope="col"></th><th scope="col">name</th><th scope="col">date</th></tr></thead><tbody><tr><th scope="row">Prepared</th><td></td><td></td></tr><tr><th scope="row">Checked</th><td></td><td></td></tr></tbody></table></section>`;
