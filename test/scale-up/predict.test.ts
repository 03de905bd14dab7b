import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, expect, test } from 'vitest';
import { predictPlant } from '../../pipeline/batch/predict-plant.ts';
import { computeStudy } from '../../pipeline/batch/run-study.ts';
import { lawsJson } from '../../pipeline/results/laws-json.ts';

const folder = mkdtempSync(join(tmpdir(), 'predict-'));
afterAll(() => rmSync(folder, { recursive: true }));
const datasets = join(import.meta.dirname, '../../datasets');
const write = (name: string, text: string): string => {
  writeFileSync(join(folder, name), text);
  return join(folder, name);
};

test.each([
  ['pellets-dissolving', 'plant.csv'],
  ['water-in-a-tube', 'plant.csv'],
])('%s: laws.json alone predicts what the study predicts', async (name, plant) => {
  const result = await computeStudy(join(datasets, name, 'study.yaml'));
  const laws = write(`${name}.json`, lawsJson(result));
  const alone = predictPlant({ laws, plant: join(datasets, name, plant), conservative: 'low' });
  const ofLaws = result.plant!.cases.map((one) => one.predictions.filter(({ kind }) => kind === 'fitted law'));
  expect(alone.cases.map((one) => one.predictions)).toEqual(ofLaws);
  expect(alone.cases.map((one) => one.extrapolation)).toEqual(result.plant!.cases.map((one) => one.extrapolation));
  expect(alone.criteria).toEqual(result.plant!.criteria);
});

test('another law can lead; one that is not there, or another file, is refused', async () => {
  const result = await computeStudy(join(datasets, 'pellets-dissolving', 'study.yaml'));
  const laws = write('laws.json', lawsJson(result));
  const plant = join(datasets, 'pellets-dissolving', 'plant.csv');
  const other = result.forPlant.accepted.find((one) => one !== result.chosen)!;
  expect(predictPlant({ laws, plant, law: other, conservative: 'high' }).cases[0]!.predictions[0]!.by).toBe(other);
  expect(() => predictPlant({ laws, plant, law: 'nobody', conservative: 'low' })).toThrow(expect.objectContaining({ exit: 2 }));
  const broken = write('broken.json', '{"format": 1, "laws": []}');
  expect(() => predictPlant({ laws: broken, plant, conservative: 'low' })).toThrow(expect.objectContaining({ exit: 2 }));
});
