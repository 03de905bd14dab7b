import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { deflateRawSync } from 'node:zlib';
import * as XLSX from '@e965/xlsx';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { InputError } from '../../pipeline/base/input-error.ts';
import { isFault } from '../../pipeline/quantities/fault.ts';
import { parseUnit } from '../../pipeline/quantities/unit.ts';
import { caps } from '../../pipeline/trials/caps.ts';
import { sumLedger } from '../../pipeline/trials/ledger.ts';
import { readTable } from '../../pipeline/trials/read-table.ts';
import { readTrials } from '../../pipeline/trials/read-trials.ts';
import { zipSizes } from '../../pipeline/trials/zip-sizes.ts';
import { declared, place, placed, readSample, workbook } from './sample.ts';

const fault = (act: () => unknown): InputError => {
  try {
    act();
  } catch (error) {
    if (error instanceof InputError) return error;
    throw error;
  }
  throw new Error('nothing was refused');
};
const read = (text: string | Buffer, file = 'trials.csv', sheet?: string) =>
  readTable(typeof text === 'string' ? Buffer.from(text) : text, { file, ...(sheet === undefined ? {} : { sheet }) });

/** A ZIP archive of one packed part whose headers say that it unpacks to 10 bytes. */
function lyingBomb(unpacked: number): Buffer {
  return archive([{ name: 'xl/workbook.xml', packed: deflateRawSync(Buffer.alloc(unpacked)), size: 10 }]);
}

const bytesWithParts = (count: number): Buffer =>
  archive(Array.from({ length: count }, (_, k) => ({ name: String(k), packed: deflateRawSync(Buffer.from('x')), size: 1 })));

/** Local headers, then the directory, then its end: APPNOTE 6.3.10, sections 4.3.7, 4.3.12 and 4.3.16. */
function archive(parts: readonly { readonly name: string; readonly packed: Buffer; readonly size: number }[]): Buffer {
  const local: Buffer[] = [];
  const listed: Buffer[] = [];
  let at = 0;
  for (const { name, packed, size } of parts) {
    const sizes = Buffer.alloc(18);
    sizes.writeUInt16LE(8, 0);
    sizes.writeUInt32LE(packed.length, 10);
    sizes.writeUInt32LE(size, 14);
    const names = Buffer.alloc(4);
    names.writeUInt16LE(name.length, 0);
    local.push(Buffer.from('PK\x03\x04\x14\0\0\0', 'latin1'), sizes, names, Buffer.from(name), packed);
    const where = Buffer.alloc(14);
    where.writeUInt32LE(at, 10);
    listed.push(Buffer.from('PK\x01\x02\x14\0\x14\0\0\0', 'latin1'), sizes, names, where, Buffer.from(name));
    at += 30 + name.length + packed.length;
  }
  const directory = Buffer.concat(listed);
  const end = Buffer.alloc(22);
  end.write('PK\x05\x06', 'latin1');
  end.writeUInt16LE(parts.length, 8);
  end.writeUInt16LE(parts.length, 10);
  end.writeUInt32LE(directory.length, 12);
  end.writeUInt32LE(at, 16);
  return Buffer.concat([...local, directory, end]);
}

