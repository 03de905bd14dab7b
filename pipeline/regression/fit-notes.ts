import type { Note, Section } from '../base/message.ts';
import * as says from '../base/says/regression.ts';
import { campaignSizes } from './campaign-effect.ts';
import type { FitData, FitOptions, Held, Parameter, StatedUncertaintyTest } from './fit.ts';
import type { Solved } from './solve-law.ts';

/** What the notes of a fit look at. */
export interface Findings {
  readonly law: string;
  readonly solved: Solved;
  readonly parameters: readonly Parameter[];
  readonly uncorrected: readonly number[];
  readonly statedUncertainty: StatedUncertaintyTest | undefined;
  readonly data: FitData;
  readonly options: FitOptions;
}

/** Below these a note turns into a warning: real share of a group's variation; probability that stated uncertainties are right. */
const LIMITS = { reliability: 0.85, tail: 0.05, degreesOfFreedom: 5, moved: 0.25 };

/** Everything that the reader of a fit must be told, each where it belongs. */
export function fitNotes(found: Findings): readonly Note[] {
  return [
    ...howItEnded(found),
    ...whatIsHeld(found),
    ...predictions(found),
    ...campaigns(found),
    ...components(found),
    ...errorsInGroups(found),
    ...bounds(found),
  ];
}

type Say = (section: Section, level: Note['level'], code: string, text: string) => Note;
const sayer =
  (about: string): Say =>
  (section, level, code, text) => ({ section, level, code, text, about });

function howItEnded({ law, solved, options }: Findings): readonly Note[] {
  const say = sayer(law);
  const { stop } = solved.settled;
  const { n } = solved.eq.problem;
  const free = solved.search.free.length;
  const notes: Note[] = [];
  if (stop.why === 'not finite') return [say('answer', 'warning', 'law-without-value', says.noValue(law))];
  if (solved.entangled.length > 0) return [say('answer', 'warning', 'not-identified', says.notIdentified(solved.entangled))];
  if (n <= free) return [say('answer', 'warning', 'too-few-trials', says.tooFewTrials(law, n, free))];
  if (stop.why === 'no further descent' || stop.why === 'iterations used up')
    notes.push(say('answer', 'warning', 'not-converged', says.notConverged(law, stop.why, stop.value, stop.limit)));
  if (n - free < LIMITS.degreesOfFreedom)
    notes.push(say('answer', 'warning', 'few-degrees-of-freedom', says.fewDegreesOfFreedom(law, n - free)));
  if (solved.sandwich !== undefined && solved.sandwich.phi === undefined)
    notes.push(say('answer', 'warning', 'no-covariance', says.noCovariance(law)));
  if (options.weights === 'column') notes.push(say('method', 'note', 'weights-replace-uncertainty', says.weightsReplace()));
  return notes;
}

function whatIsHeld({ law, solved }: Findings): readonly Note[] {
  const say = sayer(law);
  const from: Record<Held['from'], string> = {
    theory: 'theory',
    start: 'its start value',
    'common exponent': 'the nearest common exponent',
  };
  return solved.held.map((held) =>
    held.why === 'not identified'
      ? say('answer', 'warning', 'held-not-identified', says.heldNotIdentified(held.parameter, held.value, from[held.from]))
      : say('answer', 'warning', 'held-unreliable', says.heldUnreliable(held.parameter, held.value, from[held.from], held.reliability)),
  );
}

/** Said of every law that has an interval: what a prediction from it holds and what not. */
function predictions({ law, solved }: Findings): readonly Note[] {
  return solved.sandwich?.phi === undefined ? [] : [sayer(law)('plant', 'note', 'what-predictions-hold', says.whatPredictionsHold())];
}

/** One campaign or two tell nothing of a third: said beside every prediction. */
function campaigns({ law, solved, data, options }: Findings): readonly Note[] {
  const say = sayer(law);
  const count = campaignSizes(data).length;
  switch (solved.prepared.effect) {
    case 'fixed':
      return [say('plant', 'warning', 'two-campaigns', says.twoCampaigns(law, shiftOf(solved)))];
    case 'inseparable':
      return [say('plant', 'note', 'campaigns-inseparable', says.campaignsInseparable())];
    case 'random':
      return [
        ...(count === 2 ? [say('plant', 'warning', 'two-campaigns', says.randomTwoCampaigns())] : []),
        ...(solved.settled.components.campaign > 0 ? [] : [say('evidence', 'note', 'campaign-variance-zero', says.campaignAtZero())]),
      ];
    default:
      if (count > 1)
        return [say('plant', options.campaignEffect === 'none' ? 'warning' : 'note', 'campaigns-ignored', says.campaignsIgnored(count))];
      return [say('plant', 'warning', 'one-campaign', says.oneCampaign(law))];
  }
}

const shiftOf = ({ settled, eq }: Solved): string => {
  const { model } = eq.problem;
  const size = Math.abs(settled.theta[model.constants.length]!);
  return model.scale === 'relative' ? says.choices.percent(Math.expm1(size)) : says.choices.digits(size);
};

/** Scatter at zero, and stated uncertainties that the trials contradict. */
function components({ law, solved, statedUncertainty: test, uncorrected, parameters, options }: Findings): readonly Note[] {
  const say = sayer(law);
  if (test === undefined || solved.sandwich === undefined) return [];
  const { chiSquared, degreesOfFreedom, below, above } = test;
  if (options.scatter === 'none')
    return above < LIMITS.tail
      ? [say('answer', 'warning', 'scatter-ignored', says.scatterIgnored(chiSquared, degreesOfFreedom, above))]
      : [];
  if (solved.settled.components.scatter > 0) return [];
  return below < LIMITS.tail
    ? [
        say(
          'answer',
          'warning',
          'uncertainty-too-large',
          says.uncertaintyTooLarge(chiSquared, degreesOfFreedom, below, above, listed(parameters, uncorrected)),
        ),
      ]
    : [say('evidence', 'note', 'scatter-zero', says.scatterAtZero(chiSquared, degreesOfFreedom, below, above))];
}

const listed = (parameters: readonly Parameter[], values: readonly number[]): string =>
  parameters.flatMap(({ name, fixed }, j) => (fixed ? [] : [`${name} ${says.choices.digits(values[j]!)}`])).join(', ');

/** How far the design is its own error, and where the law would be without the correction. */
function errorsInGroups({ law, solved, parameters, uncorrected }: Findings): readonly Note[] {
  const say = sayer(law);
  const reliability = solved.sandwich?.reliability ?? 1;
  const moved = parameters.some(
    ({ estimate, standardErrorRandom, fixed }, j) => !fixed && Math.abs(estimate - uncorrected[j]!) > LIMITS.moved * standardErrorRandom,
  );
  if (reliability < LIMITS.reliability)
    return [say('answer', 'warning', 'attenuation', says.attenuated(reliability, listed(parameters, uncorrected)))];
  return moved ? [say('evidence', 'note', 'errors-in-groups', says.uncorrected(listed(parameters, uncorrected)))] : [];
}

function bounds({ law, parameters }: Findings): readonly Note[] {
  const say = sayer(law);
  return parameters
    .filter(({ onBound }) => onBound)
    .map(({ name, estimate }) => say('answer', 'warning', 'on-bound', says.onBound(name, estimate)));
}
