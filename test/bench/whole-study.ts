import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { catalogue } from '../../correlations/catalogue.ts';
import { compare } from '../../pipeline/audit/ratio.ts';
import { seeded } from '../../pipeline/numerics/random.ts';
import type { Observations } from '../../pipeline/observations/observation.ts';

const main = 'dist/pipeline/cli/main.js';

/** Invented trials of a heated tube, as a table. */
function tubeTrials(count: number): string {
  const random = seeded(9);
  const rows = Array.from({ length: count }, (_, i) => {
    const flow = 4 + 20 * random.uniform();
    const inlet = 18 + 20 * random.uniform();
    const wall = 60 + 20 * random.uniform();
    const ntu = 0.55 * (flow / 10) ** -0.2 * Math.exp(0.03 * random.normal());
    return `T${i + 1},${'ABCDE'[i % 5]},${flow.toFixed(3)},${inlet.toFixed(2)},${(wall - (wall - inlet) * Math.exp(-ntu)).toFixed(2)},${wall.toFixed(2)}`;
  });
  return `trial,campaign,flow [L/min],T_in [degC],T_out [degC],T_wall [degC]\n${rows.join('\n')}\n`;
}

const study = `pilotlaw: 1
title: bench of a heated tube (invented)
invented: true
transfer: heat
equipment: tube
trials: {file: trials.csv, trial: trial, campaign: campaign}
quantities:
  volume_flow: {column: flow, random: 0.5 %, systematic: 0.5 %}
  inlet_temperature: {column: T_in, random: 0.05 K, systematic: 0.1 K, instrument: TT}
  outlet_temperature: {column: T_out, random: 0.05 K, systematic: 0.1 K, instrument: TT}
  wall_temperature: {column: T_wall, random: 0.15 K}
  diameter: 15.8 mm
  length: 1.8 m
fluid: {name: water, temperature: temperature}
coefficient: {route: log-mean-difference}
groups: {Re: pipe, Nu: pipe}
laws:
  - Nu = C * Re^a * Pr^b
  - Nu = C * Re^0.8 * Pr^0.4
  - Nu = C * Re^a * Pr^(1/3)
  - Nu = C * Re^a * Pr^(1/3) * viscosity_ratio^0.14
  - Nu = C * Re^a * Pr^(1/3) * viscosity_ratio^m
  - {form: "Nu = y0 + C * Re^a * Pr^(1/3)", start: {y0: 3.66, C: 0.02, a: 0.8}}
fit: {resamples: 2000}
`;

/** A cold run of 200 trials, 6 forms, 2,000 resamples, all applicable correlations and the report; and its peak memory. */
export function wholeStudy(): readonly string[] {
  const folder = mkdtempSync(join(tmpdir(), 'pilotlaw-whole-'));
  try {
    writeFileSync(join(folder, 'study.yaml'), study);
    writeFileSync(join(folder, 'trials.csv'), tubeTrials(200));
    const times = Array.from({ length: 3 }, () => {
      const start = performance.now();
      const { status, stderr } = spawnSync(process.execPath, [main, 'run', folder, '--fresh', '--quiet'], { encoding: 'utf8' });
      if (status !== 0) throw new Error(stderr);
      return performance.now() - start;
    });
    const measured = spawnSync('/usr/bin/time', ['-f', '%M', process.execPath, main, 'run', folder, '--fresh', '--quiet'], {
      encoding: 'utf8',
    });
    const memory = measured.status === 0 ? `, peak memory ${Math.round(Number(measured.stderr.trim().split('\n').at(-1)) / 1024)} MB` : '';
    return [
      `cold study of 200 trials, 6 forms, 2,000 resamples, audit, report: ${Math.min(...times).toFixed(0)} ms (aim: under 2,000 ms)${memory}`,
    ];
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** Every correlation that needs groups alone, evaluated with slopes and limits on 1,000 trials. */
export function auditBench(): readonly string[] {
  const random = seeded(4);
  const n = 1000;
  const able = catalogue.filter(({ groups }) => Object.keys(groups).length <= 4);
  const keys = [...new Set(able.flatMap(({ groups }) => Object.values(groups)))];
  const columns = keys.map(() => Float64Array.from({ length: n }, () => Math.log(1 + 5000 * random.uniform())));
  const observations: Observations = {
    scale: 'relative',
    trials: Array.from({ length: n }, (_, i) => `T${i}`),
    campaign: new Array<number>(n).fill(0),
    campaigns: ['all'],
    keys,
    z: columns,
    randomInputs: [],
    random: columns[0]!.length > 0 ? Array.from({ length: n }, () => new Float64Array(0)) : [],
    sources: [],
    systematic: Array.from({ length: n }, () => new Float64Array(0)),
  };
  const all = (): void => {
    for (const one of able) compare(one, 'direct', one.groups, observations);
  };
  all();
  const start = performance.now();
  all();
  const ms = performance.now() - start;
  return [`${able.length} correlations with slopes and limits on 1,000 trials: ${ms.toFixed(0)} ms (aim: under 100 ms)`];
}
