import type { Key, Rule } from '../rule.ts';

const OTHER = '_other';

/** `viscosity@film` of the second stream is `viscosity_other@film`. */
export function otherKey(key: Key): Key {
  const at = key.indexOf('@');
  return at < 0 ? `${key}${OTHER}` : `${key.slice(0, at)}${OTHER}${key.slice(at)}`;
}

/** The same rules for the second stream. `shared`: keys that both streams have in common. */
export const forOtherStream = (rules: readonly Rule[], shared: readonly Key[] = []): readonly Rule[] =>
  rules.map((rule) => {
    const rename = (key: Key): Key => (shared.includes(key) ? key : otherKey(key));
    return { ...rule, gives: rename(rule.gives), from: rule.from.map(rename) };
  });
