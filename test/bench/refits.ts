import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { levenbergMarquardt } from 'ml-levenberg-marquardt';
import { seeded } from '../../pipeline/numerics/random.ts';
import { fitLaw } from '../../pipeline/regression/fit-law.ts';
import { modelOf } from '../../pipeline/regression/model.ts';
import { resampler } from '../../pipeline/regression/warm-resamples.ts';
import { data, law, options } from '../regression/laws.ts';

/** Same trials, same weights, warm start from the full fit, analytic slopes where the other program takes them; one thread each. */
const N = 100;
const REFITS = 2000;

interface Bench {
  readonly name: string;
  readonly form: string;
  readonly re: readonly number[];
  readonly sc: readonly number[];
  readonly sh: readonly number[];
  readonly weights: readonly Float64Array[];
}

function made(name: string, form: string, offset: number): Bench {
  const random = seeded(77);
  const re = Array.from({ length: N }, () => 100 * 30 ** random.uniform());
  const sc = Array.from({ length: N }, () => 300 * 5 ** random.uniform());
  const sh = re.map((r, i) => (offset + 0.6 * r ** 0.5 * Math.cbrt(sc[i]!)) * Math.exp(0.05 * random.normal()));
  const weights = Array.from({ length: REFITS }, () => {
    const copies = new Float64Array(N);
    for (let i = 0; i < N; i++) copies[random.integer(N)]! += 1;
    return copies;
  });
  return { name, form, re, sc, sh, weights };
}

/** ms a refit of ours; the best of nine passes, as the others' is the best of theirs: the machine is shared. */
function ours({ form, re, sc, sh, weights }: Bench): number {
  const one = law(form, ['Sh', 'Re', 'Sc'], { start: { y0: 2, C: 0.6, a: 0.5 } });
  const trials = data({ y: sh.map(Math.log), x: [re.map(Math.log), sc.map(Math.log)] });
  const fit = fitLaw(one, trials, options());
  const model = modelOf(one.form, 'relative');
  const theta = Float64Array.from(model.constants, (name, k) => (model.asLogarithm[k] ? Math.log(fit.values[name]!) : fit.values[name]!));
  const refits = resampler(model, trials.y, trials.x, new Float64Array(N).fill(1), theta);
  const out = theta.slice();
  const all = (): void => {
    for (const copies of weights) refits.fit(copies, out);
  };
  all();
  const passes = Array.from({ length: 9 }, () => {
    const start = performance.now();
    all();
    return performance.now() - start;
  });
  return Math.min(...passes) / REFITS;
}

const PYTHON = `
import json, sys, time
import numpy as np
from scipy.optimize import curve_fit
b = json.load(open(sys.argv[1]))
re, sc, y = np.array(b['re']), np.array(b['sc']), np.log(np.array(b['sh']))
w = np.array(b['weights'])
third = np.cbrt(sc)
if b['power']:
    f = lambda x, C, a: np.log(C) + a * np.log(re) + np.log(third)
    jac = lambda x, C, a: np.column_stack([np.full(len(re), 1 / C), np.log(re)])
    p0 = [0.6, 0.5]
else:
    def f(x, y0, C, a): return np.log(y0 + C * re**a * third)
    def jac(x, y0, C, a):
        g = re**a * third
        v = y0 + C * g
        return np.column_stack([1 / v, g / v, C * g * np.log(re) / v])
    p0 = [2.0, 0.6, 0.5]
p0, _ = curve_fit(f, None, y, p0=p0, jac=jac, xtol=1e-10, ftol=1e-10)
best = 1e9
for rows in np.array_split(w[: b['count']], 8):
    t = time.perf_counter()
    for c in rows:
        keep = c > 0
        sigma = np.where(keep, 1 / np.sqrt(np.where(keep, c, 1)), 1e9)
        p, _ = curve_fit(f, None, y, p0=p0, jac=jac, sigma=sigma, xtol=1e-10, ftol=1e-10)
    best = min(best, (time.perf_counter() - t) * 1000 / len(rows))
print(best)
`;

