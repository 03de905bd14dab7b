import { createHash } from 'node:crypto';
import { gunzipSync, gzipSync } from 'node:zlib';
import { freeze } from './assets/frozen.ts';
import { liveScript } from './assets/live.generated.ts';
import { loader, sharedLoader } from './assets/loader.ts';
import { html, type Markup } from './html.ts';
import type { LiveData } from './live-data.ts';
import { style } from './theme.ts';

const hashOf = (text: string): string => `'sha256-${createHash('sha256').update(text).digest('base64')}'`;

interface Undressed {
  readonly title: string;
  readonly body: Markup;
  /** What the script reads; a page without it has no script. */
  readonly data?: LiveData;
  /** Where the script stands as a file, as the page names it; in the page itself where left out. */
  readonly script?: string;
}

/** Name of the script that the reports of a batch share. */
export const SHARED_SCRIPT = 'pilotlaw-live.js';

/** That script, readable. */
export const sharedScript = (): string => gunzipSync(Buffer.from(liveScript.gzip, 'base64')).toString('utf8');

/**
 * A whole page under a policy that allows its own style and scripts by their hashes and nothing else: no request, no eval, no style
 * or handler written into markup.
 */
export function dress({ title, body, data, script }: Undressed): string {
  const trusted = script === undefined ? `${hashOf(loader)} '${liveScript.hash}'` : `${hashOf(sharedLoader)} 'strict-dynamic'`;
  const scripts = data === undefined ? '' : ` script-src ${trusted};`;
  const policy = `default-src 'none'; style-src ${hashOf(style)};${scripts} base-uri 'none'; form-action 'none'`;
  return `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta http-equiv="Content-Security-Policy" content="${policy}"><meta name="viewport" content="width=device-width, initial-scale=1"><title>${html`${title}`.markup}</title><style>${style}</style></head><body>${body.markup}
${data === undefined ? '' : scriptsOf(data, script)}</body></html>
`;
}

/** Data and script, packed: both are text of an unknown type to the browser until the loader inflates them. */
function scriptsOf(data: LiveData, script: string | undefined): string {
  const packed = `<script type="application/octet-stream" id="data">${gzipSync(freeze(data), { level: 9 }).toString('base64')}</script>\n`;
  if (script !== undefined)
    return `${packed}${html`<script type="application/octet-stream" id="live" data-src="${script}"></script>`.markup}\n<script>${sharedLoader}</script>`;
  return `${packed}<script type="application/octet-stream" id="live">${liveScript.gzip}</script>\n<script>${loader}</script>`;
}
