import { type Faults, faults, throwIfAny, withoutEchoes } from './faults.ts';
import { given } from './given.ts';
import { messagesOf } from './issues.ts';
import { readCoefficient } from './read-coefficient.ts';
import { readFluid } from './read-fluid.ts';
import { readLaws } from './read-laws.ts';
import { readQuantities } from './read-quantity.ts';
import { readAudit, readFit, readGroups, readOutput, readPlant, readRig, readTrials } from './read-settings.ts';
import type { Study } from './study.ts';
import { studySchema } from './study-schema.ts';
import { plain, type Tree } from './tree.ts';
import { child, textAt, truthAt, wordAt } from './view.ts';
import { readTree } from './yaml-tree.ts';

/**
 * The text of a study file -> its syntax with places. What names, units, formulas and laws mean is settled later.
 * Throws one InputError (exit 2) with every fault of the file, in the file's order.
 */
export function parseStudy(text: string, file: string): Study {
  const { tree, faults: syntax } = readTree(text, file);
  if (tree === undefined) {
    throwIfAny(syntax);
    throw new Error('a text that is no YAML must have a fault');
  }
  const shape = studySchema.safeParse(plain(tree)).error?.issues ?? [];
  const found = faults();
  const study = readStudy(tree, file, found);
  throwIfAny(withoutEchoes(withoutEchoes(syntax, messagesOf(shape, tree)), found.all()));
  return study;
}

function readStudy(tree: Tree, file: string, found: Faults): Study {
  const top = { file, line: 1, column: 1 };
  return given({
    file,
    title: textAt(tree, 'title')?.is ?? '',
    transfer: wordAt<'heat' | 'mass'>(tree, 'transfer')?.is ?? 'heat',
    equipment: textAt(tree, 'equipment') ?? { is: 'other', place: top },
    invented: truthAt(tree, 'invented', false),
    trials: readTrials(child(tree, 'trials') ?? tree, found),
    quantities: readQuantities(child(tree, 'quantities'), found),
    fluid: readFluid(child(tree, 'fluid'), found),
    coefficient: readCoefficient(child(tree, 'coefficient'), found),
    groups: readGroups(child(tree, 'groups'), found),
    laws: readLaws(child(tree, 'laws'), found),
    fit: readFit(child(tree, 'fit'), found, top),
    audit: readAudit(child(tree, 'audit'), found, top),
    plant: readPlant(child(tree, 'plant'), found),
    rig: readRig(child(tree, 'rig'), found),
    output: readOutput(child(tree, 'output'), found, top),
  });
}
