import { says } from '../base/says/cli.ts';
import { flag, textOption } from './arguments.ts';
import type { Command } from './command-line.ts';

/** `pilotlaw predict LAWS PLANT` */
export const predictCommand: Command = {
  usage: 'predict <laws> <plant>',
  about: says.predict,
  options: (y) =>
    y
      .positional('laws', { type: 'string', describe: says.positionalLaws })
      .positional('plant', { type: 'string', describe: says.positionalPlant })
      .option('law', { type: 'string', describe: says.optionLaw })
      .option('out', { type: 'string', describe: says.optionOutFile })
      .option('json', { type: 'boolean', describe: says.optionJson }),
  run: async (given, terminal) => {
    const request = {
      laws: String(given.laws),
      plant: String(given.plant),
      law: textOption(given, 'law'),
      out: textOption(given, 'out'),
      json: flag(given, 'json'),
    };
    const { predictPlant } = await import('./predict-plant.ts');
    return predictPlant(request, terminal);
  },
};
