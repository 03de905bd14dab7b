import { InputError } from '../base/input-error.ts';
import type { Note } from '../base/message.ts';
import type { Place } from '../base/place.ts';
import { says } from '../base/says/trials.ts';
import type { Staged } from '../base/staged.ts';
import { studentQuantile } from '../numerics/distributions.ts';
import type { Trial } from './average.ts';
import type { LedgerEntry } from './ledger.ts';
import type { Log } from './log-table.ts';
import { meanOfSeries } from './mean-of-series.ts';
import { onlyCampaign } from './read-row.ts';
import type { Trials } from './read-trials.ts';
import { steadyShare } from './steadiness.ts';

/** How steady windows are looked for. */
export interface SteadyOptions {
  /** Least length of a window, s: several time constants of the slowest quantity. */
  readonly window: number;
  /** Share of samples that must lie about one level; 0.9 where left out. */
  readonly share?: number;
  /** Two-sided significance of the t test of one sample; 0.01 where left out. */
  readonly significance?: number;
  readonly place: Place;
}

/** Rows [from, to) of a log in which every declared column is steady. */
export interface SteadyWindow {
  readonly from: number;
  readonly to: number;
  /** Per column: mean in SI, its standard uncertainty with autocorrelation counted, independent samples. */
  readonly mean: Float64Array;
  readonly u: Float64Array;
  readonly effective: Float64Array;
}

/** A gap longer than this many usual steps ends a window. */
const gapSteps = 3;
const leastSamples = 10;
const standardShare = 0.9;
const standardSignificance = 0.01;
/** Fewer independent samples than this leave the uncertainty of their mean uncertain itself. */
const fewIndependent = 20;

/**
 * Stretches of a log where all columns are steady by Kelly and Hedengren's test: window by window, neighbours joined as long as they pass together.
 * As many samples as the test lets pass unsteady, (1 - share) of a window, are taken off both ends, where a ramp would begin.
 * Throws InputError (exit 2) where the window holds fewer than ten samples.
 */
export function findSteady(
  log: Log,
  { window, share = standardShare, significance = standardSignificance, place }: SteadyOptions,
): readonly SteadyWindow[] {
  const step = usualStep(log.time);
  const n = Math.round(window / step);
  if (!(n >= leastSamples))
    throw new InputError([{ code: 'window-too-short', text: says.windowTooShort(window, step, leastSamples), place }]);
  const passes = (from: number, to: number): boolean => {
    const tCrit = studentQuantile(1 - significance / 2, to - from - 2);
    return log.values.every((x) => steadyShare(x, from, to, tCrit) >= share);
  };
  const cut = Math.ceil(Number(((1 - share) * n).toPrecision(12)));
  return stretches(log.time, gapSteps * step)
    .flatMap((stretch) => joined(stretch, n, passes))
    .map(({ from, to }) => measured(log, { from: from + cut, to: to - cut }));
}

interface Span {
  readonly from: number;
  readonly to: number;
}

/** The median step of time. */
function usualStep(time: Float64Array): number {
  if (time.length < 2) return Number.NaN;
  const steps = time.slice(1).map((t, k) => t - time[k]!);
  return steps.sort()[Math.floor(steps.length / 2)]!;
}

/** Rows without a gap between them. */
function stretches(time: Float64Array, longest: number): readonly Span[] {
  const spans: Span[] = [];
  let from = 0;
  for (let k = 1; k <= time.length; k++) {
    if (k < time.length && time[k]! - time[k - 1]! <= longest) continue;
    spans.push({ from, to: k });
    from = k;
  }
  return spans;
}

/** Windows of n rows that pass, neighbours joined where they pass together. */
function joined({ from, to }: Span, n: number, passes: (from: number, to: number) => boolean): readonly Span[] {
  const found: Span[] = [];
  for (let start = from; start + n <= to; ) {
    if (!passes(start, start + n)) {
      start += Math.max(1, Math.floor(n / 4));
      continue;
    }
    let end = start + n;
    while (end + n <= to && passes(end, end + n) && passes(start, end + n)) end += n;
    found.push({ from: start, to: end });
    start = end;
  }
  return found;
}

