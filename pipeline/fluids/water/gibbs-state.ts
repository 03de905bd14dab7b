/** Specific gas constant of water, J/(kg K): IAPWS R7-97(2012), eq. (1). */
export const R_WATER = 461.526;

/** The dimensionless Gibbs energy and its derivatives by reduced pressure (p) and inverse reduced temperature (t). */
interface Gibbs {
  readonly g: number;
  readonly gp: number;
  readonly gpp: number;
  readonly gt: number;
  readonly gtt: number;
  readonly gpt: number;
}

/** Thermodynamic state, SI: kg/m^3, J/kg, J/(kg K), m/s, 1/K, kg/(m^3 Pa). */
export interface GibbsState {
  readonly density: number;
  readonly enthalpy: number;
  readonly internalEnergy: number;
  readonly entropy: number;
  readonly heatCapacity: number;
  /** At constant volume. */
  readonly heatCapacityVolume: number;
  readonly speedOfSound: number;
  readonly thermalExpansion: number;
  /** d density/d pressure at constant temperature. */
  readonly compression: number;
}

/** Relations of a Gibbs function to the state: IAPWS R7-97(2012), Tables 3 and 12. */
export function gibbsState({ g, gp, gpp, gt, gtt, gpt }: Gibbs, pi: number, tau: number, T: number, p: number, R: number): GibbsState {
  const volume = (pi * gp * R * T) / p;
  const enthalpy = tau * gt * R * T;
  const slope = gp - tau * gpt;
  const cp = -R * tau * tau * gtt;
  return {
    density: 1 / volume,
    enthalpy,
    internalEnergy: enthalpy - p * volume,
    entropy: R * (tau * gt - g),
    heatCapacity: cp,
    heatCapacityVolume: cp + (R * slope * slope) / gpp,
    speedOfSound: Math.sqrt((R * T * gp * gp) / ((slope * slope) / (tau * tau * gtt) - gpp)),
    thermalExpansion: slope / gp / T,
    compression: (-pi * gpp) / gp / p / volume,
  };
}
