import { says } from '../base/says/cli.ts';
import { flag, textOption } from './arguments.ts';
import type { Command } from './command.ts';

/** `pilotlaw correlations [ID]` */
export const correlationsCommand: Command = {
  name: 'correlations',
  about: says.correlations,
  takes: [{ name: 'ID', about: says.positionalId, optional: true }],
  options: [
    { name: 'family', value: 'NAME', about: says.optionFamily },
    { name: 'gives', value: 'NAME', about: says.optionGives },
    { name: 'search', value: 'TEXT', about: says.optionSearch },
    { name: 'at', value: 'TEXT', about: says.optionAt },
    { name: 'page', value: 'FILE', about: says.optionPage },
    { name: 'json', about: says.optionJson },
  ],
  run: async (given, terminal) => {
    const request = {
      id: textOption(given, 'id'),
      family: textOption(given, 'family'),
      gives: textOption(given, 'gives'),
      search: textOption(given, 'search'),
      at: textOption(given, 'at'),
      page: textOption(given, 'page'),
      json: flag(given, 'json'),
    };
    const { showCorrelations } = await import('./show-correlations.ts');
    return showCorrelations(request, terminal);
  },
};
