import { says } from '../base/says/cli.ts';
import { flag, wholeOption } from './arguments.ts';
import type { Command } from './command.ts';

/** `pilotlaw next-trials STUDY` */
export const nextTrialsCommand: Command = {
  name: 'next-trials',
  about: says.nextTrials,
  takes: [{ name: 'STUDY', about: says.positionalStudy }],
  options: [
    { name: 'count', value: 'N', about: says.optionCount },
    { name: 'seed', value: 'N', about: says.optionSeed },
    { name: 'json', about: says.optionJson },
  ],
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
