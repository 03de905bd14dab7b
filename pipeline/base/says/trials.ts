const cut = (text: string): string => (text.length > 60 ? `${text.slice(0, 57)}...` : text);
const quoted = (text: string): string => `"${cut(text)}"`;
const count = (n: number): string => String(n).replace(/\B(?=(\d{3})+$)/gu, ',');
const some = (names: readonly string[], most = 12): string =>
  names.length <= most ? names.map(quoted).join(', ') : `${names.slice(0, most).map(quoted).join(', ')} and ${names.length - most} more`;
const megabytes = (bytes: number): string => (Number.isFinite(bytes) ? `${Math.ceil(bytes / 1e6)} MB` : 'more than 4 GB');

interface Spot {
  readonly line: number;
  readonly column: number;
}

/** What is said about tables of trials and logged series. */
export const says = {
  nul: (): string => 'the row holds a NUL character; write the file anew as text',
  tooManyRows: (most: number): string =>
    `more than ${count(most)} rows; a table of trials or cases has at most so many (a long log is read as a series)`,
  tooManyColumns: (most: number): string => `more than ${count(most)} columns; at most so many are read`,
  quoteNotClosed: (): string => 'a quote opens here and never closes; close it, or write the cell without quotes',
  strayQuote: (): string => 'a quote stands inside a field; put the whole field in quotes and double those in it: "1"" pipe"',
  fieldTooLong: (most: number, quote: Spot | undefined): string =>
    `a row of more than ${count(most)} characters${quote === undefined ? '; write one row a line' : `; a quote opens at line ${quote.line}, column ${quote.column} and never closes`}`,
  ragged: (fields: number, header: number): string =>
    `${fields} field${fields === 1 ? '' : 's'}, the header has ${header}; give each row as many fields (a decimal comma in a file separated by commas makes two of one)`,
  emptyTable: (): string => 'the table is empty; it needs a header and one row a trial',
  noRows: (): string => 'there is no row below the header; each trial is one row',
  titleRows: (rows: readonly string[]): string =>
    `${rows.length === 1 ? 'a row stands' : `${rows.length} rows stand`} above the header and ${rows.length === 1 ? 'was' : 'were'} not read as data: ${some(rows, 3)}`,
  oneColumn: (): string => 'the whole row was read as one field; separate fields by comma, semicolon or tab',
  fileKind: (ending: string): string => `files ending in ".${cut(ending)}" are not read; save the table as .csv, .tsv, .txt or .xlsx`,
  sheetOfText: (sheet: string): string => `a text file has no sheets; leave sheet: ${quoted(sheet)} out`,
  workbookNamedText: (): string =>
    'this is a workbook (or another ZIP archive) under the name of a text file; call it .xlsx or save it as text',
  notAWorkbook: (old: boolean): string =>
    old
      ? 'this is a workbook of the old format; save it as .xlsx'
      : 'this is no .xlsx workbook, or a broken one; open it in a worksheet program and save it anew as .xlsx',
  workbookTooLarge: (bytes: number, most: number): string =>
    `the workbook unpacks to ${megabytes(bytes)}; at most ${megabytes(most)} are read`,
  noSuchSheet: (wanted: string, names: readonly string[], hint: string): string =>
    `no sheet ${quoted(wanted)}; there ${names.length === 1 ? 'is' : 'are'} ${some(names)}${hint}`,
  emptyWorkbook: (): string => 'no sheet of the workbook holds anything',
  whichSheet: (names: readonly string[]): string => `${names.length} sheets hold something: ${some(names)}; say which one with sheet:`,
  mergedCells: (ranges: readonly string[]): string =>
    `cells merged downwards were read as the same value in each of their rows: ${ranges.slice(0, 8).join(', ')}${ranges.length > 8 ? ` and ${ranges.length - 8} more` : ''}`,
  hiddenRows: (rows: readonly number[]): string =>
    `hidden rows were read like the others: ${rows.slice(0, 8).join(', ')}${rows.length > 8 ? ` and ${rows.length - 8} more` : ''}; use leave_out to leave trials out`,
  columnTwice: (wanted: string, headers: readonly string[]): string =>
    `${quoted(wanted)} may mean ${headers.length} columns (${some(headers)}); give the whole header, and no two alike`,
  noSuchColumn: (wanted: string, names: readonly string[], likely: string | undefined): string =>
    `no column ${quoted(wanted)}${likely === undefined ? '' : `; did you mean ${quoted(likely)}?`}; the columns are ${some(names)}`,
  unitsContradict: (header: string, inHeader: string, below: string): string =>
    `column ${quoted(header)} has the unit ${quoted(inHeader)} in its header and ${quoted(below)} below it; give it once`,
  trialTwice: (trial: string, lines: readonly number[]): string =>
    `trial ${quoted(trial)} stands in ${lines.length} rows (lines ${lines.slice(0, 6).join(', ')}${lines.length > 6 ? ' ...' : ''}); write \`readings: average\` under trials if they are readings of it, else give each row its own name`,
  trialInTwo: (trial: string, first: number, other: number): string =>
    `trial ${quoted(trial)} has another campaign or setting in line ${other} than in line ${first}; readings of one trial belong to one of each`,
  noSuchTrial: (trial: string, likely: string | undefined): string =>
    `no row is named ${quoted(trial)}${likely === undefined ? '' : `; did you mean ${quoted(likely)}?`}`,
  noName: (column: string): string => `${quoted(column)} is empty, so the row names no trial or campaign`,
  emptyCell: (column: string, text: string): string =>
    text.trim() === '' ? `${quoted(column)} is empty` : `${quoted(column)} is missing (${quoted(text.trim())})`,
  ofColumn: (column: string, text: string): string => `${quoted(column)}: ${text}`,
  tooLargeInSI: (text: string): string => `${quoted(text.trim())} is too large a number in SI`,
  belowZero: (text: string): string => `${quoted(text.trim())} lies at or below absolute zero`,
  oneReadingOf: (readings: number, trial: string): string => `one of ${readings} readings of trial ${quoted(trial)}`,
  decimalComma: (): string => 'the file writes decimals with a comma, and was read so',
  thinReadings: (trial: string, columns: number): string =>
    `${columns} of the values of trial ${quoted(trial)} rest on fewer readings than the trial has, because some cells are missing`,
  orderNotRead: (): string =>
    'the order of trials was not read: this cell is neither a number nor a date written year first (2024-12-31) or with points (31.12.2024)',
  logEncoding: (): string => 'the log holds bytes that are no characters of its encoding; save it as UTF-8',
  logQuote: (): string => 'a quote stands inside a field or never closes; write the log without quotes, or close them',
  logUnitMissing: (header: string, unit: string): string =>
    `${quoted(header)} tells no unit; give it beside the column, or in the header as ${quoted(`${header} [${unit}]`)}`,
  timeNotRead: (text: string): string =>
    `${quoted(text.trim())} is no time: give numbers with a unit in the header (t [s]), dates written year first or with points, or times of day with hours, minutes and seconds`,
  timeBackwards: (trial: string, line: number): string =>
    `the curve of trial ${quoted(trial)} was not read: time runs backwards at line ${line}`,
  curveTooShort: (trial: string, inside: number, samples: number): string =>
    `the curve of trial ${quoted(trial)} has ${inside} samples in its window (${samples} were read); three are the least`,
  logRowsSkipped: (rows: number, text: string): string =>
    `${count(rows)} row${rows === 1 ? '' : 's'} of the log ${rows === 1 ? 'was' : 'were'} not read; ${rows === 1 ? '' : 'the first one: '}${text}`,
  logRagged: (): string => 'the row has another number of fields than the header',
  logUnnamed: (): string => 'the row names no trial',
  logBackwards: (): string => 'time runs backwards',
  logRowsRefused: (rows: number): string => `${count(rows)} rows of the log are no numbers or run back in time`,
  windowTooShort: (window: number, step: number, least: number): string =>
    Number.isNaN(step)
      ? 'the log has fewer than two rows'
      : `a window of ${window} s holds fewer than ${least} samples of this log, which are ${step} s apart; give a longer one`,
  steadyWindow: (rows: number, first: number, last: number): string => `mean of ${count(rows)} steady rows, lines ${first} to ${last}`,
  notSteady: (rows: number): string => `${count(rows)} row${rows === 1 ? '' : 's'} not steady`,
  steadyCriterion: (
    windows: number,
    used: number,
    rows: number,
    { window, share, significance }: { readonly window: number; readonly share: number; readonly significance: number },
  ): string =>
    `${windows} steady window${windows === 1 ? '' : 's'} with ${count(used)} of ${count(rows)} rows of the log, found by the test of Kelly and Hedengren (2013) on every column: at least ${Number(window.toPrecision(6))} s long, ${Number((100 * share).toPrecision(4))} % of samples about one level, each sample tested at ${significance}; each is one trial, its means with standard uncertainties that count autocorrelation (Geyer 1992, Wolff 2004). A drift smaller than the scatter of a window passes the test`,
  noSteadyWindow: (window: number, rows: number): string =>
    `no stretch of ${Number(window.toPrecision(6))} s is steady in every column of the log (${count(rows)} rows read): give a shorter window or a smaller share, or state the trials yourself`,
  fewIndependent: (keys: readonly string[], least: number): string =>
    `${keys.map(quoted).join(', ')}: the window is worth only ${Math.max(1, Math.round(least))} independent samples, so the uncertainty of the mean is too small by tens of per cent; log longer`,
  noCurve: (trial: string): string => `trial ${quoted(trial)} has no logged curve`,
  severalCurves: (trial: string, names: readonly string[]): string =>
    `trial ${quoted(trial)} names ${names.length} files for its curve (${some(names, 4)}); one trial has one curve`,
  curvesRead: (curves: number, samples: number): string =>
    `${count(curves)} logged curve${curves === 1 ? '' : 's'} with ${count(samples)} samples in their windows came down to readings of their trials; the uncertainty of each is that of the least-squares fit, autocorrelation of its residuals counted (Geyer 1992)`,
  curveWithoutTrial: (names: readonly string[]): string =>
    `the log holds curves that no trial of the table names, and they were not used: ${some(names, 6)}`,
  seriesTrial: (): string => 'one log for several trials needs trial: the column of the log that names the trial',
  windowReversed: (): string => 'give the earlier end of the window first, such as [0 s, 120 s]',
  noLineFeed: (): string => 'the log has no line feeds; save it with one row a line',
  caseTwice: (name: string, line: number): string =>
    `the case ${quoted(name)} stands in line ${line} already; give each case a name of its own`,
  commaText: (count: number, columns: readonly string[]): string =>
    `${count} cells of column${columns.length === 1 ? '' : 's'} ${some(columns, 8)} hold numbers as text with a decimal comma; they are read as numbers`,
  unlikelyValue: (key: string, value: number, unit: string, [from, to]: readonly [number, number]): string =>
    `${key} is ${Number(value.toPrecision(4))}${unit === '1' ? '' : ` ${unit}`} in a typical trial, where equipment usually has ${from} to ${to}${unit === '1' ? '' : ` ${unit}`}: is its unit right?`,
};
