import { expect, test } from 'vitest';
import { killLoop } from '../strength/kill-loop.ts';

test('runs killed at random times leave whole files, an honest provenance.json and the user’s own', async () => {
  const { faults, ended, before, after, between } = await killLoop({ kills: 6, seed: 3, check: 3 });
  expect(faults).toEqual([]);
  expect(ended + before + after + between).toBe(6);
}, 300_000);
