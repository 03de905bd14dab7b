import { createHash } from 'node:crypto';
import type { StudyResult } from '../pipeline/results/study-result.ts';
import { lawChart } from './charts/law-chart.ts';
import type { Spec } from './charts/palette.ts';
import { startReport, svgOf } from './charts/render.ts';
import { parityChart, residualChart } from './charts/residual-charts.ts';
import { html, type Markup, raw } from './html.ts';
import { answer } from './sections/answer.ts';
import { audit } from './sections/audit.ts';
import { cautions } from './sections/cautions.ts';
import { evidence } from './sections/evidence.ts';
import { method } from './sections/method.ts';
import { plant } from './sections/plant.ts';
import { trials } from './sections/trials.ts';
import { style } from './theme.ts';

export interface Report {
  readonly html: string;
  /** Vega-Lite specifications by name. */
  readonly charts: Readonly<Record<string, Spec>>;
}

/** One study's result as one self-contained page: static pictures, no script, no request; a strict policy by the hash of its style. */
export async function renderReport(result: StudyResult): Promise<Report> {
  startReport();
  const charts = chartsOf(result);
  const pictures = new Map<string, Markup>();
  for (const [name, spec] of Object.entries(charts)) pictures.set(name, raw(await svgOf(spec, name)));
  const body = html`<header><h1>${result.study.title}</h1><p class="fine">${result.study.transfer === 'heat' ? 'Heat' : 'Mass'} transfer trials; equipment: ${result.study.equipment}${result.study.invented ? '; the data are invented' : ''}</p>
<nav aria-label="Sections"><a href="#answer">Law</a><a href="#audit">Published</a><a href="#plant">Plant</a><a href="#evidence">Evidence</a><a href="#trials">Trials</a><a href="#method">Method</a><a href="#cautions">Cautions</a></nav></header>
<main>${answer(result, pictures)}${audit(result)}${plant(result)}${evidence(result, pictures)}${trials(result)}${method(result)}${cautions(result)}</main>`;
  const hash = createHash('sha256').update(style).digest('base64');
  const page = `<!doctype html>\n<html lang="en"><head><meta charset="utf-8"><meta http-equiv="Content-Security-Policy" content="default-src 'none'; style-src 'sha256-${hash}'; base-uri 'none'; form-action 'none'"><meta name="viewport" content="width=device-width, initial-scale=1"><title>${html`${result.study.title}`.markup}</title><style>${style}</style></head><body>${body.markup}</body></html>\n`;
  return { html: page, charts };
}

function chartsOf(result: StudyResult): Record<string, Spec> {
  const fit = result.fits.find((one) => one.name === result.chosen)!;
  const log = fit.scale === 'relative';
  const unit = (name: string): string => {
    const found = result.columns.find((column) => column.name === name)?.unit ?? '1';
    return found === '1' ? name : `${name} in ${found}`;
  };
  const laws = result.curves.map(
    (curve, k) => [`law-${k + 1}`, lawChart(curve, { x: unit(curve.group), y: unit(fit.form.response), log })] as const,
  );
  return {
    ...Object.fromEntries(laws),
    parity: parityChart(result, fit, unit(fit.form.response)),
    residuals: residualChart(result, fit, log),
  };
}
