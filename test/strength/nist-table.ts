import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { answer, models } from '../regression/nist-problems.ts';

// npm run nist: makes nist-table.md anew.

const rows = Object.keys(models).flatMap((name) =>
  ([1, 2] as const).map((start) => {
    const one = answer(name, start);
    const cells = [name, start, one.parameters.toFixed(1), one.errors.toFixed(1), one.residualSd.toFixed(1), one.stop];
    console.log(...cells);
    return `| ${cells.join(' | ')} |`;
  }),
);

writeFileSync(
  join(import.meta.dirname, 'nist-table.md'),
  `# The 27 nonlinear problems of NIST's Statistical Reference Datasets

Made by \`npm run nist\`. Correct digits (log relative error, signs counted, 11 certified) of the worst parameter, the worst standard error and the residual standard deviation, by the program's
own fit from both published starts. Sources and one misprint: datasets/nist-strd/README.md.

| problem | start | parameters | standard errors | residual sd | stop |
|---|---|---|---|---|---|
${rows.join('\n')}
`,
);
