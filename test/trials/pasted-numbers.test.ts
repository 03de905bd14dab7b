import { describe, expect, test } from 'vitest';
import { usual } from '../../pipeline/quantities/usual.ts';
import { quantities } from '../../pipeline/quantities/vocabulary.ts';
import { readTable } from '../../pipeline/trials/read-table.ts';
import { unlikelyValues } from '../../pipeline/trials/unlikely.ts';
import { workbook } from './sample.ts';

// Cells as a German spreadsheet holds them after pasting: text. Common practice, no source.
const read = (rows: (string | number)[][]) => readTable(workbook(rows), { file: 'trials.xlsx' });

describe('numbers stored as text with a decimal comma', () => {
  test('are read in a column where one of them can be nothing else, and that is said', () => {
    const table = read([
      ['run', 'Q [L/min]', 'T [degC]'],
      ['R1', '5,03', 21.5],
      ['R2', '1,234', 22.25],
    ]);
    expect(table.rows.map(({ cells }) => cells)).toEqual([
      ['R1', '5.03', '21.5'],
      ['R2', '1.234', '22.25'],
    ]);
    expect(table.remarks.find(({ code }) => code === 'comma-text')!.text).toContain('2 cells of column "B"');
  });

  test('stay text where all of them might be thousands', () => {
    const table = read([
      ['run', 'N [rpm]'],
      ['R1', '1,234'],
      ['R2', '2,500'],
    ]);
    expect(table.rows[0]!.cells[1]).toBe('1,234');
    expect(table.remarks.some(({ code }) => code === 'comma-text')).toBe(false);
  });
});

describe('values far from where such values lie', () => {
  const of = (value: number) =>
    unlikelyValues(
      {
        keys: ['diameter'],
        trials: [{ trial: 'R1', campaign: 'A', file: 'f', line: 2, lines: [2], readings: 1, values: Float64Array.of(value), thin: [] }],
      },
      { length: 1.8 },
    );

  test('a bore of 15.8 m asks for its unit; 15.8 mm does not', () => {
    expect(of(15.8)).toEqual([
      expect.objectContaining({ level: 'warning', about: 'diameter', text: expect.stringContaining('is its unit right?') }),
    ]);
    expect(of(0.0158)).toEqual([]);
  });

  test('every range belongs to a quantity and is one', () => {
    for (const [key, [from, to]] of Object.entries(usual)) {
      expect(quantities[key]).toBeDefined();
      expect(from).toBeLessThan(to);
    }
  });
});
