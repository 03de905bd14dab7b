import { expect, test } from 'vitest';
import { differences } from '../strength/same-bytes.ts';

test('the same bytes with one job and two, in other locales, time zones and folders', async () => {
  expect(await differences(['stack-loss', 'water-in-a-tube'], 4)).toEqual([]);
}, 300_000);
