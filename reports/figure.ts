import type { Spec } from './charts/palette.ts';
import { html, type Markup, raw } from './html.ts';

/** A picture before it is drawn: what it shows in words for those who do not see it, and the caption for everybody. */
export interface Figure {
  readonly name: string;
  readonly spec: Spec;
  readonly alternative: string;
  readonly caption: string;
  /** Half-width pictures stand side by side where there is room. */
  readonly half?: boolean;
}

/** Rows with their names beside them cannot shrink: they scroll sideways where the screen is narrow. */
const hasRows = ({ spec }: Figure): boolean => JSON.stringify(spec).includes('"field":"row","type":"nominal"');

/** Drawn pictures by name, ready to be put where they belong. */
export type Pictures = ReadonlyMap<string, Markup>;

/** A figure of the page; the live script finds its picture by `data-chart`. */
export function figureOf(figure: Figure, svg: string): Markup {
  const { name, alternative, caption, half } = figure;
  const kind = hasRows(figure) ? html` class="picture rows" tabindex="0"` : html` class="picture"`;
  return html`<figure id="fig-${name}"${half === true && html` class="half"`}><div${kind} data-chart="${name}" role="img" aria-label="${alternative}">${raw(svg)}</div><figcaption>${caption}</figcaption></figure>`;
}

/** All pictures whose name starts so, in their order. */
export const picturesOf = (pictures: Pictures, start: string): readonly Markup[] =>
  [...pictures].filter(([name]) => name === start || name.startsWith(`${start}-`)).map(([, markup]) => markup);
