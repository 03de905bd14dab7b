import type { Correlation, Limit } from '../correlations/correlation.ts';
import { evaluateCorrelation } from '../correlations/evaluate-correlation.ts';
import { formText } from '../pipeline/algebra/print.ts';
import { definitionText } from '../pipeline/groups/definition.ts';
import { quantityOf } from '../pipeline/quantities/vocabulary.ts';
import { dress } from './dress.ts';
import { html, type Markup } from './html.ts';
import * as says from './says/catalogue-page.ts';
import { formMarkup } from './typeset.ts';
import { behind } from './units.ts';

/** The whole catalogue as one page for reference: formula typeset, every definition, range bars, source and checks. Complete without scripts; no request to anywhere. */
export function cataloguePage(catalogue: readonly Correlation[]): string {
  const families = [...new Set(catalogue.map(({ family }) => family))];
  const checks = catalogue.reduce((sum, { printed }) => sum + printed.length, 0);
  const body = html`<header><h1>${says.heading()}</h1><p>${says.standing(catalogue.length, families.length, checks)}</p>
<nav aria-label="${says.families()}"><ol>${families.map((family) => html`<li><a href="#${family}">${family}</a></li>`)}</ol></nav></header>
<main>${families.map((family) =>
    familySection(
      family,
      catalogue.filter((one) => one.family === family),
    ),
  )}</main>`;
  return dress({ title: says.heading(), body });
}

const familySection = (family: string, entries: readonly Correlation[]): Markup =>
  html`<section id="${family}" aria-labelledby="${family}-name"><h2 id="${family}-name">${family}</h2>
${entries.map(article)}</section>
`;

function article(entry: Correlation): Markup {
  const { id, title, authors, year, form, values, reads, average, accuracy, use, analogy, source, where, constantsFrom } = entry;
  return html`<article id="${id}" aria-labelledby="${id}-title"><h3 id="${id}-title">${title}</h3>
<p class="fine">${authors} ${year}; <span class="formula">${id}</span></p>
<div class="law" role="region" tabindex="0" aria-label="${formText(form, values)}">${formMarkup(form, short, values)}</div>
<p class="fine">${says.definitions()}</p><ul class="notes fine">${Object.entries(entry.groups).map(([name, key]) => html`<li>${definitionOf(name, key)}</li>`)}</ul>
<p class="fine">${entry.limits.length === 0 ? says.noRange() : says.range()}</p>${entry.limits.map(bar)}
<p>${use}</p>
<p class="fine">${says.details(reads, average, accuracy)} ${says.analogy(analogy)}</p>
<p class="fine">${source} ${where} (${constantsFrom === 'memory' ? says.memory() : says.read()}).</p>
<ul class="notes fine">${entry.printed.map((check) => html`<li>${checkText(entry, check)}</li>`)}</ul></article>
`;
}

function definitionOf(name: string, key: string): string {
  const group = definitionText(key);
  if (group !== undefined) return group.text;
  const quantity = quantityOf(key);
  return quantity === undefined
    ? `${name}: ${key}`
    : `${name}: ${quantity.says}${behind(quantity.unit) === '' ? '' : `, in${behind(quantity.unit)}`}`;
}

function checkText(entry: Correlation, { kind, at, value, source, where }: Correlation['printed'][number]): string {
  const gives = evaluateCorrelation(entry, at).value;
  const point = Object.entries(at)
    .map(([name, x]) => `${name} = ${short(x)}`)
    .join(', ');
  return says.checked(kind, point, entry.form.response, short(value), short(gives), `${source}, ${where}`);
}

/** Published constants as they are printed, without zeros behind; what is worked out, to five digits. */
const short = (value: number): string => String(Number(value.toPrecision(5))).replace('e+', 'e');

const WIDTH = 460;
const DECADES = [-4, 12] as const;

/** Range of one limit over the decades that all bars share; open ends run out of the picture. The text says the same. */
function bar({ from, to, says: text }: Limit): Markup {
  const place = (value: number | undefined, open: number): number => {
    const ten = value === undefined || !(value > 0) ? open : Math.log10(value);
    return (WIDTH * (Math.min(DECADES[1], Math.max(DECADES[0], ten)) - DECADES[0])) / (DECADES[1] - DECADES[0]);
  };
  const [left, right] = [place(from, DECADES[0]), place(to, DECADES[1])];
  const ticks = Array.from({ length: (DECADES[1] - DECADES[0]) / 2 + 1 }, (_, k) => DECADES[0] + 2 * k);
  return html`<figure class="range"><svg viewBox="0 0 ${WIDTH} 30" width="${WIDTH}" height="30" role="img" aria-label="${says.barText(text)}"><line x1="0" x2="${WIDTH}" y1="9" y2="9" stroke="var(--grid)" stroke-width="2"/><line x1="${left.toFixed(1)}" x2="${Math.max(right, left + 2).toFixed(1)}" y1="9" y2="9" stroke="var(--accent)" stroke-width="6"/>${ticks.map((ten) => html`<text x="${place(10 ** ten, 0).toFixed(1)}" y="26" font-size="10" fill="var(--quiet)" text-anchor="${ten === DECADES[0] ? 'start' : ten === DECADES[1] ? 'end' : 'middle'}">${ten === 0 ? '1' : `1e${ten}`}</text>`)}</svg><figcaption>${text}</figcaption></figure>
`;
}
