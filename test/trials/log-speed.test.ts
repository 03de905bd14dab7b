import { expect, test } from 'vitest';
import { measure } from './log-speed.ts';

// The short version of log-speed.ts, whose table for a million rows is fixtures/log-speed.txt (1.3 to 1.7 times csv-parse alone); time is measured there, never here.
test('a log of 50,000 rows is read in flat memory', async () => {
  const [, curves, columns] = await measure(50_000);
  expect(Math.max(curves!.megabytes, columns!.megabytes)).toBeLessThan(200);
});
