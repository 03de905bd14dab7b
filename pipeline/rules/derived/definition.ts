import type { Key, Rule } from '../rule.ts';

/** A rule that follows from the meaning of its words. `assumes` is told to the reader once where the rule is in force. */
export const definition = (gives: Key, from: readonly Key[], of: (...x: number[]) => number, formula: string, assumes?: string): Rule => ({
  gives,
  from,
  of,
  formula,
  source: 'definition',
  ...(assumes === undefined ? {} : { assumes }),
});
