import type { Note } from '../base/message.ts';
import * as says from '../base/says/evidence.ts';
import { breakNotes } from './break-notes.ts';
import { type BreakSearch, breakSearches } from './break-search.ts';
import type { Contender } from './choose.ts';
import type { Fit, FitData, FitOptions } from './fit.ts';
import { subset } from './fit-data.ts';
import { fitLaw, type LawToFit } from './fit-law.ts';
import { collinearity, entangled } from './identifiability.ts';
import { residualNotes } from './residual-checks.ts';
import { type RobustRefit, robustRefits } from './robust.ts';
import { robustNotes } from './robust-notes.ts';
import { roleOf } from './role-of.ts';
import { whitenedDesign } from './whitened-design.ts';

export interface TheoryTest {
  readonly law: string;
  readonly parameter: string;
  readonly theory: string;
  readonly value: number;
  readonly compatible: boolean;
  readonly says: string;
}

export interface InfluenceRow {
  readonly kind: 'campaign' | 'trial' | 'robust refit' | 'no errors in x';
  readonly left: string;
  readonly values: Readonly<Record<string, number>>;
}

export interface Identifiability {
  readonly law: string;
  readonly conditionIndices: readonly number[];
  readonly proportions: readonly (readonly number[])[];
  readonly parameters: readonly string[];
  readonly says: readonly string[];
}

/** What the trials can tell of the laws. */
export interface Evidence {
  readonly theory: readonly TheoryTest[];
  readonly influence: readonly InfluenceRow[];
  /** Of the chosen law. */
  readonly robust: readonly RobustRefit[];
  /** Of the chosen law, one for each Re in it. */
  readonly breaks: readonly BreakSearch[];
  readonly identifiability: readonly Identifiability[];
  readonly notes: readonly Note[];
}

/** One law with what it was fitted to. */
export interface Witness extends Contender {
  readonly law: LawToFit;
  readonly data: FitData;
}

export interface EvidenceSettings {
  readonly chosen: string;
  readonly order: readonly (number | undefined)[];
  readonly setting: readonly (string | undefined)[];
  readonly options: FitOptions;
}

export function evidenceOf(witnesses: readonly Witness[], { chosen, order, setting, options }: EvidenceSettings): Evidence {
  const best = witnesses.find(({ fit }) => fit.name === chosen)!;
  const robust = robustRefits(best.law, best.fit, best.data, options);
  const breaks = breakSearches(best.law, best.fit, best.data, options);
  return {
    theory: witnesses.flatMap(({ fit }) => theoryTests(fit)),
    influence: [...robust.flatMap(robustRow), ...influenceOf(best, options)],
    robust,
    breaks,
    identifiability: witnesses.map(({ fit, data }) => identifiabilityOf(fit, data)),
    notes: [
      ...witnesses.flatMap(({ fit, data }) => residualNotes(fit, data, order, setting)),
      ...witnesses.flatMap(({ fit, data }) => rangeNotes(fit, data)),
      ...robustNotes(best.fit, robust, best.data.trials),
      ...breakNotes(breaks),
    ],
  };
}

const robustRow = ({ method, values, stop }: RobustRefit): readonly InfluenceRow[] =>
  stop === 'converged' ? [{ kind: 'robust refit', left: method, values }] : [];

/** Exponents and offsets that theory or long practice gives: 1/3 (boundary layer at Pr or Sc), 1/2 (laminar layer, penetration), 0.8 (turbulent tube), 2/3 (stirred vessel), 2 (stagnant sphere). */
const theories: readonly {
  readonly text: string;
  readonly value: number;
  readonly about: 'exponent' | 'offset';
  readonly of: readonly string[];
}[] = [
  { text: '1/3', value: 1 / 3, about: 'exponent', of: ['Pr', 'Sc'] },
  { text: '1/2', value: 0.5, about: 'exponent', of: ['Re', 'Sc'] },
  { text: '0.8', value: 0.8, about: 'exponent', of: ['Re'] },
  { text: '2/3', value: 2 / 3, about: 'exponent', of: ['Re'] },
  { text: '2', value: 2, about: 'offset', of: [] },
];

function theoryTests(fit: Fit): readonly TheoryTest[] {
  return fit.parameters.flatMap((parameter) => {
    if (parameter.fixed) return [];
    const role = roleOf(fit, parameter.name);
    return theories
      .filter((theory) => theory.about === role.kind && (role.kind === 'offset' || theory.of.includes(role.of)))
      .map((theory) => {
        const compatible = parameter.lower <= theory.value && theory.value <= parameter.upper;
        return {
          law: fit.name,
          parameter: parameter.name,
          theory: theory.text,
          value: theory.value,
          compatible,
          says: says.theory(parameter, role.of, theory.text, compatible),
        };
      });
  });
}

/** The law without each campaign, and without each of the three most influential trials. */
function influenceOf({ law, fit, data }: Witness, options: FitOptions): readonly InfluenceRow[] {
  const without = (kind: InfluenceRow['kind'], left: string, trials: readonly number[]): readonly InfluenceRow[] => {
    const refit = fitLaw({ ...law, start: fit.values, trusted: true }, subset(data, trials), options, 'values');
    return refit.stop.why === 'rank deficient' || refit.stop.why === 'not finite' ? [] : [{ kind, left, values: refit.values }];
  };
  const all = data.trials.map((_, i) => i);
  const campaigns =
    data.campaigns.length < 2
      ? []
      : data.campaigns.flatMap((name, c) =>
          without(
            'campaign',
            name,
            all.filter((i) => data.campaign[i] !== c),
          ),
        );
  const worst = [...all]
    .sort((a, b) => (fit.diagnostics.cook[b] ?? 0) - (fit.diagnostics.cook[a] ?? 0))
    .slice(0, data.trials.length > 6 ? 3 : 0);
  return [
    ...campaigns,
    ...worst.flatMap((one) =>
      without(
        'trial',
        data.trials[one]!,
        all.filter((i) => i !== one),
      ),
    ),
  ];
}

function identifiabilityOf(fit: Fit, data: FitData): Identifiability {
  const columns = whitenedDesign(fit, data);
  const found = columns.length === 0 ? { indices: [], proportions: [] } : collinearity(columns);
  const mixed = found.indices.length === 0 ? [] : entangled(found).map((j) => fit.free[j]!);
  const sentences = [
    ...(mixed.length > 1 ? [says.entangled(fit.name, mixed, found.indices.at(-1)!)] : []),
    ...fit.form.groups.map((name, g) => says.range(name, spanOf(data, g), data.scale)),
  ];
  return { law: fit.name, conditionIndices: found.indices, proportions: found.proportions, parameters: fit.free, says: sentences };
}

/** max/min for logarithms, max - min for values. */
function spanOf(data: FitData, g: number): number {
  const column = data.x[g]!;
  const [low, high] = [Math.min(...column), Math.max(...column)];
  return data.scale === 'relative' ? Math.exp(high - low) : high - low;
}

/** A group that hardly varies cannot show its exponent. */
const NARROW = 1.5;

function rangeNotes(fit: Fit, data: FitData): readonly Note[] {
  if (data.scale !== 'relative') return [];
  return fit.parameters.flatMap((parameter): readonly Note[] => {
    const role = roleOf(fit, parameter.name);
    if (parameter.fixed || role.kind !== 'exponent') return [];
    const span = spanOf(data, fit.form.groups.indexOf(role.of));
    return span < NARROW
      ? [
          {
            section: 'evidence',
            level: 'warning',
            code: 'narrow-range',
            text: says.narrow(fit.name, role.of, parameter.name, span),
            about: fit.name,
          },
        ]
      : [];
  });
}
