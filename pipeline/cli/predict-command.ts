import { resolve } from 'node:path';
import { says } from '../base/says/cli.ts';
import { flag, textOption, wrongCommandLine } from './arguments.ts';
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
    { name: 'conservative', value: 'SIDE', about: says.optionConservative },
    { name: 'out', value: 'FILE', about: says.optionOutFile },
    { name: 'json', about: says.optionJson },
  ],
  run: async (given, terminal) => {
    const [law, out] = [textOption(given, 'law'), textOption(given, 'out')];
    const side = textOption(given, 'conservative') ?? 'low';
    if (side !== 'low' && side !== 'high') throw wrongCommandLine(says.notASide(side));
    const { predictCases } = await import('./predict-cases.ts');
    return predictCases(
      {
        laws: resolve(String(given.laws)),
        plant: resolve(String(given.plant)),
        conservative: side,
        json: flag(given, 'json'),
        ...(law === undefined ? {} : { law }),
        ...(out === undefined ? {} : { out: resolve(out) }),
      },
      terminal,
    );
  },
};
