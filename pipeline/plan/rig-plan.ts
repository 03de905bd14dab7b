import { nearest } from '../base/nearest.ts';
import * as says from '../base/says/plant.ts';
import { parseAmount } from '../quantities/amount.ts';
import { isFault } from '../quantities/fault.ts';
import type { Unit } from '../quantities/unit.ts';
import { quantityNames, quantityOf } from '../quantities/vocabulary.ts';
import { type RuleBook, resolve } from '../rules/resolve.ts';
import type { Input, Key, Recipe } from '../rules/rule.ts';
import type { Placed, Study } from '../study/study.ts';
import type { Faults } from './faults.ts';
import type { PlannedLaw } from './plan.ts';

/** One thing that next trials may set: its levels in SI, the unit it is told in, what a change costs. */
interface RigSetting {
  readonly key: Key;
  readonly levels: readonly number[];
  readonly unit: Unit;
  readonly cost: number;
}

/** The rig's box, and the groups of every law from its settings. */
export interface RigPlan {
  readonly settings: readonly RigSetting[];
  readonly campaigns: 'new' | 'existing' | 'either';
  /** Groups only: no response is needed of a trial that has not been run. */
  readonly recipe: Recipe;
}

const LEVELS = 7;

/** Settings -> levels; groups of the laws from settings, the study's constants, and its other columns at the trials' middle. */
export function planRig(
  rig: NonNullable<Study['rig']>,
  laws: readonly PlannedLaw[],
  book: RuleBook,
  inputs: readonly Input[],
  faults: Faults,
): RigPlan {
  const known = [...quantityNames, ...inputs.map(({ key }) => key)];
  const settings = Object.entries(rig.settings).flatMap(([key, setting]): readonly RigSetting[] => {
    if (!known.includes(key)) {
      const place = (setting.from ?? setting.levels?.[0])?.place ?? rig.place;
      faults.add('unknown-setting', says.unknownRigSetting(key, nearest(key, known)), place);
      return [];
    }
    const read = settingOf(key, setting, faults);
    return read === undefined ? [] : [read];
  });
  if (Object.keys(rig.settings).length === 0) faults.add('rig-empty', says.rigEmpty(), rig.place);
  const set = new Set(settings.map(({ key }) => key));
  const all: readonly Input[] = [
    ...settings.map(({ key }) => inputs.find((input) => input.key === key) ?? { key, label: key }),
    ...inputs.filter(({ key }) => !set.has(key)),
  ];
  const keys = [...new Set(laws.flatMap((law) => law.form.groups.map((name) => law.groups[name]!)))];
  return { settings, campaigns: rig.campaigns, recipe: resolve(book, all, keys).recipe };
}

type Setting = NonNullable<Study['rig']>['settings'][string];

function settingOf(key: Key, { from, to, levels, cost }: Setting, faults: Faults): RigSetting | undefined {
  const read = (text: Placed<string>) => {
    const amount = parseAmount(text.is, quantityOf(key));
    if (!isFault(amount)) return amount;
    faults.add(amount.code, `rig.${key}: ${amount.text}`, text.place);
    return undefined;
  };
  const ends = [from, to, ...(levels ?? [])].flatMap((one) => (one === undefined ? [] : [read(one)]));
  if (ends.some((one) => one === undefined) || ends.length === 0) return undefined;
  const amounts = ends as readonly NonNullable<(typeof ends)[number]>[];
  const { unit } = amounts[0]!;
  const values = amounts.map(({ si }) => si);
  if (levels !== undefined) return { key, levels: [...new Set(values)].sort((a, b) => a - b), unit, cost };
  return { key, levels: between(Math.min(...values), Math.max(...values), quantityOf(key)?.kind === 'temperature'), unit, cost };
}

/** Seven levels from end to end, in equal ratios where the range is wide and its zero means nothing is there. */
function between(from: number, to: number, linear: boolean): readonly number[] {
  if (!(to > from)) return [from];
  const ratio = !linear && from > 0 && to / from > 1.5;
  return Array.from({ length: LEVELS }, (_, k) => {
    const t = k / (LEVELS - 1);
    return ratio ? from * (to / from) ** t : from + (to - from) * t;
  });
}
