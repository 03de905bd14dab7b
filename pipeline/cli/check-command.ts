import { says } from '../base/says/cli.ts';
import type { Command } from './command-line.ts';

/** `pilotlaw check STUDY...` */
export const checkCommand: Command = {
  usage: 'check <study..>',
  about: says.check,
  options: (y) => y.positional('study', { type: 'string', describe: says.positionalStudy }),
  run: async (given, terminal) => {
    const { checkStudies } = await import('./check-studies.ts');
    return checkStudies(given.study as readonly string[], terminal);
  },
};
