import { InputError } from '../base/input-error.ts';
import { says } from '../base/says/cli.ts';

/** Arguments as the parser of the command line hands them over. */
export type Given = Readonly<Record<string, unknown>>;

/** The command line is wrong: exit 2. */
export const wrongCommandLine = (text: string): InputError => new InputError([{ code: 'command-line', text }], 2);

/** A text option: given once and not empty, or not at all. */
export function textOption(given: Given, option: string): string | undefined {
  const value = given[option];
  if (value === undefined) return undefined;
  if (Array.isArray(value)) throw wrongCommandLine(says.optionTwice(option));
  if (value === '') throw wrongCommandLine(says.optionEmpty(option));
  return String(value);
}

/** A whole number in a range; decimal digits only. */
export function wholeOption(given: Given, option: string, from: number, to: number): number | undefined {
  const text = textOption(given, option);
  if (text === undefined) return undefined;
  const number = /^\d{1,15}$/.test(text) ? Number(text) : Number.NaN;
  if (!(number >= from && number <= to)) throw wrongCommandLine(says.notANumber(option, text, from, to));
  return number;
}

/** An option without a value: there or not. */
export function flag(given: Given, option: string): boolean {
  const value = given[option];
  if (value === undefined) return false;
  if (value !== true) throw wrongCommandLine(Array.isArray(value) ? says.optionTwice(option) : says.optionTakesNoValue(option));
  return true;
}
