import { differences } from './same-bytes.ts';

// npx tsx test/strength/same.ts [repeats]: the demo studies again and again, with one and two jobs, in other locales and time zones. Needs dist/ (node build.js).

const STUDIES = ['cannon-cooling', 'carbon-lamp', 'pellets-dissolving', 'stack-loss', 'water-in-a-tube'];
const repeats = Number(process.argv[2] ?? 20);

const found = await differences(STUDIES, repeats);
for (const one of found) console.log(one);
console.log(`${repeats} repeats of ${STUDIES.length} studies: ${found.length === 0 ? 'the same bytes' : `${found.length} differences`}`);
process.exitCode = found.length === 0 ? 0 : 1;
