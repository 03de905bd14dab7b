import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { html, type Markup } from '../html.ts';
import { chosenFit } from '../law-text.ts';
import { percent, plainNumber } from '../numbers.ts';
import * as says from '../says/sections.ts';
import { prettyUnit } from '../units.ts';

/** The middle of a tried range, as a start for the reader's own value. */
const middle = (low: number, high: number): number =>
  Number((low > 0 ? Math.sqrt(low) * Math.sqrt(high) : low / 2 + high / 2).toPrecision(3));

/** Own group values to the response with its interval; hidden until the script that computes it runs. */
export function calculator(result: StudyResult): Markup | false {
  const fit = chosenFit(result);
  if (fit === undefined || !fit.form.groups.every((name) => (fit.ranges[name] ?? []).every(Number.isFinite))) return false;
  const unit = (name: string): string => prettyUnit(result.columns.find((one) => one.key === fit.groups[name])?.unit ?? '1');
  return html`<form id="calculator" class="live" hidden aria-labelledby="calculator-head"><h3 id="calculator-head">${says.calculator()}</h3>
<div class="fields">${fit.form.groups.map((name, k) => {
    const [low, high] = fit.ranges[name]!;
    return html`<label for="group-${k}">${name}${unit(name) === '' ? '' : ` in ${unit(name)}`}<input id="group-${k}" name="${name}" inputmode="decimal" autocomplete="off" value="${middle(low, high)}" aria-describedby="group-${k}-tried"><span id="group-${k}-tried" class="fine">tried: ${plainNumber(low)} to ${plainNumber(high)}</span></label>`;
  })}${result.coefficient !== null && html`<label for="per-response">${result.coefficient.symbol} per ${fit.form.response}, in ${prettyUnit(result.coefficient.unit)}<input id="per-response" name="factor" inputmode="decimal" autocomplete="off" value="" aria-describedby="per-response-note"><span id="per-response-note" class="fine">${result.study.transfer === 'heat' ? 'conductivity over length' : 'diffusivity over length'}; may stay empty</span></label>`}</div>
<output id="calculated" for="${fit.form.groups.map((_, k) => `group-${k}`).join(' ')}"></output>
<p class="fine">${says.calculatorFine(percent(result.options.confidence))}</p></form>`;
}
