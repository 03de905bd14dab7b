export const serial = (law: string, lag1: number): string =>
  `Residuals of ${law} follow each other in the order of the run (lag-1 correlation ${lag1.toFixed(2)}): the form does not hold over the whole run, or something drifted. Its intervals are too narrow by as much as neighbouring readings repeat each other.`;
export const bend = (law: string, group: string): string =>
  `Residuals of ${law} bend against ${group}: one exponent does not hold over its whole range. Try an offset, a blended law or two ranges, and do not extrapolate in ${group}.`;
export const uneven = (law: string, rises: boolean): string =>
  `The scatter about ${law} ${rises ? 'grows' : 'falls'} with the predicted value: intervals are too ${rises ? 'narrow' : 'wide'} at the high end and too ${rises ? 'wide' : 'narrow'} at the low one.`;
export const notNormal = (law: string, largest: number, trial: string): string =>
  `Residuals of ${law} are not normally distributed; the largest is ${Math.abs(largest).toFixed(1)} standard deviations ${largest > 0 ? 'above' : 'below'} (trial ${trial}). Compare the robust refits before leaning on the intervals.`;
export const lackOfFit = (law: string, ratio: number, lacking: boolean, replicates: number): string =>
  lacking
    ? `About ${law} trials scatter ${Math.sqrt(ratio).toFixed(1)} times as much as replicates of one setting do (${replicates} degrees of freedom): the form misses something that the rig repeats.`
    : `About ${law} trials scatter no more than replicates of one setting do (variance ratio ${ratio.toFixed(2)}, ${replicates} degrees of freedom).`;
