import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { html, type Markup } from '../html.ts';

/** What does it say for the plant? */
export function plant(result: StudyResult): Markup {
  const notes = result.notes.filter((note) => note.section === 'plant');
  return html`<section id="plant"><h2>What does it say for the plant?</h2><p>This version predicts no plant cases: apply the law above only inside its ranges, and in the same kind of equipment.</p><ul>${notes.map((note) => html`<li>${note.text}</li>`)}</ul></section>`;
}
