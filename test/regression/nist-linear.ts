import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { fitLaw } from '../../pipeline/regression/fit-law.ts';
import { data, law, options } from './laws.ts';
import { digits } from './nist-problems.ts';

/** One linear problem with its certified values; y and columns x. */
interface LinearProblem {
  readonly model: string;
  readonly y: readonly number[];
  readonly x: Readonly<Record<string, readonly number[]>>;
  readonly values: readonly number[];
  readonly errors: readonly number[];
  readonly residualSd: number;
}

const folder = join(import.meta.dirname, '../../datasets/nist-strd/linear');

/** Of a table carried in datasets/nist-strd/linear. */
function carried(name: string, model: string, certified: Pick<LinearProblem, 'values' | 'errors' | 'residualSd'>): LinearProblem {
  const [header, ...rows] = readFileSync(join(folder, `${name}.csv`), 'utf8')
    .trim()
    .split(/\r?\n/u) as [string, ...string[]];
  const cells = rows.map((row) => row.split(',').map(Number));
  const column = (k: number): readonly number[] => cells.map((row) => row[k]!);
  const names = header.split(',').slice(1);
  return { model, y: column(0), x: Object.fromEntries(names.map((of, k) => [of, column(k + 1)])), ...certified };
}

const polynomial = (degree: number): string =>
  Array.from({ length: degree + 1 }, (_, k) => (k === 0 ? 'b0' : k === 1 ? 'b1*x' : `b${k}*x^${k}`)).join(' + ');

const whole = Array.from({ length: 21 }, (_, x) => x);
const fifth = (b: number): readonly number[] =>
  whole.map((x) => Array.from({ length: 6 }, (_, k) => (b * x) ** k).reduce((s, v) => s + v, 0));
/** What Wampler added to the exact polynomial. */
const added = [
  759, -2048, 2048, -2048, 2523, -2048, 2048, -2048, 1838, -2048, 2048, -2048, 1838, -2048, 2048, -2048, 2523, -2048, 2048, -2048, 759,
];
const errorsOf3 = [2152.3262467817, 2363.55173469681, 779.343524331583, 101.47550755035, 5.64566512170752, 0.112324854679312];
const wampler = (times: number): LinearProblem => ({
  model: polynomial(5),
  y: fifth(1).map((value, i) => value + times * added[i]!),
  x: { x: whole },
  values: [1, 1, 1, 1, 1, 1],
  errors: errorsOf3.map((value) => value * times),
  residualSd: 2360.14502379268 * times,
});
const span = (from: number, to: number): readonly number[] => Array.from({ length: to - from + 1 }, (_, k) => from + k);

/** Linear Statistical Reference Datasets (NIST/ITL, StRD), certified values; see datasets/nist-strd/README.md. Wampler and NoInt are formulas. */
export const linearProblems: Readonly<Record<string, LinearProblem>> = {
  Norris: carried('Norris', polynomial(1), {
    values: [-0.262323073774029, 1.00211681802045],
    errors: [0.232818234301152, 0.429796848199937e-3],
    residualSd: 0.884796396144373,
  }),
  Pontius: carried('Pontius', polynomial(2), {
    values: [0.673565789473684e-3, 0.732059160401003e-6, -0.316081871345029e-14],
    errors: [0.107938612033077e-3, 0.157817399981659e-9, 0.486652849992036e-16],
    residualSd: 0.205177424076185e-3,
  }),
  NoInt1: {
    model: 'b1*x',
    y: span(130, 140),
    x: { x: span(60, 70) },
    values: [2.07438016528926],
    errors: [0.0165289256198347],
    residualSd: 3.56753034006338,
  },
  NoInt2: {
    model: 'b1*x',
    y: [3, 4, 4],
    x: { x: span(4, 6) },
    values: [0.727272727272727],
    errors: [0.0420827318078432],
    residualSd: 0.369274472937998,
  },
  Filip: carried('Filip', polynomial(10), {
    values: [
      -1467.4896142298, -2772.17959193342, -2316.37108160893, -1127.97394098372, -354.478233703349, -75.1242017393757, -10.8753180355343,
      -1.06221498588947, -0.0670191154593408, -0.00246781078275479, -0.402962525080404e-4,
    ],
    errors: [
      298.084530995537, 559.77986547495, 466.477572127796, 227.204274477751, 71.6478660875927, 15.28971787474, 2.23691159816033,
      0.221624321934227, 0.0142363763154724, 0.535617408889821e-3, 0.896632837373868e-5,
    ],
    residualSd: 0.00334801051324544,
  }),
  Longley: carried('Longley', 'b0 + b1*x1 + b2*x2 + b3*x3 + b4*x4 + b5*x5 + b6*x6', {
    values: [
      -3482258.63459582, 15.0618722713733, -0.035819179292591, -2.02022980381683, -1.03322686717359, -0.0511041056535807, 1829.15146461355,
    ],
    errors: [
      890420.383607373, 84.9149257747669, 0.0334910077722432, 0.488399681651699, 0.214274163161675, 0.22607320006937, 455.478499142212,
    ],
    residualSd: 304.854073561965,
  }),
  Wampler1: { model: polynomial(5), y: fifth(1), x: { x: whole }, values: [1, 1, 1, 1, 1, 1], errors: [], residualSd: 0 },
  Wampler2: {
    model: polynomial(5),
    y: fifth(0.1),
    x: { x: whole },
    values: [1, 0.1, 0.01, 0.001, 0.0001, 0.00001],
    errors: [],
    residualSd: 0,
  },
  Wampler3: wampler(1),
  Wampler4: wampler(100),
  Wampler5: wampler(10_000),
};

/** Correct digits of the program's own fit; where the data are exact (Wampler1, 2) residual sd is told beside the largest y. */
export function linearAnswer(name: string) {
  const problem = linearProblems[name]!;
  const groups = Object.keys(problem.x);
  const form = law(`y = ${problem.model}`, ['y', ...groups]);
  const fit = fitLaw(form, data({ y: problem.y, x: groups.map((of) => problem.x[of]!) }, 'absolute'), options({ scale: 'absolute' }));
  const first = problem.model.startsWith('b1') ? 1 : 0;
  const of = (k: number) => fit.parameters.find((one) => one.name === `b${k + first}`)!;
  const exact = problem.residualSd === 0;
  return {
    problem: name,
    parameters: Math.min(...problem.values.map((value, k) => digits(of(k).estimate, value))),
    errors: exact ? Number.NaN : Math.min(...problem.errors.map((value, k) => digits(of(k).standardErrorRandom, value))),
    residualSd: exact ? Number.NaN : digits(fit.statistics.residualSd, problem.residualSd),
    residualShare: fit.statistics.residualSd / Math.max(...problem.y.map(Math.abs)),
    stop: fit.stop.why,
    codes: fit.notes.map((note) => note.code),
  };
}
