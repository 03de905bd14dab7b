import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { planRatios, rigs, share } from './plans.ts';

// npm run next-trials-table: makes next-trials.md anew; about a minute.

const RUNS = 200;
const median = (values: readonly number[]): number => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)]!;

const rows = rigs.map((rig) => {
  const ratios = Array.from({ length: RUNS }, (_, k) => planRatios(rig, 31_000 + k));
  const cells = (['factorial', 'random'] as const).flatMap((against) => {
    const of = ratios.map((one) => one[against]);
    return [`${(100 * share(of)).toFixed(1)} %`, median(of).toFixed(3)];
  });
  console.log(rig.name, ...cells);
  return `| ${[rig.name, ...cells].join(' | ')} |`;
});

writeFileSync(
  join(import.meta.dirname, 'next-trials.md'),
  `# Proposed trials against other plans of the same size

Made by \`npm run next-trials-table\` (${RUNS} invented rigs a row, seeds 31000 on). Each rig is run in the middle of its box, the law is fitted, trials are proposed for a plant three times
beyond the box in Re; then the variance of the law at the plant is worked out from the true scatter and campaign variance, by the whole covariance matrix, as if the trials had
been run: after the proposals, after a factorial of the box's corners, and after the best of twenty random plans, each of the same size and in the same campaign.
A share counts the rigs on which the proposals are within 2 % of the other plan or better; the ratio is the median of proposals over the other plan.

| rig | against the factorial | ratio | against the best of 20 random | ratio |
|---|---|---|---|---|
${rows.join('\n')}
`,
);
