import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

const main = 'dist/pipeline/cli/main.js';

/** Median wall time of a command in ms; throws where it fails, since a failed run has no time. */
function time(args: readonly string[], repeats: number): number {
  const times = Array.from({ length: repeats }, () => {
    const start = performance.now();
    const { status, stderr } = spawnSync(process.execPath, args, { encoding: 'utf8' });
    if (status !== 0) throw new Error(`node ${args.join(' ')} ended with ${status}: ${stderr}`);
    return performance.now() - start;
  });
  return times.sort((a, b) => a - b)[Math.floor(repeats / 2)]!;
}

/** `--help` and a cold study against an empty node, in one run. */
export function commandLine(): readonly string[] {
  const folder = mkdtempSync(join(tmpdir(), 'pilotlaw-bench-'));
  try {
    const empty = time(['-e', ''], 11);
    const help = time([main, '--help'], 11);
    const study = time([main, 'run', 'datasets/water-in-a-tube', '--fresh', '--quiet', '--out', join(folder, 'tube')], 5);
    return [
      `empty node             ${empty.toFixed(0)} ms`,
      `pilotlaw --help        ${help.toFixed(0)} ms = ${(help / empty).toFixed(2)} x empty node (aim: 2 x)`,
      `cold tube study        ${study.toFixed(0)} ms = ${(study / empty).toFixed(1)} x empty node (aim: under 2,000 ms)`,
    ];
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
