import { palette } from './palette.ts';

/** A line's name beside its end: share of the plot's width, pixels from its top. */
export interface End {
  readonly label: string;
  readonly across: number;
  readonly y: number;
  readonly colour: string;
}

const APART = 14;

/** Labels of lines that end close together are moved apart, and kept within the height of the plot. */
function spreadApart(ends: readonly End[], height: number): readonly (End & { readonly at: number })[] {
  const sorted = [...ends].sort((a, b) => a.y - b.y || (a.label < b.label ? -1 : 1));
  const at = sorted.map((end) => Math.min(Math.max(end.y, 4), height - 4));
  for (let k = 1; k < at.length; k++) at[k] = Math.max(at[k]!, at[k - 1]! + APART);
  if (at.length > 0) at[at.length - 1] = Math.min(at.at(-1)!, height - 4);
  for (let k = at.length - 2; k >= 0; k--) at[k] = Math.min(at[k]!, at[k + 1]! - APART);
  return sorted.map((end, k) => ({ ...end, at: at[k]! }));
}

/** Text layers right of the plot, each joined to its line's end by a hairline. */
export function endLabels(ends: readonly End[], height: number): readonly unknown[] {
  const placed = spreadApart(ends, height);
  if (placed.length === 0) return [];
  return placed.flatMap(({ label, across, y, at, colour }) => {
    const [from, to] = [Math.min(Math.max(y, 0), height), at];
    return [
      {
        data: { values: [{}] },
        mark: {
          type: 'rule',
          x: { expr: `width * ${across.toFixed(3)}` },
          x2: { expr: 'width + 14' },
          y: from,
          y2: to,
          color: palette.faint,
          strokeWidth: 0.7,
        },
        encoding: {},
      },
      {
        data: { values: [{ label }] },
        mark: {
          type: 'text',
          align: 'left',
          baseline: 'middle',
          x: { expr: 'width + 17' },
          y: to,
          color: colour,
          fontSize: 12,
          fontWeight: colour === palette.accent ? 'bold' : 'normal',
        },
        encoding: { text: { field: 'label', type: 'nominal' } },
      },
    ];
  });
}
