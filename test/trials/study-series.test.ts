import { describe, expect, test } from 'vitest';
import { InputError } from '../../pipeline/base/input-error.ts';
import { parseUnit } from '../../pipeline/quantities/unit.ts';
import { quantityOf } from '../../pipeline/quantities/vocabulary.ts';
import type { SeriesReduction } from '../../pipeline/reduction/series/series.ts';
import type { SeriesEntry } from '../../pipeline/study/study.ts';
import { withCurves } from '../../pipeline/trials/curve-readings.ts';
import { readTable } from '../../pipeline/trials/read-table.ts';
import { readTrials } from '../../pipeline/trials/read-trials.ts';
import { readStudySeries, type StudySeries } from '../../pipeline/trials/study-series.ts';
import { declared, placed } from './sample.ts';

const table = readTable(Buffer.from('run,log,x\nA,a.csv,1\nB,b.csv,2\nC,,3\n'), { file: 'trials.csv' });
const read = readTrials(table, declared({ trial: placed('run') }), [{ key: 'own', index: 2, unit: parseUnit('1') as never }]);
const files: Readonly<Record<string, string>> = {
  'a.csv': 't [s],T [degC]\n0,80\n10,60\n20,50\n30,45\n',
  'b.csv': 't [s],T [degC]\n0,70\n10,65\n20,60\n',
  'all.csv': 'run,t [s],T [degC]\nA,0,80\nB,0,70\nA,10,60\nB,10,65\nA,20,50\nB,20,60\nZ,0,1\nZ,1,1\nZ,2,1\n',
};
const series = (entry: Partial<SeriesEntry>): StudySeries => ({
  entry: { time: placed('t'), value: placed('T'), ...entry },
  table,
  trials: read.value.trials,
  quantity: quantityOf('temperature')!,
  missing: [],
  open: (file) => ({ file, pieces: [Buffer.from(files[file]!)] }),
});
const code = async (entry: Partial<SeriesEntry>): Promise<string> => {
  try {
    await readStudySeries(series(entry));
  } catch (error) {
    if (error instanceof InputError) return error.messages[0]!.code;
    throw error;
  }
  return 'read';
};

describe("a study's logged curves", () => {
  test('one file a trial, named in a column; a trial without one is refused', async () => {
    const { value, refused } = await readStudySeries(series({ files: placed('log'), window: [placed('0 s'), placed('20 s')] }));
    expect([...value.keys()]).toEqual(['A', 'B']);
    expect([...value.get('A')!.time]).toEqual([0, 10, 20]);
    expect(refused.map(({ trial, code: why, place }) => [trial, why, place!.line])).toEqual([['C', 'no-curve', 4]]);
  });

  test('one long file; curves of strangers are told', async () => {
    const { value, refused, notes } = await readStudySeries(series({ file: placed('all.csv'), trial: placed('run') }));
    expect([...value.keys()]).toEqual(['A', 'B']);
    expect(refused.map(({ trial }) => trial)).toEqual(['C']);
    expect(notes.map((note) => [note.code, note.text.includes('"Z"')])).toEqual([['curve-without-trial', true]]);
  });

  test('faults of the study are told at the study', async () => {
    expect(await code({ file: placed('all.csv') })).toBe('series-trial');
    expect(await code({ files: placed('logs') })).toBe('no-such-column');
    expect(await code({ files: placed('log'), window: [placed('20 s'), placed('0 s')] })).toBe('window-reversed');
    expect(await code({ files: placed('log'), window: [placed('0 m'), placed('9 s')] })).toBe('unit-dimension');
  });

  test('curves become readings of their trials with an uncertainty; the rest is refused with the reason', async () => {
    const { value: curves } = await readStudySeries(series({ files: placed('log') }));
    const drop: SeriesReduction = {
      value: 'temperature',
      gives: ['drop'],
      needs: ['own', 'mass'],
      optional: [],
      reduce: (curve, given) =>
        given('own') === 2
          ? { refused: { code: 'why', text: 'because' } }
          : {
              readings: { drop: { value: (curve.value[0]! - curve.value.at(-1)!) * given('mass')!, u: 0.5 } },
              fitted: curve.value,
              notes: given('none') === undefined ? [{ code: 'said', text: 'said' }] : [],
            },
    };
    const { value, refused, notes } = withCurves(
      read.value,
      curves,
      drop,
      ({ values }) =>
        (key) =>
          ({ own: values[0]!, mass: 2 })[key],
    );
    expect(value.keys).toEqual(['own', 'drop']);
    expect(value.trials.map(({ trial, values, statistical }) => [trial, ...values, statistical])).toEqual([['A', 1, 70, { drop: 0.5 }]]);
    expect(refused).toEqual([{ trial: 'B', code: 'why', text: 'because', place: { file: 'b.csv', line: 2, trial: 'B' } }]);
    expect(notes.map(({ code: which }) => which)).toEqual(['curves-read', 'said']);
    expect(notes[1]).toMatchObject({ about: 'A' });
    expect(value.curves.map(({ trial }) => trial)).toEqual(['A']);
  });
});
