import { says } from '../base/says/cli.ts';
import type { Command } from './command.ts';

/** `pilotlaw check STUDY...` */
export const checkCommand: Command = {
  name: 'check',
  about: says.check,
  takes: [{ name: 'STUDY', about: says.positionalStudy, many: true }],
  options: [],
  run: async (given, terminal) => {
    const { checkStudies } = await import('./check-studies.ts');
    return checkStudies(given.study as readonly string[], terminal);
  },
};
