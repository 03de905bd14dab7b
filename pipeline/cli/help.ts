import { says } from '../base/says/cli.ts';
import { type Command, usage } from './command.ts';

const table = (rows: readonly (readonly [string, string])[]): readonly string[] => {
  const width = Math.max(...rows.map(([left]) => left.length));
  return rows.map(([left, right]) => `  ${left.padEnd(width)}  ${right}`);
};

const GENERAL: readonly (readonly [string, string])[] = [
  ['--help', says.optionHelp],
  ['--version', says.optionVersion],
];

/** What `pilotlaw --help` prints. */
export const overview = (commands: readonly Command[]): string =>
  [says.about, '', ...table(commands.map((command) => [usage(command), command.about])), '', ...table(GENERAL), '', says.epilogue].join(
    '\n',
  );

/** What `pilotlaw COMMAND --help` prints. */
export function commandHelp(command: Command): string {
  const arguments_ = command.takes.map(({ name, about }) => [name, about] as const);
  const options = command.options.map(
    ({ name, value, about }) => [value === undefined ? `--${name}` : `--${name} ${value}`, about] as const,
  );
  return [`${usage(command)}`, `  ${command.about}`, '', ...table([...arguments_, ...options, ...GENERAL])].join('\n');
}
