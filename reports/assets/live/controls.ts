import type { LiveData } from '../../live-data.ts';
import * as says from '../../says/live.ts';
import { element } from './element.ts';
import { facts } from './facts.ts';
import type { Store } from './state.ts';

/** The bar at the head of the page: the trial picked, campaigns shown, kind of axes; one line until it is opened. */
export function controls(data: LiveData, store: Store): void {
  const bar = document.getElementById('controls') as HTMLDetailsElement;
  bar.append(
    picking(data, store),
    ...(data.campaigns.length > 1 ? [campaigns(data, store)] : []),
    ...(hasLogarithms(data) ? [axes(store)] : []),
  );
  const line = bar.querySelector('summary')!;
  const tell = (): void => {
    line.textContent = says.chosen(data.trials[store.state().picked]?.trial, store.state().hidden.length, store.state().axes === 'linear');
  };
  store.listen(tell);
  tell();
  bar.hidden = false;
}

const hasLogarithms = (data: LiveData): boolean => JSON.stringify(data.charts).includes('"type":"log"');

/** A field with all names, buttons to step and let go, and what is known of the trial picked. */
function picking(data: LiveData, store: Store): HTMLElement {
  const list = element('datalist', { id: 'trial-names' }, ...data.trials.map((trial) => element('option', { value: trial.trial })));
  const field = element('input', { id: 'pick', list: 'trial-names', autocomplete: 'off' });
  const told = element('dl', { class: 'facts', role: 'status' });
  const rowOf = new Map(data.trials.map((trial, row) => [trial.trial, row]));
  field.addEventListener('change', () => store.set({ picked: rowOf.get(field.value.trim()) ?? -1 }));
  const step = (by: number) => () => {
    const n = data.trials.length;
    const { picked } = store.state();
    store.set({ picked: picked < 0 ? (by > 0 ? 0 : n - 1) : (picked + by + n) % n });
  };
  const button = (text: string, act: () => void): HTMLElement => {
    const made = element('button', { type: 'button' }, text);
    made.addEventListener('click', act);
    return made;
  };
  store.listen(({ picked }, change) => {
    if (change.picked === undefined) return;
    field.value = data.trials[picked]?.trial ?? '';
    told.replaceChildren(
      ...facts(data, picked).map(([name, text]) => element('div', {}, element('dt', {}, name), element('dd', {}, text))),
    );
  });
  return element(
    'div',
    { class: 'row' },
    element('label', { for: 'pick' }, says.pickField(), ' ', field),
    list,
    button(says.before(), step(-1)),
    button(says.after(), step(1)),
    button(says.none(), () => store.set({ picked: -1 })),
    told,
  );
}

/** One box for each campaign; unticked ones step into the background of every picture. */
function campaigns(data: LiveData, store: Store): HTMLElement {
  const boxes = data.campaigns.map((name, k) => {
    const box = element('input', { type: 'checkbox', id: `campaign-${k}` });
    box.checked = true;
    box.addEventListener('change', () => {
      const { hidden } = store.state();
      store.set({ hidden: box.checked ? hidden.filter((one) => one !== name) : [...hidden, name] });
    });
    return element('label', { for: `campaign-${k}` }, box, ' ', name === '' ? says.noName() : name);
  });
  return element('fieldset', { class: 'row' }, element('legend', {}, says.campaigns()), ...boxes);
}

function axes(store: Store): HTMLElement {
  const box = element('input', { type: 'checkbox', id: 'linear-axes' });
  box.addEventListener('change', () => store.set({ axes: box.checked ? 'linear' : 'as drawn' }));
  return element('div', { class: 'row' }, element('label', { for: 'linear-axes' }, box, ' ', says.linearAxes()));
}