describe('files that stop with place and remedy (exit 3)', () => {
  const empty = workbook([]);
  const two = workbook([['run'], ['R1']], (_, book) => {
    book.SheetNames.push('More');
    book.Sheets.More = { A1: { t: 's', v: 'x' }, '!ref': 'A1' };
  });

  test.each([
    ['an unclosed quote', 'run,N\nR1,300\nR2,"300\nR3,400\n', 'trials.csv', 'quote-not-closed', { line: 3, column: 4 }, 'close it'],
    ['a stray quote', 'run,pipe\nR1,1" pipe\n', 'trials.csv', 'stray-quote', { line: 2, column: 5 }, 'double'],
    ['a quote that closes too early', 'run,pipe\nR1,"1"x\n', 'trials.csv', 'stray-quote', { line: 2, column: 6 }, 'double'],
    ['nothing', '', 'trials.csv', 'empty-table', { line: 1 }, 'header'],
    ['only blanks', '\n \n,,\n', 'trials.csv', 'empty-table', { line: 1 }, 'header'],
    ['only a header', 'run,N\n', 'trials.csv', 'no-rows', { line: 1 }, 'one row'],
    ['a NUL in the header', 'run,\0N\nR1,3\n', 'trials.csv', 'header-broken', { line: 1 }, 'NUL'],
    ['another ending', 'run,N\nR1,3\n', 'trials.ods', 'file-kind', { line: 1 }, '.xlsx'],
    ['no ending', 'run,N\nR1,3\n', 'trials', 'file-kind', { line: 1 }, '.xlsx'],
  ])('%s', (_, text, file, code, at, remedy) => {
    const error = fault(() => read(text, file));
    expect([error.exit, error.messages[0]!.code]).toEqual([3, code]);
    expect(error.messages[0]!.place).toMatchObject({ file, ...at });
    expect(error.messages[0]!.text).toContain(remedy);
  });

  test.each([
    ['text named .xlsx', Buffer.from('run,N\nR1,3\n'), undefined, 'not-a-workbook'],
    [
      'random bytes named .xlsx',
      Buffer.from([0x50, 0x4b, 3, 4, 9, 9, 9, 9, 9, 9, 9, 9, 9, 9, 9, 9, 9, 9, 9, 9, 9, 9, 9, 9]),
      undefined,
      'not-a-workbook',
    ],
    [
      'the old format',
      Buffer.concat([Buffer.from([0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1, 0x1a, 0xe1]), Buffer.alloc(600)]),
      undefined,
      'not-a-workbook',
    ],
    ['a workbook cut short', workbook([['run'], ['R1']]).subarray(0, 900), undefined, 'not-a-workbook'],
    ['an empty workbook', empty, undefined, 'which-sheet'],
    ['two sheets and none named', two, undefined, 'which-sheet'],
    ['a sheet that is not there', two, 'Trails', 'no-such-sheet'],
  ])('%s', (_, bytes, sheet, code) => {
    const error = fault(() => read(bytes, 'trials.xlsx', sheet));
    expect([error.exit, error.messages[0]!.code]).toEqual([3, code]);
  });

  test('a sheet that is not there suggests the one that is', () => {
    expect(fault(() => read(two, 'trials.xlsx', 'Trails')).messages[0]!.text).toContain('did you mean "Trials"?');
  });

  test('a workbook under the name of a text, and a sheet of a text', () => {
    expect(fault(() => read(workbook([['run'], ['R1']]))).messages[0]!.code).toBe('file-kind');
    expect(fault(() => read('run\nR1\n', 'trials.csv', 'Trials')).messages[0]!.code).toBe('sheet-of-text');
  });

  test('a field of 5 MB is told with its line, and where the quote before it opens', () => {
    const long = fault(() => read(`run,N\nR1,300\nR2,${'9'.repeat(5_000_000)}\n`));
    expect(long.messages[0]).toMatchObject({ code: 'field-too-long', place: { file: 'trials.csv', line: 3, column: 1 } });
    const quoted = fault(() => read(`run,N\nR1,"300\n${'R2,1\n'.repeat(400_000)}`));
    expect(quoted.messages[0]!.text).toContain('line 2, column 4');
  });

  test('too many rows and columns', () => {
    expect(fault(() => read(`N\n${'1\n'.repeat(caps.rows + 1)}`)).messages[0]!.code).toBe('too-many-rows');
    expect(fault(() => read(`${'a,'.repeat(caps.columns)}a\n`)).messages[0]!.code).toBe('too-many-columns');
  });

  test('a zip bomb is refused before it is unpacked', () => {
    const bytes = Buffer.from(workbook([['run'], ['R1']]));
    const directory = bytes.readUInt32LE(bytes.length - 22 + 16);
    bytes.writeUInt32LE(caps.workbookBytes + 1, directory + 24);
    expect(fault(() => read(bytes, 'trials.xlsx')).messages[0]!.code).toBe('workbook-too-large');
    const most = { parts: caps.workbookParts, unpacked: caps.workbookBytes };
    expect(zipSizes(workbook([['run']]), most)!.parts).toBeGreaterThan(5);
    expect(fault(() => read(bytesWithParts(caps.workbookParts + 1), 'trials.xlsx')).messages[0]!.code).toBe('workbook-too-large');
  });

  test('a directory that lies about the size is found out without unpacking the whole', () => {
    const most = { parts: 10, unpacked: 1_000_000 };
    expect(zipSizes(lyingBomb(20_000_000), most)!.unpacked).toBe(most.unpacked + 1);
    expect(zipSizes(lyingBomb(999_999), most)!.unpacked).toBe(999_999);
  });

  // Found by throwing bytes at the reader (test/strength/fuzz.ts): unpacked by the workbook library alone, this one never ends.
  test('a part that does not unpack stops the file at once', () => {
    const bytes = readFileSync(join(import.meta.dirname, 'fixtures/damaged-part.xlsx'));
    expect(fault(() => read(bytes, 'trials.xlsx')).messages[0]!.code).toBe('not-a-workbook');
  });

  test('a sheet that claims a million rows is read by its cells, at once', () => {
    const rows = [
      ['run', 'N [rpm]'],
      ['R1', 300],
    ];
    const parts = XLSX.CFB.read(workbook(rows), { type: 'buffer' });
    const sheet = XLSX.CFB.find(parts, '/xl/worksheets/sheet1.xml')!;
    sheet.content = Buffer.from(
      Buffer.from(sheet.content as Uint8Array)
        .toString()
        .replace('ref="A1:B2"', 'ref="A1:XFD1048576"'),
    );
    expect(sheet.content.toString()).toContain('XFD1048576');
    const bytes = Buffer.from(XLSX.CFB.write(parts, { type: 'buffer', fileType: 'zip' }) as Uint8Array);
    const begin = performance.now();
    expect(read(bytes, 'trials.xlsx').rows.length).toBe(1);
    expect(performance.now() - begin).toBeLessThan(2000);
  });

  test('names like formulas and pages stay text', () => {
    const table = read('run,N\n=cmd|x,1\n<script>alert(1)</script>,2\n"+1",3\n__proto__,4\n');
    expect(table.rows.map(({ cells }) => cells[0])).toEqual(['=cmd|x', '<script>alert(1)</script>', '+1', '__proto__']);
  });
});

