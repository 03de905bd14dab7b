import { execFileSync, spawnSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { read, type WorkBook, write } from '@e965/xlsx';
import { afterAll, describe, expect, test } from 'vitest';
import { computeStudy } from '../../pipeline/batch/run-study.ts';
import { predictor } from '../../pipeline/regression/predict-ln.ts';
import { lawPython } from '../../pipeline/results/law-python.ts';
import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { workbook } from '../../pipeline/results/workbook.ts';

/** Debian's python3 and LibreOffice (headless) recompute the law's interval from what the results carry. */
const has = (program: string, ...words: string[]): boolean => spawnSync(program, words, { timeout: 60_000 }).status === 0;
const python = has('python3', '--version');
const office = has('soffice', '--headless', '--version');
const folder = mkdtempSync(join(tmpdir(), 'other-programs-'));
afterAll(() => rmSync(folder, { recursive: true }));

const studies = ['pellets-dissolving', 'water-in-a-tube', 'cannon-cooling', 'stack-loss', 'carbon-lamp'];
const study = (name: string): Promise<StudyResult> => computeStudy(join(import.meta.dirname, '../../datasets', name, 'study.yaml'));

/** Beyond the range on one side, in it on the other; a factor and shifts of the plant's own. */
function question(result: StudyResult) {
  const fit = result.fits.find((one) => one.name === result.chosen)!;
  const groups = Object.fromEntries(fit.form.groups.map((name, k) => [name, fit.ranges[name]![1] * (k === 0 ? 1.3 : 0.9)]));
  const factor = 0.0123;
  const shifts = Object.fromEntries(Object.keys(fit.shifts).map((source, k) => [source, 0.01 * (k + 1) * (k % 2 === 0 ? 1 : -1)]));
  const sources = Object.fromEntries(Object.entries(shifts).map(([source, shift]) => [source, { groups: {}, factor: shift }]));
  const found = predictor(fit)({ at: groups, lnFactor: Math.log(factor), sources });
  return { fit, groups, factor, shifts, expected: [found.value, found.lawLower, found.lawUpper, found.lower, found.upper] };
}

/** 12 digits of the value, 8 of the ends. */
function agree(found: readonly number[], expected: readonly number[]): void {
  expect(Math.abs(found[0]! / expected[0]! - 1)).toBeLessThan(1e-12);
  for (let k = 1; k < 5; k++) expect(Math.abs(found[k]! / expected[k]! - 1)).toBeLessThan(1e-8);
}

describe.skipIf(!python)('the generated Python, run by python3', () => {
  test.each(studies)('%s', async (name) => {
    const result = await study(name);
    const { fit, groups, factor, shifts, expected } = question(result);
    writeFileSync(join(folder, `law_${studies.indexOf(name)}.py`), lawPython(fit, result.study.title, fit.text)!);
    // An absolute law takes the plant's shift of the result itself.
    const scale = fit.scale === 'relative' ? 1 : expected[0]!;
    const asked = { groups, factor, shifts: Object.fromEntries(Object.entries(shifts).map(([source, shift]) => [source, shift * scale])) };
    writeFileSync(join(folder, 'asked.json'), JSON.stringify(asked));
    const script = `import json, law_${studies.indexOf(name)} as law
asked = json.load(open('asked.json'))
print(json.dumps(law.predict(asked['groups'], factor=asked['factor'], plant_shifts=asked['shifts'])))`;
    agree(JSON.parse(execFileSync('python3', ['-c', script], { cwd: folder, encoding: 'utf8' })) as number[], expected);
  });

  test('hostile names stay text', () => {
    const fit = {
      name: '"""\nimport os',
      form: { response: 'y', tree: { op: 'group', name: 'a"];import os#' }, groups: ['a"];import os#'], constants: [] },
      values: {},
      groups: {},
      free: [],
      shifts: { '"]\n': [] },
      components: { names: ['scatter'], values: [1], covariance: [[1]], derivatives: [[]], criterion: 0 },
      covarianceRandom: [],
      residualDegreesOfFreedom: 5,
      confidence: 0.95,
      scale: 'absolute',
      ranges: { 'a"];import os#': [0, 1] },
      campaigns: { kind: 'none' },
    } as const;
    const text = lawPython(fit, '"""\nimport os', 'y = \\"""')!;
    writeFileSync(join(folder, 'hostile.py'), text);
    const script = `import hostile, json; print(json.dumps([hostile.value({'a"];import os#': 2}), hasattr(hostile, 'os')]))`;
    expect(JSON.parse(execFileSync('python3', ['-c', script], { cwd: folder, encoding: 'utf8' }))).toEqual([2, false]);
  });
});

describe.skipIf(!office)('the workbook, recalculated by LibreOffice', () => {
  test('every study: value to 12 digits, interval to 8, after the inputs were changed', { timeout: 120_000 }, async () => {
    const asked = await Promise.all(studies.map(async (name) => ({ name, ...question(await study(name)), result: await study(name) })));
    for (const { name, result, groups, factor, shifts, expected, fit } of asked) {
      const book = read(workbook(result), { type: 'array' });
      const scale = fit.scale === 'relative' ? 1 : expected[0]!;
      change(book, { ...groups, factor, ...Object.fromEntries(Object.entries(shifts).map(([source, shift]) => [source, shift * scale])) });
      writeFileSync(join(folder, `${name}.xlsx`), write(book, { type: 'buffer', bookType: 'xlsx' }) as Buffer);
    }
    mkdirSync(join(folder, 'profile/user'), { recursive: true });
    writeFileSync(join(folder, 'profile/user/registrymodifications.xcu'), recalculateAlways);
    const files = studies.map((name) => join(folder, `${name}.xlsx`));
    execFileSync(
      'soffice',
      [
        '--headless',
        `-env:UserInstallation=file://${folder}/profile`,
        '--convert-to',
        'xlsx:Calc MS Excel 2007 XML',
        '--outdir',
        join(folder, 'out'),
        ...files,
      ],
      {
        stdio: 'ignore',
      },
    );
    for (const { name, expected } of asked)
      agree(ends(read(readFileSync(join(folder, 'out', `${name}.xlsx`)), { type: 'buffer' })), expected);
  });
});

/** A profile in which every workbook is recalculated on opening. */
const recalculateAlways = `<?xml version="1.0" encoding="UTF-8"?>
<oor:items xmlns:oor="http://openoffice.org/2001/registry">
<item oor:path="/org.openoffice.Office.Calc/Formula/Load"><prop oor:name="OOXMLRecalcMode" oor:op="fuse"><value>0</value></prop></item>
</oor:items>
`;

/** Sets input cells (the first row with that label) and forgets what formulas held, so that nothing but recalculation can give an answer. */
function change(book: WorkBook, inputs: Readonly<Record<string, number>>): void {
  const sheet = book.Sheets.law!;
  const open = new Set(Object.keys(inputs));
  for (let row = 1; row < 400; row++) {
    const label = String(sheet[`A${row}`]?.v ?? '');
    if (open.delete(label)) sheet[`B${row}`].v = inputs[label];
  }
  expect([...open]).toEqual([]);
  for (const name of Object.keys(sheet)) if (sheet[name]?.f !== undefined) sheet[name].v = 0;
}

function ends(book: WorkBook): readonly number[] {
  const sheet = book.Sheets.law!;
  const of = (label: string): number => {
    for (let row = 1; row < 400; row++) if (sheet[`A${row}`]?.v === label) return sheet[`B${row}`].v as number;
    return Number.NaN;
  };
  return ['times factor', 'law, lower', 'law, upper', 'new campaign, lower', 'new campaign, upper'].map(of);
}
