import type { Fit } from '../../pipeline/regression/fit.ts';
import type { LawCurve, StudyResult } from '../../pipeline/results/study-result.ts';
import type { Figure } from '../figure.ts';
import { chosenFit } from '../law-text.ts';
import { percent } from '../numbers.ts';
import * as says from '../says/figures.ts';
import { auditCharts, compared } from './audit-chart.ts';
import { budgetCharts, exponentChart, influenceChart, methodsChart } from './evidence-charts.ts';
import { correlationLabels } from './labels.ts';
import { lawChart, namedLines } from './law-chart.ts';
import type { Spec } from './palette.ts';
import { narrowingChart, plantCharts, proposalMap } from './plant-charts.ts';
import { rangeMap } from './range-map.ts';
import { leverageChart, parityChart, residualsAgainst, residualsAgainstFitted, residualsInOrder } from './residual-charts.ts';
import { MOST_CURVES, seriesChart } from './series-charts.ts';

/** Every picture of the report in the order of its sections, each a pure function of the result. */
export function figuresOf(result: StudyResult): readonly Figure[] {
  const fit = chosenFit(result);
  return [
    ...(fit === undefined ? [] : answerFigures(result, fit)),
    ...auditFigures(result),
    ...plantFigures(result),
    ...(fit === undefined ? [] : evidenceFigures(result, fit)),
    ...nextFigures(result),
  ];
}

/** A picture that may have nothing to show. */
const optional = (spec: Spec | undefined, figure: Omit<Figure, 'spec'>): readonly Figure[] =>
  spec === undefined ? [] : [{ ...figure, spec }];

/** One figure, or several numbered parts of it. */
const parts = (specs: readonly Spec[], figure: Omit<Figure, 'spec'>): readonly Figure[] =>
  specs.map((spec, k) => ({ ...figure, name: specs.length === 1 ? figure.name : `${figure.name}-${k + 1}`, spec }));

function answerFigures(result: StudyResult, fit: Fit): readonly Figure[] {
  const caption = (curve: LawCurve): string => says.lawCaption(result, curve, curve.published.length - namedLines(result, curve));
  return [
    ...result.curves.map((curve, k) => ({
      name: `law-${k + 1}`,
      spec: lawChart(result, curve),
      caption: caption(curve),
      alternative: says.lawAlternative(result, curve),
    })),
    ...optional(exponentChart(result), {
      name: 'exponents',
      caption: says.exponentCaption(),
      alternative: says.exponentAlternative(result.theory.filter((one) => one.law === fit.name).map((one) => one.says)),
    }),
    ...optional(rangeMap(result), {
      name: 'range-map',
      caption: says.rangeCaption(result.plant?.cases.length ?? 0),
      alternative: says.rangeAlternative(fit.form.groups),
    }),
  ];
}

function auditFigures(result: StudyResult): readonly Figure[] {
  if (result.audit === null) return [];
  const labels = correlationLabels(result.audit.rows);
  const named = compared(result).map((row) => ({ name: labels.get(row.id)!, verdict: row.verdict }));
  return parts(auditCharts(result), {
    name: 'audit-bias',
    caption: says.auditCaption(result.audit.tolerance, result.options.confidence),
    alternative: says.auditAlternative(named),
  });
}

function plantFigures(result: StudyResult): readonly Figure[] {
  const { plant } = result;
  if (plant === null) return [];
  const budgets = plant.cases.flatMap((one) => {
    const shares = one.predictions[0]?.shares ?? [];
    return shares.length === 0
      ? []
      : [{ of: one.name, total: 1, shares: shares.map((share) => ({ ...share, kind: 'systematic' as const })) }];
  });
  return [
    ...parts(plantCharts(result), {
      name: 'plant-intervals',
      caption: says.plantCaption(result.options.confidence),
      alternative: says.plantAlternative(plant.says),
    }),
    ...parts(budgetCharts(budgets), {
      name: 'plant-budget',
      caption: says.plantBudgetCaption(),
      alternative: says.budgetAlternative(largestOf(budgets)),
    }),
  ];
}

const largestOf = (
  budgets: readonly { readonly of: string; readonly shares: readonly { readonly source: string; readonly share: number }[] }[],
): readonly string[] =>
  budgets.flatMap(({ of, shares }) => (shares[0] === undefined ? [] : [`${of}, ${shares[0].source} ${percent(shares[0].share)}`]));

/** Groups against which residuals are drawn; more would be noise. */
const MOST_GROUPS = 6;

function evidenceFigures(result: StudyResult, fit: Fit): readonly Figure[] {
  const { studentised, cook } = fit.diagnostics;
  const beyond = studentised.filter((r) => Math.abs(r) > 2).length;
  const residual = (name: string, spec: Spec, against: string): Figure => ({
    name,
    spec,
    half: true,
    caption: says.residualCaption(against),
    alternative: says.residualAlternative(against, beyond, studentised.length),
  });
  const most = result.trials.map((trial, row) => ({ trial: trial.trial, cook: cook[row] ?? 0 })).sort((a, b) => b.cook - a.cook);
  return [
    {
      name: 'parity',
      spec: parityChart(result, fit),
      half: true,
      caption: says.parityCaption(fit.scale === 'relative'),
      alternative: says.parityAlternative(result),
    },
    {
      name: 'leverage',
      spec: leverageChart(result, fit),
      half: true,
      caption: says.leverageCaption(),
      alternative: says.leverageAlternative(most.slice(0, 3).map((one) => one.trial)),
    },
    residual('residual-fitted', residualsAgainstFitted(result, fit), `fitted ${fit.form.response}`),
    ...fit.form.groups
      .slice(0, MOST_GROUPS)
      .map((group, k) => residual(`residual-group-${k + 1}`, residualsAgainst(result, fit, group), group)),
    residual('residual-order', residualsInOrder(result, fit), 'the order of the trials'),
    ...optional(influenceChart(result, fit), {
      name: 'influence',
      caption: says.influenceCaption(),
      alternative: says.influenceAlternative(),
    }),
    ...optional(methodsChart(result, fit), {
      name: 'interval-methods',
      caption: says.methodsCaption(),
      alternative: says.methodsAlternative(),
    }),
    ...parts(budgetCharts(result.budgets), {
      name: 'budget',
      caption: says.budgetCaption(),
      alternative: says.budgetAlternative(largestOf(result.budgets)),
    }),
    ...result.series.slice(0, MOST_CURVES).map((series, k) => ({
      name: `series-${k + 1}`,
      spec: seriesChart(series),
      half: true,
      ...(series.windows === undefined
        ? {
            caption: says.seriesCaption(series.trial, series.quantity),
            alternative: says.seriesAlternative(series.trial, series.quantity, series.t.length),
          }
        : { caption: says.logCaption(series.quantity), alternative: says.logAlternative(series.quantity, series.windows.length) }),
    })),
  ];
}

function nextFigures(result: StudyResult): readonly Figure[] {
  const { nextTrials } = result;
  if (nextTrials === null) return [];
  return [
    ...optional(proposalMap(result), {
      name: 'proposals',
      caption: says.proposalCaption(chosenFit(result)?.form.groups.slice(0, 2) ?? []),
      alternative: says.proposalAlternative(nextTrials.proposals.length),
    }),
    ...optional(narrowingChart(result), {
      name: 'narrowing',
      caption: says.narrowingCaption(),
      alternative: says.narrowingAlternative(nextTrials.says),
    }),
  ];
}
