import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { settings } from './settings.ts';
import { coverages, isLow, obeys, type Tally, tally } from './tally.ts';

// npm run calibrate [-- studies]: makes calibration.md anew; some minutes on one core.

const SEED = 20_000;
const studies = Number(process.argv[2] ?? 2000);

const percent = (share: number): string => (100 * share).toFixed(1);
const bias = (one: Tally): string =>
  one.parameters.map((p) => `${p.name === 'C' ? 'ln C' : p.name} ${p.bias.toFixed(4)} (${p.biasError.toFixed(4)})`).join(', ');
const covers = (one: Tally, of: readonly string[]): string =>
  coverages(one)
    .filter((each) => of.some((name) => each.of.startsWith(name)))
    .map(({ share }) => `${percent(share)}${isLow(share, one.studies) ? ' low' : ''}`)
    .join(', ');
const warned = (one: Tally): string =>
  Object.entries(one.warnings)
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .map(([code, share]) => `${code} ${percent(share)}`)
    .join(', ');
const verdict = (one: Tally): string => (one.setting.premise === 'true' ? (obeys(one) ? 'obeys' : 'BREAKS') : one.setting.premise);

const rows = settings.map((setting, k) => {
  const one = tally(setting, studies, SEED + k);
  console.log(`${setting.name}: ${verdict(one)}`);
  const names = one.parameters.map(({ name }) => name);
  return `| ${[setting.name, bias(one), covers(one, names), covers(one, ['law']), covers(one, ['prediction']), warned(one), verdict(one)].join(' | ')} |`;
});

const text = `# Calibration of the intervals, by simulation

Made by \`npm run calibrate\` (${studies} studies a row, seed ${SEED} + row, Node ${process.versions.node.split('.')[0]}). Every study is invented: its truth is known, readings, campaigns, scatter and
systematic shifts are drawn anew, the law is fitted, and the 95 % intervals are held against the truth. Unless a row says otherwise: power law with exponent 0.6, u(ln Re) 0.1,
u(ln Sh) 0.03, scatter 0.05, campaign standard deviation 0.1, uncertainties stated as they are. Standard error of a coverage of 95 %: ${percent(Math.sqrt((0.95 * 0.05) / studies))} %.

- bias: median error of each parameter (standard error of the median); exact would be 0.
- parameters, law, prediction: coverage in %. Law and prediction inside the range of Re, then 3 times beyond it. The prediction is that of the coefficient of a new campaign.
- low: below 92.5 % by more than three standard errors.
- warnings: share of studies in %.
- rule: a row with a low coverage warns about its intervals in at least 90 % of studies, a row without in at most 10 %. It is not held against rows whose stated uncertainties are
  wrong, or in which the truth (campaigns that do not differ) cannot be known from the data. \`attenuation\` says what the correction leans on, not that an interval is too narrow.

| setting | bias | parameters | law | prediction | warnings | rule |
|---|---|---|---|---|---|---|
${rows.join('\n')}
`;
writeFileSync(join(import.meta.dirname, 'calibration.md'), text);
