import { createHash } from 'node:crypto';
import type { StudyResult } from '../pipeline/results/study-result.ts';
import { figuresOf } from './charts/all.ts';
import type { Spec } from './charts/palette.ts';
import { startReport, svgOf } from './charts/render.ts';
import { figureOf, type Pictures } from './figure.ts';
import { html, type Markup } from './html.ts';
import { answer } from './sections/answer.ts';
import { audit } from './sections/audit.ts';
import { cautions } from './sections/cautions.ts';
import { evidence } from './sections/evidence.ts';
import { method } from './sections/method.ts';
import { nextTrials } from './sections/next-trials.ts';
import { plant } from './sections/plant.ts';
import { questions } from './sections/section.ts';
import { trials } from './sections/trials.ts';
import { style } from './theme.ts';

export interface Report {
  readonly html: string;
  /** Vega-Lite specifications by name. */
  readonly charts: Readonly<Record<string, Spec>>;
}

/** One study's result as one self-contained page: no request, and a policy that allows nothing but its own style by its hash. */
export async function renderReport(result: StudyResult): Promise<Report> {
  startReport();
  const figures = figuresOf(result);
  const pictures = new Map<string, Markup>();
  for (const figure of figures) pictures.set(figure.name, figureOf(figure, await svgOf(figure.spec, figure.name)));
  const hash = createHash('sha256').update(style).digest('base64');
  const title = html`${result.study.title}`.markup;
  const page = `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta http-equiv="Content-Security-Policy" content="default-src 'none'; style-src 'sha256-${hash}'; base-uri 'none'; form-action 'none'"><meta name="viewport" content="width=device-width, initial-scale=1"><title>${title}</title><style>${style}</style></head><body>${head(result).markup}
${main(result, pictures).markup}</body></html>
`;
  return { html: page, charts: Object.fromEntries(figures.map(({ name, spec }) => [name, spec])) };
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
  html`<main>${answer(result, pictures)}${audit(result, pictures)}${plant(result, pictures)}${evidence(result, pictures)}${nextTrials(result, pictures)}${trials(result)}${method(result)}${cautions(result)}</main>`;
