import { expect, test } from 'vitest';
import { studyOf } from '../scale-up/study-on-disk.ts';

// Data that a law made to the last bit, as people try a program out: no scatter is left at all. Closed form, no source needed.
test.each(['Sh = C * Re^a', 'Sh = 2 + C * Re^a'])('%s finds the constants it was made with, and a scatter of rounding', async (law) => {
  const offset = law.includes('2 +') ? 2 : 0;
  const rows = [10, 20, 40, 80, 160, 320, 640].map((Re, k) => `E${k},${Re},${offset + 0.5 * Re ** 0.6}`);
  const { fits } = await studyOf({
    'study.yaml': `pilotlaw: 1
title: invented, exact
transfer: mass
trials: {file: trials.csv, trial: run}
groups: {Re: {column: Re}, Sh: {column: Sh}}
laws: ["${law}"]
fit: {resamples: 0}
audit: none
`,
    'trials.csv': `run,Re,Sh\n${rows.join('\n')}\n`,
  });
  expect(fits[0]!.values.C).toBeCloseTo(0.5, 12);
  expect(fits[0]!.values.a).toBeCloseTo(0.6, 12);
  expect(fits[0]!.statistics.residualSd).toBeLessThan(1e-13);
});
