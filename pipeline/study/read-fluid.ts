import { says } from '../base/says/study.ts';
import type { Faults } from './faults.ts';
import { given } from './given.ts';
import { checkPath } from './paths.ts';
import type { FluidEntry, Placed, Study } from './study.ts';
import type { Tree } from './tree.ts';
import { child, entriesOf, itemsOf, placed, textAt } from './view.ts';

/** One stream, or `own` and `other`. */
export function readFluid(tree: Tree | undefined, faults: Faults): Study['fluid'] {
  if (tree === undefined) return undefined;
  const own = child(tree, 'own');
  const other = child(tree, 'other');
  if (own === undefined && other === undefined) return { own: readStream(tree, faults) };
  return given({ own: own && readStream(own, faults), other: other && readStream(other, faults) });
}

const CONDITIONS = ['temperature', 'pressure', 'mass_fraction', 'relative_humidity'];

function readStream(tree: Tree, faults: Faults): Placed<FluidEntry> {
  if (tree.kind === 'scalar') return { is: { name: placed(tree), at: {} }, place: tree.place };
  const name = textAt(tree, 'name');
  const table = textAt(tree, 'table');
  const by = child(tree, 'by');
  const named = [name && 'name', table && 'table'].filter((key) => key !== undefined);
  if (named.length !== 1) faults.add('one-of', says.oneOf(['name', 'table'], named), tree.place);
  if (table !== undefined && by === undefined) faults.add('needs', says.needs('table', 'by, such as by: [temperature]'), table.place);
  if (by !== undefined && table === undefined) faults.add('needs', says.needs('by', 'table'), by.place);
  checkPath(table, faults);
  const at = Object.fromEntries(entriesOf(tree).flatMap(({ key, value }) => (CONDITIONS.includes(key) ? [[key, placed(value)]] : [])));
  return { is: given({ name, table, by: by && itemsOf(by).map(placed), at }), place: tree.place };
}
