import { type Child, html, type Markup } from './html.ts';

export interface Column {
  readonly head: Child;
  readonly numeric?: boolean;
  /** A column of sentences. */
  readonly broad?: boolean;
}

/** Heads of a table: a text, `#text` for a column of numbers, `~text` for a column of sentences. */
export const columns = (...heads: readonly string[]): readonly Column[] =>
  heads.map((head) =>
    head.startsWith('#') ? { head: head.slice(1), numeric: true } : head.startsWith('~') ? { head: head.slice(1), broad: true } : { head },
  );

/** A table with caption and heads, its first cell of each row the row's head; scrolls sideways where the screen is narrow. `name` tells the scrolled region to those who do not see it. */
export function table(
  caption: string,
  heads: readonly Column[],
  rows: readonly (readonly Child[])[],
  attributes: Markup | false = false,
): Markup {
  const kind = (k: number): Markup | false =>
    heads[k]?.numeric === true ? html` class="n"` : heads[k]?.broad === true && html` class="b"`;
  return html`<div class="wide" role="region" tabindex="0" aria-label="${caption}"><table${attributes}><caption>${caption}</caption><thead><tr>${heads.map((one, k) => html`<th scope="col"${kind(k)}>${one.head}</th>`)}</tr></thead><tbody>
${rows.map((row) => rowOf(row, kind))}
</tbody></table></div>`;
}

const rowOf = (row: readonly Child[], kind: (k: number) => Markup | false): Markup =>
  html`<tr>${row.map((cell, k) => (k === 0 ? html`<th scope="row"${kind(k)}>${cell}</th>` : html`<td${kind(k)}>${cell}</td>`))}</tr>`;
