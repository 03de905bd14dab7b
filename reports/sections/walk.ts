import { html, type Markup } from '../html.ts';
import { plainNumber } from '../numbers.ts';
import * as says from '../says/walk.ts';
import { columns, table } from '../table.ts';
import { behind } from '../units.ts';

/** What is needed to walk through one trial: what was read, and each step with its formula. Values in the units beside them. */
export interface Walk {
  readonly trial: string;
  readonly raw: readonly { readonly key: string; readonly value: number; readonly unit: string }[];
  readonly steps: readonly {
    readonly key: string;
    readonly value: number;
    readonly unit: string;
    readonly formula: string;
    readonly source: string;
  }[];
}

/** The whole way from the readings of one trial to its groups, to be repeated by hand; the same on paper and on the live page. */
export const walkMarkup = ({ trial, raw, steps }: Walk): Markup =>
  html`<h3>${says.lead(trial)}</h3>
<p class="fine">${says.readIn()}: ${raw.map(({ key, value, unit }) => `${key} ${plainNumber(value, 6)}${behind(unit)}`).join(', ')}. ${says.fine()}</p>
${table(
  says.caption(trial),
  columns('step', '~formula', '#value', '~source'),
  steps.map((step) => [
    step.key,
    html`<span class="formula">${step.formula}</span>`,
    `${plainNumber(step.value, 6)}${behind(step.unit)}`,
    step.source,
  ]),
)}`;
