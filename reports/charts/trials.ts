import { palette } from './palette.ts';

/** What the live page sets: the trial picked in any picture or in the ledger, and the campaigns put in the background. */
export const shared = [
  { name: 'picked', value: -1 },
  { name: 'hidden', value: [] },
] as const;

/** Dots shrink where there are many. */
const dotSize = (n: number): number => (n > 600 ? 9 : n > 150 ? 18 : 34);

const faded = { condition: { test: 'indexof(hidden, datum.campaign) >= 0', value: 0.1 }, value: 1 };

/** The trials: the darkest thing on the page. Rows of the named data set hold row, trial and campaign. */
export const trialDots = (data: string, encoding: Record<string, unknown>, n: number, tooltip: readonly unknown[] = []) => ({
  data: { name: data },
  mark: { type: 'point', filled: true, color: palette.ink, size: dotSize(n), clip: true },
  encoding: {
    ...encoding,
    opacity: faded,
    tooltip: [{ field: 'trial', type: 'nominal', title: 'trial' }, { field: 'campaign', type: 'nominal', title: 'campaign' }, ...tooltip],
  },
});

/** Ring and name of the trial picked; nothing until one is. */
export const pickedTrial = (data: string, encoding: Record<string, unknown>) => [
  {
    data: { name: data },
    transform: [{ filter: 'datum.row === picked' }],
    mark: { type: 'point', filled: false, stroke: palette.accent, strokeWidth: 2.5, size: 170 },
    encoding,
  },
  {
    data: { name: data },
    transform: [{ filter: 'datum.row === picked' }],
    mark: { type: 'text', dy: -14, fontWeight: 'bold', color: palette.accent },
    encoding: { ...encoding, text: { field: 'trial', type: 'nominal' } },
  },
];

/** A straight error bar of each trial along one axis. */
export const errorBars = (data: string, encoding: Record<string, unknown>, n: number) => ({
  data: { name: data },
  mark: { type: 'rule', color: palette.quiet, strokeWidth: n > 150 ? 0.4 : 0.8, clip: true },
  encoding: { ...encoding, opacity: faded },
});

/** Numbers that JSON cannot hold are left out of a picture. */
export const isDrawn = (...values: readonly number[]): boolean => values.every(Number.isFinite);
