import { expect, test } from 'vitest';
import type { Note } from '../../pipeline/base/message.ts';
import { renderReport } from '../../reports/page.ts';
import { studyOf } from '../scale-up/study-on-disk.ts';

// Propagation of distributions (JCGM 101:2008) on demand, through a whole study. Invented readings: h by velocity, each with a stated random uncertainty.
const study = (random: string, more: string): Promise<Awaited<ReturnType<typeof studyOf>>> =>
  studyOf({
    'study.yaml': `pilotlaw: 1
title: sampled readings (invented)
transfer: heat
equipment: other
trials: {file: trials.csv, trial: trial}
quantities:
  velocity: {column: v, random: ${random}}
  heat_transfer_coefficient: {column: h, random: 2 %}
coefficient: {route: measured}
laws: [heat_transfer_coefficient = C * velocity^a]
audit: none
fit: {resamples: 0${more}}
`,
    'trials.csv': `trial,v [m/s],h [W/(m2 K)]\n${Array.from({ length: 12 }, (_, i) => {
      const v = 0.5 * 1.3 ** i;
      return `T${i},${v.toFixed(4)},${(900 * v ** 0.6 * (1 + 0.03 * Math.sin(5 * i))).toFixed(1)}`;
    }).join('\n')}\n`,
  });
const sampled = ({ notes }: { readonly notes: readonly Note[] }): Note | undefined => notes.find(({ code }) => code === 'monte-carlo');

test('small uncertainties: first order holds, and that is told', async () => {
  const result = await study('2 %', ', monte_carlo: true');
  expect(sampled(result)).toMatchObject({ level: 'note', section: 'method' });
});

// ln of a normal reading with 30 %: standard deviation 0.355 by quadrature of its density above 0 (scipy 1.17.1, integrate.quad), against 0.30 to first order
test('large ones: a warning that stands in the report', async () => {
  const result = await study('30 %', ', monte_carlo: true');
  const note = sampled(result)!;
  expect(note.level).toBe('warning');
  expect((await renderReport(result)).html).toContain(note.text.slice(0, 40));
});

test('nothing is sampled unless the study asks, and the law is the same', async () => {
  const [plain, asked] = [await study('2 %', ''), await study('2 %', ', monte_carlo: true')];
  expect(sampled(plain)).toBeUndefined();
  expect(asked.fits[0]!.values).toEqual(plain.fits[0]!.values);
});
