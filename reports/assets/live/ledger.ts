import * as says from '../../says/live.ts';
import { element } from './element.ts';
import type { Store } from './state.ts';

/** Makes the ledger searchable, sortable and pickable. */
export function liveLedger(store: Store): void {
  const table = document.getElementById('ledger') as HTMLTableElement | null;
  const tools = document.getElementById('ledger-tools');
  if (table === null || tools === null) return;
  const rows = [...table.tBodies[0]!.rows];
  pickable(rows, store);
  searchable(rows, tools);
  sortable(table, rows);
  tools.hidden = false;
}

/** Names of used trials become buttons; the row picked is marked. */
function pickable(rows: readonly HTMLTableRowElement[], store: Store): void {
  const buttons = new Map<number, HTMLButtonElement>();
  for (const row of rows) {
    const name = row.querySelector<HTMLElement>('[data-row]');
    if (name === null) continue;
    const index = Number(name.dataset.row);
    const button = element('button', { type: 'button', class: 'pick', 'aria-pressed': 'false' }, name.textContent ?? '');
    button.addEventListener('click', () => store.set({ picked: store.state().picked === index ? -1 : index }));
    name.replaceWith(button);
    buttons.set(index, button);
  }
  let last = -1;
  store.listen(({ picked }) => {
    if (picked === last) return;
    mark(buttons.get(last), false);
    mark(buttons.get(picked), true);
    last = picked;
  });
}

function mark(button: HTMLButtonElement | undefined, on: boolean): void {
  button?.setAttribute('aria-pressed', String(on));
  button?.closest('tr')?.classList.toggle('picked', on);
}

function searchable(rows: readonly HTMLTableRowElement[], tools: HTMLElement): void {
  const field = tools.querySelector('input')!;
  const count = tools.querySelector('[role=status]')!;
  const texts = rows.map((row) => (row.textContent ?? '').toLowerCase());
  const search = (): void => {
    const words = field.value
      .toLowerCase()
      .split(/\s+/)
      .filter((word) => word !== '');
    let shown = 0;
    rows.forEach((row, k) => {
      row.hidden = !words.every((word) => texts[k]!.includes(word));
      if (!row.hidden) shown++;
    });
    count.textContent = says.rowsShown(shown, rows.length);
  };
  field.addEventListener('input', search);
  search();
}

/** A press on a head sorts by its column, up and then down. */
function sortable(table: HTMLTableElement, rows: readonly HTMLTableRowElement[]): void {
  const heads = [...table.tHead!.rows[0]!.cells];
  heads.forEach((head, column) => {
    const button = element('button', { type: 'button', class: 'sort' }, ...head.childNodes);
    head.append(button);
    button.addEventListener('click', () => {
      const down = head.getAttribute('aria-sort') === 'ascending';
      for (const other of heads) other.removeAttribute('aria-sort');
      head.setAttribute('aria-sort', down ? 'descending' : 'ascending');
      const sorted = [...rows].sort((a, b) => (down ? -1 : 1) * compare(cell(a, column), cell(b, column)));
      table.tBodies[0]!.append(...sorted);
    });
  });
}

const cell = (row: HTMLTableRowElement, column: number): string => row.cells[column]?.textContent?.trim() ?? '';

/** Numbers by size, texts by letters with numbers in them by size, blanks last. */
function compare(a: string, b: string): number {
  const [x, y] = [Number.parseFloat(a), Number.parseFloat(b)];
  if (a === '' || b === '') return Number(a === '') - Number(b === '');
  const numbers = /^[-\d.]/.test(a) && /^[-\d.]/.test(b) && !Number.isNaN(x) && !Number.isNaN(y);
  return numbers && x !== y ? x - y : a.localeCompare(b, 'en', { numeric: true });
}
