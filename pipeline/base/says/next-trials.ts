const percent = (share: number): string => `±${Number((100 * share).toPrecision(3))} %`;

export const newCampaign = (): string => 'a new one';
export const nothingToPropose = (): string => 'No trial in the rig’s box can be evaluated, so nothing is proposed.';

interface Narrowed {
  readonly name: string;
  readonly now: number;
  readonly after: number;
  readonly floor: number;
}

/** Narrowing below this share of the half-width is hardly worth a trial. */
const HARDLY = 0.05;

export function headline(count: number, campaign: string, cases: readonly Narrowed[], kind: string): string {
  const trials = `${count} further ${count === 1 ? 'trial' : 'trials'}${campaign === newCampaign() ? ' in a new campaign' : ` in campaign ${campaign}`}`;
  if (cases.length === 0) return `${trials} make the parameters of the law as certain together as the rig’s box allows.`;
  const told = cases
    .slice(0, 3)
    .map(({ name, now, after, floor }) => `case ${name} from ${percent(now)} to ${percent(after)} (floor ${percent(floor)})`);
  const little = cases.every(({ now, after }) => now - after < HARDLY * now);
  const why =
    kind === 'random' ? 'the floor is the difference between campaigns and the scatter' : 'the floor is the scatter of single trials';
  return little
    ? `Hardly anything narrows the plant prediction: ${trials} take ${told.join('; ')}; ${why}, which no further trial changes.`
    : `${trials} narrow ${told.join('; ')}; ${why}.`;
}

export const assumedScatter = (law: string): string =>
  `Worked out for the law "${law}" at its fitted values: a further trial is taken to scatter and to be measured like the trials so far, and to share their systematic errors.`;
export const keptAtMiddle = (keys: readonly string[]): string =>
  `Kept at the middle of the trials, as the rig section does not set them: ${keys.join(', ')}.`;
export const idleSetting = (keys: readonly string[]): string =>
  `${keys.join(', ')} under rig ${keys.length === 1 ? 'does' : 'do'} not change any group of the chosen law.`;
export const withoutPlant = (): string =>
  'There are no plant cases to narrow, so the determinant of the parameters’ covariance is made small instead.';
export const noCandidates = (): string => 'No combination of the settings under rig gives all groups of the law.';
export const campaignsUnknown = (): string =>
  'Differences between campaigns are not known from these trials and cannot be counted here; a trial in a further campaign tells more than this shows.';
