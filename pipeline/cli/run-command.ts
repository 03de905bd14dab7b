import { availableParallelism } from 'node:os';
import { says } from '../base/says/cli.ts';
import { flag, textOption, wholeOption } from './arguments.ts';
import type { Command } from './command.ts';

const MOST_JOBS = 64;
const MOST_SEED = 4_294_967_295;

/** `pilotlaw run STUDY...` */
export const runCommand: Command = {
  name: 'run',
  about: says.run,
  takes: [{ name: 'STUDY', about: says.positionalStudy, many: true }],
  options: [
    { name: 'out', value: 'DIR', about: says.optionOut },
    { name: 'jobs', value: 'N', about: says.optionJobs },
    { name: 'seed', value: 'N', about: says.optionSeed },
    { name: 'fresh', about: says.optionFresh },
    { name: 'quiet', about: says.optionQuiet },
    { name: 'json', about: says.optionJson },
  ],
  run: async (given, terminal) => {
    const request = {
      studies: given.study as readonly string[],
      out: textOption(given, 'out'),
      jobs: wholeOption(given, 'jobs', 1, MOST_JOBS) ?? availableParallelism(),
      seed: wholeOption(given, 'seed', 0, MOST_SEED),
      fresh: flag(given, 'fresh'),
      quiet: flag(given, 'quiet'),
      json: flag(given, 'json'),
    };
    const { runStudies } = await import('./run-studies.ts');
    return runStudies(request, terminal);
  },
};
