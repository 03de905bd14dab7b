export const onlyOne = (law: string): string => `${law} is the only law proposed.`;
export const chosen = (law: string): string =>
  `${law} is chosen: the law with fewest parameters stands unless a richer one predicts left-out trials better by more than one standard error.`;

export interface Against {
  readonly mean: number;
  readonly standardError: number;
  readonly folds: number;
  readonly wins: number;
  readonly better: boolean;
  readonly campaigns: boolean;
  readonly decided: boolean;
}

export const against = (
  standing: string,
  rival: string,
  { mean, standardError, folds, wins, better, campaigns, decided }: Against,
): string => {
  const what = campaigns ? 'left-out campaigns' : 'left-out trials';
  if (!Number.isFinite(mean)) return `${rival} could not be held against ${standing} on left-out trials.`;
  const count = `${rival} predicts ${wins} of ${folds} ${what} better than ${standing}`;
  const size = `mean gain in squared error over its variance ${mean.toPrecision(2)} +- ${standardError.toPrecision(2)}`;
  const verdict = better ? 'so it takes its place' : `so ${standing} stands`;
  return decided
    ? `${count} (${size}), ${verdict}.`
    : `${count} (${size}); ${folds} ${campaigns ? 'campaigns' : 'folds'} are too few for a verdict, ${verdict}.`;
};

export const isChosen = (): string => 'chosen';
export const notWorse = (): string => 'not clearly worse';
export const notUsable = (why: string): string => `not usable: the fit ended as "${why}"`;
export const worse = (better: number, folds: number, campaigns: boolean): string =>
  `worse than the chosen law on left-out ${campaigns ? 'campaigns' : 'trials'} (${better} of ${folds} are predicted better by the chosen one)`;
