import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { seeded } from '../../pipeline/numerics/random.ts';
import { fitLaw } from '../../pipeline/regression/fit-law.ts';
import { data, law, options } from '../regression/laws.ts';

/** Whole fits of 100 invented trials: errors in both variables against scipy.odr, ten campaigns against lme4. Best of several, same data and start. */
const N = 100;

const PYTHON = `
import json, sys, time
import numpy as np
from scipy import odr
b = json.load(open(sys.argv[1]))
x, y = np.array(b['x']), np.array(b['y'])
model = odr.Model(lambda p, x: np.log(p[0] + p[1] * np.exp(p[2] * x)))
best = 1e9
for _ in range(7):
    t = time.perf_counter()
    odr.ODR(odr.RealData(x, y, sx=0.05, sy=0.05), model, beta0=[2.0, 0.6, 0.5]).run()
    best = min(best, time.perf_counter() - t)
print(best * 1000)
`;

const R = `
d <- read.csv(commandArgs(TRUE)[1]); suppressMessages(library(lme4))
best <- Inf
for (k in 1:7) { t <- proc.time()[["elapsed"]]; for (j in 1:5) lmer(y ~ x + (1 | g), d); best <- min(best, 1000 * (proc.time()[["elapsed"]] - t) / 5) }
cat(best, "\\n")
`;

const best = (work: () => void): number => {
  work();
  return Math.min(
    ...Array.from({ length: 7 }, () => {
      const start = performance.now();
      work();
      return performance.now() - start;
    }),
  );
};

export function fitBench(): readonly string[] {
  const random = seeded(12);
  const truth = Array.from({ length: N }, () => Math.log(50) + 4 * random.uniform());
  const campaign = truth.map((_, i) => i % 10);
  const shifts = Array.from({ length: 10 }, () => 0.1 * random.normal());
  const x = truth.map((v) => v + 0.05 * random.normal());
  const y = truth.map((v) => Math.log(2 + 0.6 * Math.exp(0.5 * v)) + 0.05 * random.normal());
  const mixed = x.map((v, i) => 0.6 * v + shifts[campaign[i]!]! + 0.05 * random.normal());
  const offset = law('Sh = y0 + C * Re^a', ['Sh', 'Re'], { start: { y0: 2, C: 0.6, a: 0.5 } });
  const power = law('Sh = C * Re^a', ['Sh', 'Re']);
  const both = data({ y, x: [x], sigma: y.map(() => [0.0025, 0, 0, 0.0025]) });
  const errors = best(() => fitLaw(offset, both, options({ scatter: 'none' })));
  const groups = best(() => fitLaw(power, data({ y: mixed, x: [x], campaign }), options({ campaignEffect: 'intercept' })));
  const folder = mkdtempSync(join(tmpdir(), 'pilotlaw-fits-'));
  try {
    writeFileSync(join(folder, 'b.json'), JSON.stringify({ x, y }));
    writeFileSync(join(folder, 'd.csv'), `y,x,g\n${mixed.map((v, i) => `${v},${x[i]},${campaign[i]}`).join('\n')}\n`);
    const odr = spawnSync('/usr/bin/python3', ['-c', PYTHON, join(folder, 'b.json')], { encoding: 'utf8' });
    const lmer = spawnSync('Rscript', ['-e', R, join(folder, 'd.csv')], { encoding: 'utf8' });
    const told = (what: string, ours: number, name: string, { status, stdout }: typeof odr): string =>
      `${what}: ${ours.toFixed(1)} ms with covariance and diagnostics; ${name} ${status === 0 ? `${Number(stdout).toFixed(1)} ms = ${(Number(stdout) / ours).toFixed(1)} x ours` : 'not installed here'}`;
    return [told('errors in both variables, n = 100', errors, 'scipy.odr', odr), told('ten campaigns, n = 100', groups, 'lme4 lmer', lmer)];
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
