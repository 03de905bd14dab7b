import { says } from '../base/says/study.ts';
import type { Faults } from './faults.ts';
import { given } from './given.ts';
import type { LawEntry, Placed } from './study.ts';
import type { Tree } from './tree.ts';
import { child, itemsOf, numberOf, placed, placedNumber, recordOf, textAt } from './view.ts';

/** The laws in their order; a bare text is named after its place in the list. */
export function readLaws(tree: Tree | undefined, faults: Faults): readonly LawEntry[] {
  const laws = itemsOf(tree).map((item, k) => readLaw(item, k + 1));
  const seen = new Set<string>();
  for (const { name, start, bounds } of laws) {
    if (seen.has(name.is)) faults.add('law-name-twice', says.lawNameTwice(name.is), name.place);
    seen.add(name.is);
    checkBounds(start, bounds, faults);
  }
  return laws;
}

function readLaw(tree: Tree, number: number): LawEntry {
  const name = textAt(tree, 'name') ?? { is: `law ${number}`, place: tree.place };
  if (tree.kind === 'scalar') return { name, form: placed(tree), start: {}, bounds: {}, in: {} };
  const parameters = child(tree, 'parameters');
  return given({
    name,
    form: textAt(tree, 'form') ?? { is: '', place: tree.place },
    parameters: parameters === undefined ? undefined : itemsOf(parameters).map(placed),
    start: recordOf(child(tree, 'start'), placedNumber),
    bounds: recordOf(child(tree, 'bounds'), pair),
    in: recordOf(child(tree, 'in'), placed),
  });
}

const pair = (tree: Tree): Placed<readonly [number, number]> => {
  const [low, high] = itemsOf(tree).map(numberOf);
  return { is: [low ?? Number.NaN, high ?? Number.NaN], place: tree.place };
};

function checkBounds(start: LawEntry['start'], bounds: LawEntry['bounds'], faults: Faults): void {
  for (const [name, { is, place }] of Object.entries(bounds)) {
    const [low, high] = is;
    const from = start[name];
    if (!(low < high)) faults.add('bounds-reversed', says.boundsReversed(low, high), place);
    else if (from !== undefined && !(from.is >= low && from.is <= high))
      faults.add('start-outside', says.startOutside(name, from.is, low, high), from.place);
  }
}
