import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fuzzCommands } from './fuzz-commands.ts';
import { fuzz, HANG } from './fuzz-run.ts';
import { targets } from './fuzz-targets.ts';

// npx tsx test/strength/fuzz.ts [inputs a target] [studies]: makes fuzz.md anew. Needs dist/ (node build.js). Best with --expose-gc (NODE_OPTIONS).

const RUNS = Number(process.argv[2] ?? 100_000);
const STUDIES = Number(process.argv[3] ?? 1_000);
const SEED = 1912;

const heap = (): number => {
  globalThis.gc?.();
  return process.memoryUsage().heapUsed / 1e6;
};

/** The table so far; written after every target, since all of it takes long. */
function tell(rows: readonly string[], commanded: string): void {
  writeFileSync(
    join(import.meta.dirname, 'fuzz.md'),
    `# Inputs thrown at the readers

Made by \`npx tsx test/strength/fuzz.ts\` (fast-check, seed ${SEED} + row): word salads, sound texts bent, random characters and bytes. Every input must be read or be refused with
a message that has a place, within ${HANG / 1000} s. A law that is read must be read again as it is printed; a unit must be finite; rows must have the header's width; the
study that \`begin\` would write for a table must parse. Growth: heap after all inputs, less that after the twentieth part of them thrown before.

| target | inputs | read | refused | slowest | growth | defects |
|---|---|---|---|---|---|---|
${rows.join('\n')}

${commanded}
`,
  );
}

const rows: string[] = [];
const defects: string[] = [];
for (const [k, target] of targets.entries()) {
  fuzz(target, Math.ceil(RUNS / 20), SEED - 1 - k);
  const before = heap();
  const { read, refused, slowest, defect } = fuzz(target, RUNS, SEED + k);
  const growth = heap() - before;
  rows.push(
    `| ${target.name} | ${RUNS} | ${read} | ${refused} | ${slowest.toFixed(0)} ms | ${growth.toFixed(1)} MB | ${defect === undefined ? 'none' : 'FOUND'} |`,
  );
  console.log(rows.at(-1));
  if (defect !== undefined) defects.push(`${target.name}: ${defect}`);
  tell(rows, 'Through the command line: not yet run.');
}
const { studies, done, refused, faults } = await fuzzCommands(STUDIES, SEED, 50);
for (const one of [...defects, ...faults]) console.log(one);
tell(
  rows,
  `Through the command line (\`run\`, 50 studies a command): ${studies} studies, half of them with one thing bent, half sound in form and odd in what they say; ${done} done, ${refused} refused, ${faults.length} defects (exit 1, a stack, or nothing told).`,
);
process.exitCode = defects.length + faults.length === 0 ? 0 : 1;
