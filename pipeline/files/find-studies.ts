import { type Dirent, readdirSync, statSync } from 'node:fs';
import { basename, dirname, join, relative, resolve, sep } from 'node:path';
import { InputError } from '../base/input-error.ts';
import type { Message } from '../base/message.ts';
import { says } from '../base/says/files.ts';
import { causeOf } from './cause.ts';
import { globPattern, hasGlob } from './glob.ts';

/** The name that makes a folder a study. */
const studyFileName = 'study.yaml';

const skipped = new Set(['node_modules', '.git']);
const mostStudies = 10_000;
const mostFiles = 200_000;
const deepest = 40;

/**
 * Study files that the command line means: a file is taken as it is, a folder is walked for `study.yaml`, `*`, `?` and `**` are expanded.
 * In sorted order and without repetition. Whatever leads to no study is refused, all such at once.
 */
export function findStudies(given: readonly string[]): readonly string[] {
  const faults: Message[] = [];
  const found = new Set<string>();
  for (const one of given) {
    const studies = studiesOf(one);
    if (studies.length === 0) faults.push({ code: 'no-study', text: says.noStudy(one, studyFileName), place: { file: one } });
    for (const study of studies) found.add(study);
  }
  if (given.length === 0) faults.push({ code: 'no-study', text: says.nothingGiven(studyFileName) });
  if (found.size > mostStudies) faults.push({ code: 'too-many-studies', text: says.tooManyStudies(found.size, mostStudies) });
  if (faults.length > 0) throw new InputError(faults);
  return [...found].sort();
}

function studiesOf(given: string): readonly string[] {
  const stat = statSync(given, { throwIfNoEntry: false });
  if (stat?.isFile()) return [resolve(given)];
  if (stat?.isDirectory()) return filesBelow(resolve(given)).filter((file) => basename(file) === studyFileName);
  return hasGlob(given) ? expand(given) : [];
}

function expand(given: string): readonly string[] {
  const whole = resolve(given);
  const parts = whole.split(sep);
  const fixed = parts.slice(0, parts.findIndex(hasGlob)).join(sep) || sep;
  if (statSync(fixed, { throwIfNoEntry: false })?.isDirectory() !== true) return [];
  const pattern = globPattern(relative(fixed, whole).split(sep).join('/'));
  return filesBelow(fixed).filter((file) => {
    const path = relative(fixed, file).split(sep).join('/');
    return /\.ya?ml$/u.test(path) && pattern.test(path) ? true : basename(file) === studyFileName && pattern.test(dirname(path));
  });
}

/** All files below a folder; links to folders are not followed, so that no circle is walked. */
function filesBelow(folder: string): readonly string[] {
  const files: string[] = [];
  walk(folder, folder, 0, files);
  return files;
}

function walk(top: string, folder: string, depth: number, files: string[]): void {
  if (depth > deepest) return;
  for (const entry of entries(folder)) {
    if (skipped.has(entry.name)) continue;
    const path = join(folder, entry.name);
    if (entry.isDirectory()) walk(top, path, depth + 1, files);
    else if (entry.isFile() || (entry.isSymbolicLink() && statSync(path, { throwIfNoEntry: false })?.isFile())) files.push(path);
    if (files.length > mostFiles)
      throw new InputError([{ code: 'too-many-files', text: says.tooManyFiles(top, mostFiles), place: { file: top } }]);
  }
}

/** Entries in sorted order; a folder below that may not be read is no place of studies. */
function entries(folder: string): readonly Dirent[] {
  try {
    return readdirSync(folder, { withFileTypes: true }).sort((a, b) => (a.name < b.name ? -1 : 1));
  } catch (error) {
    causeOf(error);
    return [];
  }
}
