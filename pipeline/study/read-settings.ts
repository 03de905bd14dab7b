import { says } from '../base/says/study.ts';
import type { Faults } from './faults.ts';
import { given } from './given.ts';
import { checkPath } from './paths.ts';
import { readFluid } from './read-fluid.ts';
import { readQuantities } from './read-quantity.ts';
import type { GroupEntry, Placed, SteadyEntry, Study } from './study.ts';
import type { Tree } from './tree.ts';
import { child, entriesOf, itemsOf, numberOf, placed, recordOf, shareOf, textAt, truthAt, wordAt, written } from './view.ts';

export function readTrials(tree: Tree, faults: Faults): Study['trials'] {
  const short = tree.kind === 'scalar';
  const file = short ? placed(tree) : (textAt(tree, 'file') ?? { is: '', place: tree.place });
  checkPath(file, faults);
  return given({
    file,
    steady: short ? undefined : readSteady(tree, faults),
    sheet: textAt(tree, 'sheet'),
    trial: textAt(tree, 'trial'),
    campaign: textAt(tree, 'campaign'),
    readings: wordAt<'average'>(tree, 'readings'),
    setting: textAt(tree, 'setting'),
    order: textAt(tree, 'order'),
    missing: itemsOf(child(tree, 'missing')).map(written),
    leaveOut: itemsOf(child(tree, 'leave_out')).map((item) => ({
      trial: textAt(item, 'trial') ?? placed(item),
      reason: textAt(item, 'reason')?.is ?? '',
    })),
  });
}

/** How steady windows are looked for in a raw log; keys that say what its rows are have no meaning there. */
function readSteady(tree: Tree, faults: Faults): SteadyEntry | undefined {
  const steady = child(tree, 'steady');
  if (steady === undefined) return undefined;
  for (const key of ['trial', 'campaign', 'readings', 'setting', 'order', 'sheet']) {
    const other = child(tree, key);
    if (other !== undefined) faults.add('steady-alone', says.steadyAlone(key), other.place);
  }
  const within = (key: string, standard: number, from: number, to: number): number => {
    const given = child(steady, key);
    const share = given === undefined ? standard : shareOf(given);
    if (!(share >= from && share <= to)) faults.add('wrong-value', says.notThis(written(given!), says.between(from, to)), given!.place);
    return share;
  };
  const nothing = { is: '', place: steady.place };
  return {
    time: textAt(steady, 'time') ?? nothing,
    window: textAt(steady, 'window') ?? nothing,
    share: within('share', 0.9, 0.5, 1),
    significance: within('significance', 0.01, 1e-4, 0.2),
    place: steady.place,
  };
}

export const readGroups = (tree: Tree | undefined, faults: Faults): Readonly<Record<string, Placed<GroupEntry>>> =>
  recordOf(tree, (value) => ({ is: readGroup(value, faults), place: value.place }));

function readGroup(tree: Tree, faults: Faults): GroupEntry {
  if (tree.kind === 'scalar') return { basis: placed(tree) };
  const entry = given({
    basis: textAt(tree, 'basis'),
    at: textAt(tree, 'at'),
    formula: textAt(tree, 'formula'),
    column: textAt(tree, 'column'),
    random: textAt(tree, 'random'),
    systematic: textAt(tree, 'systematic'),
  });
  const origins = (['basis', 'formula', 'column'] as const).filter((key) => entry[key] !== undefined);
  if (origins.length > 1 || (origins.length === 0 && entry.at === undefined))
    faults.add('one-of', says.oneOf(['basis', 'formula', 'column'], origins), tree.place);
  return entry;
}

export function readFit(tree: Tree | undefined, faults: Faults, place: Placed<string>['place']): Study['fit'] {
  const of = tree ?? { kind: 'map', entries: [], place };
  const confidence = child(of, 'confidence');
  const level = confidence === undefined ? 0.95 : shareOf(confidence);
  if (!(level >= 0.5 && level <= 0.9999))
    faults.add('wrong-value', says.notThis(written(confidence!), 'a confidence from 0.5 to 0.9999, such as 0.95'), confidence!.place);
  const resamples = child(of, 'resamples');
  return {
    error: wordAt<'relative' | 'absolute'>(of, 'error')?.is ?? 'relative',
    weights: textAt(of, 'weights') ?? { is: 'uncertainty', place: of.place },
    scatter: wordAt<'estimate' | 'none'>(of, 'scatter')?.is ?? 'estimate',
    campaignEffect: wordAt<'auto' | 'none' | 'intercept'>(of, 'campaign_effect')?.is ?? 'auto',
    confidence: level,
    resamples: resamples === undefined ? 2000 : numberOf(resamples),
    monteCarlo: truthAt(of, 'monte_carlo', false),
  };
}

