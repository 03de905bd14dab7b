import { exprText } from '../../pipeline/algebra/print.ts';
import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { html, type Markup } from '../html.ts';
import { percentOfLn, plainNumber, roundedLike, valueBy } from '../numbers.ts';

/** Which law, and where does it hold? */
export function answer(result: StudyResult, pictures: ReadonlyMap<string, Markup>): Markup {
  const fit = result.fits.find((one) => one.name === result.chosen)!;
  const { statistics } = fit;
  const text = `${fit.form.response} = ${exprText(fit.form.tree, fit.values, (value) => plainNumber(value))}`;
  const ranges = Object.entries(fit.ranges).map(([name, [low, high]]) => `${name} ${plainNumber(low)} to ${plainNumber(high)}`);
  const scatter = fit.scale === 'relative' ? percentOfLn(statistics.residualSd) : plainNumber(statistics.residualSd);
  const warnings = result.notes.filter((note) => note.level === 'warning' && (note.about === undefined || note.about === fit.name));
  return html`<section id="answer"><h2>Which law, and where does it hold?</h2>
<p class="lead">${text} describes ${statistics.n} trials with a scatter of ${scatter}${ranges.length === 0 ? '' : `, for ${ranges.join(', ')}`}.</p>
<div class="law">${text}</div>
<p>${result.choice.why}</p>
${warnings.length > 0 && html`<div class="warnings"><h3>What to mind</h3><ul>${warnings.map((note) => html`<li>${note.text}</li>`)}</ul></div>`}
${result.curves.map(
  (curve, k) =>
    html`<figure>${pictures.get(`law-${k + 1}`)}<figcaption>${fit.form.response} against ${curve.group}${
      Object.keys(curve.at).length === 0
        ? ''
        : `, trials moved along the law to ${Object.entries(curve.at)
            .map(([name, value]) => `${name} ${plainNumber(value)}`)
            .join(', ')}`
    }. Dots: trials with one standard uncertainty; line: the law; inner band: its ${Math.round(100 * fit.confidence)} % confidence; outer band: where a further trial is expected; thin lines: published correlations in their range.</figcaption></figure>`,
)}
<div class="wide"><table><caption>Parameters of ${fit.name}, intervals at ${Math.round(100 * fit.confidence)} %</caption><thead><tr><th scope="col">parameter</th><th scope="col" class="n">estimate</th><th scope="col" class="n">from</th><th scope="col" class="n">to</th><th scope="col" class="n">degrees of freedom</th><th scope="col">remark</th></tr></thead><tbody>
${fit.parameters.map((p) => html`<tr><th scope="row">${p.name}</th><td class="n">${valueBy(p.estimate, p.lower, p.upper)}</td><td class="n">${Number.isFinite(p.lower) ? roundedLike(p.lower, p.estimate, p.lower, p.upper) : 'open'}</td><td class="n">${Number.isFinite(p.upper) ? roundedLike(p.upper, p.estimate, p.lower, p.upper) : 'open'}</td><td class="n">${plainNumber(p.degreesOfFreedom)}</td><td>${p.fixed ? 'held, not measured' : p.onBound ? 'on its bound' : ''}</td></tr>`)}
</tbody></table></div>
${result.theory.length > 0 && html`<h3>Against theory</h3><ul>${result.theory.filter((one) => one.law === fit.name).map((one) => html`<li>${one.says}</li>`)}</ul>`}
</section>`;
}
