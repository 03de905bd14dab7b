import { didYouMean } from '../nearest.ts';

export const tooLong = (length: number, limit: number): string =>
  `this text has ${length} characters; at most ${limit.toLocaleString('en-US')} are read`;
export const tooDeep = (limit: number): string => `this is nested more than ${limit} levels deep`;
export const strangeCharacter = (character: string): string =>
  `"${character}" has no meaning in a law; use numbers, names, + - * / ^, parentheses and functions`;
export const unexpected = (text: string): string => `"${text}" is not expected here; between two names or numbers stands one of + - * / ^`;
export const missingSign = (sign: string, read: string): string =>
  `"${sign}" is missing here${read === '' ? ' at the end' : ` before "${read}"`}`;
export const endsEarly = (): string => 'the expression ends where a number or a name is expected';
export const numberTooLarge = (text: string): string => `${text} is too large for a number`;
export const numberTooSmall = (text: string): string => `${text} is too small for a number; write 0 if that is meant`;
export const functionNeedsArgument = (name: string): string => `${name} is a function and needs its argument in parentheses: ${name}(...)`;
export const unknownFunction = (name: string, known: readonly string[]): string =>
  `"${name}" is no function${didYouMean(name, known)}; write * between a name and a parenthesis, or use one of ${known.filter((one) => one !== 'pi').join(', ')}`;
export const argumentCount = (name: string, wanted: 1 | 2, read: number): string =>
  `${name} takes ${wanted === 1 ? 'one argument' : 'two or more arguments'}, here are ${read}`;

export const needsEquals = (): string => 'a law reads RESPONSE = expression, with one "="';
export const responseIsName = (read: string): string => `left of "=" stands the name of the response alone, not "${read}"`;
export const responseInside = (name: string): string => `${name} stands on both sides of "="`;
export const noParameter = (): string => 'a law needs at least one parameter to be fitted; every name in it is a group or a quantity';
export const likeKnown = (name: string, known: string): string =>
  `"${name}" would be a parameter, but it looks like ${known}; did you mean "${known}"? If it is a parameter, list the law's parameters under "parameters"`;
export const notListed = (name: string, parameters: readonly string[]): string =>
  `"${name}" is neither a group or quantity known here nor one of the parameters listed${didYouMean(name, parameters)}`;
export const unusedParameter = (name: string): string => `the parameter "${name}" does not stand in the law`;
export const knownAsParameter = (name: string): string => `"${name}" is a group or quantity and cannot be a parameter as well`;
export const inseparable = (names: readonly string[]): string => (names.length === 1 ? withoutEffect(names[0]!) : together(names));
const withoutEffect = (name: string): string => `the law does not depend on the parameter ${name}, whatever its value; drop it`;
const together = (names: readonly string[]): string =>
  `no data could tell the parameters ${names.join(' and ')} apart: the law depends on them only together; drop one of them`;
export const unknownName = (name: string, known: readonly string[]): string => `"${name}" is not known here${didYouMean(name, known)}`;
export const limitShape = (): string =>
  'a limit reads "Re >= 1e4", "0.7 <= Pr <= 160" or "Re * Pr > 0.2": one expression with a number on one side or on both';
export const limitOrder = (from: number, to: number): string => `the lower end ${from} lies above the upper end ${to}`;