/** Undefined for `audit: none`; without the key every applicable correlation is audited. */
export function readAudit(tree: Tree | undefined, faults: Faults, place: Placed<string>['place']): Study['audit'] {
  if (tree?.kind === 'scalar') return undefined;
  const of = tree ?? { kind: 'map', entries: [], place };
  const against = child(of, 'against');
  const tolerance = child(of, 'tolerance');
  const share = tolerance === undefined ? 0.2 : shareOf(tolerance);
  if (!(share >= 0.01 && share <= 5))
    faults.add('wrong-value', says.notThis(written(tolerance!), 'a share from 1 % to 500 %, such as 20 %'), tolerance!.place);
  const own = textAt(of, 'own');
  checkPath(own, faults);
  return given({
    against:
      against === undefined
        ? { is: 'applicable', place: of.place }
        : against.kind === 'list'
          ? { is: against.items.map(written), place: against.place }
          : placed(against),
    analogy: truthAt(of, 'analogy', true),
    tolerance: share,
    own,
  });
}

export function readPlant(tree: Tree | undefined, faults: Faults): Study['plant'] {
  if (tree === undefined) return undefined;
  const file = tree.kind === 'scalar' ? placed(tree) : textAt(tree, 'file');
  const target = child(tree, 'target');
  if (file === undefined && child(tree, 'quantities') === undefined) faults.add('needs', says.needsPlant, tree.place);
  checkPath(file, faults);
  return given({
    file,
    sheet: textAt(tree, 'sheet'),
    case: textAt(tree, 'case'),
    conservative: wordAt<'low' | 'high'>(tree, 'conservative')?.is ?? 'low',
    target: target && recordOf(target, placed),
    quantities: readQuantities(child(tree, 'quantities'), faults),
    fluid: readFluid(child(tree, 'fluid'), faults),
  });
}

type RigSetting = NonNullable<Study['rig']>['settings'][string];

export function readRig(tree: Tree | undefined, faults: Faults): Study['rig'] {
  if (tree === undefined) return undefined;
  const settings: Record<string, RigSetting> = Object.create(null);
  for (const { key, value } of entriesOf(tree)) if (key !== 'campaigns') settings[key] = readRigSetting(value, faults);
  return { settings, campaigns: wordAt<'new' | 'existing' | 'either'>(tree, 'campaigns')?.is ?? 'new', place: tree.place };
}

function readRigSetting(tree: Tree, faults: Faults): RigSetting {
  if (tree.kind === 'list') {
    const [from, to] = tree.items.map(placed);
    return given({ from, to, cost: 1 });
  }
  const levels = child(tree, 'levels');
  const from = textAt(tree, 'from');
  const to = textAt(tree, 'to');
  const ways = [(from ?? to) && 'from and to', levels && 'levels'].filter((way) => way !== undefined);
  if (ways.length !== 1 || (from === undefined) !== (to === undefined))
    faults.add('one-of', says.oneOf(['from and to', 'levels'], ways.length === 1 ? [] : ways), tree.place);
  const cost = child(tree, 'cost');
  return given({ from, to, levels: levels && itemsOf(levels).map(placed), cost: cost === undefined ? 1 : numberOf(cost) });
}

export function readOutput(tree: Tree | undefined, faults: Faults, place: Placed<string>['place']): Study['output'] {
  const folder = tree === undefined ? undefined : tree.kind === 'scalar' ? placed(tree) : textAt(tree, 'folder');
  checkPath(folder, faults);
  return { folder: folder ?? { is: 'results', place }, assets: (tree && wordAt<'inline' | 'shared'>(tree, 'assets')?.is) ?? 'inline' };
}
