import type { AuditResult } from '../audit/verdict.ts';
import type { Note } from '../base/message.ts';
import * as says from '../base/says/results.ts';
import type { Staged } from '../base/staged.ts';
import type { Budget } from '../budget/budget.ts';
import type { Observed } from '../observations/observe.ts';
import type { Naming, Plan } from '../plan/plan.ts';
import type { Choice, Contender } from '../regression/choose.ts';
import type { Evidence } from '../regression/evidence.ts';
import type { FitOptions } from '../regression/fit.ts';
import type { IntervalRow } from '../regression/intervals.ts';
import type { ForPlant } from '../scale-up/for-plant.ts';
import type { NextTrialsResult, PlantResult } from '../scale-up/plant-result.ts';
import type { TrialsWithCurves } from '../trials/curve-readings.ts';
import { foldLedger, sumLedger } from '../trials/ledger.ts';
import type { Trials } from '../trials/read-trials.ts';
import type { SteadyTrials } from '../trials/steady.ts';
import type { BothSides } from './both-sides.ts';
import type { LawCurve } from './curves.ts';
import { drawnCurves } from './drawn-curves.ts';
import { drawnLog } from './drawn-log.ts';
import { methodOf } from './method.ts';
import type { StudyResult } from './study-result.ts';
import { trialRows } from './trial-rows.ts';

/** All that the stages made. */
export interface Stages {
  readonly plan: Plan;
  readonly read: Staged<Trials | TrialsWithCurves | SteadyTrials>;
  readonly observed: Staged<Observed>;
  readonly contenders: readonly Contender[];
  readonly choice: Choice;
  readonly evidence: Evidence;
  readonly intervals: readonly IntervalRow[];
  readonly audit: AuditResult | null;
  readonly plant: PlantResult | null;
  readonly nextTrials: NextTrialsResult | null;
  readonly forPlant: ForPlant;
  readonly budgets: readonly Budget[];
  readonly curves: readonly LawCurve[];
  readonly sides: BothSides | null;
  readonly notes: readonly Note[];
  readonly cautions: readonly string[];
  readonly options: FitOptions;
  readonly facts: {
    readonly version: string;
    readonly node: string;
    readonly seed: number;
    readonly files: readonly { readonly file: string; readonly sha256: string }[];
  };
}

/** Everything as plain JSON. */
export function assemble(stages: Stages): StudyResult {
  const { plan, read, observed, contenders, choice, evidence, options, facts } = stages;
  const { study } = plan;
  const { observations, evaluated } = observed.value;
  const law = plan.laws.find((one) => one.name === choice.law)!;
  const columns = columnsOf(plan);
  const rows = foldLedger(read.value.ledger, [...read.refused, ...observed.refused]);
  const statements = statementsOf(options, contenders);
  return {
    format: 1,
    study: {
      title: study.title,
      transfer: study.transfer,
      equipment: study.equipment.is,
      file: study.file,
      invented: study.invented,
      fluid: [study.fluid?.own, study.fluid?.other]
        .flatMap((one) => (one === undefined ? [] : [one.is.name?.is ?? one.is.table?.is ?? '']))
        .join(' and '),
      route: study.coefficient?.route.is ?? '',
    },
    options: {
      error: options.scale,
      weights: study.fit.weights.is,
      scatter: options.scatter,
      campaignEffect: options.campaignEffect,
      confidence: options.confidence,
      resamples: options.resamples,
      tolerance: study.audit?.tolerance ?? Number.NaN,
    },
    response: plan.namings.get(law.groups[law.form.response]!)!,
    coefficient: plan.coefficient,
    columns,
    ledger: { ...sumLedger(rows), trials: observations.trials.length, rows },
    campaigns: observations.campaigns,
    trials: trialRows(
      plan,
      read.value,
      evaluated,
      observations,
      columns.map((column) => column.key),
    ),
    fits: contenders.map(({ fit }) => fit),
    chosen: choice.law,
    choice,
    theory: evidence.theory,
    intervals: stages.intervals,
    influence: evidence.influence,
    robust: evidence.robust,
    breaks: evidence.breaks,
    identifiability: evidence.identifiability,
    audit: stages.audit,
    plant: stages.plant,
    nextTrials: stages.nextTrials,
    forPlant: stages.forPlant,
    budgets: stages.budgets,
    curves: stages.curves,
    sides: stages.sides,
    series: seriesOf(read.value, plan),
    notes: distinct(stages.notes),
    method: methodOf(
      plan,
      statements,
      plan.candidates.map((one) => one.correlation.source),
    ),
    cautions: stages.cautions,
    provenance: { version: facts.version, node: facts.node, seed: facts.seed, files: facts.files },
  };
}

const seriesOf = (read: Stages['read']['value'], plan: Plan): StudyResult['series'] =>
  'curves' in read ? drawnCurves(read.curves, plan) : 'log' in read ? drawnLog(read, plan) : [];

/** Response first, then every group of every law, each once. */
function columnsOf({ laws, namings }: Plan): readonly Naming[] {
  const keys = new Set([
    ...laws.map((law) => law.groups[law.form.response]!),
    ...laws.flatMap((law) => law.form.groups.map((name) => law.groups[name]!)),
  ]);
  return [...keys].map((key) => namings.get(key)!);
}

function statementsOf(options: FitOptions, contenders: readonly Contender[]): readonly string[] {
  const plain = contenders.every(({ fit }) => Number.isNaN(fit.statistics.chiSquared) && Number.isNaN(fit.statistics.campaignSd));
  return [
    plain ? says.plainMethod() : options.scale === 'relative' ? says.normalEquation() : says.absoluteEquation(),
    says.intervalMethod(options.confidence),
  ];
}

/** The same sentence is told once. */
function distinct(notes: readonly Note[]): readonly Note[] {
  const seen = new Set<string>();
  return notes.filter(({ section, text }) => {
    const key = `${section}|${text}`;
    if (seen.has(key)) return false;
    seen.add(key);
    return true;
  });
}
