/** The few colours of the page, light scheme. The page shows them through variables, so that a dark scheme can replace them. */
export const palette = {
  ink: '#16191d',
  quiet: '#59626c',
  faint: '#868f98',
  grid: '#e6e9ec',
  accent: '#0a6a74',
  band: '#cfe3e4',
  warm: '#a4471c',
  page: '#ffffff',
} as const;

/** Colour -> variable of the page's style. */
const variables: Readonly<Record<string, string>> = Object.fromEntries(
  Object.entries(palette).map(([name, colour]) => [colour, `var(--${name})`]),
);

/** The same picture with its colours as variables of the page. */
export const inPageColours = (text: string): string =>
  Object.entries(variables).reduce((all, [colour, variable]) => all.replaceAll(`"${colour}"`, `"${variable}"`), text);

/** Config that all charts share: quiet axes, text at one size, no frame; the page gives each picture its text alternative. */
export const config = {
  background: 'transparent',
  font: 'system-ui, sans-serif',
  view: { stroke: null },
  mark: { aria: false },
  axis: {
    aria: false,
    labelColor: palette.quiet,
    titleColor: palette.ink,
    titleFontWeight: 'normal',
    gridColor: palette.grid,
    domainColor: palette.faint,
    tickColor: palette.faint,
    labelFontSize: 12,
    titleFontSize: 13,
    labelOverlap: 'greedy',
    titlePadding: 8,
  },
  text: { fontSize: 12, color: palette.quiet },
} as const;

export type Spec = Record<string, unknown>;

export const SCHEMA = 'https://vega.github.io/schema/vega-lite/v6.json';
