import { says } from '../base/says/cli.ts';
import { flag, textOption } from './arguments.ts';
import type { Command } from './command-line.ts';

/** `pilotlaw begin TRIALS` */
export const beginCommand: Command = {
  usage: 'begin <trials>',
  about: says.begin,
  options: (y) =>
    y
      .positional('trials', { type: 'string', describe: says.positionalTrials })
      .option('sheet', { type: 'string', describe: says.optionSheet })
      .option('force', { type: 'boolean', describe: says.optionForce }),
  run: async (given, terminal) => {
    const request = { trials: String(given.trials), sheet: textOption(given, 'sheet'), force: flag(given, 'force') };
    const { beginStudy } = await import('./begin-study.ts');
    return beginStudy(request, terminal);
  },
};
