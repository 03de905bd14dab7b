import { didYouMean } from '../nearest.ts';

const thousands = (n: number): string => String(n).replace(/\B(?=(\d{3})+$)/g, ',');

/** What was read, short enough to stand in a sentence. */
function shown(value: unknown): string {
  if (value === null || value === '') return 'nothing';
  if (Array.isArray(value)) return 'a list';
  if (typeof value === 'object') return 'a map of keys';
  if (typeof value === 'boolean') return `${value} (a truth value; in quotes it is a text)`;
  const text = String(value);
  return `"${text.length > 60 ? `${text.slice(0, 57)}...` : text}"`;
}

/** What is said about the form of a study file. */
export const says = {
  tooLarge: (characters: number, most: number): string =>
    `${thousands(characters)} characters; a study file has at most ${thousands(most)}`,
  tooDeep: (most: number): string => `maps and lists stand more than ${most} deep in each other; a study file needs 6 levels`,
  emptyFile: 'nothing in it; a study starts with `pilotlaw: 1` and a `title`',
  twoDocuments: 'a second document starts here; a study file is one document, so leave out the line `---`',
  tab: 'this line is indented by a tab; YAML wants spaces',
  notYaml: (message: string): string => `not YAML: ${message}`,
  tag: (message: string): string => `${message}; a study file needs no tags (words with !)`,
  tooManyValues: (most: number): string =>
    `more than ${thousands(most)} values once aliases (*) are written out; write the study without them`,
  unknownAlias: (name: string): string =>
    `nothing above is named &${name}, so *${name} means nothing; a text that starts with * goes in quotes`,
  aliasOfItself: 'this alias (*) stands inside what it refers to; write the value out',
  keyNotText: 'a key must be a plain word',
  keyNotAllowed: (key: string): string => `"${key}" cannot be used as a name`,
  keyTwice: (key: string): string => `"${key}" stands here for the second time; a key may be given once`,
  textTooLong: (characters: number, most: number): string =>
    `a text of ${thousands(characters)} characters; at most ${thousands(most)} are read`,
  controlCharacter: 'this text holds a control character (NUL or the like); write it without',
  andMore: (count: number): string => `and ${thousands(count)} more faults`,

  empty: (wants: string): string => `is empty; give ${wants}`,
  missing: (wants: string): string => `is missing; give ${wants}`,
  notThis: (value: unknown, wants: string): string => `${shown(value)} is not ${wants}`,
  notOneOf: (value: unknown, known: readonly string[]): string =>
    `${shown(value)} is not one of ${known.join(', ')}${typeof value === 'string' ? didYouMean(value, known) : ''}`,
  unknownKey: (key: string, known: readonly string[]): string => {
    const meant = didYouMean(key, known);
    return `unknown key "${key}"${meant === '' ? `; known here: ${known.join(', ')}` : meant}`;
  },
  format: (value: unknown): string => `${shown(value)} is not a format of study files that this version reads; it reads 1`,

  oneOf: (keys: readonly string[], given: readonly string[]): string =>
    given.length === 0 ? `give one of ${keys.join(', ')}` : `${given.join(' and ')} contradict each other; give one of ${keys.join(', ')}`,
  needs: (key: string, other: string): string => `${key} says nothing without ${other}`,
  unitTwice: 'the unit stands here and beside the value; give it once',
  lawNameTwice: (name: string): string => `a second law named "${name}"; names of laws must differ`,
  startOutside: (name: string, start: number, low: number, high: number): string =>
    `${name} starts at ${start}, outside its bounds ${low} to ${high}`,
  boundsReversed: (low: number, high: number): string => `${low} to ${high} is no interval; give the lower bound first`,
  outsideFolder: (path: string): string => `"${path}" leads out of the study's folder; give a path inside it, such as data/trials.csv`,
  rangeReversed: 'give the lower end first',
  needsPlant: 'plant needs a file with cases, or quantities',
  idTwice: (id: string): string => `a second correlation with id "${id}"; ids must differ`,
  ownTooMany: (count: number, most: number): string => `${count} correlations; at most ${most} are read`,
  steadyAlone: (key: string): string => `${key} has no meaning beside steady, which makes the trials itself; leave it out`,
  between: (from: number, to: number): string => `a share from ${from} to ${to}`,
};
