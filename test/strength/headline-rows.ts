import { renderReport } from '../../reports/page.ts';
import { ugly } from '../reports/build/ugly.ts';

const text = (markup: string): string =>
  markup
    .replace(/<[^>]+>/gu, '')
    .replace(/&amp;/gu, '&')
    .replace(/&lt;/gu, '<')
    .replace(/&gt;/gu, '>')
    .replace(/&quot;/gu, '"')
    .replace(/&#39;/gu, "'")
    .replace(/\s+/gu, ' ')
    .trim();

/** First sentences of a section: what its lead says. */
function lead(html: string, id: string): string {
  const section = html.slice(html.indexOf(`<section id="${id}"`));
  return text(/<p class="lead">(.*?)<\/p>/su.exec(section)?.[1] ?? '');
}

const cell = (said: string): string =>
  (said.length > 400 ? `${said.slice(0, 397)}...` : said)
    .replace(/\|/gu, '\\|')
    .replace(/[`<>]/gu, (c) => `\\${c}`)
    .replace(/[\u202a-\u202e\u2066-\u2069]/gu, (c) => `U+${c.codePointAt(0)!.toString(16).toUpperCase()}`);

/** The headline of every ugly study of the browser tests, section by section. */
export async function headlineTable(): Promise<string> {
  const rows: string[] = [];
  for (const [name, result] of Object.entries(ugly)) {
    const { html } = await renderReport(result);
    for (const id of ['answer', 'audit', 'plant', 'next-trials']) rows.push(`| ${cell(name)} | ${id} | ${cell(lead(html, id))} |`);
  }
  return `# What the report says first, in every ugly case

Made by \`npm run headlines\` from the made-up results of test/reports/build/ugly.ts; read by hand when it changes.

| study | section | first sentence |
|---|---|---|
${rows.join('\n')}
`;
}
