import type { Route, RouteContext, Settings } from './route.ts';
import { plainContext, settingOf } from './route.ts';

const results = {
  h: 'heat_transfer_coefficient',
  U: 'overall_coefficient',
  k: 'mass_transfer_coefficient',
  kLa: 'volumetric_coefficient',
} as const;

const resultOf = (settings: Settings, { transfer }: RouteContext = plainContext): keyof typeof results => {
  const result = settingOf(measured, settings, 'result') as keyof typeof results | '';
  return result === '' ? (transfer === 'heat' ? 'h' : 'k') : result;
};

/** The coefficient is in the table already. */
export const measured: Route = {
  name: 'measured',
  transfer: 'either',
  title: 'Coefficient as given',
  formula: 'h or k as given',
  source: 'definition',
  settings: {
    result: { says: 'which coefficient is given: h or U, k or kLa; h and k where nothing is said', allowed: ['h', 'U', 'k', 'kLa'] },
  },
  result: resultOf,
  gives: (settings, context) => results[resultOf(settings, context)],
  needs: (settings) => [{ key: results[resultOf(settings)], says: 'the coefficient' }],
  rules: () => [],
  ledger: [],
  numbers: {},
  caution: 'Nothing is known here of how the coefficient was had; its uncertainty must be stated with it.',
};
