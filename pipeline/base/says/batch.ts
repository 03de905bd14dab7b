/** What is said about batches of studies. */
export const tookTooLong = (limit: number): string =>
  `was stopped after ${limit < 60_000 ? `${limit / 1000} s` : `${limit / 60_000} min`}; fewer resamples (fit.resamples), fewer rows or laws with fewer parameters take less`;
export const outOfMemory = (): string =>
  'needs more memory than there is; fewer rows, fewer resamples (fit.resamples) or fewer studies at the same time (--jobs 1) need less';
export const threadEnded = (code: number): string => `the thread of a study ended with code ${code}`;
export const indexNotOurs = (): string =>
  'this page is not from pilotlaw and is left as it is, so the overview of the studies is not written; move it away, or choose another folder with --out';
export const defectOfOurs = (text: string): string => `a defect of pilotlaw: ${text}`;
