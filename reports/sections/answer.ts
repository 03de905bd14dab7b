import type { Fit } from '../../pipeline/regression/fit.ts';
import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { type Pictures, picturesOf } from '../figure.ts';
import { html, type Markup } from '../html.ts';
import { chosenFit, lawNumbers, lawText } from '../law-text.ts';
import { percent, plainNumber, roundedLike, valueBy } from '../numbers.ts';
import * as says from '../says/answer.ts';
import { columns, table } from '../table.ts';
import { formMarkup } from '../typeset.ts';
import { prettyUnit } from '../units.ts';
import { section } from './section.ts';

/** Which law, and where does it hold? */
export function answer(result: StudyResult, pictures: Pictures): Markup {
  const fit = chosenFit(result);
  const lead = `${says.headline(result)} ${says.scatterSentence(result)}`;
  if (fit === undefined) return section('answer', lead, warnings(result));
  return section(
    'answer',
    lead,
    html`<div class="law" role="region" tabindex="0" aria-label="${says.lawRegion()}">${formMarkup(fit.form, lawNumbers(fit), fit.values)}</div>
<p class="fine formula">${lawText(fit)}</p>
<p>${result.choice.why}</p>
${warnings(result)}
${picturesOf(pictures, 'law')}
${parameters(result, fit)}
${picturesOf(pictures, 'exponents')}
${theory(result, fit)}
${ranges(result, fit)}
${picturesOf(pictures, 'range-map')}`,
  );
}

/** Every warning of the study, wherever else it stands too. */
function warnings(result: StudyResult): Markup | false {
  const found = result.notes.filter((note) => note.level === 'warning' && (note.about === undefined || note.about === result.chosen));
  return (
    found.length > 0 &&
    html`<div class="warnings"><h3>${says.mind()}</h3><ul>${found.map((note) => html`<li>${note.text}</li>`)}</ul></div>`
  );
}

function parameters(result: StudyResult, fit: Fit): Markup {
  const end = (value: number, one: Fit['parameters'][number]): string =>
    Number.isFinite(value) ? roundedLike(value, one.estimate, one.lower, one.upper) : says.openEnd();
  return table(
    `Parameters of ${fit.name}; intervals at ${percent(result.options.confidence)}, random and systematic parts together`,
    columns('parameter', '#estimate', '#from', '#to', '#standard error', '#degrees of freedom', 'interval by', 'remark'),
    fit.parameters.map((one) =>
      one.fixed
        ? [one.name, plainNumber(one.estimate, 4), '', '', '', '', '', says.heldRemark()]
        : [
            one.name,
            valueBy(one.estimate, one.lower, one.upper),
            end(one.lower, one),
            end(one.upper, one),
            plainNumber(one.standardError, 2),
            plainNumber(one.degreesOfFreedom),
            one.intervalBy,
            [one.onBound ? says.boundRemark() : '', heldWhy(fit, one.name)].filter((text) => text !== '').join('; '),
          ],
    ),
  );
}

function heldWhy(fit: Fit, name: string): string {
  const held = fit.held.find((one) => one.parameter === name);
  return held === undefined ? '' : `held at ${plainNumber(held.value)} (${held.from}): ${held.why}`;
}

function theory(result: StudyResult, fit: Fit): Markup | false {
  const own = result.theory.filter((one) => one.law === fit.name);
  return own.length > 0 && html`<h3>Against theory</h3><ul>${own.map((one) => html`<li>${one.says}</li>`)}</ul>`;
}

function ranges(result: StudyResult, fit: Fit): Markup {
  const rows = Object.entries(fit.ranges).map(([name, [low, high]]) => {
    const definition = result.columns.find((one) => one.key === fit.groups[name]);
    const span = fit.scale === 'relative' ? `× ${plainNumber(high / low)}` : plainNumber(high - low);
    return [
      name,
      plainNumber(low),
      plainNumber(high),
      prettyUnit(definition?.unit ?? ''),
      low === high ? 'one value' : span,
      definition?.text ?? '',
    ];
  });
  return table('Where the law was tried', columns('group', '#from', '#to', 'unit', '#span', 'definition'), rows);
}
