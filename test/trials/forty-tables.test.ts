import { describe, expect, test } from 'vitest';
import { refused, right } from './forty-samples.ts';
import { readSample } from './sample.ts';

describe('tables as rigs print them', () => {
  test('there are forty and more', () => {
    expect(right.length + refused.length).toBeGreaterThanOrEqual(40);
  });

  test.each(right.map((one) => [one.says, one] as const))('%s', (_, sample) => {
    const read = readSample(sample);
    expect(read.faults).toEqual([]);
    expect(read.rows.map(([trial]) => trial)).toEqual(sample.rows.map(([trial]) => trial));
    read.rows.forEach(([, ...values], k) => {
      const [, ...wanted] = sample.rows[k]!;
      for (const [j, value] of values.entries()) expect(value / wanted[j]!).toBeCloseTo(1, 12);
    });
    expect(read.out.length).toBe(sample.out?.length ?? 0);
    for (const [k, text] of read.out.entries()) expect(text).toContain(sample.out![k]!);
    expect(read.notes).toEqual(sample.notes ?? []);
  });

  test.each(refused.filter((one) => one.trials !== undefined).map((one) => [one.says, one] as const))('refused: %s', (_, sample) => {
    const read = readSample(sample);
    expect(read.faults.length).toBe(1);
    expect(read.faults[0]).toContain(sample.faults![0]!);
  });

  test('refused: fields separated by bars', () => {
    const read = readSample(refused.at(-1)!);
    expect(read.faults[0]).toContain('the columns are');
    expect(read.notes).toEqual(['one-column']);
  });
});
