import { says } from '../base/says/study.ts';
import { faults, throwIfAny, withoutEchoes } from './faults.ts';
import { given } from './given.ts';
import { messagesOf } from './issues.ts';
import type { OwnCorrelationEntry } from './study.ts';
import { ownCorrelationsSchema } from './study-schema.ts';
import { plain, type Tree } from './tree.ts';
import { child, itemsOf, numberOf, placed, recordOf, textAt } from './view.ts';
import { readTree } from './yaml-tree.ts';

/** A user's own published correlations (`audit.own`), as written. Throws one InputError (exit 2) with every fault of the file. */
export function parseOwnCorrelations(text: string, file: string): readonly OwnCorrelationEntry[] {
  const { tree, faults: syntax } = readTree(text, file);
  const shape = tree === undefined ? [] : messagesOf(ownCorrelationsSchema.safeParse(plain(tree)).error?.issues ?? [], tree);
  throwIfAny(withoutEchoes(syntax, shape));
  const entries = itemsOf(tree).map(readEntry);
  throwIfAny(repeatedIds(entries));
  return entries;
}

function readEntry(tree: Tree): OwnCorrelationEntry {
  const nothing = { is: '', place: tree.place };
  const year = child(tree, 'year');
  return given({
    id: textAt(tree, 'id') ?? nothing,
    authors: textAt(tree, 'authors')?.is ?? '',
    year: year === undefined ? Number.NaN : numberOf(year),
    gives: textAt(tree, 'gives') ?? nothing,
    family: textAt(tree, 'family'),
    title: textAt(tree, 'title')?.is,
    form: textAt(tree, 'form') ?? nothing,
    groups: recordOf(child(tree, 'groups'), placed),
    at: recordOf(child(tree, 'at'), placed),
    in: recordOf(child(tree, 'in'), placed),
    limits: itemsOf(child(tree, 'limits')).map(placed),
    accuracy: textAt(tree, 'accuracy')?.is,
    reads: textAt(tree, 'reads'),
    source: textAt(tree, 'source')?.is,
  });
}

function repeatedIds(entries: readonly OwnCorrelationEntry[]) {
  const found = faults();
  const seen = new Set<string>();
  for (const { id } of entries) {
    if (seen.has(id.is)) found.add('id-twice', says.idTwice(id.is), id.place);
    seen.add(id.is);
  }
  return found.all();
}
