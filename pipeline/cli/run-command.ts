import { says } from '../base/says/cli.ts';
import { flag, textOption, wholeOption } from './arguments.ts';
import type { Command } from './command-line.ts';

const MOST_JOBS = 64;
const MOST_SEED = 4_294_967_295;

/** `pilotlaw run STUDY...` */
export const runCommand: Command = {
  usage: 'run <study..>',
  about: says.run,
  options: (y) =>
    y
      .positional('study', { type: 'string', describe: says.positionalStudy })
      .option('out', { type: 'string', describe: says.optionOut })
      .option('jobs', { type: 'string', describe: says.optionJobs })
      .option('seed', { type: 'string', describe: says.optionSeed })
      .option('fresh', { type: 'boolean', describe: says.optionFresh })
      .option('quiet', { type: 'boolean', describe: says.optionQuiet })
      .option('json', { type: 'boolean', describe: says.optionJson }),
  run: async (given, terminal) => {
    const request = {
      studies: given.study as readonly string[],
      out: textOption(given, 'out'),
      jobs: wholeOption(given, 'jobs', 1, MOST_JOBS),
      seed: wholeOption(given, 'seed', 0, MOST_SEED),
      fresh: flag(given, 'fresh'),
      quiet: flag(given, 'quiet'),
      json: flag(given, 'json'),
    };
    const { runStudies } = await import('./run-studies.ts');
    return runStudies(request, terminal);
  },
};
