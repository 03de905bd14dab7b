import { billetSchultes1999Pall25 } from './billet-schultes-1999-pall-25.ts';
import { billetSchultes1999Pall50 } from './billet-schultes-1999-pall-50.ts';
import { billetSchultes1999Raschig25 } from './billet-schultes-1999-raschig-25.ts';
import { onda1968Gas } from './onda-1968-gas.ts';
import { onda1968GasSmall } from './onda-1968-gas-small.ts';
import { onda1968LiquidCeramic } from './onda-1968-liquid-ceramic.ts';
import { onda1968LiquidPlastic } from './onda-1968-liquid-plastic.ts';
import { onda1968LiquidSteel } from './onda-1968-liquid-steel.ts';
import { shulman1955Gas } from './shulman-1955-gas.ts';

export const packedColumn = [
  billetSchultes1999Pall25,
  billetSchultes1999Pall50,
  billetSchultes1999Raschig25,
  onda1968Gas,
  onda1968GasSmall,
  onda1968LiquidCeramic,
  onda1968LiquidPlastic,
  onda1968LiquidSteel,
  shulman1955Gas,
];
