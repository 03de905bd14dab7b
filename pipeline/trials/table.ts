/** A table as read: text cells with places, nothing interpreted yet. */
export interface Table {
  readonly file: string;
  readonly sheet?: string;
  readonly header: readonly string[];
  /** Unit texts from a units row, one a column, where the file has such a row. */
  readonly unitsRow?: readonly string[];
  /** `,` only in files that separate fields by semicolon or tab and use it so. */
  readonly decimal: '.' | ',';
  readonly rows: readonly TableRow[];
  /** Rows that are no data for a reason of form (ragged, NUL): they enter the ledger as refused. */
  readonly badRows: readonly { readonly line: number; readonly text: string }[];
}

export interface TableRow {
  /** 1-based line in the file, or row of the sheet. */
  readonly line: number;
  readonly cells: readonly string[];
}
