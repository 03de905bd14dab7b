import { basename, dirname, join, resolve } from 'node:path';
import { version } from '../base/version.ts';
import { sha256OfFile } from '../files/hash.ts';
import { pathInside } from '../files/inside.ts';
import { fileExists, readBytes } from '../files/read.ts';
import { ownResults } from '../files/replace-results.ts';
import { PROVENANCE, type Provenance } from '../results/provenance.ts';
import type { StudySummary } from './summary.ts';

const MOST = 2 ** 33;

/**
 * The summary of results that stand, or nothing where the study must be computed: another version, Node version or seed, an input whose bytes differ, a result
 * that is missing or differs from what was written. The options are in the study file, which is an input; the files that it names follow from its bytes.
 */
export function standing(study: string, folder: string, seed: number): StudySummary | undefined {
  try {
    const list = join(folder, PROVENANCE);
    if (!fileExists(list)) return undefined;
    const read = JSON.parse(readBytes(list, { most: 1 << 24 }).toString('utf8')) as Provenance;
    if (read.version !== version || read.node !== process.versions.node || read.seed !== seed) return undefined;
    const results = ownResults(list);
    const sound =
      results.length > 0 && inputsStand(study, read.inputs) && results.every((one) => isStill(join(folder, one.file), one.sha256));
    return sound ? { study, folder, ...(read.summary as Omit<StudySummary, 'study' | 'folder'>) } : undefined;
  } catch {
    return undefined;
  }
}

function inputsStand(study: string, inputs: Provenance['inputs']): boolean {
  const place = { file: study };
  const home = dirname(resolve(study));
  return (
    inputs.some(({ file }) => file === basename(study)) &&
    inputs.every(({ file, sha256 }) => isStill(pathInside(home, file, place), sha256))
  );
}

const isStill = (path: string, sha256: string): boolean => sha256OfFile(path, { most: MOST }) === sha256;
