import { expect, test } from 'vitest';
import { measure } from './log-speed.ts';

// The short version of log-speed.ts, whose table for a million rows is fixtures/log-speed.txt (1.3 to 1.7 times csv-parse alone); the limit here leaves room for a busy machine.
test('a log of 50,000 rows is read in flat memory and not much slower than csv-parse alone splits it', async () => {
  const [alone, curves, columns] = await measure(50_000);
  expect(curves!.seconds / alone!.seconds).toBeLessThan(2.5);
  expect(columns!.seconds / alone!.seconds).toBeLessThan(2.5);
  expect(Math.max(curves!.megabytes, columns!.megabytes)).toBeLessThan(200);
});
