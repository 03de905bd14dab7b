import { says } from '../base/says/cli.ts';
import { flag, wholeOption } from './arguments.ts';
import type { Command } from './command-line.ts';

/** `pilotlaw next-trials STUDY` */
export const nextTrialsCommand: Command = {
  usage: 'next-trials <study>',
  about: says.nextTrials,
  options: (y) =>
    y
      .positional('study', { type: 'string', describe: says.positionalStudy })
      .option('count', { type: 'string', describe: says.optionCount })
      .option('seed', { type: 'string', describe: says.optionSeed })
      .option('json', { type: 'boolean', describe: says.optionJson }),
  run: async (given, terminal) => {
    const request = {
      study: String(given.study),
      count: wholeOption(given, 'count', 1, 50),
      seed: wholeOption(given, 'seed', 0, 4_294_967_295),
      json: flag(given, 'json'),
    };
    const { proposeTrials } = await import('./propose-trials.ts');
    return proposeTrials(request, terminal);
  },
};