const R = `
args <- commandArgs(TRUE)
d <- read.csv(args[1]); w <- as.matrix(read.csv(args[2], header = FALSE))
third <- d$sc^(1/3)
form <- if (args[3] == "1") log(sh) ~ log(C) + a * log(re) + log(third) else log(sh) ~ log(y0 + C * re^a * third)
start <- if (args[3] == "1") list(C = 0.6, a = 0.5) else list(y0 = 2, C = 0.6, a = 0.5)
full <- nls(form, d, start = start)
lm_there <- requireNamespace("minpack.lm", quietly = TRUE)
run <- function(fit) { best <- Inf
  for (part in split(seq_len(nrow(w)), rep(1:4, each = 25))) { t <- proc.time()[["elapsed"]]
    for (i in part) { keep <- w[i, ] > 0; try(fit(d[keep, ], w[i, keep]), silent = TRUE) }
    best <- min(best, 1000 * (proc.time()[["elapsed"]] - t) / length(part)) }
  best }
fit_nls <- function(dd, ww) { dd$third <- dd$sc^(1/3); nls(form, dd, start = as.list(coef(full)), weights = ww) }
d$third <- third
cat(run(fit_nls), "\\n")
if (lm_there) cat(run(function(dd, ww) minpack.lm::nlsLM(form, dd, start = as.list(coef(full)), weights = ww)), "\\n")
`;

/** One line for each program, as a multiple of ours. */
export function refitBench(): readonly string[] {
  const folder = mkdtempSync(join(tmpdir(), 'pilotlaw-refits-'));
  try {
    return [
      made('Sh = y0 + C Re^a Sc^(1/3)', 'Sh = y0 + C * Re^a * Sc^(1/3)', 2),
      made('Sh = C Re^a Sc^(1/3)', 'Sh = C * Re^a * Sc^(1/3)', 0),
    ].flatMap((bench) => lines(bench, folder));
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

function lines(bench: Bench, folder: string): readonly string[] {
  const mine = ours(bench);
  const power = !bench.form.includes('y0');
  const count = 400;
  const told = (name: string, ms: number | undefined): string =>
    `  ${name.padEnd(44)}${ms === undefined ? 'not installed here, or fails' : `${ms.toFixed(4)} ms = ${(ms / mine).toFixed(0)} x ours`}`;
  writeFileSync(
    join(folder, 'b.json'),
    JSON.stringify({ ...bench, weights: bench.weights.slice(0, count).map((one) => Array.from(one)), count, power }),
  );
  const python = spawnSync('/usr/bin/python3', ['-c', PYTHON, join(folder, 'b.json')], { encoding: 'utf8' });
  writeFileSync(join(folder, 'd.csv'), `re,sc,sh\n${bench.re.map((r, i) => `${r},${bench.sc[i]},${bench.sh[i]}`).join('\n')}\n`);
  writeFileSync(
    join(folder, 'w.csv'),
    `${bench.weights
      .slice(0, 100)
      .map((one) => Array.from(one).join(','))
      .join('\n')}\n`,
  );
  const r = spawnSync('Rscript', ['-e', R, join(folder, 'd.csv'), join(folder, 'w.csv'), power ? '1' : '0'], { encoding: 'utf8' });
  const [nls, nlsLM] = r.status === 0 ? r.stdout.trim().split(/\s+/u).map(Number) : [];
  return [
    `${bench.name}, n = ${N}, log residuals, ${REFITS} weighted refits from the full fit: ${mine.toFixed(4)} ms each (${Math.round(1000 / mine)} a second)`,
    told('scipy.optimize.curve_fit, analytic Jacobian', python.status === 0 ? Number(python.stdout) : undefined),
    told('R nls', nls),
    told('R minpack.lm::nlsLM', nlsLM),
    told('ml-levenberg-marquardt', levenberg(bench, power)),
  ];
}

/** The library's own weighted fit; its derivatives are by differences. Undefined where it fails on any of them. */
function levenberg({ re, sc, sh, weights }: Bench, power: boolean): number | undefined {
  const some = weights.slice(0, 100);
  const start = performance.now();
  let failed = 0;
  for (const copies of some) {
    const kept = re.flatMap((_, i) => (copies[i]! > 0 ? [i] : []));
    const model =
      (p: number[]) =>
      (i: number): number => {
        const [y0, c, a] = power ? [0, p[0]!, p[1]!] : [p[0]!, p[1]!, p[2]!];
        return Math.log(y0 + c * re[i]! ** a * Math.cbrt(sc[i]!));
      };
    try {
      levenbergMarquardt({ x: kept, y: kept.map((i) => Math.log(sh[i]!)) }, model, {
        initialValues: power ? [0.6, 0.5] : [2, 0.6, 0.5],
        weights: kept.map((i) => 1 / Math.sqrt(copies[i]!)),
        maxIterations: 20,
        errorTolerance: 1e-10,
      });
    } catch {
      failed += 1;
    }
  }
  return failed === some.length ? undefined : (performance.now() - start) / (some.length - failed);
}
