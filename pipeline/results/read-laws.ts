import { z } from 'zod';
import type { Expr } from '../algebra/form.ts';
import { InputError } from '../base/input-error.ts';
import * as says from '../base/says/results.ts';
import type { Predictable } from '../regression/predict-ln.ts';
import type { ForPlant } from '../scale-up/for-plant.ts';

/** A `laws.json` read back: all that a prediction needs. */
export interface SavedLaws {
  readonly study: { readonly title: string; readonly transfer: 'heat' | 'mass'; readonly equipment: string };
  /** What the laws give at the plant; `key` is h, k or the response itself. */
  readonly coefficient: { readonly key: string; readonly symbol: string; readonly unit: string };
  readonly chosen: string;
  readonly laws: readonly Predictable[];
  readonly forPlant: ForPlant;
}

const number = z.number();
const rows = z.array(z.array(number));
const record = <T extends z.ZodType>(of: T) => z.record(z.string(), of);
const fn = z.enum(['exp', 'ln', 'log10', 'sqrt', 'tanh', 'sin', 'cos', 'atan', 'abs', 'friction']);

const expression: z.ZodType<Expr> = z.lazy(() =>
  z.union([
    z.object({ op: z.literal('number'), value: number }),
    z.object({ op: z.enum(['group', 'constant']), name: z.string() }),
    z.object({ op: z.enum(['+', '*', 'min', 'max', '^']), of: z.tuple([expression, expression]) }),
    z.object({ op: z.literal('call'), fn, of: z.array(expression) }),
    z.object({ op: z.literal('bands'), on: expression, below: z.array(number), of: z.array(expression) }),
  ]),
) as z.ZodType<Expr>;

const law = z.object({
  name: z.string(),
  form: z.object({ response: z.string(), tree: expression, groups: z.array(z.string()), constants: z.array(z.string()) }),
  chosen: z.boolean(),
  accepted: z.boolean(),
  free: z.array(z.string()),
  values: record(number),
  keys: record(z.string()),
  covariance_random: rows,
  systematic: record(z.array(number)),
  components: z.object({
    names: z.array(z.string()),
    values: z.array(number),
    covariance: rows,
    derivatives: z.array(rows),
    criterion: number.nullable(),
  }),
  residual_degrees_of_freedom: number,
  campaign_effect: z.enum(['random', 'fixed', 'none', 'inseparable']),
  ranges: record(z.tuple([number, number])),
});

const file = z.object({
  format: z.literal(1),
  study: z.object({ title: z.string(), transfer: z.enum(['heat', 'mass']), equipment: z.string() }),
  confidence: number,
  scale: z.enum(['relative', 'absolute']),
  coefficient: z.object({ key: z.string(), symbol: z.string(), unit: z.string() }),
  laws: z.array(law).min(1),
  for_plant: z.looseObject({
    basis: z.looseObject({ equipment: z.string(), transfer: z.string() }),
    tried: z.array(z.looseObject({ key: z.string() })),
    anchor: z.looseObject({}),
    largestSpreads: record(number),
    accepted: z.array(z.string()),
  }),
});

/** Text of a `laws.json` as this version writes it; anything else is refused (exit 2) with the first field that is wrong. */
export function readLaws(text: string, name: string): SavedLaws {
  const place = { file: name };
  let parsed: unknown;
  try {
    parsed = JSON.parse(text);
  } catch (error) {
    throw new InputError([{ code: 'no-laws', text: says.noLaws((error as Error).message), place }]);
  }
  const read = file.safeParse(parsed);
  if (!read.success) {
    const { path, message } = read.error.issues[0]!;
    throw new InputError([{ code: 'no-laws', text: says.wrongLaws(message), place: { ...place, key: path.join('.') } }]);
  }
  const { study, coefficient, confidence, scale, laws, for_plant } = read.data;
  return {
    study,
    coefficient,
    chosen: (laws.find((one) => one.chosen) ?? laws[0]!).name,
    laws: laws.map(
      (one): Predictable => ({
        name: one.name,
        form: one.form,
        values: one.values,
        groups: one.keys,
        free: one.free,
        shifts: one.systematic,
        components: { ...one.components, criterion: one.components.criterion ?? Number.NaN },
        covarianceRandom: one.covariance_random,
        residualDegreesOfFreedom: one.residual_degrees_of_freedom,
        confidence,
        scale,
        ranges: one.ranges,
        campaigns: { kind: one.campaign_effect },
      }),
    ),
    forPlant: for_plant as unknown as ForPlant,
  };
}
