import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { fitLaw } from '../../pipeline/regression/fit-law.ts';
import { data, law, options } from './laws.ts';

/** Models of the nonlinear Statistical Reference Datasets (NIST/ITL, StRD), as the files in datasets/nist-strd print them. */
export const models: Readonly<Record<string, string>> = {
  Bennett5: 'b1 * (b2 + x)^(-1/b3)',
  BoxBOD: 'b1 * (1 - exp(-b2*x))',
  Chwirut1: 'exp(-b1*x) / (b2 + b3*x)',
  Chwirut2: 'exp(-b1*x) / (b2 + b3*x)',
  DanWood: 'b1 * x^b2',
  ENSO: 'b1 + b2*cos(2*pi*x/12) + b3*sin(2*pi*x/12) + b5*cos(2*pi*x/b4) + b6*sin(2*pi*x/b4) + b8*cos(2*pi*x/b7) + b9*sin(2*pi*x/b7)',
  Eckerle4: '(b1/b2) * exp(-0.5*((x - b3)/b2)^2)',
  Gauss1: 'b1*exp(-b2*x) + b3*exp(-(x - b4)^2/b5^2) + b6*exp(-(x - b7)^2/b8^2)',
  Gauss2: 'b1*exp(-b2*x) + b3*exp(-(x - b4)^2/b5^2) + b6*exp(-(x - b7)^2/b8^2)',
  Gauss3: 'b1*exp(-b2*x) + b3*exp(-(x - b4)^2/b5^2) + b6*exp(-(x - b7)^2/b8^2)',
  Hahn1: '(b1 + b2*x + b3*x^2 + b4*x^3) / (1 + b5*x + b6*x^2 + b7*x^3)',
  Kirby2: '(b1 + b2*x + b3*x^2) / (1 + b4*x + b5*x^2)',
  Lanczos1: 'b1*exp(-b2*x) + b3*exp(-b4*x) + b5*exp(-b6*x)',
  Lanczos2: 'b1*exp(-b2*x) + b3*exp(-b4*x) + b5*exp(-b6*x)',
  Lanczos3: 'b1*exp(-b2*x) + b3*exp(-b4*x) + b5*exp(-b6*x)',
  MGH09: 'b1*(x^2 + x*b2) / (x^2 + x*b3 + b4)',
  MGH10: 'b1 * exp(b2/(x + b3))',
  MGH17: 'b1 + b2*exp(-x*b4) + b3*exp(-x*b5)',
  Misra1a: 'b1 * (1 - exp(-b2*x))',
  Misra1b: 'b1 * (1 - (1 + b2*x/2)^(-2))',
  Misra1c: 'b1 * (1 - (1 + 2*b2*x)^(-0.5))',
  Misra1d: 'b1*b2*x*((1 + b2*x)^(-1))',
  Nelson: 'b1 - b2*x1*exp(-b3*x2)',
  Rat42: 'b1 / (1 + exp(b2 - b3*x))',
  Rat43: 'b1 / ((1 + exp(b2 - b3*x))^(1/b4))',
  Roszman1: 'b1 - b2*x - atan(b3/(x - b4))/pi',
  Thurber: '(b1 + b2*x + b3*x^2 + b4*x^3) / (1 + b5*x + b6*x^2 + b7*x^3)',
};

interface Problem {
  readonly parameters: readonly {
    readonly name: string;
    readonly starts: readonly [number, number];
    readonly value: number;
    readonly error: number;
  }[];
  readonly residualSd: number;
  readonly y: readonly number[];
  readonly x: Readonly<Record<string, readonly number[]>>;
}

const folder = join(import.meta.dirname, '../../datasets/nist-strd');

/** Roszman1 prints b1 as 1.20196866396E-0; NIST's own value (memory) agrees with the certified residual deviation. */
const MISPRINT = { file: 'Roszman1', parameter: 'b1', value: 0.20196866396 };

function readProblem(name: string): Problem {
  const lines = readFileSync(join(folder, `${name}.dat`), 'utf8').split(/\r?\n/u);
  const numbers = (line: string): readonly number[] => (line.match(/[-+]?(?:\d+\.?\d*|\.\d+)(?:[eE][-+]?\d+)?/gu) ?? []).map(Number);
  const parameters = lines.flatMap((line) => {
    const found = /^\s*(b\d)\s*=(.*)$/u.exec(line);
    if (found === null) return [];
    const [first, second, value, error] = numbers(found[2]!) as [number, number, number, number];
    const certified = name === MISPRINT.file && found[1] === MISPRINT.parameter ? MISPRINT.value : value;
    return [{ name: found[1]!, starts: [first, second] as const, value: certified, error }];
  });
  const sd = lines.find((line) => line.startsWith('Residual Standard Deviation'))!;
  const head = lines.findLastIndex((line) => line.startsWith('Data:'));
  const names = lines[head]!.replace('Data:', '').trim().split(/\s+/u);
  const rows = lines
    .slice(head + 1)
    .map(numbers)
    .filter((row) => row.length === names.length);
  const column = (k: number): readonly number[] => rows.map((row) => row[k]!);
  const y = column(0);
  return {
    parameters,
    residualSd: numbers(sd)[0]!,
    y: name === 'Nelson' ? y.map(Math.log) : y,
    x: Object.fromEntries(names.slice(1).map((of, k) => [of, column(k + 1)])),
  };
}

/** Correct digits, as NIST counts them: -log10 of the relative error; 11 at most, the digits that are certified. */
export const digits = (found: number, certified: number): number =>
  Math.max(0, Math.min(11, -Math.log10(Math.abs(found - certified) / Math.abs(certified))));

interface Answer {
  readonly problem: string;
  readonly start: 1 | 2;
  /** Worst over the parameters, signs counted; worst over their standard errors; residual standard deviation. */
  readonly parameters: number;
  readonly errors: number;
  readonly residualSd: number;
  readonly stop: string;
}

/** The program's own nonlinear fit of one problem from one start, on the values themselves. */
export function answer(name: string, start: 1 | 2): Answer {
  const problem = readProblem(name);
  const groups = Object.keys(problem.x);
  const fit = fitLaw(
    law(`y = ${models[name]}`, ['y', ...groups], {
      start: Object.fromEntries(problem.parameters.map((p) => [p.name, p.starts[start - 1]!])),
    }),
    data({ y: problem.y, x: groups.map((group) => problem.x[group]!) }, 'absolute'),
    options({ scale: 'absolute' }),
  );
  const of = (parameter: string) => fit.parameters.find((one) => one.name === parameter)!;
  return {
    problem: name,
    start,
    parameters: Math.min(...problem.parameters.map((p) => digits(of(p.name).estimate, p.value))),
    errors: Math.min(...problem.parameters.map((p) => digits(of(p.name).standardErrorRandom, p.error))),
    residualSd: digits(fit.statistics.residualSd, problem.residualSd),
    stop: fit.stop.why,
  };
}
