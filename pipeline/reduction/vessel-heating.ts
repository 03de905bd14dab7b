import { says } from '../base/says/reduction.ts';
import { root } from '../numerics/root.ts';
import type { Check, Key, Rule } from '../rules/rule.ts';
import { wellKnown } from './checks.ts';
import { where } from './defaults.ts';
import { logMean } from './log-mean.ts';
import type { Need, Route, Settings } from './route.ts';
import { settingOf } from './route.ts';
import { rateAt, rateKeys, relaxation } from './series/relaxation.ts';

const flowing = (settings: Settings): boolean => settingOf(vesselHeating, settings, 'jacket') === 'flowing';

/** Heat to contents and equipment is G (T_j - T) - G_l (T - T_a) - Q_l, T from start to end in t. Solved for the conductance G, W/K. */
function conductance(
  capacity: number,
  start: number,
  end: number,
  jacket: number,
  t: number,
  loss: number,
  perKelvin: number,
  ambient: number,
): number {
  // towards T_inf = (G T_j + G_l T_a - Q_l)/(G + G_l) at rate (G + G_l)/C
  const rate = (G: number): number => (G + perKelvin) / capacity;
  const final = (G: number): number => (G * jacket + perKelvin * ambient - loss) / (G + perKelvin);
  const plain = (capacity / t) * Math.log((jacket - start) / (jacket - end));
  if (!(plain > 0)) return Number.NaN;
  if (loss === 0 && perKelvin === 0) return plain;
  // what the contents lack at the end of t, relative to the way to go
  const lack = (G: number): number => final(G) + (start - final(G)) * Math.exp(-rate(G) * t) - end;
  const sign = Math.sign(end - start);
  return Math.exp(root((x) => sign * lack(Math.exp(x)), Math.log(plain) - 12, Math.log(plain) + 8));
}

/** Conductance G from the rate of a logged curve as a function of the temperature it approaches. */
function conductanceOfCurve(
  rateTo: (T: number) => number,
  jacket: number,
  capacity: number,
  loss: number,
  perKelvin: number,
  ambient: number,
): number {
  const plain = rateTo(jacket) * capacity - perKelvin;
  if (!(plain > 0)) return Number.NaN;
  if (loss === 0 && perKelvin === 0) return plain;
  const final = (G: number): number => (G * jacket + perKelvin * ambient - loss) / (G + perKelvin);
  return root((G) => rateTo(final(G)) * capacity - perKelvin - G, plain / 3, plain * 3);
}

const source = 'definition';
const losing: readonly Key[] = ['total_heat_capacity', 'heat_loss', 'loss_conductance', 'ambient_temperature'];

const capacityRules: readonly Rule[] = [
  where('equipment_heat_capacity', 0, says.noEquipmentHeat),
  {
    gives: 'total_heat_capacity',
    from: ['liquid_volume', 'density', 'heat_capacity', 'equipment_heat_capacity'],
    of: (v, rho, c, equipment) => v! * rho! * c! + equipment!,
    formula: 'C = V rho c_p + C_e',
    source,
  },
];

const lossRules: readonly Rule[] = [
  where('heat_loss', 0, says.noConstantLoss),
  where('loss_conductance', 0, says.noLossConductance),
  {
    gives: 'ambient_temperature',
    from: ['loss_conductance'],
    of: (g) => (g === 0 ? 0 : Number.NaN),
    formula: 'not needed without loss_conductance',
    source: 'not given',
    checks: [
      {
        code: 'ambient-missing',
        from: ['loss_conductance'],
        holds: (g) => g === 0,
        otherwise: 'refuse',
        says: () => says.ambientMissing,
      },
    ],
  },
];

const approaches: Check = {
  code: 'beyond-jacket',
  from: ['initial_temperature', 'final_temperature', 'jacket_temperature'],
  holds: (a, b, jacket) => (jacket! - a!) * (jacket! - b!) > 0 && Math.abs(jacket! - b!) < Math.abs(jacket! - a!),
  otherwise: 'refuse',
  says: (a, b, jacket) => says.beyondJacket(a!, b!, jacket!),
};

const timeMean: readonly Rule[] = [
  {
    gives: 'temperature',
    from: ['curve_start', 'curve_end', 'jacket_temperature'],
    of: (a, b, jacket) => jacket! - logMean(jacket! - a!, jacket! - b!),
    formula: 'T = T_j - dT_lm of T_j - T_0 and T_j - T_1',
    source,
    assumes: says.timeMean,
  },
  {
    gives: 'temperature',
    from: ['initial_temperature', 'final_temperature', 'jacket_temperature'],
    of: (a, b, jacket) => jacket! - logMean(jacket! - a!, jacket! - b!),
    formula: 'T = T_j - dT_lm of T_j - T_0 and T_j - T_1',
    source,
    assumes: says.timeMean,
  },
];

/** Conductance between jacket (as it enters) and contents: by the rate of a logged curve, or by two temperatures. */
const effective: readonly Rule[] = [
  {
    gives: 'effective_conductance',
    from: [...rateKeys, 'jacket_temperature', ...losing],
    of: (rate, slope, curvature, fitted, jacket, capacity, loss, perKelvin, ambient) =>
      conductanceOfCurve((T) => rateAt(rate!, slope!, curvature!, fitted!, T), jacket!, capacity!, loss!, perKelvin!, ambient!),
    formula: 'G = rate C - loss_conductance, rate of the approach to (G T_j + loss_conductance T_amb - heat_loss)/(G + loss_conductance)',
    source,
    checks: [wellKnown('curve_rate', 'the rate of the curve', ' 1/s')],
  },
  {
    gives: 'effective_conductance',
    from: [
      'total_heat_capacity',
      'initial_temperature',
      'final_temperature',
      'jacket_temperature',
      'time',
      'heat_loss',
      'loss_conductance',
      'ambient_temperature',
    ],
    of: (capacity, a, b, jacket, t, loss, perKelvin, ambient) => conductance(capacity!, a!, b!, jacket!, t!, loss!, perKelvin!, ambient!),
    formula:
      'C dT/dt = G (T_j - T) - heat_loss - loss_conductance (T - T_amb), solved for G; without loss G = C/t ln((T_j - T_0)/(T_j - T_1))',
    source,
    checks: [approaches],
  },
];

