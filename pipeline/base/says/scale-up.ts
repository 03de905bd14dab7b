/** Three significant digits; powers of ten outside 0.001 to 100 000. */
const short = (value: number): string => {
  const plain = Number(value.toPrecision(3));
  const size = Math.abs(plain);
  return plain === 0 || (size >= 1e-3 && size < 1e5) ? String(plain) : value.toExponential(2).replace('e+', 'e');
};
const percent = (share: number): string => `${short(100 * share)} %`;
const inUnit = (unit: string): string => (unit === '1' || unit === '' ? '' : ` ${unit}`);

export const fromLaw = (): string => 'parameters of the law';
export const fromCampaigns = (): string => 'differences between campaigns';
export const fromScatter = (): string => 'scatter of the trials';

export const laminarFloor = (): string => 'fully developed laminar flow, wall at one temperature or concentration (Shah and London 1978)';
export const stagnantFloor = (): string => 'a sphere in a medium at rest';

export const equalPower = (): string => 'power per volume';
export const equalTip = (): string => 'tip speed';
export const equalReynolds = (): string => 'Reynolds number';
export const equalFroude = (): string => 'Froude number';
export const equalSuspension = (): string => 'margin above the just-suspended speed (Zwietering 1958)';
export const equalCoefficient = (): string => 'coefficient, by the law';
export const equalVolumetric = (): string => 'volumetric coefficient, by the law';
export const criteriaOf = (name: string, speed: number, impeller: number): string =>
  `case ${name}, against the trials' geometric means (speed ${short(60 * speed)} rpm, impeller ${short(1000 * impeller)} mm), vessels geometrically similar, same liquid`;

interface Said {
  readonly name: string;
  readonly predictions: readonly { readonly coefficient: number; readonly lower: number; readonly upper: number }[];
  readonly verdict: string;
}

export function plantHeadline(
  cases: readonly Said[],
  { symbol, unit }: { readonly symbol: string; readonly unit: string },
  confidence: number,
): string {
  const told = cases
    .slice(0, 3)
    .map(({ name, predictions: [first], verdict }) =>
      first === undefined
        ? `Case ${name}: no prediction; ${verdict}.`
        : `Case ${name}: ${symbol} = ${short(first.coefficient)}${inUnit(unit)} (${short(first.lower)} to ${short(first.upper)} at ${percent(confidence)}); ${verdict}.`,
    );
  const more = cases.length > 3 ? [`${cases.length - 3} more ${cases.length === 4 ? 'case stands' : 'cases stand'} below.`] : [];
  return [...told, ...more].join(' ');
}

interface Outside {
  readonly of: string;
  readonly kind: 'group' | 'raw' | 'joint';
  readonly value: number;
  readonly from: number;
  readonly to: number;
  readonly beyond: number;
}

/** The worst group first; without any, the raw quantity or the combination. */
export function caseVerdict(extrapolation: readonly Outside[], wider: 'interval' | 'spread between laws'): string {
  const worst = (kind: Outside['kind']): Outside | undefined =>
    extrapolation.filter((one) => one.kind === kind && one.beyond > 1).sort((a, b) => b.beyond - a.beyond)[0];
  const [group, joint, raw] = [worst('group'), worst('joint'), worst('raw')];
  const told: string[] = [];
  if (group !== undefined) told.push(`${group.of} lies ${short(group.beyond)} x ${side(group)} tried`);
  else if (joint !== undefined && joint.beyond > 1.2)
    told.push(
      `each group is inside what was tried, but their combination is not (law ${short(joint.beyond)} x less certain than at any trial)`,
    );
  else told.push('inside what was tried');
  if (raw !== undefined) told.push(`${raw.of} ${short(raw.beyond)} x ${side(raw)} tried`);
  if (wider === 'spread between laws') told.push('the laws differ by more than the interval');
  return told.join('; ');
}

const side = ({ value, to }: Outside): string => (value > to ? 'above the largest' : 'below the smallest');

export const noAnswer = (groups: readonly string[]): string =>
  groups.length === 0 ? 'the law has no value there' : `${groups.join(' and ')} ${groups.length === 1 ? 'has' : 'have'} no value there`;
export const ofCase = (name: string, text: string): string => `Case ${name}: ${text}`;
export const lacksAtPlant = (by: string, keys: readonly string[]): string =>
  `${by} is not asked for the plant: ${keys.join(', ')} cannot be had there.`;
export const circular = (by: string, keys: readonly string[]): string =>
  `${by} is not asked for the plant: ${keys.join(', ')} ${keys.length === 1 ? 'follows' : 'follow'} from the coefficient itself.`;
export const justSuspended = (name: string, speed: number, needed: number): string =>
  `Case ${name}: solids are just suspended at ${short(60 * needed)} rpm (Zwietering 1958); the case turns at ${short(60 * speed)} rpm${
    speed < needed ? ', so that part of them will rest on the bottom and the coefficient does not hold for them' : ''
  }.`;
export const belowFloor = (name: string, floor: string): string =>
  `Case ${name}: the design value lies below a physical floor (${floor}); the floor is the better value there.`;
export const sizeLacks = (find: string, lacks: string): string => `${find} cannot be found: ${lacks} is not stated for the case.`;
export const whatTheIntervalHolds = (confidence: number): string =>
  `Prediction intervals (${percent(confidence)}) are for the true coefficient in a new campaign: parameters, systematic sources, differences between campaigns and scatter. They hold neither the plant's own measurement uncertainty nor differences between one unit and another, which no trial on one rig can tell.`;
export const noCampaignVariance = (kind: string): string =>
  kind === 'fixed'
    ? 'With two campaigns their difference is known, its variance hardly: how far another campaign may lie off is not in the intervals.'
    : 'How far one campaign lies from another is not known from these trials and is not in the intervals; they are too narrow by that much.';
export const spreadWider = (): string =>
  'Where accepted laws differ by more than the interval of the chosen one, the difference is the better measure of what is not known; the design value is the outermost of them.';
export const compareByEye = (key: string, rig: string, plant: string | undefined): string =>
  `${key}: the rig had "${rig}", the plant ${plant === undefined || plant === '' ? 'states none' : `has "${plant}"`}; the law holds for the rig's.`;
export const worstOfRange = (name: string, worst: string, value: number, conservative: 'low' | 'high'): string =>
  `Over the range of case ${name} the design value is ${conservative === 'low' ? 'smallest' : 'largest'} at "${worst}": ${short(value)}.`;
export const resistancesAsStated = (): string =>
  'Wall, fouling and other side enter the overall coefficient as stated, without an uncertainty of their own: its interval is the coefficient’s alone.';
