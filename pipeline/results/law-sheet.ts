import type { WorkSheet } from '@e965/xlsx';
import { call } from '../algebra/build.ts';
import { derivative } from '../algebra/derivative.ts';
import { evaluate } from '../algebra/evaluate.ts';
import { spreadsheetFormula } from '../algebra/spreadsheet.ts';
import * as says from '../base/says/results.ts';
import type { Fit } from '../regression/fit.ts';
import { type Prediction, predictor } from '../regression/predict-ln.ts';
import { guarded } from './guarded.ts';
import { type Ref, SheetBuilder } from './sheet-builder.ts';
import type { StudyResult } from './study-result.ts';

/**
 * The chosen law as live formulas: group values, a factor and a confidence are the reader's to change; value, interval of the law and of a prediction
 * follow by the same formulas as `predict`. Groups start at the geometric middle of the trials. Quantiles by BETAINV, which takes fractional degrees of freedom.
 */
export function lawSheet(result: StudyResult): WorkSheet {
  const fit = result.fits.find((one) => one.name === result.chosen)!;
  const sheet = new SheetBuilder();
  sheet.row(says.sheetTitle(guarded(fit.name)));
  sheet.row(fit.text);
  sheet.row();
  const cells = inputs(sheet, fit);
  const { form } = fit;
  const h = fit.scale === 'relative' ? call('ln', form.tree) : form.tree;
  const cell = (name: string): Ref => cells.names.get(name)!;
  const tree = spreadsheetFormula(form.tree, cell);
  const slopes = fit.free.map((name) => spreadsheetFormula(derivative(h, name), cell));
  if (tree === undefined || slopes.some((one) => one === undefined)) sheet.row(form.response, says.sheetNoFormula());
  else intervals(sheet, fit, cells, tree, slopes as readonly string[]);
  return sheet.sheet;
}

interface Inputs {
  readonly names: ReadonlyMap<string, Ref>;
  readonly factor: Ref;
  readonly confidence: Ref;
  /** Source -> cell of the plant's own shift. */
  readonly plant: ReadonlyMap<string, Ref>;
  readonly middle: Readonly<Record<string, number>>;
}

function inputs(sheet: SheetBuilder, fit: Fit): Inputs {
  const names = new Map<string, Ref>();
  const middle = Object.fromEntries(fit.form.groups.map((name) => [name, middleOf(fit.ranges[name]!)]));
  sheet.row(says.sheetGroups(), '', says.sheetFrom(), says.sheetTo());
  for (const name of fit.form.groups) names.set(name, sheet.row(guarded(name), middle[name]!, ...fit.ranges[name]!)[1]!);
  const factor = sheet.row(says.sheetFactor(), 1, says.sheetFactorRemark())[1]!;
  const confidence = sheet.row(says.sheetConfidence(), fit.confidence)[1]!;
  const sources = Object.keys(fit.shifts);
  const plant = new Map<string, Ref>();
  if (sources.length > 0) sheet.row(says.sheetSources(), '', says.sheetSourcesRemark());
  for (const source of sources) plant.set(source, sheet.row(guarded(source), 0)[1]!);
  sheet.row();
  sheet.row(says.sheetParameters(), '', says.sheetError());
  for (const { name, estimate, standardError } of fit.parameters) names.set(name, sheet.row(guarded(name), estimate, standardError)[1]!);
  sheet.row();
  return { names, factor, confidence, plant, middle };
}