/** A jacket stream of given flow gives up only 1 - exp(-UA/(m c)) of what it could. */
const spent = (G: number, flow: number, c: number): number => G / (flow * c);

const stillWarm: Check = {
  code: 'jacket-spent',
  from: ['effective_conductance', 'mass_flow_other', 'heat_capacity_other'],
  holds: (G, flow, c) => spent(G!, flow!, c!) <= 0.8,
  otherwise: 'warning',
  says: (G, flow, c) => says.jacketSpent(spent(G!, flow!, c!)),
};

const notOverspent: Check = {
  ...stillWarm,
  code: 'jacket-overspent',
  holds: (G, flow, c) => spent(G!, flow!, c!) < 1,
  otherwise: 'refuse',
};

function jacketRules(settings: Settings): readonly Rule[] {
  if (!flowing(settings))
    return [
      { gives: 'jacket_temperature', from: ['temperature_other'], of: (t) => t!, formula: 'T_j = temperature_other', source },
      { gives: 'heat_conductance', from: ['effective_conductance'], of: (G) => G!, formula: 'UA = G', source },
    ];
  return [
    { gives: 'jacket_temperature', from: ['inlet_temperature_other'], of: (t) => t!, formula: 'T_j = inlet_temperature_other', source },
    {
      gives: 'heat_conductance',
      from: ['effective_conductance', 'mass_flow_other', 'heat_capacity_other'],
      of: (G, flow, c) => -flow! * c! * Math.log1p(-G! / (flow! * c!)),
      formula: 'UA = -m c ln(1 - G/(m c))',
      source,
      checks: [notOverspent, stillWarm],
    },
  ];
}

const needs = (settings: Settings): readonly Need[] => [
  { key: 'initial_temperature', says: 'of the contents; not needed with a logged curve' },
  { key: 'final_temperature', says: 'of the contents; not needed with a logged curve' },
  { key: 'time', says: 'between the two; not needed with a logged curve' },
  ...(flowing(settings)
    ? [
        { key: 'inlet_temperature_other', says: 'of the jacket stream' },
        { key: 'mass_flow_other', says: 'of the jacket stream' },
        { key: 'heat_capacity_other', says: 'of the jacket stream' },
      ]
    : [{ key: 'temperature_other', says: 'of the jacket; or inlet_temperature_other and outlet_temperature_other' }]),
  { key: 'liquid_volume', says: 'of the contents' },
  { key: 'density', says: 'of the contents' },
  { key: 'heat_capacity', says: 'of the contents' },
  { key: 'area', says: 'of the jacket or coil' },
  { key: 'equipment_heat_capacity', says: 'that warms with the contents', without: 'none' },
  { key: 'heat_loss', says: 'constant', without: 'none' },
  { key: 'loss_conductance', says: 'with ambient_temperature', without: 'none' },
];

/** Contents of a stirred vessel that warm up or cool down by a jacket or coil. */
export const vesselHeating: Route = {
  name: 'vessel-heating',
  transfer: 'heat',
  title: 'Warming or cooling of stirred contents by a jacket',
  formula: 'UA = (V rho c_p + C_e)/t ln((T_j - T_0)/(T_j - T_1)); flowing jacket: UA_eff = m c (1 - exp(-UA/(m c)))',
  source: 'definition',
  settings: {
    jacket: {
      says: 'at one temperature (steam, boiling, strong circulation), or a stream of given flow and inlet temperature',
      allowed: ['isothermal', 'flowing'],
      default: 'isothermal',
    },
  },
  result: () => 'U',
  gives: () => 'overall_coefficient',
  needs,
  rules: (settings) => [
    ...jacketRules(settings),
    ...capacityRules,
    ...lossRules,
    ...timeMean,
    ...effective,
    {
      gives: 'overall_coefficient',
      from: ['heat_conductance', 'area'],
      of: (UA, area) => UA! / area!,
      formula: 'U = UA/A',
      source,
    },
  ],
  series: (settings) =>
    flowing(settings)
      ? relaxation(['inlet_temperature_other'])
      : relaxation(['temperature_other'], ['inlet_temperature_other', 'outlet_temperature_other']),
  ledger: ['effective_conductance', 'heat_conductance', 'total_heat_capacity'],
  numbers: {
    effective_conductance: { unit: 'W/K', symbol: 'G', says: 'heat per kelvin between entering jacket and contents' },
    heat_conductance: { unit: 'W/K', symbol: 'UA', says: 'overall coefficient times area' },
    total_heat_capacity: { unit: 'J/K', symbol: 'C', says: 'heat capacity of contents and equipment' },
    jacket_temperature: { unit: 'K', symbol: 'T_j', says: 'temperature of the jacket, or of what enters it' },
  },
  caution:
    'Contents well mixed, properties and coefficient constant over the run, no heat of reaction or stirring unless in heat_loss (negative). A jacket that warms up first makes the start read low.',
};
