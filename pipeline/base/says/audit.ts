const percent = (share: number): string => `${(100 * share).toPrecision(2).replace(/\.0$/, '')} %`;
/** A ln error as a share: exp(e) - 1. */
const error = (ln: number): string => percent(Math.expm1(ln));
const factor = (value: number): string => value.toFixed(2);
const plural = (n: number, one: string): string => `${n} ${one}${n === 1 ? '' : 's'}`;

interface Row {
  readonly authors: string;
  readonly year: number;
  readonly verdict: string;
  readonly basis: string;
  readonly rigFactor: number;
  readonly rigFactorLower: number;
  readonly rigFactorUpper: number;
  readonly cvRmsLnAsPublished: number;
  readonly cvRmsLnWithFactor: number;
  readonly cvRmsLnFittedLaw: number;
}

const name = ({ authors, year, basis }: Row): string => `${authors} (${year})${basis === 'analogy' ? ' by analogy' : ''}`;

export const lacks = (keys: readonly string[]): string => `It needs ${keys.join('; ')}.`;

export const outside = (
  inRange: number,
  of: number,
  needed: number,
  limits: readonly { readonly says: string; readonly inside: number }[],
): string => {
  const missed = limits.filter((limit) => limit.inside < of).map((limit) => `${limit.says} (${limit.inside} of ${of})`);
  return `${inRange} of ${of} trials lie in its range and ${needed} are needed to judge it${missed.length === 0 ? '' : `; limits that trials miss: ${missed.join(', ')}`}.`;
};

export interface WhyInput {
  readonly verdict: string;
  readonly trends: readonly { readonly group: string; readonly slope: number; readonly pHolm: number; readonly span: number }[];
  readonly reach: number;
  readonly reachWithFactor: number;
  readonly rigFactor: number;
  readonly sigma: number;
}

export const why = ({ verdict, trends, reach, reachWithFactor, rigFactor, sigma }: WhyInput, tolerance: number): string => {
  const within = percent(tolerance);
  switch (verdict) {
    case 'wrong trend': {
      const worst = trends.reduce((a, b) => (b.span > a.span ? b : a));
      return `Measured over predicted changes as ${worst.group}^${worst.slope.toFixed(2)}, ${error(worst.span)} over the trials.`;
    }
    case 'fits as published':
      return `With its interval it stays within ${percent(reach - 1)} of the trials everywhere, inside the tolerance of ${within}.`;
    case 'fits with a rig factor':
      return `After one factor of ${factor(rigFactor)} it stays within ${percent(reachWithFactor - 1)} of the trials everywhere, inside the tolerance of ${within}.`;
    default:
      return sigma > Math.log(1 + tolerance)
        ? `The trials scatter by ${error(sigma)} about it, more than the tolerance of ${within}.`
        : `With its interval it may be off by ${percent(reach - 1)} somewhere (${percent(reachWithFactor - 1)} after one factor), more than the tolerance of ${within}, and no trend is proven.`;
  }
};

export const bestOfMany = (m: number, best: number, law: number, lawName: string): string =>
  `Choosing the best of ${m} published correlations with its factor, anew each time from the other trials, leaves an error of ${error(best)} (rms) on trials not used; ${lawName} leaves ${error(law)}.`;

export const byAnalogy = (): string =>
  'Rows marked "by analogy" carry a heat correlation over to mass transfer or the other way round (Nu for Sh, Pr for Sc). That holds for low transfer rates, no radiation and similar boundary conditions; it does not hold through changed properties at a hot wall.';

/** The first sentence of the audit. */
export const headline = (rows: readonly Row[], { lawName }: { readonly lawName: string }): string => {
  const comparable = rows.filter((row) => row.verdict !== 'not comparable');
  if (rows.length === 0) return 'No published correlation of this equipment is in the catalogue, so none was compared.';
  if (comparable.length === 0)
    return `None of the ${plural(rows.length, 'published correlation')} can be compared with these trials: each needs something that was not measured.`;
  const fits = rows.find((row) => row.verdict === 'fits as published');
  const scaled = rows.find((row) => row.verdict === 'fits with a rig factor');
  const parts: string[] = [];
  if (fits !== undefined) parts.push(`${name(fits)} fits as published`);
  if (scaled !== undefined)
    parts.push(
      `${name(scaled)} needs a rig factor of ${factor(scaled.rigFactor)} (${factor(scaled.rigFactorLower)} to ${factor(scaled.rigFactorUpper)})`,
    );
  if (parts.length === 0)
    parts.push(
      `None of the ${plural(comparable.length, 'comparable published correlation')} is shown to fit these trials, as it stands or with one factor`,
    );
  const against = fits ?? scaled ?? comparable.find((row) => Number.isFinite(row.cvRmsLnWithFactor));
  const published = against === undefined ? Number.NaN : fits === undefined ? against.cvRmsLnWithFactor : against.cvRmsLnAsPublished;
  if (against !== undefined && Number.isFinite(published) && Number.isFinite(against.cvRmsLnFittedLaw)) {
    parts.push(
      `on trials left out, ${lawName} errs by ${error(against.cvRmsLnFittedLaw)} (rms) where ${name(against)} errs by ${error(published)}`,
    );
  }
  return `${parts.join('; ')}.`;
};
