import { says } from '../base/says/cli.ts';
import { flag, textOption } from './arguments.ts';
import type { Command } from './command-line.ts';

/** `pilotlaw correlations [ID]` */
export const correlationsCommand: Command = {
  usage: 'correlations [id]',
  about: says.correlations,
  options: (y) =>
    y
      .positional('id', { type: 'string', describe: says.positionalId })
      .option('family', { type: 'string', describe: says.optionFamily })
      .option('gives', { type: 'string', describe: says.optionGives })
      .option('search', { type: 'string', describe: says.optionSearch })
      .option('at', { type: 'string', describe: says.optionAt })
      .option('json', { type: 'boolean', describe: says.optionJson }),
  run: async (given, terminal) => {
    const request = {
      id: textOption(given, 'id'),
      family: textOption(given, 'family'),
      gives: textOption(given, 'gives'),
      search: textOption(given, 'search'),
      at: textOption(given, 'at'),
      json: flag(given, 'json'),
    };
    const { showCorrelations } = await import('./show-correlations.ts');
    return showCorrelations(request, terminal);
  },
};
