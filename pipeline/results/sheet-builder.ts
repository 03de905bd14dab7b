import { type CellObject, utils, type WorkSheet } from '@e965/xlsx';

/** A reference such as `B7`. */
export type Ref = string;

const NO_NUMBER = 0x24; // #NUM!, as the workbook library numbers errors

/** Fills a sheet from the top; formulas carry the value computed here, so that the file reads right even where nothing recalculates. */
export class SheetBuilder {
  readonly #sheet: WorkSheet = {};
  #rows = 0;
  #columns = 0;

  /** A row of texts and numbers; an empty string leaves the cell empty. Returns the references of its cells. */
  row(...cells: readonly (string | number)[]): readonly Ref[] {
    this.#rows += 1;
    return cells.map((cell, k) => this.#put(k, typeof cell === 'number' ? { t: 'n', v: cell } : { t: 's', v: cell }));
  }

  /** A label and a formula (without the leading `=`) with its value now, `#NUM!` where that is no number. Returns the formula's cell. */
  formula(label: string, formula: string, value: number, remark = ''): Ref {
    this.#rows += 1;
    this.#put(0, { t: 's', v: label });
    const at = this.#put(1, Number.isFinite(value) ? { t: 'n', f: formula, v: value } : { t: 'e', f: formula, v: NO_NUMBER });
    if (remark !== '') this.#put(2, { t: 's', v: remark });
    return at;
  }

  /** Another formula for a cell that has one; its value stays. */
  replace(at: Ref, formula: string): void {
    (this.#sheet[at] as CellObject).f = formula;
  }

  /** A block of numbers below a label; returns the range of each column. */
  block(label: string, rows: readonly (readonly number[])[]): readonly Ref[] {
    const first = this.#rows + 1;
    rows.forEach((row, k) => {
      this.row(k === 0 ? label : '', ...row);
    });
    return (rows[0] ?? []).map((_, k) => `${this.#name(k + 1)}${first}:${this.#name(k + 1)}${this.#rows}`);
  }

  get sheet(): WorkSheet {
    this.#sheet['!ref'] = `A1:${this.#name(Math.max(0, this.#columns - 1))}${Math.max(1, this.#rows)}`;
    this.#sheet['!cols'] = [{ wch: 34 }, ...Array.from({ length: Math.max(0, this.#columns - 1) }, () => ({ wch: 18 }))];
    return this.#sheet;
  }

  #name(column: number): string {
    return utils.encode_col(column);
  }

  #put(column: number, cell: CellObject): Ref {
    const at = `${this.#name(column)}${this.#rows}`;
    this.#columns = Math.max(this.#columns, column + 1);
    if (cell.v !== '' && !(typeof cell.v === 'number' && !Number.isFinite(cell.v))) this.#sheet[at] = cell;
    return at;
  }
}
