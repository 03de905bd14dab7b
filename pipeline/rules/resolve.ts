import { quantityOf } from '../quantities/vocabulary.ts';
import { uncertainOf } from './evaluate.ts';
import type { Input, Key, Missing, Recipe, Rule } from './rule.ts';

/** Rules by what they give, in order of preference. Built once for a study. */
export interface RuleBook {
  readonly waysTo: (key: Key) => readonly Rule[];
}

export function ruleBook(rules: Iterable<Rule>): RuleBook {
  const ways = new Map<Key, Rule[]>();
  for (const rule of rules) {
    const known = ways.get(rule.gives);
    if (known === undefined) ways.set(rule.gives, [rule]);
    else known.push(rule);
  }
  return { waysTo: (key) => ways.get(key) ?? [] };
}

/** Key of the input that carries the relative error of a model: value 1, one draw for the study. */
export const factorKey = (source: string): Key => `factor: ${source}`;

/**
 * From what is given to what is wanted. Given beats derived; among the rules for a key the first one whose own needs can be met is taken.
 * What cannot be had comes back in `missing` with every rule that would have given it; its place in `recipe.wanted` is -1.
 */
export function resolve(
  book: RuleBook,
  inputs: readonly Input[],
  wanted: readonly Key[],
): { readonly recipe: Recipe; readonly missing: readonly Missing[] } {
  const given = new Set(inputs.map((input) => input.key));
  const chosen = chooseRules(book, given, wanted);
  return {
    recipe: layOut(inputs, chosen, wanted),
    missing: wanted.filter((key) => !given.has(key) && !chosen.has(key)).map((key) => missing(book, given, chosen, key)),
  };
}

/** Depth-first, so that preference wins over nearness. A failure met inside a cycle is not remembered: from elsewhere the key may still be had. */
function chooseRules(book: RuleBook, given: ReadonlySet<Key>, wanted: readonly Key[]): Map<Key, Rule> {
  const chosen = new Map<Key, Rule>();
  const hopeless = new Set<Key>();
  const open: Key[] = [];
  let highestCut = Number.POSITIVE_INFINITY;

  const canHave = (key: Key): boolean => {
    if (given.has(key) || chosen.has(key)) return true;
    if (hopeless.has(key)) return false;
    const standing = open.indexOf(key);
    if (standing >= 0) {
      highestCut = Math.min(highestCut, standing);
      return false;
    }
    const outerCut = highestCut;
    highestCut = Number.POSITIVE_INFINITY;
    open.push(key);
    const rule = book.waysTo(key).find((way) => way.from.every(canHave));
    open.pop();
    if (rule !== undefined) chosen.set(key, rule);
    else if (highestCut >= open.length) hopeless.add(key);
    highestCut = Math.min(outerCut, highestCut >= open.length ? Number.POSITIVE_INFINITY : highestCut);
    return rule !== undefined;
  };

  for (const key of wanted) canHave(key);
  for (const rule of chosen.values()) for (const key of checked(rule)) canHave(key);
  return chosen;
}

function layOut(inputs: readonly Input[], chosen: ReadonlyMap<Key, Rule>, wanted: readonly Key[]): Recipe {
  const ordered: Rule[] = [];
  const placed = new Set(inputs.map((input) => input.key));
  const place = (key: Key): void => {
    const rule = chosen.get(key);
    if (rule === undefined || placed.has(key)) return;
    placed.add(key);
    for (const need of rule.from) place(need);
    ordered.push(rule);
  };
  for (const key of wanted) place(key);
  for (const rule of ordered) for (const key of checked(rule)) place(key);

  const factors = new Map<Key, Input>();
  for (const { accuracy } of ordered) if (accuracy !== undefined) factors.set(factorKey(accuracy.source), factorInput(accuracy));
  const all = [...inputs, ...factors.values()];
  const keys = [...all.map((input) => input.key), ...ordered.map((rule) => rule.gives)];
  const node = new Map(keys.map((key, index) => [key, index]));
  const steps = ordered.map((rule) => ({
    rule,
    from: rule.from.map((key) => node.get(key)!),
    ...(rule.accuracy === undefined ? {} : { factor: node.get(factorKey(rule.accuracy.source))! }),
  }));
  return { inputs: all, keys, steps, wanted: wanted.map((key) => node.get(key) ?? -1) };
}

/** A rule's checks may look at keys the rule itself does not use, even at what is derived from its result; they are laid out where they can be had. */
const checked = (rule: Rule): readonly Key[] => (rule.checks ?? []).flatMap((check) => check.from.map(uncertainOf));

function factorInput({ source, share }: { readonly source: string; readonly share: number }): Input {
  return { key: factorKey(source), constant: 1, systematic: [{ spread: { share }, source, per: 'study' }], label: source };
}

function missing(book: RuleBook, given: ReadonlySet<Key>, chosen: ReadonlyMap<Key, Rule>, key: Key): Missing {
  const have = (need: Key): boolean => given.has(need) || chosen.has(need);
  return { key, ways: book.waysTo(key).map((rule) => ({ rule, lacks: rule.from.filter((need) => !have(need)) })) };
}

/**
 * The keys that nothing gives and that stand at the bottom of why `key` cannot be had, nearest way first. A quantity that would take several others is asked
 * for itself; a way that leads in a circle is none.
 */
export function rootsOfMissing(book: RuleBook, have: (key: Key) => boolean, key: Key): readonly Key[] {
  return have(key) ? [] : rootsBelow(book, have, key, new Set());
}

function rootsBelow(book: RuleBook, have: (key: Key) => boolean, key: Key, seen: ReadonlySet<Key>): readonly Key[] {
  const deeper = new Set([...seen, key]);
  const options = book
    .waysTo(key)
    .map((rule) => rule.from.filter((need) => !have(need)))
    .filter((lacks) => lacks.length > 0 && !lacks.some((need) => deeper.has(need)))
    .map((lacks) => [...new Set(lacks.flatMap((need) => rootsBelow(book, have, need, deeper)))]);
  if (options.length === 0) return [key];
  const best = options.reduce((one, option) => (option.length < one.length ? option : one));
  return best.length > 1 && quantityOf(key) !== undefined ? [key] : best;
}
