import { expect, test } from 'vitest';
import * as says from '../../pipeline/base/says/batch.ts';
import type { Outcome } from '../../pipeline/batch/outcome.ts';
import { runAll } from '../../pipeline/batch/run-all.ts';

const worker = new URL('./doing.mjs', import.meta.url);

async function outcomes(studies: readonly string[], jobs: number, timeLimit = 20_000): Promise<readonly Outcome[]> {
  const told: Outcome[] = [];
  await runAll(
    studies.map((study) => ({ study })),
    { jobs, timeLimit, worker },
    (k, outcome) => {
      expect(told[k]).toBeUndefined();
      told[k] = outcome;
    },
  );
  return told;
}

test.each([1, 2, 5])('%i at a time: every study has one outcome, and a thread that dies takes no other with it', async (jobs) => {
  const told = await outcomes(['a', 'slow', 'throws', 'b', 'leaves', 'c', 'd'], jobs);
  expect(told.map(({ kind }) => kind)).toEqual(['done', 'done', 'defect', 'done', 'defect', 'done', 'done']);
  expect(told[2]).toMatchObject({ text: 'thrown' });
  expect(told[4]).toMatchObject({ text: says.threadEnded(7) });
});

test('one without end is given up, and says so with a remedy', async () => {
  const [first, second] = await outcomes(['never ends', 'b'], 1, 1500);
  expect(first).toEqual({
    kind: 'refused',
    messages: [{ code: 'took-too-long', text: says.tookTooLong(1500), place: { file: 'never ends' } }],
    exit: 3,
  });
  expect(second!.kind).toBe('done');
});
