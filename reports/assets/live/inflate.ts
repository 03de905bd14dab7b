import type { LiveData } from '../../live-data.ts';
import { thaw } from '../frozen.ts';

/** The data block of the page: base64 of gzip of JSON. */
export async function pageData(): Promise<LiveData> {
  const text = document.getElementById('data')!.textContent!;
  const bytes = Uint8Array.from(atob(text), (c) => c.charCodeAt(0));
  const json = await new Response(new Blob([bytes]).stream().pipeThrough(new DecompressionStream('gzip'))).text();
  return thaw(json) as LiveData;
}
