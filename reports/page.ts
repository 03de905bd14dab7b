import type { StudyResult } from '../pipeline/results/study-result.ts';
import { figuresOf } from './charts/all.ts';
import type { Spec } from './charts/palette.ts';
import { draw, startReport } from './charts/render.ts';
import { dress } from './dress.ts';
import { figureOf, type Pictures } from './figure.ts';
import { html, type Markup } from './html.ts';
import { liveData } from './live-data.ts';
import { answer } from './sections/answer.ts';
import { audit } from './sections/audit.ts';
import { cautions } from './sections/cautions.ts';
import { evidence } from './sections/evidence.ts';
import { method } from './sections/method.ts';
import { nextTrials } from './sections/next-trials.ts';
import { plant } from './sections/plant.ts';
import { questions } from './sections/section.ts';
import { trials } from './sections/trials.ts';

export interface Report {
  readonly html: string;
  /** Vega-Lite specifications by name. */
  readonly charts: Readonly<Record<string, Spec>>;
}

/**
 * One study's result as one page: complete without scripts, alive with them, no request to anywhere. The script stands in the page, or is the file
 * `script` that the reports of a batch share, named from the page (see `sharedScript`).
 */
export async function renderReport(result: StudyResult, script?: string): Promise<Report> {
  startReport();
  const figures = figuresOf(result);
  const pictures = new Map<string, Markup>();
  const live: Record<string, unknown> = {};
  for (const figure of figures) {
    const drawn = await draw(figure.spec, figure.name);
    pictures.set(figure.name, figureOf(figure, drawn.svg));
    live[figure.name] = drawn.live;
  }
  const body = html`${head(result)}
${main(result, pictures)}`;
  return {
    html: dress({ title: result.study.title, body, data: liveData(result, live), ...(script === undefined ? {} : { script }) }),
    charts: Object.fromEntries(figures.map(({ name, spec }) => [name, spec])),
  };
}

const head = ({ study }: StudyResult): Markup =>
  html`<header><h1>${study.title}</h1><p class="fine">${[
    `${study.transfer === 'heat' ? 'Heat' : 'Mass'} transfer trials`,
    `equipment: ${study.equipment}`,
    study.fluid === '' ? '' : `fluid: ${study.fluid}`,
    study.route === '' ? '' : `reduced by ${study.route}`,
    study.invented ? 'the data are invented' : '',
  ]
    .filter((text) => text !== '')
    .join('; ')}</p>
<nav aria-label="Questions"><ol>${questions.map(([id, question]) => html`<li><a href="#${id}">${question}</a></li>`)}</ol></nav></header>`;

const main = (result: StudyResult, pictures: Pictures): Markup =>
  html`<main><details id="controls" class="controls" hidden><summary></summary></details>${answer(result, pictures)}${audit(result, pictures)}${plant(result, pictures)}${evidence(result, pictures)}${nextTrials(result, pictures)}${trials(result)}${method(result)}${cautions(result)}</main>`;
