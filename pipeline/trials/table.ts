import type { Message } from '../base/message.ts';

/** A table as read: text cells with places, nothing interpreted yet. */
export interface Table {
  readonly file: string;
  readonly sheet?: string;
  readonly header: readonly string[];
  /** Line of the header. */
  readonly headerLine: number;
  /** Unit texts from a units row, one a column, where the file has such a row. */
  readonly unitsRow?: readonly string[];
  /** `,` only in files that separate fields by semicolon or tab and use it so. */
  readonly decimal: '.' | ',';
  readonly rows: readonly TableRow[];
  /** Rows that are no data for a reason of form (ragged, NUL): they enter the ledger as refused. */
  readonly badRows: readonly { readonly line: number; readonly text: string }[];
  /** What the reader must be told of how the table was read: title rows above the header, merged cells. */
  readonly remarks: readonly Message[];
}

export interface TableRow {
  /** 1-based line in the file, or row of the sheet. */
  readonly line: number;
  readonly cells: readonly string[];
}

/** Text cells before header and units row are found; empty rows are left out. */
export interface Grid {
  readonly file: string;
  readonly sheet?: string;
  readonly rows: readonly GridRow[];
  /** Fields are separated by semicolon or tab, so that a comma may be a decimal mark. */
  readonly mayUseComma: boolean;
  readonly remarks: readonly Message[];
}

export interface GridRow extends TableRow {
  /** Why this row cannot be data. */
  readonly broken?: string;
}
