import { says } from '../base/says/study.ts';
import type { Faults } from './faults.ts';
import type { Placed } from './study.ts';

/** A path stays in the study's folder: relative, without a way up, on every system. */
function staysInside(path: string): boolean {
  if (/^([/\\~]|[A-Za-z]:)/.test(path) || path.includes('\0')) return false;
  let depth = 0;
  for (const part of path.split(/[/\\]/)) {
    if (part === '..') depth -= 1;
    else if (part !== '.' && part !== '') depth += 1;
    if (depth < 0) return false;
  }
  return true;
}

export function checkPath(path: Placed<string> | undefined, faults: Faults): void {
  if (path !== undefined && !staysInside(path.is)) faults.add('outside-folder', says.outsideFolder(path.is), path.place);
}
