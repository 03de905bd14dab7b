import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { InputError } from '../../pipeline/base/input-error.ts';
import { seeded } from '../../pipeline/numerics/random.ts';
import { quantityOf } from '../../pipeline/quantities/vocabulary.ts';
import { clockSeconds } from '../../pipeline/trials/clock.ts';
import { sumLedger } from '../../pipeline/trials/ledger.ts';
import { streamLog } from '../../pipeline/trials/log-stream.ts';
import { readLog } from '../../pipeline/trials/log-table.ts';
import { meanOfSeries } from '../../pipeline/trials/mean-of-series.ts';
import { quickDecimal } from '../../pipeline/trials/quick-decimal.ts';
import { readTable } from '../../pipeline/trials/read-table.ts';
import { readSeries, type SeriesSpec } from '../../pipeline/trials/series.ts';
import { steadyShare } from '../../pipeline/trials/steadiness.ts';
import { findSteady, steadyTrials } from '../../pipeline/trials/steady.ts';
import { place } from './sample.ts';

const pieces = (text: string | Buffer, size = 7): Buffer[] => {
  const bytes = Buffer.from(text);
  return Array.from({ length: Math.ceil(bytes.length / size) }, (_, k) => bytes.subarray(k * size, (k + 1) * size));
};
const log = (text: string | Buffer, size?: number) => ({ file: 'log.csv', pieces: pieces(text, size) });
const spec = (change: Partial<SeriesSpec> = {}): SeriesSpec => ({
  name: 'R1',
  time: { column: 't', place },
  value: { column: 'T', place, quantity: quantityOf('temperature')! },
  missing: ['NA'],
  ...change,
});
const fault = async (act: Promise<unknown>): Promise<InputError> => {
  const error = await act.then(
    () => undefined,
    (thrown: unknown) => thrown,
  );
  if (error instanceof InputError) return error;
  throw error ?? new Error('nothing was refused');
};

