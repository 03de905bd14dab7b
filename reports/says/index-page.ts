/** What the overview of a batch says. */
export const heading = (studies: number): string => `${studies} ${studies === 1 ? 'study' : 'studies'}`;
export const standing = (studies: number, failed: number): string =>
  failed === 0
    ? 'All have results; each title leads to its report.'
    : `${studies - failed} have results, ${failed} failed; each title leads to its report.`;
export const columns: readonly string[] = [
  'Study',
  'Law',
  'Rows used',
  'Scatter (ln, or the response’s unit)',
  'Warnings',
  'Best published correlation',
  'Verdict on it',
];
export const failed = (): string => 'No results:';
export const none = (): string => 'none';
