import { join } from 'node:path';
import { op } from 'arquero';
import { expect, test } from 'vitest';
import { computeStudy } from '../../pipeline/batch/run-study.ts';
import { frames } from '../../pipeline/results/frames.ts';
import { trialsTable } from '../../pipeline/results/tables.ts';

// Outside check: arquero's own rollup of the same column in double precision; danfojs works in single precision.
test('used trials as a DataFrame: complete columns, the same mean as arquero’s to single precision', async () => {
  const result = await computeStudy(join(import.meta.dirname, '../../datasets/water-in-a-tube/study.yaml'));
  const { trials, plant } = await frames(result);
  const used = trialsTable(result).filter((row: { status: string }) => row.status === 'used');
  const expected = (used.rollup({ m: (row: { Nu: number }) => op.mean(row.Nu) }).object() as { m: number }).m;
  expect(trials.shape[0]).toBe(result.ledger.used);
  expect(trials.columns).toContain('u_ln_Nu');
  expect(Math.abs((trials.column('Nu').mean() as number) / expected - 1)).toBeLessThan(1e-6);
  expect(trials.describe().columns).toContain('Nu');
  expect(plant!.shape[0]).toBe(result.plant!.cases.flatMap((one) => one.predictions).length);
});
