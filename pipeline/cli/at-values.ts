import { says } from '../base/says/cli.ts';
import { wrongCommandLine } from './arguments.ts';

const NUMBER = /^[+-]?(\d+(\.\d*)?|\.\d+)([eE][+-]?\d+)?$/;

/**
 * `Re=6071, Pr=0.70` -> numbers by name. `needs` must all be given, `also` may be: names that only the limits look at.
 * Throws (exit 2) on anything else, on a name the correlation does not have and on a missing one.
 */
export function atValues(text: string, needs: readonly string[], also: readonly string[] = []): Readonly<Record<string, number>> {
  const known = [...needs, ...also];
  const values: Record<string, number> = Object.create(null);
  for (const part of text.split(/[,;]/)) {
    const [name = '', number = '', ...rest] = part.split('=').map((piece) => piece.trim());
    const value = NUMBER.test(number) ? Number(number) : Number.NaN;
    if (name === '' || rest.length > 0 || !Number.isFinite(value)) throw wrongCommandLine(says.atNotRead(part.trim()));
    if (!known.includes(name)) throw wrongCommandLine(says.atUnknown(name, known));
    if (name in values) throw wrongCommandLine(says.atTwice(name));
    values[name] = value;
  }
  const missing = needs.filter((name) => !(name in values));
  if (missing.length > 0) throw wrongCommandLine(says.atMissing(missing));
  return values;
}
