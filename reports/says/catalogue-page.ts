/** What the reference page of the published correlations says. */
export const heading = (): string => 'Published correlations';
export const standing = (entries: number, families: number, checks: number): string =>
  `${entries} correlations in ${families} families of equipment, each as its authors define it, with the range they give and ${checks} checks from outside. A correlation holds for the equipment, fluids and conditions it was made from; these numbers are input to a review by a qualified engineer, and local codes and licensed practice come first.`;
export const families = (): string => 'Families';
export const definitions = (): string => 'where';
export const range = (): string => 'Range its authors give';
export const noRange = (): string => 'No range is given where its constants were read.';
export const barText = (says: string): string => `Range: ${says}`;
export const details = (reads: string, average: string, accuracy: string): string =>
  `Reads as ${reads}, ${average} value; stated accuracy: ${accuracy}.`;
export const analogy = (allowed: boolean): string =>
  allowed
    ? 'May be used for the other kind of transfer by analogy, under its conditions.'
    : 'Not for the other kind of transfer: the analogy does not hold for it.';
export const memory = (): string => 'constants from memory';
export const read = (): string => 'constants read on the page named';
export const checked = (kind: string, at: string, response: string, value: string, gives: string, source: string): string =>
  `Checked (${kind})${at === '' ? '' : ` at ${at}`}: ${response} = ${value} printed, ${gives} here. ${source}`;
