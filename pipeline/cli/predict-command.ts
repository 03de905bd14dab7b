import { says } from '../base/says/cli.ts';
import { wrongCommandLine } from './arguments.ts';
import type { Command } from './command.ts';

/** `pilotlaw predict LAWS PLANT` */
export const predictCommand: Command = {
  name: 'predict',
  about: says.predict,
  takes: [
    { name: 'LAWS', about: says.positionalLaws },
    { name: 'PLANT', about: says.positionalPlant },
  ],
  options: [
    { name: 'law', value: 'NAME', about: says.optionLaw },
    { name: 'out', value: 'FILE', about: says.optionOutFile },
    { name: 'json', about: says.optionJson },
  ],
  run: async () => {
    throw wrongCommandLine(says.notYet('predict'));
  },
};
