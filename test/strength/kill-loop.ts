import { cpSync, existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { sha256 } from '../../pipeline/files/hash.ts';
import { seeded } from '../../pipeline/numerics/random.ts';
import { pilotlaw } from './spawned.ts';

export interface Kills {
  /** The run had ended before its time came. */
  ended: number;
  /** Killed, and the results of the run before stand whole. */
  before: number;
  /** Killed, and the new results stand whole. */
  after: number;
  /** Killed halfway: no provenance.json, each file whole. */
  between: number;
  /** What must not be. */
  readonly faults: string[];
}

const own = 'a remark of the user’s own\n';
const seeds = ['2', '3'] as const;

/**
 * Runs a study over its old results again and again, with two seeds in turn, and kills each run with SIGKILL: every other one at any time from its start to
 * its end, the rest within 60 ms after it began to write. After each the folder must hold whole files of one seed or the other, a provenance.json only beside
 * exactly what it lists, and the user's own file; every `check` kills a run to the end must put all right.
 */
export async function killLoop({
  kills,
  seed,
  check,
}: {
  readonly kills: number;
  readonly seed: number;
  readonly check: number;
}): Promise<Kills> {
  const root = mkdtempSync(join(tmpdir(), 'pilotlaw-kill-'));
  try {
    const random = seeded(seed);
    const study = join(root, 'study');
    const results = join(root, 'results');
    cpSync(join(import.meta.dirname, '../../datasets/stack-loss'), study, { recursive: true });
    const run = (into: string, with_: string, started?: Parameters<typeof pilotlaw>[1]) =>
      pilotlaw(['run', study, '--out', into, '--seed', with_, '--fresh', '--jobs', '1'], started);
    const whole = new Map<string, Set<string>>();
    let longest = 0;
    for (const one of seeds) {
      const since = performance.now();
      await run(join(root, one), one);
      longest = Math.max(longest, performance.now() - since);
      for (const [name, hash] of hashes(join(root, one))) whole.set(name, (whole.get(name) ?? new Set()).add(hash));
    }
    cpSync(join(root, seeds[0]), results, { recursive: true });
    writeFileSync(join(results, 'remarks.txt'), own);
    const told: Kills = { ended: 0, before: 0, after: 0, between: 0, faults: [] };
    for (let k = 0; k < kills; k += 1) {
      const before = provenance(results);
      const wait = k % 2 === 0 ? random.uniform() * longest : random.uniform() * 60;
      const { exit } = await run(results, seeds[(k + 1) % 2]!, {
        started: (child) => {
          const kill = (): void => void setTimeout(() => child.kill('SIGKILL'), wait);
          if (k % 2 === 0) kill();
          else whenWriting(results, () => child.exitCode !== null || child.signalCode !== null, kill);
        },
      });
      told.faults.push(...faultsIn(results, whole).map((fault) => `kill ${k}: ${fault}`));
      const after = provenance(results);
      if (exit !== null) told.ended += 1;
      else if (after === undefined) told.between += 1;
      else if (after === before) told.before += 1;
      else told.after += 1;
      if ((k + 1) % check === 0) told.faults.push(...(await settled(results, run, whole)).map((fault) => `after kill ${k}: ${fault}`));
    }
    return told;
  } finally {
    rmSync(root, { recursive: true, force: true });
  }
}

function whenWriting(results: string, hasEnded: () => boolean, act: () => void): void {
  if (existsSync(join(results, '.pilotlaw-writing'))) act();
  else if (!hasEnded()) setTimeout(() => whenWriting(results, hasEnded, act), 1);
}

/** A run that nobody kills ends well and leaves nothing of the killed ones. */
async function settled(
  results: string,
  run: (into: string, seed: string) => ReturnType<typeof pilotlaw>,
  whole: ReadonlyMap<string, ReadonlySet<string>>,
): Promise<readonly string[]> {
  const { exit, err } = await run(results, seeds[0]);
  const odd = readdirSync(results).filter((name) => name.startsWith('.'));
  return [
    ...(exit === 0 ? [] : [`a run to the end left with ${exit}: ${err}`]),
    ...odd.map((name) => `${name} is left over`),
    ...(provenance(results) === undefined ? ['no provenance.json after a run to the end'] : []),
    ...faultsIn(results, whole),
  ];
}

const provenance = (folder: string): string | undefined =>
  existsSync(join(folder, 'provenance.json')) ? readFileSync(join(folder, 'provenance.json'), 'utf8') : undefined;

/** Hash of every file that is no hidden one, by name. */
function hashes(folder: string): ReadonlyMap<string, string> {
  const names = readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath, entry.name).slice(folder.length + 1))
    .filter((name) => !name.startsWith('.'));
  return new Map(names.map((name) => [name, sha256(readFileSync(join(folder, name)))]));
}

function faultsIn(results: string, whole: ReadonlyMap<string, ReadonlySet<string>>): readonly string[] {
  const there = hashes(results);
  const faults = there.get('remarks.txt') === sha256(own) ? [] : ['the user’s own file is not as it was'];
  for (const [name, hash] of there)
    if (name !== 'remarks.txt' && whole.get(name)?.has(hash) !== true) faults.push(`${name} is no whole result of one run`);
  const listed = provenance(results);
  if (listed === undefined) return faults;
  for (const { file, sha256: hash } of (JSON.parse(listed) as { results: { file: string; sha256: string }[] }).results)
    if (there.get(file) !== hash) faults.push(`${file} is not what provenance.json lists`);
  return faults;
}
