import { basename, dirname, isAbsolute, join, relative, resolve } from 'node:path';
import { InputError } from '../base/input-error.ts';
import type { Message } from '../base/message.ts';
import { says } from '../base/says/cli.ts';

/**
 * Where each study's results go with `--out`: one study into the folder itself, several into a folder of the study's folder's name inside it.
 * Without `--out` the study file says so itself (undefined). Throws (exit 2) where two studies would share a folder.
 */
export function resultsFolders(studies: readonly string[], out: string | undefined): ReadonlyMap<string, string | undefined> {
  if (out === undefined) return new Map(studies.map((study) => [study, undefined]));
  if (studies.length === 1) return new Map([[studies[0]!, resolve(out)]]);
  const owner = new Map<string, string>();
  for (const study of studies) {
    const folder = join(resolve(out), basename(dirname(study)));
    const other = owner.get(folder);
    if (other !== undefined)
      throw new InputError([{ code: 'shared-results-folder', text: says.sharedFolder(folder, other), place: { file: study } }]);
    owner.set(folder, study);
  }
  return new Map([...owner].map(([folder, study]) => [study, folder]));
}

/** Throws (exit 2) where two studies name one folder for their results. */
export function refuseShared(tasks: readonly { readonly study: string; readonly folder?: string }[]): void {
  const owner = new Map<string, string>();
  const faults: Message[] = [];
  for (const { study, folder } of tasks) {
    if (folder === undefined) continue;
    const other = owner.get(folder);
    if (other !== undefined)
      faults.push({ code: 'shared-results-folder', text: says.sharedNamedFolder(fromHere(folder), other), place: { file: study } });
    owner.set(folder, study);
  }
  if (faults.length > 0) throw new InputError(faults);
}

/** A path as the user would write it: from the folder he is in, where it lies below. */
export function fromHere(path: string): string {
  const short = relative(process.cwd(), path);
  return short === '' || short.startsWith('..') || isAbsolute(short) ? path : short;
}
