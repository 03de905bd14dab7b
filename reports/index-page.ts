import { dress } from './dress.ts';
import { html, type Markup } from './html.ts';
import * as says from './says/index-page.ts';

/** One study of a batch. Of a failed one only `study` and `faults` are known. */
export interface IndexEntry {
  /** The study file as it was named. */
  readonly study: string;
  /** What stands in the way of its results, sentence by sentence; empty where they are written. */
  readonly faults: readonly string[];
  readonly done?: {
    readonly title: string;
    /** The report, from the folder of the index. */
    readonly report: string;
    /** The chosen law with its numbers. */
    readonly text: string;
    readonly used: number;
    readonly read: number;
    /** Scatter beyond the stated uncertainties, ln (or the response's unit). */
    readonly scatter: number;
    readonly warnings: number;
    readonly bestPublished: string | null;
    readonly verdict: string | null;
  };
}

/** Stands in every index of ours, and in no page of the user's own. */
export const indexMark = 'id="pilotlaw-studies"';

/** A batch at a glance: one line a study, in their order; complete without scripts. */
export function indexPage(entries: readonly IndexEntry[]): string {
  const failed = entries.filter(({ faults }) => faults.length > 0).length;
  const body = html`<header><h1>${says.heading(entries.length)}</h1><p class="fine">${says.standing(entries.length, failed)}</p></header>
<main id="pilotlaw-studies"><section><div class="wide"><table><thead><tr>${says.columns.map((name) => html`<th scope="col">${name}</th>`)}</tr></thead>
<tbody>${entries.map(row)}</tbody></table></div></section></main>`;
  return dress({ title: says.heading(entries.length), body });
}

function row({ study, faults, done }: IndexEntry): Markup {
  if (done === undefined)
    return html`<tr><th scope="row">${study}</th><td colspan="${says.columns.length - 1}">${says.failed()}${faults.map((fault) => html`<br>${fault}`)}</td></tr>
`;
  const { title, report, text, used, read, scatter, warnings, bestPublished, verdict } = done;
  return html`<tr><th scope="row"><a href="${report}">${title}</a><br><span class="fine">${study}</span></th><td>${text}</td><td>${used} of ${read}</td><td>${short(scatter)}</td><td>${warnings}</td><td>${bestPublished ?? says.none()}</td><td>${verdict ?? says.none()}</td></tr>
`;
}

const short = (value: number): string => (Number.isFinite(value) ? String(Number(value.toPrecision(3))) : says.none());
