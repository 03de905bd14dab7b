import { says } from '../base/says/cli.ts';
import { flag, textOption } from './arguments.ts';
import type { Command } from './command.ts';

/** `pilotlaw begin TRIALS` */
export const beginCommand: Command = {
  name: 'begin',
  about: says.begin,
  takes: [{ name: 'TRIALS', about: says.positionalTrials }],
  options: [
    { name: 'sheet', value: 'NAME', about: says.optionSheet },
    { name: 'force', about: says.optionForce },
  ],
  run: async (given, terminal) => {
    const request = { trials: String(given.trials), sheet: textOption(given, 'sheet'), force: flag(given, 'force') };
    const { beginStudy } = await import('./begin-study.ts');
    return beginStudy(request, terminal);
  },
};
