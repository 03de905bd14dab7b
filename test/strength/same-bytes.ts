import { cpSync, mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { sha256 } from '../../pipeline/files/hash.ts';
import { pilotlaw, type Where } from './spawned.ts';

const surroundings: readonly { readonly name: string; readonly args: readonly string[]; readonly where: Where }[] = [
  { name: 'as the first', args: ['--jobs', '2'], where: {} },
  { name: 'one job', args: ['--jobs', '1'], where: {} },
  { name: 'German, Berlin', args: ['--jobs', '2'], where: { env: { LC_ALL: 'de_DE.UTF-8', LANG: 'de_DE.UTF-8', TZ: 'Europe/Berlin' } } },
  {
    name: 'Turkish, Kiritimati',
    args: ['--jobs', '2'],
    where: { env: { LC_ALL: 'tr_TR.UTF-8', LANG: 'tr_TR.UTF-8', TZ: 'Pacific/Kiritimati' } },
  },
  { name: 'C, another folder', args: ['--jobs', '2'], where: { env: { LC_ALL: 'C', TZ: 'America/St_Johns' }, cwd: '/' } },
];

/** Runs the studies again and again, in other surroundings in turn; what differs from the first run, by run and file. */
export async function differences(studies: readonly string[], repeats: number): Promise<readonly string[]> {
  const root = mkdtempSync(join(tmpdir(), 'pilotlaw-same-'));
  try {
    for (const name of studies) cpSync(join(import.meta.dirname, '../../datasets', name), join(root, name), { recursive: true });
    const given = studies.map((name) => join(root, name));
    const out = join(root, 'results');
    const found: string[] = [];
    let first: ReadonlyMap<string, string> | undefined;
    for (let k = 0; k <= repeats; k += 1) {
      const { name, args, where } = surroundings[k % surroundings.length]!;
      rmSync(out, { recursive: true, force: true });
      const { exit, err } = await pilotlaw(['run', ...given, '--out', out, '--fresh', ...args], where);
      if (exit !== 0) found.push(`run ${k} (${name}) left with ${exit}: ${err}`);
      const now = hashes(out);
      first ??= now;
      for (const file of new Set([...first.keys(), ...now.keys()]))
        if (first.get(file) !== now.get(file)) found.push(`run ${k} (${name}): ${file}`);
    }
    return first!.size === 0 ? ['no results'] : found;
  } finally {
    rmSync(root, { recursive: true, force: true });
  }
}

/** All results but the overview, which names the studies as they were typed. */
const hashes = (folder: string): ReadonlyMap<string, string> =>
  new Map(
    readdirSync(folder, { recursive: true, withFileTypes: true })
      .filter((entry) => entry.isFile() && entry.name !== 'index.html')
      .map((entry) => join(entry.parentPath, entry.name))
      .map((path) => [path.slice(folder.length + 1), sha256(readFileSync(path))]),
  );
