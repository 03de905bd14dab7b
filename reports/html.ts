/** Markup that is safe to put into a page as it stands. */
export interface Markup {
  readonly markup: string;
}

export const raw = (markup: string): Markup => ({ markup });

export type Child = Markup | string | number | false | null | undefined | readonly Child[];

const entities: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

/** Control characters that no HTML text may hold. */
const isControl = (code: number): boolean => code === 0x7f || (code < 0x20 && code !== 0x09 && code !== 0x0a && code !== 0x0d);

/** Text for element content and quoted attributes; characters that no HTML text may hold are shown as a mark. */
const escaped = (text: string): string =>
  Array.from(
    text.replace(/[&<>"']/g, (c) => entities[c]!),
    (c) => (isControl(c.codePointAt(0)!) ? '\ufffd' : c),
  ).join('');

function render(child: Child): string {
  if (child === false || child === null || child === undefined) return '';
  if (typeof child === 'string') return escaped(child);
  if (typeof child === 'number') return String(child);
  return 'markup' in child ? child.markup : child.map(render).join('');
}

/** Template of markup; everything put in is escaped unless it is markup itself. */
export const html = (parts: TemplateStringsArray, ...children: readonly Child[]): Markup =>
  raw(parts.reduce((all, part, i) => all + render(children[i - 1]) + part));