describe('logged curves', () => {
  test('one file is one curve, in SI, whatever the size of the pieces', async () => {
    for (const size of [1, 2, 5, 1000]) {
      const { value, notes } = await readSeries(log('t [min],T [°C]\n0,80\n1,60\n2,50\n', size), spec());
      const curve = value.curves.get('R1')!;
      expect([[...curve.time], [...curve.value], curve.line]).toEqual([[0, 60, 120], [353.15, 333.15, 323.15], 2]);
      expect([value.rows, value.samples, notes.length]).toEqual([3, 3, 0]);
    }
  });

  test('one long file, trials in any order, cut to a window', async () => {
    const text = 'run;t [s];T [°C]\nA;0;20,5\nB;0;30\nA;10;21,5\nB;10;31\nA;20;22\nB;20;32\nA;30;23\nB;30;33\n';
    const { value } = await readSeries(log(text), spec({ trial: { column: 'run', place }, window: [0, 20] }));
    expect([...value.curves.keys()]).toEqual(['A', 'B']);
    expect([...value.curves.get('A')!.value]).toEqual([293.65, 294.65, 295.15]);
    expect(value.curves.get('B')!.samples).toBe(4);
  });

  test('dates and times of day count from the first sample', async () => {
    const dated = await readSeries(log('t,T [K]\n2024-05-01 08:30:00,300\n2024-05-01 08:30:10,301\n2024-05-01 08:31:00,302\n'), spec());
    expect([...dated.value.curves.get('R1')!.time]).toEqual([0, 10, 60]);
    const clock = await readSeries(log('t;T [K]\n23:59:50,5;300\n23:59:51,0;301\n23:59:59;302\n'), spec());
    expect([...clock.value.curves.get('R1')!.time]).toEqual([0, 0.5, 8.5]);
    expect([clockSeconds('12:30'), clockSeconds('7'), clockSeconds('01:00:01.5')]).toEqual([Number.NaN, Number.NaN, 3601.5]);
  });

  test('rows that are no samples are counted by kind with the first of each', async () => {
    const text = 'run,t [s],T [K]\nA,0,300\nA,1,NA\nA,2,n.d.\nA,3\n,4,300\nA,5,301\nA,6,x\nA,7,302\n';
    const { value, notes } = await readSeries(log(text), spec({ trial: { column: 'run', place } }));
    expect([value.rows, value.samples]).toEqual([8, 3]);
    expect(notes.map(({ code, place: at }) => [code, at!.line])).toEqual([
      ['log-missing', 3],
      ['not-a-number', 4],
      ['log-unnamed', 6],
      ['log-ragged', 5],
    ]);
    expect(notes[1]!.text).toContain('2 rows of the log were not read');
    expect(notes[1]!.text).toContain('"n.d."');
  });

  test('time that runs backwards and a window with too few samples refuse the curve', async () => {
    const back = await readSeries(log('t [s],T [K]\n0,300\n2,301\n1,302\n3,303\n'), spec());
    expect(back.refused[0]).toMatchObject({ trial: 'R1', code: 'time-backwards', place: { file: 'log.csv', line: 4 } });
    const short = await readSeries(log('t [s],T [K]\n0,300\n2,301\n3,302\n'), spec({ window: [1, 5] }));
    expect(short.refused[0]!.code).toBe('curve-too-short');
    expect(short.value.curves.size).toBe(0);
  });

  test('a column that is not there, one without a unit, a quote, and bytes of another encoding stop with their place', async () => {
    expect((await fault(readSeries(log('t [s],c [g/L]\n0,1\n'), spec()))).messages[0]!.place).toBe(place);
    expect((await fault(readSeries(log('t [s],T\n0,1\n'), spec()))).messages[0]!.code).toBe('unit-missing');
    expect((await fault(readSeries(log('t [s],T [K]\n0,"1\n1,2\n', 1000), spec()))).messages[0]!.code).toBe('quote-not-closed');
    const bad = await fault(
      readSeries(log(Buffer.concat([Buffer.from('t [s],T [K]\n0,1\n1,2\n2,'), Buffer.from([0xb0]), Buffer.from('\n')]), 10), spec()),
    );
    expect(bad.messages[0]!.place).toMatchObject({ file: 'log.csv', line: 4, column: 3 });
    expect((await fault(readSeries(log(''), spec()))).messages[0]!.code).toBe('empty-table');
  });

  test('UTF-16, Windows line ends and quoted cells with line breaks', async () => {
    const wide = await readSeries(log(Buffer.from('\uFEFFt [s]\tT [°C]\r\n0\t20,5\r\n1\t21,5\r\n2\t22\r\n', 'utf16le')), spec());
    expect([...wide.value.curves.get('R1')!.value]).toEqual([293.65, 294.65, 295.15]);
    const quoted = await readSeries(log('note,t [s],T [K]\n"a\nb",0,300\n,1,301\n,2,x\n,3,302\n', 1000), spec());
    expect(quoted.notes[0]!.place!.line).toBe(5);
  });

  test('a log is read row by row as a table is, or stops for the same reason (1,000 seeded)', async () => {
    const cell = fc.oneof(
      fc.string({ maxLength: 6 }),
      fc.constantFrom('1', '2.5', '1,5', '"', '\0', ',', ';', '\t', '\n', '\r\n', '[rpm]', '°C'),
    );
    const outcome = async (act: () => Promise<number>): Promise<string> => {
      try {
        return String(await act());
      } catch (error) {
        if (!(error instanceof InputError)) throw error;
        return error.messages[0]!.code;
      }
    };
    await fc.assert(
      fc.asyncProperty(
        fc.array(cell, { maxLength: 40 }),
        fc.constantFrom(',', ';', '\t', '\n'),
        fc.integer({ min: 1, max: 9 }),
        async (cells, join, size) => {
          const bytes = Buffer.from(cells.join(join));
          const asTable = await outcome(async () => {
            const { rows, badRows } = readTable(bytes, { file: 'log.csv' });
            return rows.length + badRows.length;
          });
          expect(await outcome(async () => (await streamLog(log(bytes, size), [], () => () => {})).rows)).toBe(asTable);
        },
      ),
      { seed: 27, numRuns: 1000 },
    );
  });

  test('a number is read to the last bit (1,000 seeded)', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 999_999_999 }), fc.integer({ min: 0, max: 9 }), fc.boolean(), (digits, places, negative) => {
        const text = `${negative ? '-' : ''}${(digits / 10 ** places).toFixed(places)}`;
        return Object.is(quickDecimal(text, '.'), Number(text)) && Object.is(quickDecimal(text.replace('.', ','), ','), Number(text));
      }),
      { seed: 25, numRuns: 1000 },
    );
    expect(['', '-', '.', '1.2.3', '1e5', ' 1', '0x1', '1234567890123456', '١'].map((text) => quickDecimal(text, '.'))).toEqual(
      Array(9).fill(Number.NaN),
    );
  });
});

