import { seeded } from '../../pipeline/numerics/random.ts';
import { fitLaw } from '../../pipeline/regression/fit-law.ts';
import { predictor } from '../../pipeline/regression/predict-ln.ts';
import { draw, type Setting } from './settings.ts';

/** What became of many studies of one setting. Shares of 1. */
export interface Tally {
  readonly setting: Setting;
  readonly studies: number;
  readonly parameters: readonly { readonly name: string; readonly bias: number; readonly biasError: number; readonly coverage: number; readonly of: number }[];
  /** Interval of the law (line) and of the prediction (a new campaign's coefficient), inside and 3 times outside the range. */
  readonly law: { readonly inside: number; readonly outside: number };
  readonly prediction: { readonly inside: number; readonly outside: number };
  /** Share of studies with each code among the notes, by level. */
  readonly warnings: Readonly<Record<string, number>>;
  readonly notes: Readonly<Record<string, number>>;
  readonly held: number;
}

/** Runs `studies` synthetic studies, seeded. */
export function tally(setting: Setting, studies: number, seed: number): Tally {
  const random = seeded(seed);
  const sums = new Map<string, { error: number; square: number; covered: number; n: number }>();
  const hits = { law: { inside: 0, outside: 0 }, prediction: { inside: 0, outside: 0 } };
  const warnings: Record<string, number> = {};
  const notes: Record<string, number> = {};
  let held = 0;
  for (let study = 0; study < studies; study++) {
    const { law, data, options, truth, inside, outside } = draw(setting, random);
    const fit = fitLaw(law, data, options);
    for (const parameter of fit.parameters) {
      const true_ = truth[parameter.name];
      if (true_ === undefined) continue;
      if (parameter.fixed) {
        held += 1;
        continue;
      }
      const sum = sums.get(parameter.name) ?? { error: 0, square: 0, covered: 0, n: 0 };
      const error = parameter.estimate - true_;
      sum.error += error;
      sum.square += error * error;
      sum.covered += parameter.lower <= true_ && true_ <= parameter.upper ? 1 : 0;
      sum.n += 1;
      sums.set(parameter.name, sum);
    }
    const predict = predictor(fit);
    for (const [where, asked] of [['inside', inside], ['outside', outside]] as const) {
      const p = predict(asked.condition);
      hits.law[where] += p.lawLower <= asked.line && asked.line <= p.lawUpper ? 1 : 0;
      hits.prediction[where] += p.lower <= asked.coefficient && asked.coefficient <= p.upper ? 1 : 0;
    }
    for (const code of new Set(fit.notes.map((note) => `${note.level} ${note.code}`))) {
      const [level, name] = code.split(' ') as ['note' | 'warning', string];
      const counted = level === 'warning' ? warnings : notes;
      counted[name] = (counted[name] ?? 0) + 1 / studies;
    }
  }
  const share = ({ inside, outside }: { inside: number; outside: number }) => ({ inside: inside / studies, outside: outside / studies });
  return {
    setting,
    studies,
    parameters: [...sums].map(([name, { error, square, covered, n }]) => ({
      name,
      bias: error / n,
      biasError: Math.sqrt((square / n - (error / n) ** 2) / n),
      coverage: covered / n,
      of: n,
    })),
    law: share(hits.law),
    prediction: share(hits.prediction),
    warnings,
    notes,
    held: held / studies,
  };
}