function intervals(sheet: SheetBuilder, fit: Fit, cells: Inputs, tree: string, slopes: readonly string[]): void {
  const { form, free, components } = fit;
  const relative = fit.scale === 'relative';
  const now = predictor(fit)({ at: cells.middle });
  const h = relative ? call('ln', form.tree) : form.tree;
  const value = sheet.formula(form.response, tree, evaluate(form.tree, cells.middle, fit.values));
  const result = sheet.formula(says.sheetTimesFactor(), `${value}*${cells.factor}`, now.value);
  // Cells of the ends stand on top; what they are worked out from follows below.
  const ends = endsBelow(sheet, now);
  sheet.row();
  sheet.row(says.sheetWorking());
  const scale = relative ? '1' : cells.factor;
  const gradient = free.map((name, k) =>
    sheet.formula(`d/d ${guarded(name)}`, `(${slopes[k]!})*${scale}`, evaluate(derivative(h, name), cells.middle, fit.values)),
  );
  const w = rangeOf(gradient);
  const places = free.map((name) => form.constants.indexOf(name));
  const of = (m: readonly (readonly number[])[]): readonly (readonly number[])[] => places.map((a) => places.map((b) => m[a]![b]!));
  const quadratic = (label: string, m: readonly (readonly number[])[], known: number): Ref => {
    if (free.length === 0) return sheet.formula(label, '0', 0);
    const columns = sheet.block(label, of(m));
    return sheet.formula(`${label}: w M w`, columns.map((column, k) => `${gradient[k]}*SUMPRODUCT(${column},${w})`).join('+'), known);
  };
  const values = gradientNow(fit, cells.middle);
  const quadraticNow = (m: readonly (readonly number[])[]): number =>
    of(m).reduce((sum, row, i) => sum + values[i]! * row.reduce((inner, one, j) => inner + one * values[j]!, 0), 0);
  const law = quadratic(says.sheetPhi(), fit.covarianceRandom, now.variance.law);
  const gammas = components.derivatives.map((m, k) => quadratic(`${says.sheetSlope()} ${components.names[k]}`, m, quadraticNow(m)));
  const known = knownPart(sheet, fit, cells, places, w, now);
  const component = (name: string): number => components.values[components.names.indexOf(name)] ?? 0;
  const rest = sheet.formula(
    says.sheetRest(),
    `(${component('campaign')}+${component('scatter')})*POWER(${scale},2)`,
    now.variance.campaign + now.variance.scatter,
  );
  const spread = (gamma: (k: number) => string): string =>
    components.covariance.flatMap((row, i) => row.map((value, j) => `(${gamma(i)})*(${gamma(j)})*(${value})`)).join('+') || '0';
  const most = fit.residualDegreesOfFreedom;
  const end = (which: keyof typeof ends, random: string, gamma: (k: number) => string, freedom: number): void => {
    const nu = sheet.formula(
      says.sheetFreedom(),
      `IF(${spread(gamma)}>0,MAX(1,MIN(${most},2*POWER(${random},2)/(${spread(gamma)}))),${most})*POWER((${random}+${known})/(${random}),2)`,
      freedom,
    );
    const x = `BETAINV(1-${cells.confidence},${nu}/2,0.5)`;
    const half = sheet.formula(says.sheetHalf(), `SQRT(${nu}*(1/${x}-1))*SQRT(${random}+${known})`, halfNow(now, which));
    ends[which](half, relative, result);
  };
  end('law', law, (k) => gammas[k]!, now.lawDegreesOfFreedom);
  end('prediction', `(${law}+${rest})`, (k) => `${gammas[k]}+POWER(${scale},2)`, now.degreesOfFreedom);
}

const rangeOf = (cells: readonly Ref[]): Ref => (cells.length === 0 ? '' : `${cells[0]}:${cells.at(-1)}`);

const gradientNow = (fit: Fit, at: Readonly<Record<string, number>>): readonly number[] => {
  const h = fit.scale === 'relative' ? call('ln', fit.form.tree) : fit.form.tree;
  return fit.free.map((name) => evaluate(derivative(h, name), at, fit.values));
};

/** sum over sources of (w K + the plant's own shift)^2. */
function knownPart(sheet: SheetBuilder, fit: Fit, cells: Inputs, places: readonly number[], w: Ref, now: Prediction): Ref {
  const sources = Object.keys(fit.shifts);
  if (sources.length === 0 || places.length === 0) return sheet.formula(says.sheetKnown(), '0', 0);
  const columns = sheet.block(
    says.sheetShifts(),
    places.map((place) => sources.map((source) => fit.shifts[source]![place]!)),
  );
  const total = columns.map((column, k) => `POWER(SUMPRODUCT(${column},${w})+${cells.plant.get(sources[k]!)},2)`).join('+');
  return sheet.formula(
    says.sheetKnown(),
    total,
    Object.values(now.sources).reduce((sum, t) => sum + t * t, 0),
  );
}

/** Four cells for the ends, filled once the working below them is laid out. */
function endsBelow(
  sheet: SheetBuilder,
  now: Prediction,
): Readonly<Record<'law' | 'prediction', (half: Ref, relative: boolean, centre: Ref) => void>> {
  const rows = [
    [says.sheetLawLower(), now.lawLower],
    [says.sheetLawUpper(), now.lawUpper],
    [says.sheetLower(), now.lower],
    [says.sheetUpper(), now.upper],
  ] as const;
  const cells = rows.map(([label, value]) => sheet.formula(label, String(value), value));
  const fill =
    (low: number) =>
    (half: Ref, relative: boolean, centre: Ref): void => {
      sheet.replace(cells[low]!, relative ? `${centre}*EXP(-${half})` : `${centre}-${half}`);
      sheet.replace(cells[low + 1]!, relative ? `${centre}*EXP(${half})` : `${centre}+${half}`);
    };
  return { law: fill(0), prediction: fill(2) };
}

/** Half-width on the scale of the fit. */
function halfNow(now: Prediction, which: 'law' | 'prediction'): number {
  const upper = which === 'law' ? now.lawUpper : now.upper;
  return now.relative ? Math.log(upper / now.value) : upper - now.value;
}

const middleOf = ([low, high]: readonly [number, number]): number => (low > 0 ? Math.sqrt(low * high) : (low + high) / 2);
