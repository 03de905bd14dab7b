import type { LiveData } from '../../live-data.ts';
import type { State, Store } from './state.ts';
import { tipOver } from './tip.ts';
import { liveView, type Tell, type View } from './vega.ts';

interface Axis {
  values?: unknown;
  readonly scale: string;
}

interface VegaSpec {
  width: number;
  data: { name: string; values?: Record<string, unknown>[] }[];
  scales: { type: string; name: string; zero?: boolean; nice?: boolean; domain: unknown }[];
  axes: Axis[];
}

/** A picture of the page, static until the reader comes near. */
interface Picture {
  readonly place: HTMLElement;
  readonly spec: VegaSpec;
  /** Width of all that is not the plot. */
  readonly beside: number;
  view?: View;
}

const LEAST_WIDTH = 190;

/** Brings every picture alive when the reader comes near it, and keeps all of them with the state. */
export function livePictures(data: LiveData, store: Store): void {
  const tell = tipOver(data);
  const pictures = [...document.querySelectorAll<HTMLElement>('.picture[data-chart]')].flatMap((place): readonly Picture[] => {
    const spec = data.charts[place.dataset.chart!] as VegaSpec | undefined;
    if (spec !== undefined) nameTrials(spec, data);
    const whole = place.querySelector('svg')?.viewBox.baseVal.width ?? 0;
    return spec === undefined ? [] : [{ place, spec, beside: whole - spec.width }];
  });
  const wake = (picture: Picture): void => {
    if (picture.view === undefined) show(picture, store, tell);
  };
  const near = new IntersectionObserver(
    (seen) => {
      for (const { isIntersecting, target } of seen) if (isIntersecting) wake(pictures.find((one) => one.place === target)!);
    },
    { rootMargin: '600px' },
  );
  for (const picture of pictures) near.observe(picture.place);
  store.listen((state, change) => {
    for (const picture of pictures) {
      if (picture.view === undefined) continue;
      if (change.axes !== undefined) show(picture, store, tell);
      else tellView(picture.view, state, picture.spec);
    }
  });
  let waiting: ReturnType<typeof setTimeout> | undefined;
  addEventListener('resize', () => {
    clearTimeout(waiting);
    waiting = setTimeout(() => {
      for (const picture of pictures) void picture.view?.width(plotWidth(picture)).runAsync();
    }, 150);
  });
}

/** Trials get their names back, which the packed data hold once. */
function nameTrials(spec: VegaSpec, { trials }: LiveData): void {
  for (const { name, values } of spec.data) {
    if (name === 'trials')
      for (const one of values ?? [])
        Object.assign(one, { trial: trials[Number(one.row)]?.trial, campaign: trials[Number(one.row)]?.campaign });
  }
}

/** Plots shrink with their column, never below what can be read, never above what was drawn. */
function plotWidth({ place, spec, beside }: Picture): number {
  return Math.min(spec.width, Math.max(LEAST_WIDTH, place.clientWidth - beside));
}

const hasTrials = (spec: VegaSpec): boolean => 'signals' in spec || JSON.stringify(spec).includes('"picked"');

function tellView(view: View, { picked, hidden }: State, spec: VegaSpec): void {
  if (hasTrials(spec)) void view.signal('picked', picked).signal('hidden', hidden).runAsync();
}

function show(picture: Picture, store: Store, tell: Tell): void {
  const { place, spec } = picture;
  const host = document.createElement('div');
  const shown = { ...(store.state().axes === 'linear' ? linear(spec) : spec), width: plotWidth(picture) };
  const view = liveView(shown, host, tell);
  if (hasTrials(spec)) view.signal('picked', store.state().picked).signal('hidden', store.state().hidden);
  view.addEventListener('click', (_event, item) => {
    const row = item?.datum?.row;
    if (typeof row === 'number' && item?.datum?.trial !== undefined) store.set({ picked: row === store.state().picked ? -1 : row });
  });
  const old = picture.view;
  picture.view = view;
  void view.runAsync().then(() => {
    place.replaceChildren(host);
    place.dataset.live = '1';
    old?.finalize();
    host.querySelector('svg')?.setAttribute('aria-hidden', 'true');
    host.querySelector('svg')?.removeAttribute('tabindex');
    if (hasTrials(spec)) steppable(place, view, store);
  });
}

/** The same picture on linear axes: labels and the low end are left to the scale. */
function linear(spec: VegaSpec): VegaSpec {
  const changed = new Set(spec.scales.filter((scale) => scale.type === 'log').map((scale) => scale.name));
  return {
    ...spec,
    scales: spec.scales.map((scale) => (changed.has(scale.name) ? { ...scale, type: 'linear', zero: false, nice: false } : scale)),
    axes: spec.axes.map((axis) => {
      if (!changed.has(axis.scale)) return axis;
      const { values: _, ...rest } = axis;
      return rest;
    }),
  };
}

/** Arrow keys step through the trials of a picture from left to right; Escape lets go. */
function steppable(place: HTMLElement, view: View, store: Store): void {
  const order = [...view.data('trials')].sort((a, b) => Number(a.x) - Number(b.x)).map((one) => Number(one.row));
  if (order.length === 0) return;
  place.tabIndex = 0;
  place.setAttribute('role', 'group');
  place.setAttribute('aria-roledescription', 'picture with trials; arrow keys step through them, Escape lets go');
  place.onkeydown = (event) => {
    const step = { ArrowRight: 1, ArrowUp: 1, ArrowLeft: -1, ArrowDown: -1 }[event.key];
    if (event.key === 'Escape') store.set({ picked: -1 });
    if (step === undefined) return;
    event.preventDefault();
    const at = order.indexOf(store.state().picked);
    const next = at < 0 ? (step > 0 ? 0 : order.length - 1) : (at + step + order.length) % order.length;
    store.set({ picked: order[next]! });
  };
}
