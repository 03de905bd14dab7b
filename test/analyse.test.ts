import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { computeStudy } from '../pipeline/batch/run-study.ts';
import { lawsJson } from '../pipeline/results/laws-json.ts';
import type { StudyResult } from '../pipeline/results/study-result.ts';
import { renderReport } from '../reports/page.ts';

const study = (name: string): Promise<StudyResult> => computeStudy(join(import.meta.dirname, '../datasets', name, 'study.yaml'));
const parameter = (result: StudyResult, law: string, name: string) =>
  result.fits.find((fit) => fit.name === law)!.parameters.find((one) => one.name === name)!;

describe('studies measured by others', () => {
  // Bates and Watts 1988, App. A1.2; R nls: theta 0.009415496643 (0.000420085673), residual standard error 1.918241.
  test('the cannon: theta as published, and one exponential does not hold', async () => {
    const result = await study('cannon-cooling');
    const theta = parameter(result, 'one exponential', 'theta');
    expect(theta.estimate).toBeCloseTo(0.009415496643, 9);
    expect(theta.standardError).toBeCloseTo(0.000420085673, 9);
    expect(result.notes.some((note) => note.code === 'residuals-in-order' && note.about === 'one exponential')).toBe(true);
    expect((await renderReport(result)).html).toContain('the form does not hold over the whole run');
  });

  // Brownlee 1965; R lm on datasets::stackloss: -39.9196744201 (11.8959968506), 0.7156402005, 1.2952861244, -0.1521225191.
  test('the stack loss: ordinary least squares as published', async () => {
    const result = await study('stack-loss');
    const found = ['b0', 'b1', 'b2', 'b3'].map((name) => parameter(result, 'straight', name));
    expect(found.map((one) => Number(one.estimate.toFixed(7)))).toEqual([-39.9196744, 0.7156402, 1.2952861, -0.1521225]);
    expect(found[0]!.standardError).toBeCloseTo(11.8959968506, 6);
    for (const { warnings } of JSON.parse(lawsJson(result)).laws) {
      const texts = warnings.map((one: { text: string }) => one.text);
      expect(texts).toEqual([...new Set(texts)]);
    }
  });

  // NIST StRD DanWood: certified b1 7.6886226176E-01 (1.8281973860E-02), b2 3.8604055871E+00 (5.1726610913E-02).
  test('the carbon lamp: NIST certified values', async () => {
    const result = await study('carbon-lamp');
    expect(parameter(result, 'power of temperature', 'b1').estimate).toBeCloseTo(0.76886226176, 8);
    expect(parameter(result, 'power of temperature', 'b1').standardError).toBeCloseTo(0.01828197386, 8);
    expect(parameter(result, 'power of temperature', 'b2').estimate).toBeCloseTo(3.8604055871, 7);
  });
});

describe('invented studies', () => {
  test.each([
    // the laws that the data were drawn from stand in the study files
    ['pellets-dissolving', 'stagnant limit kept', 'a', 0.52],
    ['water-in-a-tube', 'law 1', 'a', 0.79],
  ])('%s: the interval holds the exponent it was made with; rows add up', async (name, law, exponent, truth) => {
    const result = await study(name);
    const found = parameter(result, law, exponent);
    expect(found.lower).toBeLessThan(truth);
    expect(found.upper).toBeGreaterThan(truth);
    const { read, used, leftOut, refused } = result.ledger;
    expect(read).toBe(used + leftOut + refused);
    expect(leftOut).toBe(1);
  });

  // drawn from Sh = 2 + 0.58 Re^0.52 Sc^(1/3): not from the exponent 3/4 of Calderbank and Moo-Young
  test('pellets-dissolving is held against the correlations of suspended solids', async () => {
    const { audit } = await study('pellets-dissolving');
    const verdicts = new Map(audit!.rows.map((one) => [one.id, one.verdict]));
    expect(verdicts.get('calderbank-moo-young-1961-turbulent')).toBe('wrong trend');
    expect(verdicts.get('armenante-kirwan-1989')).not.toBe('wrong trend');
    expect(verdicts.get('levins-glastonbury-1972-slip')).toBe('not comparable');
  });

  test('the same inputs give the same bytes, and hostile text stays text', async () => {
    const result = await study('water-in-a-tube');
    const named = { ...result, study: { ...result.study, title: '<script>alert(1)</script>' } };
    const [a, b] = [await renderReport(named), await renderReport(named)];
    expect(a.html).toBe(b.html);
    expect(a.html).not.toContain('<script>alert(1)');
    expect(a.html).toContain('&lt;script&gt;alert(1)');
    const policy = /http-equiv="Content-Security-Policy" content="([^"]+)"/.exec(a.html)![1]!;
    expect(policy).toContain("default-src 'none'");
    expect(policy).not.toMatch(/unsafe/);
  });
});
