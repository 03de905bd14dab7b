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
    const count = wholeOption(given, 'count', 1, 50) ?? 3;
    const seed = wholeOption(given, 'seed', 0, 2 ** 32 - 1);
    const request = { study: String(given.study), count, json: flag(given, 'json'), ...(seed === undefined ? {} : { seed }) };
    const { proposeTrials } = await import('./propose-trials.ts');
    return proposeTrials(request, terminal);
  },
};
