import type { Correlation } from '../../correlations/correlation.ts';
import * as says from '../base/says/plan.ts';
import { definitionText } from '../groups/definition.ts';
import { isFault } from '../quantities/fault.ts';
import { fromSI } from '../quantities/unit.ts';
import { unitFor } from '../quantities/unit-for.ts';
import { quantityOf } from '../quantities/vocabulary.ts';
import type { Key, Rule } from '../rules/rule.ts';
import type { Study } from '../study/study.ts';
import { keysOn } from './analogy.ts';
import type { Faults } from './faults.ts';

/** A correlation with its definitions on the trials' side of the analogy. */
export interface Applicable {
  readonly correlation: Correlation;
  readonly basis: 'direct' | 'analogy';
  readonly own: boolean;
  readonly keys: Readonly<Record<string, Key>>;
}

/** Correlations that the study asks to be compared: those of its equipment, or those it names. By analogy only where the study allows it. */
export function applicable(
  study: Study,
  catalogue: readonly Correlation[],
  own: readonly Correlation[],
  faults: Faults,
): readonly Applicable[] {
  if (study.audit === undefined) return [];
  const { against, analogy } = study.audit;
  const asked = against.is === 'applicable' ? undefined : [against.is].flat();
  const all = [...catalogue, ...own];
  for (const id of asked ?? []) {
    if (!all.some((one) => one.id === id || one.family === id))
      faults.add(
        'unknown-correlation',
        says.unknownCorrelation(
          id,
          all.map((one) => one.id),
        ),
        against.place,
      );
  }
  const wanted = (one: Correlation): boolean =>
    asked === undefined ? own.includes(one) || one.family === study.equipment.is : asked.includes(one.id) || asked.includes(one.family);
  return all.filter(wanted).flatMap((correlation) => {
    const on = keysOn(correlation, study.transfer);
    if (on === undefined || (on.basis === 'analogy' && !analogy)) return [];
    return [{ correlation, basis: on.basis, own: own.includes(correlation), keys: on.keys }];
  });
}

/** A study that has a group as a column of its own meets every definition of that group, on trust; each such key follows from the column. */
export function trustRules(keys: readonly Key[], onTrust: ReadonlySet<string>): readonly Rule[] {
  return [...new Set(keys)].flatMap((key) => {
    const name = key.split('@')[0]!;
    if (!onTrust.has(name) || key === name) return [];
    return [
      {
        gives: key,
        from: [name],
        of: (...x: number[]) => x[0]!,
        formula: `${name} as in the table`,
        source: "the study's own column",
        assumes: says.onTrust(name),
      },
    ];
  });
}

/** Quantities that a law or a user's correlation takes in a unit of its own: `velocity [ft/s]`. */
export function unitRules(keys: readonly Key[]): readonly Rule[] {
  return [...new Set(keys)].flatMap((key) => {
    const [, name, text] = /^(.+) \[(.+)\]$/.exec(key) ?? [];
    const unit = name === undefined ? undefined : unitFor(quantityOf(name), text!);
    if (name === undefined || unit === undefined || isFault(unit)) return [];
    return [
      { gives: key, from: [name], of: (...x: number[]) => fromSI(x[0]!, unit), formula: `${name} in ${text}`, source: 'unit conversion' },
    ];
  });
}

/** Keys that correlations ask for. */
export const keysAsked = (candidates: readonly Applicable[]): readonly Key[] => candidates.flatMap((one) => Object.values(one.keys));

/** The definition behind a key in words; a quantity by what it is. */
export const keyText = (key: Key): string => definitionText(key)?.text ?? quantityOf(key.split(' [')[0]!)?.says ?? key;
