/**
 * Polynomials of Melinder 2010, Properties of Secondary Working Fluids for Indirect Systems, International Institute of Refrigeration:
 * sum over rows of c (100 w - wm)^i (t - tm)^j, w the mass fraction of the solute, t in degC.
 */
export interface SecondaryLiquid {
  readonly wm: number;
  readonly tm: number;
  /** [i, j, freezing point degC, density kg/m^3, heat capacity J/(kg K), conductivity W/(m K), ln of viscosity in mPa s] */
  readonly rows: readonly (readonly [number, number, number, number, number, number, number])[];
}

/** Water with ethylene glycol, freezing point to 100 degC, mass fractions 0 to 0.6. */
export const ethyleneGlycol: SecondaryLiquid = {
  wm: 30.8462,
  tm: 31.728,
  rows: [
    [0, 0, -15.25, 1034, 3737, 0.472, 0.4705],
    [0, 1, -1.566e-6, -0.4781, 2.93, 0.0008903, -0.0255],
    [0, 2, -2.278e-7, -0.002692, -0.004675, -1.058e-6, 0.0001782],
    [0, 3, 2.169e-9, 4.725e-6, -1.389e-5, -2.789e-9, -7.669e-7],
    [1, 0, -0.808, 1.311, -17.99, -0.004286, 0.02471],
    [1, 1, -1.339e-6, -0.006876, 0.1046, -1.473e-5, -0.0001171],
    [1, 2, 2.047e-8, 4.805e-5, -0.0004147, 1.059e-7, 1.052e-6],
    [1, 3, -2.717e-11, 1.69e-8, 1.847e-7, -1.142e-10, -1.634e-8],
    [2, 0, -0.01334, 7.49e-5, -0.09933, 1.747e-5, 3.328e-6],
    [2, 1, 6.322e-8, 7.855e-5, 0.0003516, 6.814e-8, 1.086e-6],
    [2, 2, 2.373e-10, -3.995e-7, 5.109e-6, -3.612e-9, 1.051e-8],
    [2, 3, -2.183e-12, 4.982e-9, -7.138e-8, 2.365e-12, -6.475e-10],
    [3, 0, -7.293e-5, -0.0001062, 0.00261, 3.017e-8, 1.659e-6],
    [3, 1, 1.764e-9, 1.229e-6, -1.189e-6, -2.412e-9, 3.157e-9],
    [3, 2, -2.442e-11, -1.153e-8, -1.643e-7, 4.004e-11, 4.063e-10],
    [4, 0, 1.006e-6, -9.623e-7, 1.537e-5, -1.322e-9, 3.089e-8],
    [4, 1, -7.662e-11, -7.211e-8, -4.272e-7, 2.555e-11, 1.831e-10],
    [5, 0, 1.14e-9, 4.891e-8, -1.618e-6, 2.678e-11, -1.865e-9],
  ],
};

/** Water with glycerol, freezing point to 40 degC, mass fractions 0 to 0.6. */
export const glycerol: SecondaryLiquid = {
  wm: 36.1905,
  tm: 8.911,
  rows: [
    [0, 0, -13, 1093, 3486, 0.4532, 1.52],
    [0, 1, -0.0008638, -0.3624, 3.766, 0.0009782, -0.03729],
    [0, 2, 6.895e-6, -0.002451, -0.0001222, -1.196e-7, 0.0003572],
    [0, 3, 5.229e-7, 1.547e-5, 3.219e-5, -8.778e-9, -3.648e-6],
    [1, 0, -0.5742, 2.74, -22.5, -0.003223, 0.0445],
    [1, 1, -7.991e-6, -0.008373, 0.1811, -1.951e-5, -0.0002688],
    [1, 2, -7.515e-7, 9.596e-5, 0.0003766, 1.178e-7, 8.876e-7],
    [1, 3, 1.71e-8, -6.999e-7, -1.73e-5, 1.048e-10, -2.209e-8],
    [2, 0, -0.009119, 0.004081, -0.03258, 5.539e-6, 0.0003633],
    [2, 1, 2.973e-6, 1.808e-5, 0.0007249, -6.878e-8, -4.088e-6],
    [2, 2, 2.379e-9, -8.516e-7, -2.133e-5, -2.587e-9, 6.219e-8],
    [2, 3, -1.237e-9, 1.441e-8, 4.907e-7, 2.262e-11, 6.331e-10],
    [3, 0, -0.0001641, -4.744e-5, 0.002922, -2.073e-7, 1.069e-6],
    [3, 1, -5.313e-9, 1.833e-6, -5.346e-5, -2.235e-10, -1.248e-7],
    [3, 2, 4.546e-10, -3.077e-8, 2.3e-7, -1.421e-11, 3.019e-9],
    [4, 0, -2.408e-6, -1.415e-6, 2.238e-5, 3e-9, 5.729e-8],
    [4, 1, -1.682e-9, 1.863e-8, -5.383e-7, 1.604e-10, -1.78e-9],
    [5, 0, -7.734e-9, -6.097e-9, -5.944e-7, 2.221e-10, 2.116e-9],
  ],
};

const COLUMN = { freezing: 2, density: 3, heatCapacity: 4, conductivity: 5, lnViscosity: 6 } as const;

/** Value of one polynomial at a temperature in K. */
export function secondary({ wm, tm, rows }: SecondaryLiquid, of: keyof typeof COLUMN, T: number, w: number): number {
  const x = 100 * w - wm;
  const y = T - 273.15 - tm;
  return rows.reduce((sum, row) => sum + row[COLUMN[of]] * x ** row[0] * y ** row[1], 0);
}

/** Its derivative by temperature. */
export function secondarySlope({ wm, tm, rows }: SecondaryLiquid, of: keyof typeof COLUMN, T: number, w: number): number {
  const x = 100 * w - wm;
  const y = T - 273.15 - tm;
  return rows.reduce((sum, row) => (row[1] === 0 ? sum : sum + row[COLUMN[of]] * row[1] * x ** row[0] * y ** (row[1] - 1)), 0);
}

/** Freezing point in K at a mass fraction. */
export const freezingPoint = (liquid: SecondaryLiquid, w: number): number => 273.15 + secondary(liquid, 'freezing', 273.15 + liquid.tm, w);
