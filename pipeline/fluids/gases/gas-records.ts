import type { Gas } from './gas.ts';

/**
 * Heat capacities: McBride, Zehe, Gordon 2002, NASA/TP-2002-211556 (200 to 1000 K). Transport: Svehla 1995, NASA TM-4647 (200 to 1000 K).
 * Critical constants: Lemmon, Span and others' reference equations; hydrogen and helium with the effective constants of Prausnitz (from memory).
 * The sources state no accuracy for these fits: the shares are the root-mean-square distance to the reference equations of each gas, rounded up
 * (the table stands in test/fluids/fixtures/gas-states.csv).
 */
export const nitrogen: Gas = {
  name: 'nitrogen',
  title: 'nitrogen',
  molarMass: 0.0280134,
  critical: { T: 126.192, p: 3.3958e6, acentric: 0.0372 },
  heatCapacity: [2.210371497e4, -3.81846182e2, 6.08273836, -8.53091441e-3, 1.384646189e-5, -9.62579362e-9, 2.519705809e-12],
  viscosity: [0.62526577, -31.779652, -1640.7983, 1.7454992],
  conductivity: [0.85439436, 105.73224, -12347.848, 0.47793128],
  from: 200,
  to: 1000,
  shares: { viscosity: 0.005, conductivity: 0.015, heatCapacity: 0.001 },
};

export const oxygen: Gas = {
  name: 'oxygen',
  title: 'oxygen',
  molarMass: 0.0319988,
  critical: { T: 154.581, p: 5.043e6, acentric: 0.0222 },
  heatCapacity: [-3.42556342e4, 4.84700097e2, 1.119010961, 4.29388924e-3, -6.83630052e-7, -2.0233727e-9, 1.039040018e-12],
  viscosity: [0.6091618, -52.244847, -599.74009, 2.0410801],
  conductivity: [0.77229167, 6.846321, -5893.3377, 1.2210365],
  from: 200,
  to: 1000,
  shares: { viscosity: 0.005, conductivity: 0.013, heatCapacity: 0.001 },
};

export const carbonDioxide: Gas = {
  name: 'carbon-dioxide',
  title: 'carbon dioxide',
  molarMass: 0.0440098,
  critical: { T: 304.1282, p: 7.3773e6, acentric: 0.2239 },
  heatCapacity: [4.94365054e4, -6.26411601e2, 5.30172524, 2.503813816e-3, -2.127308728e-7, -7.68998878e-10, 2.849677801e-13],
  viscosity: [0.51137258, -229.51321, 13710.678, 2.7075538],
  conductivity: [0.48056568, -507.8672, 35088.811, 3.6747794],
  // Below 255 K the saturation pressure comes within the pressures that these equations allow.
  from: 255,
  to: 1000,
  shares: { viscosity: 0.005, conductivity: 0.025, heatCapacity: 0.0015 },
};

export const hydrogen: Gas = {
  name: 'hydrogen',
  title: 'hydrogen',
  molarMass: 0.00201588,
  critical: { T: 43.6, p: 2.05e6, acentric: 0 },
  heatCapacity: [4.07832321e4, -8.00918604e2, 8.21470201, -1.269714457e-2, 1.753605076e-5, -1.20286027e-8, 3.36809349e-12],
  viscosity: [0.74553182, 43.555109, -3257.934, 0.13556243],
  conductivity: [1.0059461, 279.51262, -29792.018, 1.1996252],
  from: 200,
  to: 1000,
  shares: { viscosity: 0.01, conductivity: 0.02, heatCapacity: 0.003 },
};

export const helium: Gas = {
  name: 'helium',
  title: 'helium',
  molarMass: 0.0040026,
  critical: { T: 10.47, p: 6.76e5, acentric: 0 },
  heatCapacity: [0, 0, 2.5, 0, 0, 0, 0],
  viscosity: [0.75015944, 35.763243, -2212.1291, 0.92126352],
  conductivity: [0.75007833, 36.577987, -2363.66, 2.9766475],
  from: 200,
  to: 1000,
  shares: { viscosity: 0.003, conductivity: 0.008, heatCapacity: 0.0005 },
};

export const argon: Gas = {
  name: 'argon',
  title: 'argon',
  molarMass: 0.039948,
  critical: { T: 150.687, p: 4.863e6, acentric: -0.0022 },
  heatCapacity: [0, 0, 2.5, 0, 0, 0, 0],
  viscosity: [0.61205763, -67.714354, 190.4066, 2.1588272],
  conductivity: [0.60968928, -70.892249, 584.20624, 1.9337152],
  from: 200,
  to: 1000,
  shares: { viscosity: 0.005, conductivity: 0.012, heatCapacity: 0.001 },
};
