const listed = (names: readonly string[]): string => names.join(' and ');

export const theCase = (): string => 'plant';
const ends = { low: 'low', middle: 'middle of', high: 'high' } as const;
export const endOf = (keys: readonly string[], where: readonly ('low' | 'middle' | 'high')[]): string =>
  keys.map((key, k) => `${ends[where[k]!]} ${key}`).join(', ');

export const coefficientGiven = (key: string): string => `${key} is what the laws predict for the plant; take it out of the plant's table`;
export const inherited = (keys: readonly string[]): string =>
  `Taken over from the study for every plant case: ${keys.join(', ')}; their uncertainty shifts rig and plant together.`;
export const plantLacks = (group: string, roots: readonly string[], rigOnly: readonly string[]): string => {
  const onRig = roots.filter((key) => rigOnly.includes(key));
  return `${group} cannot be computed for the plant: ${roots.length === 0 ? 'nothing gives it' : `${listed(roots)} ${roots.length === 1 ? 'is' : 'are'} not among its columns`}${
    onRig.length === 0 ? '' : `; ${listed(onRig)} of the rig ${onRig.length === 1 ? 'is' : 'are'} not taken over`
  }. State ${roots.length === 1 ? 'it' : 'them'} in the plant table with a unit in the header, or under plant.quantities.`;
};
export const columnTwice = (name: string): string => `${name} stands in two columns of the plant table; keep one`;
export const unknownColumn = (name: string, meant: string): string =>
  `"${name}" is no quantity known here; did you mean "${meant}"? Quantities of the plant are named as in the study file`;
export const unusedColumn = (file: string, name: string): string =>
  `The column "${name}" of ${file} is no quantity known here and is not used.`;
export const unknownTarget = (key: string, known: readonly string[]): string => `target has no "${key}"; it takes ${known.join(', ')}`;
export const targetFind = (read: string, known: readonly string[]): string =>
  `${read === '' ? 'target needs find' : `"${read}" cannot be found from a coefficient`}: one of ${known.join(', ')}`;
export const targetLacks = (find: string, rate: string): string =>
  `to find ${find === 'time' ? 'a time' : `the ${find}`}, target needs ${rate} and driving_difference`;
export const targetKinds = (): string => 'rate and driving difference of a target are both by mass or both by amount of substance';
export const targetAmount = (key: string, text: string, units: readonly string[]): string =>
  `"${text}" is no ${key}: give a positive value in ${units.join(' or ')} or a multiple of it`;
export const unknownRigSetting = (key: string, meant: string | undefined): string =>
  `"${key}" is no quantity of this study that a trial could set${meant === undefined ? '' : `; did you mean "${meant}"?`}`;
export const rigEmpty = (): string =>
  'rig names nothing that a next trial may set; give a range such as rotation_speed: [100 rpm, 600 rpm]';
