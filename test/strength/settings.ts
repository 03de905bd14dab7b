import type { Random } from '../../pipeline/numerics/random.ts';
import type { FitData, FitOptions } from '../../pipeline/regression/fit.ts';
import type { Condition } from '../../pipeline/regression/predict-ln.ts';
import type { LawToFit } from '../../pipeline/regression/solve-law.ts';
import { data, law, options } from '../regression/laws.ts';

/** One kind of synthetic study. All invented; ln units unless said. */
export interface Setting {
  readonly name: string;
  readonly trials: number;
  readonly campaigns: number;
  /** Largest over smallest Re. */
  readonly range: number;
  /** Random standard uncertainties of ln Re, ln Sc and ln Sh as they are, and the factor by which the study states them. */
  readonly uRe: number;
  readonly uSc: number;
  readonly uSh: number;
  readonly stated: number;
  /** Scatter and campaign standard deviation. */
  readonly sigma: number;
  readonly tau: number;
  /** Sh = offset + C Re^a Sc^(1/3), offset 0 but for one law. */
  readonly form: 'power' | 'two groups' | 'offset' | 'line';
  /** The recorded Re is a set point, and the truth scatters about it by uRe. */
  readonly set: boolean;
  /** Sc is the same for all trials of a campaign. */
  readonly perCampaign: boolean;
  /** Standard uncertainty of a source common to all trials: ln Re moves by 1, ln Sh by -1 of it. It is at the plant too. */
  readonly systematic: number;
  readonly campaignEffect: FitOptions['campaignEffect'];
  /** Whether what the study states is true. Where it is not, or where nobody can know it, no rule is held against the program. */
  readonly premise: 'true' | 'stated wrongly' | 'cannot be known';
}

const base: Setting = {
  name: 'base',
  trials: 30,
  campaigns: 6,
  range: 10,
  uRe: 0.1,
  uSc: 0,
  uSh: 0.03,
  stated: 1,
  sigma: 0.05,
  tau: 0.1,
  form: 'power',
  set: false,
  perCampaign: false,
  systematic: 0,
  campaignEffect: 'auto',
  premise: 'true',
};

const setting = (name: string, change: Partial<Setting>): Setting => ({ ...base, name, ...change });

/** What the calibration table has a row for. */
export const settings: readonly Setting[] = [
  setting('30 trials, 6 campaigns, Re x10, exact Re', { uRe: 0 }),
  setting('30 trials, 6 campaigns, Re x10', {}),
  setting('30 trials, 6 campaigns, Re x3', { range: 3 }),
  setting('30 trials, 6 campaigns, Re x2', { range: 2 }),
  setting('30 trials, 6 campaigns, Re x2, exact Re', { range: 2, uRe: 0 }),
  setting('30 trials, 10 campaigns, Re x10', { campaigns: 10 }),
  setting('30 trials, 3 campaigns, Re x10', { campaigns: 3 }),
  setting('30 trials, 3 campaigns, Re x3', { campaigns: 3, range: 3 }),
  setting('30 trials, 2 campaigns, Re x10', { campaigns: 2 }),
  setting('30 trials, 1 campaign, Re x10', { campaigns: 1 }),
  setting('30 trials, 6 campaigns told not to differ', { campaignEffect: 'none' }),
  setting('12 trials, 3 campaigns, Re x10', { trials: 12, campaigns: 3 }),
  setting('12 trials, 6 campaigns, Re x3', { trials: 12, range: 3 }),
  setting('12 trials, 1 campaign, Re x10', { trials: 12, campaigns: 1 }),
  setting('12 trials, 1 campaign where campaigns do not differ', { trials: 12, campaigns: 1, tau: 0, premise: 'cannot be known' }),
  setting('30 trials, 6 campaigns that do not differ', { tau: 0 }),
  setting('two groups, Sc x4 within campaigns', { form: 'two groups', uSc: 0.05 }),
  setting('two groups, Sc x4 between campaigns only', { form: 'two groups', uSc: 0.05, perCampaign: true }),
  setting('free offset, Re x100', { form: 'offset', range: 100, uRe: 0.05 }),
  setting('absolute errors, straight line', { form: 'line', uRe: 0.1 }),
  setting('a source common to rig and plant', { systematic: 0.08 }),
  setting('set points', { set: true, range: 3 }),
  setting('uncertainties stated 1.5 times too large, Re x3', { stated: 1.5, range: 3, sigma: 0, premise: 'stated wrongly' }),
  setting('uncertainties stated half as large as they are, Re x3', { stated: 0.5, range: 3, premise: 'stated wrongly' }),
  setting('no scatter beyond stated uncertainties, Re x3', { sigma: 0, range: 3 }),
];

/** One synthetic study and what is true in it. */
export interface Draw {
  readonly law: LawToFit;
  readonly data: FitData;
  readonly options: FitOptions;
  readonly truth: Readonly<Record<string, number>>;
  /** Inside and 3 times beyond the range: what is asked, and what a new campaign's coefficient truly is. */
  readonly inside: Asked;
  readonly outside: Asked;
}

