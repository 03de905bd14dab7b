import { says } from '../base/says/cli.ts';
import { version } from '../base/version.ts';
import { type Given, wrongCommandLine } from './arguments.ts';
import { beginCommand } from './begin-command.ts';
import { checkCommand } from './check-command.ts';
import { type Command, usage } from './command.ts';
import { correlationsCommand } from './correlations-command.ts';
import { EXIT, type Exit, tell } from './exit.ts';
import { commandHelp, overview } from './help.ts';
import { nextTrialsCommand } from './next-trials-command.ts';
import { predictCommand } from './predict-command.ts';
import { runCommand } from './run-command.ts';
import type { Terminal } from './terminal.ts';

const commands: readonly Command[] = [runCommand, checkCommand, beginCommand, correlationsCommand, predictCommand, nextTrialsCommand];

/** Runs the program for the words after its name; never throws. */
export async function commandLine(words: readonly string[], terminal: Terminal): Promise<Exit> {
  const command = commands.find(({ name }) => name === words[0]);
  try {
    if (words.includes('--help') || words.includes('-h')) {
      terminal.out(`${command === undefined ? overview(commands) : commandHelp(command)}\n`);
      return EXIT.done;
    }
    if (words.includes('--version')) {
      terminal.out(`${version}\n`);
      return EXIT.done;
    }
    if (command === undefined) throw wrongCommandLine(noCommand(words));
    return await command.run(await parsed(command, words.slice(1)), terminal);
  } catch (error) {
    return tell(error, terminal);
  }
}

function noCommand(words: readonly string[]): string {
  const names = commands.map(({ name }) => name);
  const first = words.find((word) => !word.startsWith('-'));
  return first === undefined ? says.noCommand(names) : says.unknownCommand(first, names);
}

/** The words after the command's name, by the names of its arguments and options. Throws (exit 2) on what it does not take. */
async function parsed(command: Command, words: readonly string[]): Promise<Given> {
  const { default: yargs } = await import('yargs');
  const parser = yargs()
    .detectLocale(false)
    .exitProcess(false)
    .help(false)
    .version(false)
    .fail((text, error) => {
      throw error ?? wrongCommandLine(says.notUnderstood(text, usage(command)));
    })
    .parserConfiguration({
      'parse-numbers': false,
      'parse-positional-numbers': false,
      'boolean-negation': false,
      'camel-case-expansion': false,
      'dot-notation': false,
      'short-option-groups': false,
    })
    .string('_')
    .options(
      Object.fromEntries(
        command.options.map(({ name, value }) => [name, { type: value === undefined ? ('boolean' as const) : ('string' as const) }]),
      ),
    );
  const { _: plain, $0: _name, ...options } = await parser.parseAsync([...words]);
  refuseUnknown(command, Object.keys(options));
  return { ...options, ...placed(command, plain.map(String)) };
}

function refuseUnknown(command: Command, given: readonly string[]): void {
  const known = command.options.map(({ name }) => name);
  const unknown = given.find((name) => !known.includes(name));
  if (unknown !== undefined) throw wrongCommandLine(says.unknownOption(unknown, known));
}

/** The words that are no options, by the arguments in their order. */
function placed(command: Command, words: readonly string[]): Given {
  const given: Record<string, string | readonly string[]> = {};
  let rest = words;
  for (const { name, many, optional } of command.takes) {
    if (rest.length === 0 && !optional) throw wrongCommandLine(says.argumentMissing(name, usage(command)));
    if (rest.length > 0) given[name.toLowerCase()] = many ? rest : rest[0]!;
    rest = many ? [] : rest.slice(1);
  }
  if (rest.length > 0) throw wrongCommandLine(says.tooManyArguments(rest[0]!, usage(command)));
  return given;
}
