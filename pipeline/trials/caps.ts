/** What is read at most; each has its message. */
export const caps = {
  /** Bytes of a table of trials or plant cases. */
  tableBytes: 50_000_000,
  /** Bytes of a logged series, which is streamed. */
  logBytes: 4_000_000_000,
  rows: 200_000,
  columns: 2_000,
  /** Characters of one record of a text table. */
  recordCharacters: 1_000_000,
  /** Bytes of a workbook once unpacked. */
  workbookBytes: 300_000_000,
  /** Parts of a workbook. */
  workbookParts: 5_000,
} as const;
