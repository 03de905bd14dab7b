import { expect, test } from 'vitest';
import { fuzzCommands } from '../strength/fuzz-commands.ts';

test('forty bent studies in one command: each is done or refused by name, none is a defect', async () => {
  const { faults, studies, done } = await fuzzCommands(40, 4, 40);
  expect(faults).toEqual([]);
  expect(done).toBeGreaterThan(0);
  expect(done).toBeLessThan(studies);
}, 300_000);
