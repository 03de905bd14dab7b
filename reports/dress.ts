import { createHash } from 'node:crypto';
import { gunzipSync, gzipSync } from 'node:zlib';
import { freeze } from './assets/frozen.ts';
import { liveScript } from './assets/live.generated.ts';
import { loader } from './assets/loader.ts';
import { html, type Markup } from './html.ts';
import type { LiveData } from './live-data.ts';
import { style } from './theme.ts';

/** Whether the script stands in the page or in one file beside the index of a batch. */
export type Assets = 'inline' | 'shared';

/** Name of the shared script; reports look for it one folder above their own, where the index is. */
export const SHARED_SCRIPT = 'report.js';

/** The text of the shared script. */
export const sharedScript = (): string => `${gunzipSync(Buffer.from(liveScript.gzip, 'base64')).toString('utf8')}\n`;

const hashOf = (text: string): string => `'sha256-${createHash('sha256').update(text).digest('base64')}'`;

interface Undressed {
  readonly title: string;
  readonly body: Markup;
  readonly assets: Assets;
  /** What the script reads; a page without it has no script. */
  readonly data?: LiveData;
}

/**
 * A whole page under a policy that allows its own style and scripts by their hashes (or the one shared file) and nothing else: no request, no eval, no style
 * or handler written into markup.
 */
export function dress({ title, body, assets, data }: Undressed): string {
  const scripts =
    data === undefined ? '' : assets === 'inline' ? ` script-src ${hashOf(loader)} '${liveScript.hash}';` : " script-src 'self' file:;";
  const policy = `default-src 'none'; style-src ${hashOf(style)};${scripts} base-uri 'none'; form-action 'none'`;
  return `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta http-equiv="Content-Security-Policy" content="${policy}"><meta name="viewport" content="width=device-width, initial-scale=1"><title>${html`${title}`.markup}</title><style>${style}</style></head><body>${body.markup}
${data === undefined ? '' : scriptsOf(data, assets)}</body></html>
`;
}

/** Data and script, packed: both are text of an unknown type to the browser until the loader inflates them. */
function scriptsOf(data: LiveData, assets: Assets): string {
  const packed = `<script type="application/octet-stream" id="data">${gzipSync(freeze(data), { level: 9 }).toString('base64')}</script>\n`;
  if (assets === 'shared') return `${packed}<script src="../${SHARED_SCRIPT}" defer></script>`;
  return `${packed}<script type="application/octet-stream" id="live">${liveScript.gzip}</script>\n<script>${loader}</script>`;
}