describe('names of trials', () => {
  const table = read('run,week,N\nR1,A,1\nR1,A,2\nR2,B,3\n');
  const N = { key: 'own', index: 2, unit: parseUnit('1') };
  const columns = isFault(N.unit) ? [] : [{ ...N, unit: N.unit }];

  test('a repeated name is a fault with its lines', () => {
    const error = fault(() => readTrials(table, declared({ trial: placed('run') }), columns));
    expect(error.messages[0]).toMatchObject({ code: 'trial-twice', place: { file: 'trials.csv', line: 3 } });
    expect(error.messages[0]!.text).toContain('lines 2, 3');
    expect(error.messages[0]!.text).toContain('readings: average');
  });

  test('readings are averaged and counted', () => {
    const { value } = readTrials(table, declared({ trial: placed('run'), campaign: placed('week'), readings: placed('average') }), columns);
    expect(value.trials.map(({ trial, campaign, readings, values }) => [trial, campaign, readings, values[0]])).toEqual([
      ['R1', 'A', 2, 1.5],
      ['R2', 'B', 1, 3],
    ]);
    expect(value.ledger.map(({ line, status, reason }) => [line, status, reason])).toEqual([
      [2, 'used', 'one of 2 readings of trial "R1"'],
      [3, 'used', 'one of 2 readings of trial "R1"'],
      [4, 'used', ''],
    ]);
  });

  test('one trial in two campaigns stops', () => {
    const error = fault(() =>
      readTrials(
        read('run,week,N\nR1,A,1\nR1,B,2\n'),
        declared({ trial: placed('run'), campaign: placed('week'), readings: placed('average') }),
        columns,
      ),
    );
    expect([error.exit, error.messages[0]!.code, error.messages[0]!.place!.line]).toEqual([3, 'trial-in-two', 3]);
  });

  test('a left-out trial that no row has is a fault of the study file', () => {
    const error = fault(() =>
      readTrials(
        read('run,week,N\nR17,A,1\nR18,A,2\n'),
        declared({ trial: placed('run'), leaveOut: [{ trial: placed('R170'), reason: 'x' }] }),
        columns,
      ),
    );
    expect([error.exit, error.messages[0]!.code, error.messages[0]!.place]).toEqual([2, 'no-such-trial', place]);
    expect(error.messages[0]!.text).toContain('did you mean "R17"?');
  });

  test('columns that the table does not have are told together, at the study', () => {
    const error = fault(() =>
      readTrials(table, declared({ trial: placed('runn'), campaign: placed('day'), order: placed('started') }), columns),
    );
    expect(error.messages.map((message) => message.code)).toEqual(['no-such-column', 'no-such-column', 'no-such-column']);
    expect(error.messages[0]!.text).toContain('did you mean "run"?');
  });

  test('an empty name refuses the row; the refusal has the place', () => {
    const { value, refused } = readTrials(
      read('run,week,N\n,A,1\nR2,,2\nR3,B,3\n'),
      declared({ trial: placed('run'), campaign: placed('week') }),
      columns,
    );
    expect(value.trials.map(({ trial }) => trial)).toEqual(['R3']);
    expect(refused.map(({ code, place: at }) => [code, at!.line])).toEqual([
      ['no-name', 2],
      ['no-name', 3],
    ]);
  });

  test.each([
    ['2024-05-01 08:30', Date.UTC(2024, 4, 1, 8, 30) / 1000],
    ['2024-05-01T08:30:15', Date.UTC(2024, 4, 1, 8, 30, 15) / 1000],
    ['01.05.2024', Date.UTC(2024, 4, 1) / 1000],
    ['7', 7],
  ])('order %s', (text, order) => {
    const { value } = readTrials(read(`run,started,N\nR1,${text},1\n`), declared({ order: placed('started') }), columns);
    expect(value.trials[0]!.order).toBe(order);
  });

  test('an order that two continents read differently is not read, and said', () => {
    const { value, notes } = readTrials(read('run,started,N\nR1,1/2/2024,1\n'), declared({ order: placed('started') }), columns);
    expect([value.trials[0]!.order, notes.map((note) => note.code)]).toEqual([undefined, ['order-not-read']]);
  });
});

