import type { DataFrame } from 'danfojs-node';
import type { StudyResult } from './study-result.ts';
import { auditTable, plantTable, trialsTable } from './tables.ts';

/** The result tables as DataFrames. */
export interface Frames {
  readonly trials: DataFrame;
  readonly audit?: DataFrame;
  readonly plant?: DataFrame;
}

/**
 * Result tables for those who go on in JavaScript with DataFrames: used trials only, and only columns that are complete (danfojs counts a gap as a number).
 * Its arithmetic is in single precision: sums and means keep about seven digits. Needs the optional package danfojs-node, which is loaded here alone.
 */
export async function frames(result: StudyResult): Promise<Frames> {
  const { DataFrame } = await import('danfojs-node');
  const frame = (table: ReturnType<typeof trialsTable>): DataFrame => {
    const complete = table.columnNames().flatMap((name) => {
      const values = Array.from(table.array(name) as ArrayLike<unknown>);
      const whole = values.every((value) => typeof value === 'string') || values.every(Number.isFinite);
      return whole && values.length > 0 ? [[name, values] as const] : [];
    });
    return new DataFrame(Object.fromEntries(complete));
  };
  const used = trialsTable(result).filter((row: { status: string }) => row.status === 'used');
  const [audit, plant] = [auditTable(result), plantTable(result)];
  return {
    trials: frame(used.reify()),
    ...(audit === undefined ? {} : { audit: frame(audit) }),
    ...(plant === undefined ? {} : { plant: frame(plant) }),
  };
}
