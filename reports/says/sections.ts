/** Sentences of the sections where the result itself brings none. */
export const noAudit = (): string => 'The study asks for no comparison with published correlations, so none was made.';
export const noRows = (): string =>
  'No published correlation in the catalogue or of your own fits this equipment and these groups, so there is nothing to compare with.';
export const measuredOver = (): string =>
  'Bias is measured over predicted, over the trials in range; errors on left-out trials use the same left-out trials for all three.';
export const notCompared = (): string => 'What could not be compared';
export const noPlant = (): string =>
  'The study names no plant cases (plant: plant.csv). Apply the law inside its ranges only, in the same kind of equipment; the calculator below gives its value and interval at one condition.';
export const calculator = (): string => 'Try your own values';
export const calculatorFine = (confidence: string): string =>
  `By the same formulas as the plant cases, for group values without an uncertainty of their own, at ${confidence}. A law is silent about what lies outside its ranges: there the interval is what the law would say if it went on.`;
export const noNext = (): string => 'Nothing is proposed: the study does not say what the rig can set (rig: ...).';
export const refits = (): string => 'The law with less weight on trials far from it, and without a campaign or an influential trial';
export const breaks = (law: string): string => `One exponent of Re, or two that meet at a break, in ${law}`;
export const open = (): string => 'open';
export const comparedLaws = (): string => 'Laws compared; errors on trials that were left out of the fit';
export const condition = (law: string): string =>
  `What the trials tell of ${law} together: condition indices and the share of each parameter’s variance that hangs on them`;
export const conditionFine = (): string =>
  'Two shares above a half on one line with an index above 30: these parameters are known together, not apart (Belsley, Kuh and Welsch 1980).';
export const notDrawn = (count: number): string => `${count} further logged ${count === 1 ? 'curve is' : 'curves are'} not drawn here.`;
export const noGroups = (): string => 'No group of the law varies in these trials.';
export const statedUncertainty = (chi: string, df: string, above: string): string =>
  `Residuals against the stated uncertainties alone: chi-squared ${chi} on ${df} degrees of freedom; probability of more if they were right and complete: ${above}.`;
export const ledgerSum = (l: {
  readonly read: number;
  readonly used: number;
  readonly leftOut: number;
  readonly refused: number;
  readonly trials: number;
}): string =>
  `${l.read} ${l.read === 1 ? 'row' : 'rows'} read = ${l.used} used + ${l.leftOut} left out + ${l.refused} refused. The used rows make ${l.trials} ${l.trials === 1 ? 'trial' : 'trials'}.`;
export const ledgerMismatch = (): string =>
  'These numbers do not add up: do not rely on this report, and tell those who maintain the program.';
export const nothingLeft = (): string => 'Nothing was left out or refused.';
export const rounding = (): string =>
  'Numbers are rounded by one rule, JCGM 100:2008 (GUM), 7.2.6: an uncertainty to two significant digits, its value to the same place; numbers without an uncertainty to three digits. The result files hold full precision.';
export const fullText = (): string => 'The laws at full precision';
export const inputLead = (version: string, seed: number): string =>
  `pilotlaw ${version} computed this from the files below with seed ${seed}; the same files, version and seed give the same numbers.`;

export const otherSides = (): string =>
  'All but the law’s side, one resistance for each campaign, on the outer area, in m² K/W, with its interval';
export const ownSide = (): string =>
  'The law’s side at each trial: coefficient on its own area in W/(m² K) with the interval of the law, and its share of the whole resistance';