/** AR(1) noise of unit variance about a level. */
function noise(seed: number, n: number, phi: number): Float64Array {
  const random = seeded(seed);
  const x = new Float64Array(n);
  let e = random.normal();
  for (let i = 0; i < n; i++) {
    x[i] = e;
    e = phi * e + Math.sqrt(1 - phi * phi) * random.normal();
  }
  return x;
}

/** Variance of the mean of n samples of AR(1) with unit variance, in closed form: sum of gamma_k (1 - |k|/n)/n with gamma_k = phi^k. */
function meanVariance(n: number, phi: number): number {
  let sum = 1;
  for (let k = 1; k < n; k++) sum += 2 * (1 - k / n) * phi ** k;
  return sum / n;
}

describe('mean of autocorrelated samples', () => {
  // Oracle: the closed form above. The counts were chosen for the time they take; limits are three standard errors of the simulation about the bias measured with 10,000.
  test.each([
    [0, 400, 0.95, 1.25],
    [0.5, 400, 0.95, 1.25],
    [0.9, 2000, 0.9, 1.15],
    [-0.5, 400, 0.9, 1.2],
  ])('AR(1) with %d, %d samples: the mean of u^2 is %d to %d of the true variance', (phi, n, low, high) => {
    const studies = 300;
    let sum = 0;
    for (let k = 0; k < studies; k++) sum += meanOfSeries(noise(1000 + k, n, phi)).u ** 2;
    const ratio = sum / studies / meanVariance(n, phi);
    expect(ratio).toBeGreaterThan(low);
    expect(ratio).toBeLessThan(high);
  });

  test('a short stretch of a slow signal tells by its count that its u is too small', () => {
    const stretches = Array.from({ length: 200 }, (_, k) => meanOfSeries(noise(k, 60, 0.95)));
    const ratio = stretches.reduce((sum, { u }) => sum + u * u, 0) / 200 / meanVariance(60, 0.95);
    expect(ratio).toBeLessThan(0.6);
    expect(stretches.filter(({ effective }) => effective < 20).length).toBeGreaterThan(190);
  });

  test('treating slow samples as independent would claim a third of the uncertainty', () => {
    const { u, effective } = meanOfSeries(noise(7, 5000, 0.8));
    expect(u / Math.sqrt(1 / 5000)).toBeGreaterThan(2.4);
    expect(effective / 5000).toBeCloseTo(1 / 9, 1);
  });

  test('a constant, a large level, and a long stretch in blocks', () => {
    expect(meanOfSeries(new Float64Array(50).fill(293.15))).toEqual({ mean: 293.15, u: 0, effective: 50 });
    const level = meanOfSeries(noise(3, 1000, 0.5).map((x) => 1e6 + 1e-3 * x));
    expect(level.u / (1e-3 * Math.sqrt(meanVariance(1000, 0.5)))).toBeGreaterThan(0.7);
    const long = meanOfSeries(noise(5, 60_000, 0.9));
    expect(long.u / Math.sqrt(meanVariance(60_000, 0.9))).toBeGreaterThan(0.8);
    expect(long.u / Math.sqrt(meanVariance(60_000, 0.9))).toBeLessThan(1.2);
  });
});

