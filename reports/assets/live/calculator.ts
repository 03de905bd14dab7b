import { type Prediction, predictor } from '../../../pipeline/regression/predict-ln.ts';
import type { LiveData } from '../../live-data.ts';
import { plainNumber, roundedLike, valueBy } from '../../numbers.ts';
import * as says from '../../says/live.ts';
import { behind } from '../../units.ts';
import { element } from './element.ts';

/** Own group values to the response and the coefficient, with the very function that predicts plant cases. */
export function liveCalculator(data: LiveData): void {
  const form = document.getElementById('calculator') as HTMLFormElement | null;
  const { fit } = data;
  if (form === null || fit === null) return;
  const predict = predictor(fit);
  const out = document.getElementById('calculated')!;
  const fields = [...form.querySelectorAll('input')];
  const relative = fit.scale === 'relative';
  const compute = (): void => {
    const faults: string[] = [];
    const read = (field: HTMLInputElement): number => {
      const text = field.value.trim().replace(',', '.');
      const value = /^[-+]?(\d+\.?\d*|\.\d+)(e[-+]?\d+)?$/i.test(text) ? Number(text) : Number.NaN;
      if (!Number.isFinite(value)) faults.push(says.notANumber(field.name, field.value));
      else if (relative && !(value > 0)) faults.push(says.notPositive(field.name));
      return value;
    };
    const groups = fields.filter((field) => field.id.startsWith('group-'));
    const factor = fields.find((field) => field.id === 'per-response');
    const at = Object.fromEntries(groups.map((field) => [field.name, read(field)]));
    const times = factor === undefined || factor.value.trim() === '' ? undefined : read(factor);
    out.replaceChildren(...(faults.length > 0 ? faults : answers(data, predict({ at }), at, times)).map((text) => element('p', {}, text)));
  };
  form.addEventListener('input', compute);
  form.addEventListener('submit', (event) => event.preventDefault());
  compute();
  form.hidden = false;
}

function answers(data: LiveData, found: Prediction, at: Readonly<Record<string, number>>, times: number | undefined): readonly string[] {
  if (!Number.isFinite(found.value)) return [says.noValue()];
  return [
    told(data.response.name, found, 1, behind(data.response.unit)),
    ...(times === undefined || data.coefficient === null
      ? []
      : [told(data.coefficient.symbol, found, times, behind(data.coefficient.unit))]),
    place(data, at),
    ...(found.withoutCampaigns ? [says.campaignsUnknown()] : []),
  ];
}

/** A prediction times an exact factor. */
function told(what: string, { value, lower, upper, lawLower, lawUpper }: Prediction, factor: number, unit: string): string {
  const [v, a, b] = [value * factor, lower * factor, upper * factor];
  const end = (one: number): string => roundedLike(one, v, a, b);
  return `${says.calculated(what, valueBy(v, a, b), end(a), end(b), unit)}; ${says.lawAlone(end(lawLower * factor), end(lawUpper * factor))}.`;
}

function place({ fit }: LiveData, at: Readonly<Record<string, number>>): string {
  const out = Object.entries(fit!.ranges).flatMap(([name, [low, high]]) => {
    const value = at[name]!;
    if (value >= low && value <= high) return [];
    const side = value < low ? 'below' : 'above';
    const factor = value < low ? low / value : value / high;
    return [low > 0 && value > 0 ? says.beyond(name, side, plainNumber(factor)) : says.outside(name, side)];
  });
  return out.length === 0 ? says.inRange() : says.outOfRange(out);
}