interface Asked {
  readonly condition: Condition;
  readonly line: number;
  readonly coefficient: number;
}

const TRUTH = { C: 0.4, a: 0.6, c: 1 / 3, A: 6, k: 0.8 };

const forms: Record<Setting['form'], LawToFit> = {
  power: law('Sh = C * Re^a', ['Re']),
  'two groups': law('Sh = C * Re^a * Sc^c', ['Re', 'Sc']),
  offset: law('Sh = A + C * Re^a', ['Re']),
  line: law('y = A + k * x', ['x']),
};

/** Draws one study of a setting. */
export function draw(s: Setting, random: Random): Draw {
  return s.form === 'line' ? drawLine(s, random) : drawLogs(s, random);
}

function drawLogs(s: Setting, random: Random): Draw {
  const two = s.form === 'two groups';
  const low = s.form === 'offset' ? Math.log(3) : Math.log(1000);
  const span = Math.log(s.range);
  const lnF = (re: number, sc: number): number =>
    s.form === 'offset'
      ? Math.log(TRUTH.A + TRUTH.C * Math.exp(TRUTH.a * re))
      : Math.log(TRUTH.C) + TRUTH.a * re + (two ? TRUTH.c * sc : 0);
  const campaign = Array.from({ length: s.trials }, (_, i) => i % s.campaigns);
  const shift = Array.from({ length: s.campaigns }, () => s.tau * random.normal());
  const scOf = Array.from({ length: s.campaigns }, () => Math.log(300) + Math.log(4) * random.uniform());
  const source = s.systematic * random.normal();
  const rows = campaign.map((c) => {
    const re = low + span * random.uniform();
    const sc = s.perCampaign ? scOf[c]! : Math.log(300) + Math.log(4) * random.uniform();
    const eRe = s.uRe * random.normal();
    const [recorded, truth] = s.set ? [re, re + eRe] : [re + eRe, re];
    const y = lnF(truth, sc) + shift[c]! + s.sigma * random.normal() + s.uSh * random.normal();
    return { y: y - source, x: [recorded + source, ...(two ? [sc + s.uSc * random.normal()] : [])] };
  });
  const variances = [s.uSh, s.set ? 0 : s.uRe, ...(two ? [s.uSc] : [])].map((u) => (s.stated * u) ** 2);
  const sigma = rows.map(() => variances.flatMap((v, k) => variances.map((_, l) => (k === l ? v : 0))));
  const shared =
    s.systematic === 0 ? {} : { sources: ['shared'], systematic: rows.map(() => [-s.systematic, s.systematic, ...(two ? [0] : [])]) };
  const asked = (re: number): Asked => {
    const line = lnF(re, Math.log(600));
    const at = { Re: Math.exp(re + source), ...(two ? { Sc: 600 } : {}) };
    const sources = s.systematic === 0 ? {} : { sources: { shared: { groups: { Re: s.systematic }, factor: 0 } } };
    const berkson = s.set ? TRUTH.a * s.uRe * random.normal() : 0;
    return {
      condition: { at, ...sources },
      line: Math.exp(line),
      coefficient: Math.exp(line + s.tau * random.normal() + s.sigma * random.normal() + berkson),
    };
  };
  return {
    law: forms[s.form],
    data: data({ y: rows.map((row) => row.y), x: rows[0]!.x.map((_, k) => rows.map((row) => row.x[k]!)), campaign, sigma, ...shared }),
    options: options({ campaignEffect: s.campaignEffect }),
    truth: s.form === 'offset' ? { A: TRUTH.A, a: TRUTH.a } : two ? { C: TRUTH.C, a: TRUTH.a, c: TRUTH.c } : { C: TRUTH.C, a: TRUTH.a },
    inside: asked(low + span / 2),
    outside: asked(low + span + Math.log(3)),
  };
}

/** Absolute errors: y = A + k x, x from 0 to 1, uncertainties in y's and x's own unit. */
function drawLine(s: Setting, random: Random): Draw {
  const f = (x: number): number => TRUTH.A + TRUTH.k * x;
  const campaign = Array.from({ length: s.trials }, (_, i) => i % s.campaigns);
  const shift = Array.from({ length: s.campaigns }, () => s.tau * random.normal());
  const rows = campaign.map((c) => {
    const x = random.uniform();
    return { x: x + s.uRe * random.normal(), y: f(x) + shift[c]! + s.sigma * random.normal() + s.uSh * random.normal() };
  });
  const asked = (x: number): Asked => ({
    condition: { at: { x } },
    line: f(x),
    coefficient: f(x) + s.tau * random.normal() + s.sigma * random.normal(),
  });
  return {
    law: forms.line,
    data: data(
      { y: rows.map((row) => row.y), x: [rows.map((row) => row.x)], campaign, sigma: rows.map(() => [s.uSh ** 2, 0, 0, s.uRe ** 2]) },
      'absolute',
    ),
    options: options({ scale: 'absolute', campaignEffect: s.campaignEffect }),
    truth: { A: TRUTH.A, k: TRUTH.k },
    inside: asked(0.5),
    outside: asked(3),
  };
}
