const short = (value: number, digits = 3): string => String(Number(value.toPrecision(digits)));
const share = (chance: number): string => `${short(100 * chance, 2)} %`;

interface Found {
  readonly law: string;
  readonly group: string;
  readonly at: number;
  readonly lower: number;
  readonly upper: number;
  readonly range: readonly [number, number];
  readonly change: number;
  readonly changeLower: number;
  readonly changeUpper: number;
  readonly below: number;
  readonly above: number;
  readonly chance: number;
  readonly aicc: number;
}

const place = ({ lower, upper }: Found): string => {
  const [from, to] = [lower > 0, Number.isFinite(upper)];
  if (!from && !to) return 'anywhere in the trials, as far as they tell';
  return `${from ? short(lower) : 'the low end'} to ${to ? short(upper) : 'the high end'}`;
};
const over = ({ group, range }: Found): string => `${group} ${short(range[0])} to ${short(range[1])}`;
const aicc = (difference: number): string => `AICc ${difference < 0 ? 'falls' : 'rises'} by ${short(Math.abs(difference))} with the break`;

export const found = (one: Found): string =>
  `One exponent of ${one.group} does not hold for ${one.law} over the whole range of the trials (${over(one)}): at ${one.group} ${short(one.at)} (${place(one)}) ${
    Number.isFinite(one.below)
      ? `it goes from ${short(one.below)} to ${short(one.above)}`
      : `it changes by ${short(one.change, 2)} (${short(one.changeLower, 2)} to ${short(one.changeUpper, 2)}, were the break known)`
  }. Without a break, chance alone does as well in ${share(one.chance)} of studies; ${aicc(one.aicc)}. Do not extrapolate in ${one.group}: fit the two ranges apart, or propose a law that blends them.`;
export const notFound = (one: Found): string =>
  `Nothing speaks against one exponent of ${one.group} for ${one.law} over the trials (${over(one)}): the best break, at ${short(one.at)}, would change it by ${short(one.change, 2)} (${short(one.changeLower, 2)} to ${short(one.changeUpper, 2)}, were the break known), and chance alone does as well in ${share(one.chance)} of studies without a break; ${aicc(one.aicc)}. A change inside that interval would not show in these trials.`;
export const notLooked = (law: string, group: string, why: string): string =>
  `Whether one exponent of ${group} holds for ${law} over the whole range was not looked at: ${
    why === 'too few trials'
      ? 'the trials are too few for two exponents and a break'
      : why === 'too narrow'
        ? `${group} has too few different values inside its range`
        : 'the law, or the law with a break, could not be fitted'
  }.`;
