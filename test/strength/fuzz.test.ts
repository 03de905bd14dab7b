import { expect, test } from 'vitest';
import { fuzz } from './fuzz-run.ts';
import { targets } from './fuzz-targets.ts';

test.each(targets)(
  '$name: whatever comes is read or refused with a message',
  (target) => {
    const { defect, read, refused } = fuzz(target, 400, 20);
    expect(defect ?? '').toBe('');
    expect(read).toBeGreaterThan(0);
    expect(refused).toBeGreaterThan(0);
  },
  120_000,
);
