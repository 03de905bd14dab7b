import { says } from '../base/says/cli.ts';
import { wrongCommandLine } from './arguments.ts';
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
  run: async () => {
    throw wrongCommandLine(says.notYet('next-trials'));
  },
};