describe('steady windows', () => {
  const tCrit = 2.6;

  test('a level is steady, a drift of ten times the scatter and a step are not', () => {
    const level = noise(11, 200, 0.5);
    expect(steadyShare(level, 0, 200, tCrit)).toBeGreaterThan(0.95);
    expect(
      steadyShare(
        level.map((x, i) => x + (10 * i) / 200),
        0,
        200,
        tCrit,
      ),
    ).toBeLessThan(0.5);
    expect(
      steadyShare(
        level.map((x, i) => x + (i > 90 ? 20 : 0)),
        0,
        200,
        tCrit,
      ),
    ).toBeLessThan(0.7);
    expect(steadyShare(new Float64Array(50).fill(5), 0, 50, tCrit)).toBe(1);
  });

  // Worked by hand from eqs. (2) to (5) of the paper: x = 1, 2, 4, 3, 5; m = 1; mu = (15 - 15)/5 = 0; residuals 0, 0, 1, -1, 0; sigma = sqrt(2/3) = 0.816; with t = 3 the limit is 2.449: two of five within.
  test('five samples by hand', () => {
    expect(steadyShare(Float64Array.of(1, 2, 4, 3, 5), 0, 5, 3)).toBe(0.4);
    expect(steadyShare(Float64Array.of(1, 2, 4, 3, 5), 0, 5, 4)).toBe(0.6);
  });

  /** Three levels of 600 s with ramps of 200 s between; 1 s apart. */
  const levels = [20, 40, 30];
  const truth = (i: number): number => {
    const k = Math.floor(i / 800);
    const within = i % 800;
    const next = levels[Math.min(k + 1, 2)]!;
    return within < 600 ? levels[k]! : levels[k]! + ((next - levels[k]!) * (within - 600)) / 200;
  };
  const rig = (): string => {
    const [a, b] = [noise(31, 2200, 0.7), noise(32, 2200, 0.9)];
    const rows = Array.from({ length: 2200 }, (_, i) => `${i},${(truth(i) + 0.05 * a[i]!).toFixed(4)},${(300 + 2 * b[i]!).toFixed(3)}`);
    rows[1000] = '1000,n.d.,300';
    return `t [s],T [°C],N [rpm]\n${rows.join('\n')}\n`;
  };
  const columns = [
    { key: 'temperature', column: 'T', place, quantity: quantityOf('temperature')! },
    { key: 'rotation_speed', column: 'N', place, quantity: quantityOf('rotation_speed')! },
  ];

  test('three levels are found, no ramp among them, each mean within four of its own uncertainties, every row in the ledger', async () => {
    const { value, notes } = await readLog(log(rig(), 4096), { time: { column: 't', place }, columns, missing: [] });
    expect(notes.map((note) => note.code)).toEqual(['not-a-number']);
    const windows = findSteady(value, { window: 120, place });
    for (const { from, to } of windows) {
      const spread = [value.time[from]!, value.time[to - 1]!].map(truth);
      expect(Math.abs(spread[0]! - spread[1]!)).toBeLessThan(0.5);
    }
    expect(new Set(windows.map(({ mean }) => Math.round(mean[0]! - 273.15)))).toEqual(new Set(levels));
    const { value: read, notes: said } = steadyTrials(value, windows, { window: 120 });
    for (const { values, statistical, readings } of read.trials) {
      const level = levels.find((one) => Math.abs(one + 273.15 - values[0]!) < 1)!;
      expect(Math.abs(values[0]! - 273.15 - level)).toBeLessThan(4 * statistical!.temperature!);
      expect(Math.abs(values[1]! * 60 - 300)).toBeLessThan(4 * 60 * statistical!.rotation_speed!);
      expect(readings).toBeGreaterThanOrEqual(96);
    }
    const sums = sumLedger(read.ledger);
    expect(sums.read).toBe(2200);
    expect(sums.used + sums.leftOut + sums.refused).toBe(2200);
    expect(sums.refused).toBe(1);
    expect(sums.used).toBeGreaterThan(1200);
    expect(said[0]!.text).toContain('Kelly and Hedengren (2013)');
  });

  test('a gap in time ends a window; a window of few samples is refused with a remedy', async () => {
    const rows = Array.from({ length: 400 }, (_, i) => `${i < 200 ? i : i + 1000},20`);
    const { value } = await readLog(log(`t [s],T [°C]\n${rows.join('\n')}\n`), {
      time: { column: 't', place },
      columns: columns.slice(0, 1),
      missing: [],
    });
    expect(findSteady(value, { window: 50, place }).map(({ from, to }) => [from, to])).toEqual([
      [5, 195],
      [205, 395],
    ]);
    const error = (() => {
      try {
        findSteady(value, { window: 5, place });
        return undefined;
      } catch (thrown) {
        return thrown as InputError;
      }
    })();
    expect(error!.messages[0]).toMatchObject({ code: 'window-too-short', place });
  });
});
