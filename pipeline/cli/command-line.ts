import yargs, { type Argv, type CommandModule } from 'yargs';
import { says } from '../base/says/cli.ts';
import { version } from '../base/version.ts';
import { type Given, wrongCommandLine } from './arguments.ts';
import { beginCommand } from './begin-command.ts';
import { checkCommand } from './check-command.ts';
import { correlationsCommand } from './correlations-command.ts';
import { EXIT, type Exit, tell } from './exit.ts';
import { nextTrialsCommand } from './next-trials-command.ts';
import { predictCommand } from './predict-command.ts';
import { runCommand } from './run-command.ts';
import type { Terminal } from './terminal.ts';

/** One command: how it is written, what it takes, and what it does. What it needs beyond that it imports when it runs, so that `--help` stays fast. */
export interface Command {
  readonly usage: string;
  readonly about: string;
  readonly options: (y: Argv) => Argv;
  readonly run: (given: Given, terminal: Terminal) => Promise<Exit>;
}

const commands: readonly Command[] = [runCommand, checkCommand, beginCommand, correlationsCommand, predictCommand, nextTrialsCommand];

const nameOf = ({ usage }: Command): string => usage.split(' ')[0]!;

/** Runs the program for the words after its name; never throws. */
export async function commandLine(words: readonly string[], terminal: Terminal): Promise<Exit> {
  let exit: Exit = EXIT.done;
  const done = (code: Exit): void => {
    exit = code;
  };
  try {
    await parser(words, terminal, done).parseAsync([...words], {}, (_error, _given, output) => {
      if (output !== '') terminal.out(`${output}\n`);
    });
    return exit;
  } catch (error) {
    return tell(error, terminal);
  }
}

function parser(words: readonly string[], terminal: Terminal, done: (exit: Exit) => void): Argv {
  const base = yargs()
    .scriptName('pilotlaw')
    .detectLocale(false)
    .exitProcess(false)
    .strict()
    .demandCommand(1)
    .usage(`pilotlaw COMMAND\n\n${says.about}`)
    .epilogue(says.epilogue)
    .wrap(100)
    .version('version', says.optionVersion, version)
    .help('help', says.optionHelp)
    .parserConfiguration({
      'parse-numbers': false,
      'parse-positional-numbers': false,
      'boolean-negation': false,
      'camel-case-expansion': false,
    })
    .fail((text, error) => {
      throw error ?? wrongCommandLine(ourWords(text, words));
    });
  return commands.reduce((y, command) => y.command(asModule(command, terminal, done)), base);
}

function asModule(command: Command, terminal: Terminal, done: (exit: Exit) => void): CommandModule {
  return {
    command: command.usage,
    describe: command.about,
    builder: (y) => command.options(y),
    handler: async (given) => done(await command.run(given, terminal)),
  };
}

/** What the parser of the command line found, said as we say it. */
function ourWords(text: string, words: readonly string[]): string {
  const names = commands.map(nameOf);
  const command = commands.find((one) => nameOf(one) === words[0]);
  if (command === undefined) {
    const first = words.find((word) => !word.startsWith('-'));
    return first === undefined ? says.noCommand(names) : says.unknownCommand(first, names);
  }
  const unknown = /^Unknown arguments?: (.*)$/.exec(text)?.[1];
  if (unknown !== undefined) return unknownArgument(unknown.split(', ')[0]!, command, words);
  if (text.startsWith('Not enough non-option arguments')) return says.argumentMissing(usageOf(command));
  return says.notUnderstood(text, usageOf(command));
}

function unknownArgument(name: string, command: Command, words: readonly string[]): string {
  const isOption = words.some((word) => word === `-${name}` || word === `--${name}` || word.startsWith(`--${name}=`));
  return isOption ? says.unknownOption(name, optionNames(command)) : says.tooManyArguments(name, usageOf(command));
}

/** Names of a command's own options, from its builder. */
function optionNames(command: Command): readonly string[] {
  const names = new Set<string>();
  const listen = new Proxy({} as Argv, {
    get: (_, method) => (name: unknown) => {
      if (method === 'option' && typeof name === 'string') names.add(name);
      return listen;
    },
  });
  command.options(listen);
  return [...names];
}

const usageOf = ({ usage }: Command): string =>
  `pilotlaw ${usage.replace(/<(\w+)(\.\.)?>/g, (_, name: string, more?: string) => name.toUpperCase() + (more === undefined ? '' : '...')).replace(/\[(\w+)\]/g, (_, name: string) => `[${name.toUpperCase()}]`)}`;
