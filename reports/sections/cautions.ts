import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { html, type Markup } from '../html.ts';
import { section } from './section.ts';

/** Before anybody builds on it. */
export const cautions = (result: StudyResult): Markup =>
  section(
    'cautions',
    result.cautions[0] ?? '',
    html`<ul>${result.cautions.slice(1).map((text) => html`<li>${text}</li>`)}</ul>
<table class="sign"><caption>To be filled in by those who answer for it</caption><thead><tr><th scope="col">step</th><th scope="col">name</th><th scope="col">date and signature</th></tr></thead><tbody><tr><th scope="row">Prepared</th><td></td><td></td></tr><tr><th scope="row">Checked</th><td></td><td></td></tr></tbody></table>`,
  );
