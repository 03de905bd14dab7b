import { z } from 'zod';
import { says } from '../base/says/study.ts';

/** Between the messages of one issue with several unknown keys. */
export const KEY_BREAK = '\n';

type RawIssue = { readonly code?: string; readonly input?: unknown; readonly keys?: readonly string[] };

const told =
  (wants: string) =>
  ({ input }: RawIssue): string =>
    input === undefined ? says.missing(wants) : input === null ? says.empty(wants) : says.notThis(input, wants);

/** A text; numbers count as texts as they are written. `wants` completes "is not ..." and "give ...". */
export const text = (wants: string) => z.union([z.string().min(1), z.number()], { error: told(wants) }).meta({ description: wants });

/** A text that a number cannot stand for. */
export const word = (wants: string) =>
  z
    .string({ error: told(wants) })
    .min(1, { error: told(wants) })
    .meta({ description: wants });

export const number = (wants: string, { from = Number.NEGATIVE_INFINITY, to = Number.POSITIVE_INFINITY } = {}) => {
  const error = told(wants);
  let schema = z.number({ error });
  if (Number.isFinite(from)) schema = schema.min(from, { error });
  if (Number.isFinite(to)) schema = schema.max(to, { error });
  return schema.meta({ description: wants });
};

export const whole = (wants: string, from: number, to: number) =>
  z
    .int({ error: told(wants) })
    .min(from, { error: told(wants) })
    .max(to, { error: told(wants) })
    .meta({ description: wants });

/** 0.2 or `20 %`. */
export const share = (wants: string) =>
  z.union([z.number(), z.string().regex(/^\s*\d+(\.\d+)?\s*%\s*$/)], { error: told(wants) }).meta({ description: wants });

export const truth = (wants: string) => z.boolean({ error: told(wants) }).meta({ description: wants });

export const choice = <const T extends readonly [string, ...string[]]>(known: T, wants: string) =>
  z
    .enum(known, { error: ({ input }) => (input === undefined ? says.missing(`one of ${known.join(', ')}`) : says.notOneOf(input, known)) })
    .meta({ description: wants });

/** A map with these keys and no others. */
export const fields = <T extends z.core.$ZodLooseShape>(shape: T, wants: string) => {
  const known = Object.keys(shape);
  const error = ({ input, code, keys = [] }: RawIssue): string =>
    code === 'unrecognized_keys' ? keys.map((key) => says.unknownKey(key, known)).join(KEY_BREAK) : told(wants)({ input });
  return z.strictObject(shape, { error }).meta({ description: wants });
};

/** A map whose keys are the user's names. */
export const named = <T extends z.ZodType>(value: T, wants: string) =>
  z
    .record(
      z.string().regex(/^[\p{L}][\p{L}\p{N}_]{0,79}$/u, { error: told('a name: a letter, then letters, digits and underscores') }),
      value,
      { error: told(wants) },
    )
    .meta({ description: wants });

export const list = <T extends z.ZodType>(item: T, wants: string, most: number, least = 0) =>
  z
    .array(item, { error: told(wants) })
    .min(least, { error: told(wants) })
    .max(most, { error: told(`${wants} (at most ${most})`) })
    .meta({ description: wants });

export const either = <A extends z.ZodType, B extends z.ZodType>(a: A, b: B, wants: string) =>
  z.union([a, b], { error: told(wants) }).meta({ description: wants });
