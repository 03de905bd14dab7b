import type { Dimension } from '../quantities/dimension.ts';
import type { Input, Key, Recipe } from '../rules/rule.ts';
import type { Study } from '../study/study.ts';
import type { Table } from '../trials/table.ts';
import type { Formula } from './formula-rules.ts';
import type { QuantityPlan } from './quantity-plan.ts';

/**
 * What a plant case takes over from the study, as plain data: fluid models, definitions, and the fluid's properties where the study states them as
 * constants. Nothing of the rig's geometry or of its running conditions. `laws.json` carries it, so that `predict` needs no study.
 */
export interface PlantBasis {
  readonly transfer: Study['transfer'];
  readonly equipment: string;
  readonly fluid?: Study['fluid'];
  /** Property tables by file. */
  readonly tables: Readonly<Record<string, Table>>;
  readonly formulas: readonly Formula[];
  /** Groups of the study's own: by formula, or as a column. */
  readonly groups: Study['groups'];
  /** Constants that hold for the plant too; their systematic sources are the study's own. */
  readonly inherited: readonly Input[];
  /** Systematic uncertainty of each property the study states, constant or column: a plant's own value of it comes from the same hand. */
  readonly sources: Readonly<Record<Key, NonNullable<Input['systematic']>>>;
  /** Every quantity that the study states: a plant that lacks one of them is told so by its name. */
  readonly stated: readonly Key[];
  /** Constants of the study that do not. */
  readonly rigOnly: readonly Key[];
  /** Of every name of the study's own. */
  readonly dimensions: Readonly<Record<string, Dimension>>;
  /** Characteristic length -> the quantity that held it on the rig: the plant's is taken from the same. */
  readonly lengths: Readonly<Record<Key, Key>>;
  /** Text quantities of the rig such as impeller_type, for the reader to compare. */
  readonly texts: Readonly<Record<string, string>>;
}

/** Properties belong to the fluid or the solid, which the plant shares with the rig. */
const shared: ReadonlySet<string> = new Set([
  'density',
  'viscosity',
  'kinematic_viscosity',
  'thermal_conductivity',
  'heat_capacity',
  'diffusivity',
  'solute_molar_volume',
  'solvent_molar_mass',
  'association_factor',
  'solute_radius',
  'carrier_molar_mass',
  'diffusion_volume',
  'carrier_diffusion_volume',
  'thermal_expansion',
  'surface_tension',
  'latent_heat',
  'flow_index',
  'consistency',
  'shear_constant',
  'molar_mass',
  'partition_coefficient',
  'solid_density',
  'solid_heat_capacity',
  'solid_conductivity',
  'permeability',
]);

export const isLength = (key: Key): boolean => key.startsWith('characteristic_length@');

const isShared = (key: Key): boolean => shared.has(key.replace(/_other$/u, ''));

export function plantBasis(study: Study, quantities: QuantityPlan, tables: ReadonlyMap<string, Table>, { steps }: Recipe): PlantBasis {
  const constants = quantities.inputs.filter((input) => input.constant !== undefined);
  const own = Object.entries(study.groups).filter(([, { is }]) => is.formula !== undefined || is.column !== undefined);
  return {
    transfer: study.transfer,
    equipment: study.equipment.is,
    ...(study.fluid === undefined ? {} : { fluid: study.fluid }),
    tables: Object.fromEntries(tables),
    formulas: quantities.formulas,
    groups: Object.fromEntries(own),
    inherited: constants.filter(({ key }) => isShared(key)),
    sources: Object.fromEntries(
      quantities.inputs.flatMap(({ key, systematic }) => (systematic !== undefined && isShared(key) ? [[key, systematic]] : [])),
    ),
    stated: quantities.inputs.map(({ key }) => key),
    rigOnly: constants.filter(({ key }) => !isShared(key)).map(({ key }) => key),
    dimensions: Object.fromEntries(quantities.dimensions),
    lengths: Object.fromEntries(steps.flatMap(({ rule }) => (isLength(rule.gives) ? [[rule.gives, rule.from[0]!]] : []))),
    texts: quantities.texts,
  };
}
