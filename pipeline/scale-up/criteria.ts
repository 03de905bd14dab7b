import * as says from '../base/says/scale-up.ts';
import { root } from '../numerics/root.ts';
import type { PlantCase } from '../plan/plant-cases.ts';
import type { PlantPlan } from '../plan/plant-plan.ts';
import { casePrediction, type Speaker } from './case-predictions.ts';
import { evaluateAt } from './condition.ts';
import type { Tried } from './extrapolation.ts';
import type { CriterionRow } from './plant-result.ts';

/** The rig's middle: geometric means over the trials. */
export interface Anchor {
  readonly speed: number;
  readonly impeller: number;
  readonly coefficient: number;
  readonly powerPerVolume: number;
}

/** Speeds of a geometrically similar vessel, N2/N1 = (d1/d2)^x; the liquid is the same. */
const similar: readonly { readonly criterion: string; readonly exponent: number }[] = [
  { criterion: says.equalPower(), exponent: 2 / 3 },
  { criterion: says.equalTip(), exponent: 1 },
  { criterion: says.equalReynolds(), exponent: 2 },
  { criterion: says.equalFroude(), exponent: 1 / 2 },
  { criterion: says.equalSuspension(), exponent: 0.85 },
];

/** N2 for one criterion of similarity: speed 1/s, diameters m. */
export const similarSpeed = (speed: number, from: number, to: number, exponent: number): number => speed * (from / to) ** exponent;

export function anchorOf(tried: readonly Tried[], coefficients: readonly number[]): Anchor {
  const middle = (key: string): number => {
    const found = tried.find((one) => one.key === key);
    return found === undefined ? Number.NaN : found.middle;
  };
  const ln = coefficients.filter((one) => one > 0).map(Math.log);
  return {
    speed: middle('rotation_speed'),
    impeller: middle('impeller_diameter'),
    coefficient: Math.exp(ln.reduce((sum, one) => sum + one, 0) / ln.length),
    powerPerVolume: middle('power_per_volume'),
  };
}

/** Speed, power and coefficient of one plant vessel by each criterion; empty where rig or plant is no vessel with a known impeller and speed. */
export function criteriaOf(
  plan: PlantPlan,
  one: PlantCase,
  anchor: Anchor,
  speaker: Speaker,
  volumetric: boolean,
): readonly CriterionRow[] {
  const place = plan.recipe.inputs.findIndex(({ key }) => key === 'rotation_speed');
  const at = (speed: number) => {
    const inputs = one.inputs.slice();
    inputs[place] = speed;
    return evaluateAt(plan.recipe, inputs, [...speaker.keys, ...(plan.perCoefficient === undefined ? [] : [plan.perCoefficient])]);
  };
  if (place < 0 || !(anchor.speed > 0) || !(anchor.impeller > 0)) return [];
  const impeller = at(anchor.speed).value('impeller_diameter');
  if (!(impeller > 0)) return [];
  const row = (criterion: string, speed: number): CriterionRow => {
    const here = at(speed);
    const { row: found } = casePrediction(speaker, here);
    return {
      criterion,
      rotationSpeed: speed,
      power: here.value('power'),
      powerPerVolume: here.value('power_per_volume'),
      tipSpeed: here.value('tip_speed'),
      coefficient: found.coefficient,
      lower: found.lower,
      upper: found.upper,
    };
  };
  const rows = similar.map(({ criterion, exponent }) => row(criterion, similarSpeed(anchor.speed, anchor.impeller, impeller, exponent)));
  const equal = root(
    (lnSpeed) => Math.log(speaker.predict(at(Math.exp(lnSpeed))).value / anchor.coefficient),
    Math.log(anchor.speed * 1e-3),
    Math.log(anchor.speed * 1e3),
  );
  return [
    ...rows,
    ...(Number.isFinite(equal) ? [row(volumetric ? says.equalVolumetric() : says.equalCoefficient(), Math.exp(equal))] : []),
  ];
}
