import type { StudyResult } from '../../pipeline/results/study-result.ts';
import type { CriterionRow, PlantCase, PlantResult } from '../../pipeline/scale-up/plant-result.ts';
import { type Pictures, picturesOf } from '../figure.ts';
import { type Child, html, type Markup } from '../html.ts';
import { percent, plainNumber, roundedLike, valueBy, withInterval } from '../numbers.ts';
import * as says from '../says/sections.ts';
import { columns, table } from '../table.ts';
import { behind, prettyUnit } from '../units.ts';
import { calculator } from './calculator.ts';
import { notesOf, section } from './section.ts';

/** What does it say for the plant? */
export function plant(result: StudyResult, pictures: Pictures): Markup {
  const found = result.plant;
  if (found === null) return section('plant', says.noPlant(), html`${notesOf(result, 'plant')}${calculator(result)}`);
  return section(
    'plant',
    prettyUnit(found.says),
    html`${picturesOf(pictures, 'plant-intervals')}
${designs(found)}
${predictions(found, result.options.confidence)}
${extrapolation(found)}
${found.cases.map((one) => overall(one))}
${floors(found)}
${picturesOf(pictures, 'plant-budget')}
${found.criteria.map((one) => criteria(one.of, one.rows, found))}
${found.notes.length > 0 && html`<ul class="notes">${found.notes.map((note) => html`<li>${note.text}</li>`)}</ul>`}
${notesOf(result, 'plant', (note) => found.notes.some((one) => one.text === note.text))}
${calculator(result)}`,
  );
}

/** What to size with, and how far the case lies outside: verdict beside the number. */
function designs({ cases, coefficient }: PlantResult): Markup {
  const unit = prettyUnit(coefficient.unit);
  return table(
    'Design values',
    columns(
      'case',
      `#expected ${coefficient.symbol}${unit === '' ? '' : ` in ${unit}`}`,
      '#design value',
      'side',
      '#wanted: expected',
      '#at the design value',
      'verdict',
    ),
    cases.map((one) => [
      one.name,
      one.predictions[0] === undefined ? '–' : valueBy(one.predictions[0].coefficient, one.predictions[0].lower, one.predictions[0].upper),
      one.predictions[0] === undefined
        ? plainNumber(one.design.coefficient)
        : roundedLike(one.design.coefficient, one.predictions[0].coefficient, one.predictions[0].lower, one.predictions[0].upper),
      `${one.design.side}, one-sided ${percent(one.design.confidence)}`,
      one.target === undefined ? '–' : `${one.target.find} ${plainNumber(one.target.nominal)}${behind(one.target.unit)}`,
      one.target === undefined
        ? '–'
        : html`${plainNumber(one.target.design)}${behind(one.target.unit)}<br><span class="fine">${one.target.formula}</span>`,
      one.verdict,
    ]),
  );
}

const predictions = ({ cases, coefficient }: PlantResult, confidence: number): Markup =>
  table(
    `Every law for every case: ${coefficient.symbol}${behind(coefficient.unit) === '' ? '' : ` in ${prettyUnit(coefficient.unit)}`}, intervals at ${percent(confidence)}`,
    columns(
      'case',
      'by',
      '#law (interval of the law alone)',
      '#prediction from',
      '#to',
      '#degrees of freedom',
      'in range',
      '~largest sources',
      'the wider one',
    ),
    cases.flatMap((one) =>
      one.predictions.map((by, k): readonly Child[] => [
        one.name,
        html`${by.by}<br><span class="fine">${by.kind}</span>`,
        withInterval(by.coefficient, by.lawLower, by.lawUpper),
        roundedLike(by.lower, by.coefficient, by.lower, by.upper),
        roundedLike(by.upper, by.coefficient, by.lower, by.upper),
        plainNumber(by.degreesOfFreedom),
        by.inRange ? 'yes' : 'no',
        by.shares
          .slice(0, 3)
          .map((share) => `${share.source} ${percent(share.share)}`)
          .join(', '),
        k === 0 ? `${one.wider} (laws differ by × ${plainNumber(one.spread)})` : '',
      ]),
    ),
  );

function extrapolation({ cases }: PlantResult): Markup | false {
  const rows = cases.flatMap((one) =>
    one.extrapolation.map((of) => [
      one.name,
      of.of,
      of.kind,
      plainNumber(of.value),
      `${plainNumber(of.from)} to ${plainNumber(of.to)}`,
      prettyUnit(of.unit),
      of.beyond > 1 ? `× ${plainNumber(of.beyond)} beyond` : 'inside',
    ]),
  );
  return (
    rows.length > 0 &&
    table('How far each case lies outside the trials', columns('case', 'of', 'kind', '#plant', '#tried', 'unit', 'outside'), rows)
  );
}

function overall(one: PlantCase): Markup | false {
  if (one.overall === undefined) return false;
  const { nominal, lower, upper, resistances } = one.overall;
  const total = resistances.reduce((sum, part) => sum + part.value, 0);
  return html`${table(
    `Resistances in series, case ${one.name}: overall coefficient ${withInterval(nominal, lower, upper)} W/(m² K)`,
    columns('resistance', '#m² K/W', '#share'),
    resistances.map((part) => [part.name, plainNumber(part.value), percent(part.value / total)]),
  )}`;
}

function floors({ cases }: PlantResult): Markup | false {
  const rows = cases.flatMap((one) => one.floors.map((floor) => [one.name, floor.says, plainNumber(floor.value)]));
  return rows.length > 0 && table('Floors: what the coefficient cannot fall below', columns('case', 'floor', '#value'), rows);
}

const criteria = (of: string, rows: readonly CriterionRow[], { coefficient }: PlantResult): Markup =>
  table(
    `Scale-up criteria: ${of}`,
    columns(
      'kept equal',
      '#speed in 1/s',
      '#power in W',
      '#power per volume in W/m³',
      '#tip speed in m/s',
      `#${coefficient.symbol}${coefficient.unit === '1' ? '' : ` in ${prettyUnit(coefficient.unit)}`}`,
    ),
    rows.map((row) => [
      row.criterion,
      plainNumber(row.rotationSpeed),
      plainNumber(row.power),
      plainNumber(row.powerPerVolume),
      plainNumber(row.tipSpeed),
      withInterval(row.coefficient, row.lower, row.upper),
    ]),
  );
