import type { LiveData } from '../../live-data.ts';
import { facts } from './facts.ts';
import type { Tell } from './vega.ts';

/** The small box beside the pointer: text only, never markup. */
export function tipOver(data: LiveData): Tell {
  const box = document.createElement('div');
  box.className = 'tip';
  box.hidden = true;
  box.setAttribute('aria-hidden', 'true');
  document.body.append(box);
  addEventListener('scroll', () => (box.hidden = true), { passive: true });
  return (event, item, value) => {
    const row = item?.datum?.row;
    const lines = typeof row === 'number' && item?.datum?.trial !== undefined ? facts(data, row) : plain(value);
    box.hidden = lines.length === 0;
    if (box.hidden) return;
    box.replaceChildren(...lines.map(([name, text]) => line(name, text)));
    place(box, event);
  };
}

const plain = (value: unknown): readonly (readonly [string, string])[] =>
  value !== null && typeof value === 'object' ? Object.entries(value).map(([name, text]) => [name, String(text)]) : [];

function line(name: string, text: string): HTMLElement {
  const row = document.createElement('div');
  const head = document.createElement('b');
  head.textContent = `${name}: `;
  row.append(head, text);
  return row;
}

const GAP = 14;

function place(box: HTMLElement, event: MouseEvent): void {
  const { width, height } = box.getBoundingClientRect();
  const left = Math.max(4, Math.min(event.clientX + GAP, innerWidth - width - 4));
  const under = event.clientY + GAP + height <= innerHeight;
  box.style.left = `${left + scrollX}px`;
  box.style.top = `${Math.max(4, under ? event.clientY + GAP : event.clientY - height - GAP) + scrollY}px`;
}
