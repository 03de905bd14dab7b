/** Markup that is safe to put into a page as it stands. */
export interface Markup {
  readonly markup: string;
}

export const raw = (markup: string): Markup => ({ markup });

export type Child = Markup | string | number | false | null | undefined | readonly Child[];

const entities: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

/** Text for element content and quoted attributes; characters that no HTML text may hold are shown as a mark. */
// biome-ignore lint/suspicious/noControlCharactersInRegex: control characters are what is looked for
export const escaped = (text: string): string => text.replace(/[&<>"']/g, (c) => entities[c]!).replace(/[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f]/g, '\ufffd');

function render(child: Child): string {
  if (child === false || child === null || child === undefined) return '';
  if (typeof child === 'string') return escaped(child);
  if (typeof child === 'number') return String(child);
  return 'markup' in child ? child.markup : child.map(render).join('');
}

/** Template of markup; everything put in is escaped unless it is markup itself. */
export const html = (parts: TemplateStringsArray, ...children: readonly Child[]): Markup => raw(parts.reduce((all, part, i) => all + render(children[i - 1]) + part));
