import type { Fit } from '../../pipeline/regression/fit.ts';
import type { Identifiability, StudyResult } from '../../pipeline/results/study-result.ts';
import { MOST_CURVES } from '../charts/series-charts.ts';
import { type Pictures, picturesOf } from '../figure.ts';
import { html, type Markup } from '../html.ts';
import { chosenFit } from '../law-text.ts';
import { percent, percentOfLn, plainNumber, roundedLike } from '../numbers.ts';
import { refitOf } from '../says/figures.ts';
import * as says from '../says/sections.ts';
import { columns, table } from '../table.ts';
import { notesOf, section } from './section.ts';

/** Can these trials tell that? */
export function evidence(result: StudyResult, pictures: Pictures): Markup {
  const fit = chosenFit(result);
  const own = result.identifiability.find((one) => one.law === result.chosen);
  return section(
    'evidence',
    (own?.says ?? []).join(' ') || says.noGroups(),
    html`${notesOf(result, 'evidence')}
<div class="pair">${picturesOf(pictures, 'parity')}${picturesOf(pictures, 'leverage')}${picturesOf(pictures, 'residual')}</div>
${fit?.statedUncertainty !== undefined && html`<p>${says.statedUncertainty(plainNumber(fit.statedUncertainty.chiSquared), plainNumber(fit.statedUncertainty.degreesOfFreedom), plainNumber(fit.statedUncertainty.above, 2))}</p>`}
${picturesOf(pictures, 'influence')}
${fit !== undefined && influence(result, fit)}
${breaks(result)}
${laws(result)}
${sides(result)}
${own !== undefined && identifiability(own)}
${picturesOf(pictures, 'budget')}
${budgets(result)}
${picturesOf(pictures, 'interval-methods')}
${fit !== undefined && methods(result, fit)}
<div class="pair">${picturesOf(pictures, 'series')}</div>
${result.series.length > MOST_CURVES && html`<p class="fine">${says.notDrawn(result.series.length - MOST_CURVES)}</p>`}`,
  );
}

function influence(result: StudyResult, fit: Fit): Markup | false {
  const names = fit.parameters.filter((one) => !one.fixed).map((one) => one.name);
  if (result.influence.length === 0 || names.length === 0) return false;
  const shown = (name: string, value: number): string => {
    const one = fit.parameters.find((parameter) => parameter.name === name)!;
    return Number.isFinite(value) ? roundedLike(value, one.estimate, one.lower, one.upper) : plainNumber(value);
  };
  return table(
    says.refits(),
    columns('refit', ...names.map((name) => `#${name}`)),
    result.influence.map((row) => [refitOf(row.kind, row.left), ...names.map((name) => shown(name, row.values[name] ?? Number.NaN))]),
  );
}

function breaks(result: StudyResult): Markup | false {
  const rows = result.breaks.flatMap((one) => (one.looked ? [one] : []));
  const place = (value: number): string => (value > 0 && Number.isFinite(value) ? plainNumber(value) : says.open());
  return (
    rows.length > 0 &&
    table(
      says.breaks(rows[0]!.law),
      columns(
        'group',
        '#best break',
        '#from',
        '#to',
        '#exponent below',
        '#above',
        '#change',
        '#from',
        '#to',
        '#AICc by the break',
        '#chance alone',
      ),
      rows.map((one) => [
        one.group,
        ...[one.at, one.lower, one.upper].map(place),
        ...[one.below, one.above, one.change, one.changeLower, one.changeUpper].map((value) => plainNumber(value)),
        plainNumber(one.aicc),
        percent(one.chance),
      ]),
    )
  );
}

/** Both sides of a law that was fitted through overall coefficients. */
function sides({ sides: both }: StudyResult): Markup | false {
  if (both === null) return false;
  const bounded = (value: number, lower: number, upper: number): readonly string[] =>
    [value, lower, upper].map((one) => plainNumber(one, 4));
  return html`${table(
    says.otherSides(),
    columns('campaign', '#resistance', '#lower', '#upper'),
    both.others.map(({ campaign, resistance, lower, upper }) => [campaign, ...bounded(resistance, lower, upper)]),
  )}
${table(
  says.ownSide(),
  columns('trial', '#coefficient', '#lower', '#upper', '#share of the whole resistance'),
  both.own.map(({ trial, coefficient, lower, upper, share }) => [trial, ...bounded(coefficient, lower, upper), percent(share)]),
)}`;
}

function laws(result: StudyResult): Markup {
  const relative = result.options.error === 'relative';
  return table(
    says.comparedLaws(),
    columns('law', '#free parameters', '#AICc', '#BIC', '#error on left-out trials', 'remark'),
    result.choice.compared.map((row) => [
      row.law,
      row.parameters,
      plainNumber(row.aicc, 4),
      plainNumber(row.bic, 4),
      relative ? percentOfLn(row.cvRmsLn) : plainNumber(row.cvRmsLn),
      row.says,
    ]),
  );
}

function identifiability({ law, conditionIndices, proportions, parameters }: Identifiability): Markup | false {
  if (conditionIndices.length < 2) return false;
  return html`${table(
    says.condition(law),
    columns('#condition index', ...parameters.map((name) => `#${name}`)),
    conditionIndices.map((index, k) => [plainNumber(index), ...parameters.map((_, j) => percent(proportions[k]?.[j] ?? Number.NaN))]),
  )}<p class="fine">${says.conditionFine()}</p>`;
}

const budgets = (result: StudyResult): Markup | false =>
  result.budgets.length > 0 &&
  html`<details><summary>All sources of uncertainty in numbers</summary>${table(
    'Shares of each source in the variance of each parameter',
    columns('parameter', 'source', 'kind', '#share'),
    result.budgets.flatMap((budget) => budget.shares.map((one) => [budget.of, one.source, one.kind, percent(one.share)])),
  )}</details>`;

function methods(result: StudyResult, fit: Fit): Markup | false {
  const rows = result.intervals.filter((one) => one.law === fit.name);
  return (
    rows.length > 0 &&
    table(
      'Intervals of the parameters by method',
      columns('parameter', 'method', '#from', '#to', 'note'),
      rows.map((row) => {
        const one = fit.parameters.find((parameter) => parameter.name === row.parameter);
        const end = (value: number): string =>
          one === undefined ? plainNumber(value) : roundedLike(value, one.estimate, one.lower, one.upper);
        return [row.parameter, row.method, end(row.lower), end(row.upper), row.note];
      }),
    )
  );
}