function measured({ values }: Log, { from, to }: Span): SteadyWindow {
  const means = values.map((x) => meanOfSeries(x.subarray(from, to)));
  return {
    from,
    to,
    mean: Float64Array.from(means, ({ mean }) => mean),
    u: Float64Array.from(means, ({ u }) => u),
    effective: Float64Array.from(means, ({ effective }) => effective),
  };
}

/** Trials that are steady windows of a log. */
export interface SteadyTrials extends Trials {
  readonly log: Log;
  readonly windows: readonly (Span & { readonly trial: string; readonly mean: Float64Array })[];
}

/** Each window as one trial, named by its time; rows outside are left out, and the ledger counts every row of the log. */
export function steadyTrials(
  log: Log,
  windows: readonly SteadyWindow[],
  { window, share = standardShare, significance = standardSignificance }: Omit<SteadyOptions, 'place'>,
): Staged<SteadyTrials> {
  const trials = windows.map((window, k) => steadyTrial(log, window, k + 1));
  const used = windows.map(
    (window, k): LedgerEntry => ({
      ...entry(log, window, trials[k]!.trial),
      status: 'used',
      reason: says.steadyWindow(window.to - window.from, log.lines[window.from]!, log.lines[window.to - 1]!),
    }),
  );
  const unused = outside(windows, log.time.length).map(
    (span): LedgerEntry => ({ ...entry(log, span, ''), status: 'left out', reason: says.notSteady(span.to - span.from) }),
  );
  const refused: LedgerEntry[] =
    log.skipped === 0
      ? []
      : [
          {
            trial: '',
            campaign: '',
            file: log.file,
            line: 1,
            rows: log.skipped,
            status: 'refused',
            reason: says.logRowsRefused(log.skipped),
          },
        ];
  const ledger = [...used, ...unused, ...refused].sort((a, b) => a.line - b.line);
  return {
    value: {
      keys: log.keys,
      trials,
      ledger,
      log,
      windows: windows.map(({ from, to, mean }, k) => ({ from, to, mean, trial: trials[k]!.trial })),
    },
    notes: [criterion(log, windows, { window, share, significance }), ...thinWindows(log, windows, trials)],
    refused: [],
  };
}

const entry = (log: Log, { from, to }: Span, trial: string) => ({
  trial,
  campaign: trial === '' ? '' : onlyCampaign,
  file: log.file,
  line: log.lines[from]!,
  rows: to - from,
});

function steadyTrial(log: Log, { from, to, mean, u }: SteadyWindow, number: number): Trial {
  return {
    trial: `window ${number}`,
    campaign: onlyCampaign,
    order: log.time[from]!,
    file: log.file,
    line: log.lines[from]!,
    lines: [log.lines[from]!],
    readings: to - from,
    values: mean,
    thin: [],
    statistical: Object.fromEntries(log.keys.map((key, k) => [key, u[k]!])),
  };
}

/** What lies between the windows. */
function outside(windows: readonly Span[], length: number): readonly Span[] {
  const edges = [0, ...windows.flatMap(({ from, to }) => [from, to]), length];
  return edges.flatMap((from, k) => (k % 2 === 0 && edges[k + 1]! > from ? [{ from, to: edges[k + 1]! }] : []));
}

function criterion(
  log: Log,
  windows: readonly SteadyWindow[],
  { window, share, significance }: Required<Omit<SteadyOptions, 'place'>>,
): Note {
  const rows = windows.reduce((sum, { from, to }) => sum + to - from, 0);
  return {
    section: 'trials',
    level: 'note',
    code: 'steady-windows',
    text: says.steadyCriterion(windows.length, rows, log.rows, { window, share, significance }),
    place: { file: log.file },
  };
}

function thinWindows(log: Log, windows: readonly SteadyWindow[], trials: readonly Trial[]): readonly Note[] {
  return windows.flatMap(({ effective }, k) => {
    const few = log.keys.filter((_, column) => effective[column]! < fewIndependent);
    if (few.length === 0) return [];
    return [
      {
        section: 'trials',
        level: 'warning',
        code: 'few-independent',
        text: says.fewIndependent(few, Math.min(...effective)),
        about: trials[k]!.trial,
      } as const,
    ];
  });
}
