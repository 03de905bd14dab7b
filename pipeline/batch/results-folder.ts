import { dirname, resolve } from 'node:path';
import { newPathInside } from '../files/inside.ts';
import { readBytes } from '../files/read.ts';

/** Where results go if the study file says nothing. */
const DEFAULT = 'results';
const MOST = 1 << 20;

/**
 * The folder that a study file names for its results, without reading the rest of it; undefined where it cannot be told before all faults are.
 * The file is only parsed where the word `output` stands in it.
 */
export async function namedFolder(study: string): Promise<string | undefined> {
  try {
    const text = readBytes(study, { most: MOST }).toString('utf8');
    const name = text.includes('output') ? await outputFolder(text) : DEFAULT;
    return name === undefined ? undefined : newPathInside(dirname(resolve(study)), name, { file: study });
  } catch {
    return undefined;
  }
}

async function outputFolder(text: string): Promise<string | undefined> {
  const { parseDocument } = await import('yaml');
  const document = parseDocument(text, { logLevel: 'silent' });
  if (document.errors.length > 0) return undefined;
  const folder: unknown = document.getIn(['output', 'folder']);
  return folder === undefined ? DEFAULT : typeof folder === 'string' ? folder : undefined;
}
