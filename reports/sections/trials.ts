import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { html, type Markup } from '../html.ts';
import { plainNumber } from '../numbers.ts';

/** Which trials count? */
export function trials(result: StudyResult): Markup {
  const { read, used, leftOut, refused, rows } = result.ledger;
  const byName = new Map(result.trials.map((trial) => [trial.trial, trial]));
  const unit = (text: string): string => (text === '1' ? '' : ` in ${text}`);
  return html`<section id="trials"><h2>Which trials count?</h2><p class="lead">${read} rows read = ${used} used + ${leftOut} left out + ${refused} refused; ${result.ledger.trials} trials.</p>
<div class="wide"><table><caption>The ledger, in the order of the file</caption><thead><tr><th scope="col">trial</th><th scope="col">campaign</th><th scope="col" class="n">line</th><th scope="col">status</th><th scope="col">reason or remark</th>${result.coefficient !== null && html`<th scope="col" class="n">${result.coefficient.symbol}${unit(result.coefficient.unit)}</th>`}${result.columns.map((column) => html`<th scope="col" class="n">${column.name}${unit(column.unit)}</th>`)}</tr></thead><tbody>
${rows.map((row) => {
  const trial = row.status === 'used' ? byName.get(row.trial) : undefined;
  return html`<tr><th scope="row">${row.trial}</th><td>${row.campaign}</td><td class="n">${row.line}</td><td>${row.status}</td><td>${[row.reason, ...(trial?.notes ?? [])].filter((text) => text !== '').join('; ')}</td>${result.coefficient !== null && html`<td class="n">${trial === undefined ? '' : plainNumber(trial.coefficient)}</td>`}${result.columns.map((_, k) => html`<td class="n">${trial === undefined ? '' : plainNumber(trial.values[k]!)}</td>`)}</tr>`;
})}
</tbody></table></div>${walk(result)}</section>`;
}

/** The whole way from readings to groups for the first trial, by hand. */
function walk({ trials: all }: StudyResult): Markup | false {
  const one = all[0];
  if (one === undefined || one.trace.length === 0) return false;
  return html`<h3>Trial ${one.trial}, step by step</h3><p class="fine">Read, in SI: ${Object.entries(one.raw)
    .map(([key, value]) => `${key} ${plainNumber(value, 5)}`)
    .join(', ')}.</p>
<div class="wide"><table><thead><tr><th scope="col">step</th><th scope="col" class="n">value</th><th scope="col">unit</th><th scope="col">formula</th><th scope="col">source</th></tr></thead><tbody>${one.trace.map((step) => html`<tr><th scope="row">${step.key}</th><td class="n">${plainNumber(step.value, 5)}</td><td>${step.unit}</td><td>${step.formula}</td><td>${step.source}</td></tr>`)}</tbody></table></div>`;
}
