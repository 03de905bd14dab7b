export const tooFewTrials = (n: number, least: number): string =>
  `${n} ${n === 1 ? 'trial can' : 'trials can'} be used; the smallest law asked for needs at least ${least}`;
export const notFitted = (law: string, why: string, notes: readonly string[]): string =>
  `${law} could not be fitted (${why})${notes.length === 0 ? '' : `: ${notes.join(' ')}`}`;
