import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { killLoop } from './kill-loop.ts';

/** 200 runs killed at random times; the table is test/strength/kill.md. Needs dist/ (node build.js). */
const KILLS = 200;
const SEED = 8;

const { ended, before, after, between, faults } = await killLoop({ kills: KILLS, seed: SEED, check: 20 });
const table = `# Runs killed at random times

${KILLS} runs of \`stack-loss\` over older results, seed ${SEED}, each killed by SIGKILL: every other at any time between start and end, the rest within 60 ms after it
began to write. After every kill: each file whole, \`provenance.json\` only beside exactly what it lists, the user's own file as it was; every 20 kills a run
to the end puts all right. Remade by \`npx tsx test/strength/kill.ts\`; the counts depend on the machine's speed, the faults must not.

| what the kill left | runs |
|---|---|
| the older results, whole | ${before} |
| no provenance.json, each file whole | ${between} |
| the new results, whole | ${after} |
| (the run had ended before its time) | ${ended} |
| **faults** | **${faults.length}** |
`;
writeFileSync(join(import.meta.dirname, 'kill.md'), table);
console.log(table);
for (const fault of faults) console.log(fault);
process.exitCode = faults.length === 0 ? 0 : 1;
