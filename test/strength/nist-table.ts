import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { linearAnswer, linearProblems } from '../regression/nist-linear.ts';
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

const figure = (value: number): string => (Number.isFinite(value) ? value.toFixed(1) : '-');
const linear = Object.keys(linearProblems).map((name) => {
  const one = linearAnswer(name);
  const cells = [name, '-', figure(one.parameters), figure(one.errors), figure(one.residualSd), one.stop];
  console.log(...cells);
  return `| ${cells.join(' | ')} |`;
});

writeFileSync(
  join(import.meta.dirname, 'nist-table.md'),
  `# Problems of NIST's Statistical Reference Datasets: 27 nonlinear, 11 linear

Made by \`npm run nist\`. Correct digits (log relative error, signs counted, 11 certified) of the worst parameter, the worst standard error and the residual standard deviation, by the program's
own fit, nonlinear ones from both published starts. Sources and one misprint: datasets/nist-strd/README.md.

| problem | start | parameters | standard errors | residual sd | stop |
|---|---|---|---|---|---|
${rows.join('\n')}
${linear.join('\n')}

Filip (eleven powers of one x) is refused: the fit says which parameters the data cannot tell apart. Wampler1 and 2 are exact: no residual to compare.
`,
);
