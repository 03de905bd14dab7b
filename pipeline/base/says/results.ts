const short = (value: number): string => String(Number(value.toPrecision(4)));

export const constantInput = (value: number, unit: string): string => `constant ${short(value)} ${unit}`.trim();
export const columnInput = (column: string, unit: string): string =>
  `column "${column}"${unit === '1' || unit === '' ? '' : ` in ${unit}`}`;
export const modelInput = (): string => 'stated accuracy of a property model';
export const shareSpread = (share: number): string => `${short(100 * share)} %`;
export const absoluteSpread = (si: number, unit: string): string => `${short(si)} ${unit}`.trim();
export const systematicInput = (size: string, source: string, per: string): string =>
  `${size} (${source}${per === 'campaign' ? ', anew in each campaign' : ''})`;
export const setPoint = (size: string): string => `${size}, a set point: counted in the scatter, not as error in x`;

/** Cautions, by what the case is. */
export const reviewCaution = (): string =>
  'These numbers are input to a review by a qualified engineer. They do not replace local codes, standards, permits or licensed practice, which come first wherever they differ.';
export const rangeCaution = (): string =>
  'A law holds in the range of its trials, in the same kind of equipment. What lies outside is extrapolation and is marked where it stands.';
export const heatCaution = (): string =>
  'Where heat removal keeps a reaction in check, a coefficient that is only expected is not enough: near a thermal-runaway limit, design on the lower bound, with the cooling fault considered, by those licensed to do so.';
export const pressureCaution = (): string =>
  'Steam, hot surfaces and vessels under pressure are subject to pressure-equipment rules; sizing here says nothing about mechanical design, relief or protection against burns.';
export const cryogenCaution = (): string =>
  'Below the freezing point of water or near boiling the fluid may change phase, embrittle materials or displace breathing air; none of that is in these numbers.';
export const gasCaution = (gas: string): string =>
  `${gas} can asphyxiate or burn in closed spaces; ventilation, monitoring and ignition are a matter of their own.`;
export const solidsCaution = (): string =>
  'Solids that take up water, react, or give off heat or dust when they dissolve behave unlike these trials; check solubility, heat of solution and dust hazards separately.';
export const transferCaution = (): string =>
  'Mass transfer rates say nothing about toxicity, exposure limits or release to the environment; these follow their own rules.';
export const inventedCaution = (): string => 'The data of this study are invented: nothing may be built on it.';

export const normalEquation = (): string =>
  'Parameters minimise r^T V^-1 r on the logarithms, V holding each trial’s measurement variance (errors in the response and in every group with their covariance), the scatter sigma^2 and the between-campaign variance tau^2; sigma^2 and tau^2 by restricted maximum likelihood at those parameters.';
export const absoluteEquation = (): string =>
  'Parameters minimise r^T V^-1 r on the values themselves, V holding each trial’s measurement variance, the scatter sigma^2 and the between-campaign variance tau^2; sigma^2 and tau^2 by restricted maximum likelihood.';
export const intervalMethod = (confidence: number): string =>
  `Intervals are at ${short(100 * confidence)} % confidence: Student t with Satterthwaite degrees of freedom on a covariance that counts the estimated variances and the errors in x; systematic uncertainties are added as shared shifts.`;
export const plainMethod = (): string => 'No uncertainty is stated and no campaign effect is in force: this is ordinary least squares.';

export const sheetTitle = (law: string): string => `Law: ${law}`;
export const sheetParameters = (): string => 'Parameters';
export const sheetError = (): string => 'standard error';
export const sheetGroups = (): string => 'Groups: change these';
export const sheetFrom = (): string => 'tried from';
export const sheetTo = (): string => 'tried to';
export const sheetNoFormula = (): string => 'this law has no spreadsheet formula (it holds an implicit friction factor)';

export const noLaws = (why: string): string => `this is no laws.json of pilotlaw: ${why}`;
export const wrongLaws = (why: string): string =>
  `this laws.json cannot be used for a prediction: ${why}; run the study again to write it anew`;
export const noSuchLaw = (name: string, known: readonly string[]): string =>
  `there is no law "${name}" in it; its laws are ${known.join(', ')}`;

export const pythonHead = (title: string, formula: string): string =>
  `"""${title}: ${formula}

A fitted law with its intervals; predict({...}) takes group values by name. Outside RANGES it extrapolates.
These numbers are input to a review by a qualified engineer; local codes and licensed practice come first.
"""`;

export const sheetFactor = (): string => 'factor';
export const sheetFactorRemark = (): string =>
  'turns the response into what is wanted, such as conductivity over length; 1 leaves it as it is';
export const sheetConfidence = (): string => 'confidence';
export const sheetSources = (): string => 'Shift of ln result at the plant by one standard uncertainty';
export const sheetSourcesRemark = (): string =>
  'of sources that the plant shares with the rig (of the result itself for an absolute law); 0 where it does not';
export const sheetTimesFactor = (): string => 'times factor';
export const sheetLawLower = (): string => 'law, lower';
export const sheetLawUpper = (): string => 'law, upper';
export const sheetLower = (): string => 'new campaign, lower';
export const sheetUpper = (): string => 'new campaign, upper';
export const sheetWorking = (): string => 'Working';
export const sheetPhi = (): string => 'covariance of the parameters';
export const sheetSlope = (): string => 'its slope to the variance of';
export const sheetShifts = (): string => 'shift by each source';
export const sheetKnown = (): string => 'variance of the sources';
export const sheetRest = (): string => 'variance of campaign and scatter';
export const sheetFreedom = (): string => 'degrees of freedom';
export const sheetHalf = (): string => 'half-width';

const toTenth = (value: number): string => `${Math.round(100 * value)}`;
const span = (values: readonly number[]): string => `${short(Math.min(...values))} to ${short(Math.max(...values))}`;
export const bothSides = (
  law: string,
  others: readonly { readonly campaign: string; readonly resistance: number; readonly lower: number; readonly upper: number }[],
  own: readonly number[],
): string =>
  `${law}, both sides: ${others
    .map(
      ({ campaign, resistance, lower, upper }) =>
        `${campaign === '' ? 'all else' : `all else in campaign ${campaign}`} resists ${short(resistance)} m^2 K/W (${short(lower)} to ${Number.isFinite(upper) ? short(upper) : 'no upper bound'}) on the outer area`,
    )
    .join('; ')}; the law's side has a coefficient of ${span(own)} W/(m^2 K) on its own area`;
export const ownShare = (low: number, high: number): string =>
  `the law's side holds ${toTenth(low)} to ${toTenth(high)} % of the whole resistance${low < 0.3 ? '; below 30 % its law rests on a small difference of large numbers' : ''}`;
export const oneStep = (): string =>
  'law and resistances are fitted to the overall coefficients in one step (after Wilson 1915); no resistance found here goes back into a reduction. Each campaign has a resistance of its own, so no other difference between campaigns is looked for, and how the own side itself would differ in another campaign is not known';