describe('laws (seeded, 1,000 cases each)', () => {
  const runs = { seed: 22, numRuns: 1000 } as const;
  const cell = fc.oneof(
    fc.string({ maxLength: 8 }),
    fc.constantFrom('1', '2.5', '1,5', '1e9', '"', '""', '\0', ',', ';', '\t', '\n', '\r\n', '<0.1', 'NA', '=1+1', ' ', '°C', '[rpm]'),
  );

  test('any text is a table or an InputError with a place, and the ledger adds up', () => {
    fc.assert(
      fc.property(fc.array(cell, { maxLength: 40 }), fc.constantFrom(',', ';', '\t', '\n'), (cells, join) => {
        try {
          const table = read(cells.join(join));
          const { value } = readTrials(table, declared({ missing: ['NA'] }), [{ key: 'own', index: 0, unit: parseUnit('1') as never }]);
          const sums = sumLedger(value.ledger);
          return (
            sums.read === sums.used + sums.leftOut + sums.refused &&
            sums.read === table.rows.length + table.badRows.length &&
            value.trials.length === sums.used
          );
        } catch (error) {
          if (!(error instanceof InputError)) throw error;
          return error.messages.every((message) => message.place !== undefined && message.text.length > 10);
        }
      }),
      runs,
    );
  });

  test('numbers written in any of six ways come back as they are', () => {
    const number = fc.double({ min: -1e6, max: 1e6, noNaN: true }).map((x) => (Object.is(x, -0) || Math.abs(x) < 1e-300 ? 0 : x));
    const style = fc.constantFrom([',', '.'], [';', '.'], [';', ','], ['\t', '.'], ['\t', ','], [',', '.', 'utf16']);
    fc.assert(
      fc.property(fc.array(number, { minLength: 1, maxLength: 20 }), style, (numbers, [separator, mark, wide]) => {
        const lines = [
          `run${separator}x`,
          ...numbers.map((x, k) => `R${k}${separator}${String(x).replace('.', mark!)}`),
          `last${separator}0${mark}5`,
        ];
        const text = lines.join('\r\n');
        const bytes = wide === undefined ? Buffer.from(text) : Buffer.from(`\uFEFF${text}`, 'utf16le');
        const { rows, out } = readSample({ says: '', bytes, read: { own: ['x', '1'] }, trials: { trial: placed('run') } });
        return out.length === 0 && [...numbers, 0.5].every((x, k) => rows[k]![1] === x);
      }),
      runs,
    );
  });

  test('workbook bytes that are hit at random are a table or an InputError', () => {
    const sound = workbook([
      ['run', 'N [rpm]'],
      ['R1', 300],
      ['R2', 600],
    ]);
    fc.assert(
      fc.property(fc.array(fc.tuple(fc.nat(sound.length - 1), fc.nat(255)), { minLength: 1, maxLength: 12 }), (hits) => {
        const bytes = Buffer.from(sound);
        for (const [at, byte] of hits) bytes[at] = byte;
        try {
          return read(bytes, 'trials.xlsx').rows.length >= 0;
        } catch (error) {
          return error instanceof InputError;
        }
      }),
      { seed: 23, numRuns: 200 },
    );
  });

  test('a workbook gives back numbers to the last bit', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ noNaN: true, noDefaultInfinity: true }), { minLength: 1, maxLength: 20 }), (numbers) => {
        const { rows } = readSample({
          says: '',
          file: 'a.xlsx',
          bytes: workbook([['x'], ...numbers.map((x) => [x])]),
          read: { own: ['x', '1'] },
        });
        return numbers.every((x, k) => rows[k]![1] === x || (x === 0 && rows[k]![1] === 0));
      }),
      { seed: 24, numRuns: 100 },
    );
  });

  test('XLSX is the library that wrote the samples', () => {
    expect(XLSX.version).toBe('0.20.3');
  });
});
