import { type Dimension, dimensionless } from './dimension.ts';
import { isFault } from './fault.ts';
import { parseUnit } from './unit.ts';

/** A physical quantity that the program knows by name. */
export interface Quantity {
  readonly name: string;
  /** SI unit; empty for a text. */
  readonly unit: string;
  readonly dimension: Dimension;
  /** The other SI unit it may have instead: concentrations and rates by amount of substance. */
  readonly molar?: { readonly unit: string; readonly dimension: Dimension };
  /** ISO 80000-3 to -9 where it has one; `_` starts a subscript, `^` a superscript. */
  readonly symbol: string;
  readonly says: string;
  readonly kind: Kind;
  /** Counted in revolutions: rad/s is divided by 2 pi. */
  readonly revolutions: boolean;
  /** Units in which a reader likes to see it. */
  readonly friendly: readonly string[];
}

type Kind = 'temperature' | 'temperature difference' | 'plain' | 'text';

interface Extra {
  readonly kind?: Kind;
  readonly molar?: string;
  readonly revolutions?: boolean;
  readonly friendly?: readonly string[];
}

const dimensionOf = (unit: string): Dimension => {
  const parsed = parseUnit(unit);
  if (isFault(parsed)) throw new Error(parsed.text);
  return parsed.dimension;
};

function quantity(name: string, unit: string, symbol: string, says: string, extra: Extra = {}): Quantity {
  const kind = extra.kind ?? 'plain';
  return {
    name,
    unit,
    dimension: kind === 'text' ? dimensionless : dimensionOf(unit),
    ...(extra.molar === undefined ? {} : { molar: { unit: extra.molar, dimension: dimensionOf(extra.molar) } }),
    symbol,
    says,
    kind,
    revolutions: extra.revolutions ?? false,
    friendly: extra.friendly ?? [],
  };
}

const temperature = (name: string, symbol: string, says: string): Quantity =>
  quantity(name, 'K', symbol, says, { kind: 'temperature', friendly: ['degC'] });
const concentration = (name: string, symbol: string, says: string): Quantity =>
  quantity(name, 'kg/m^3', symbol, says, { molar: 'mol/m^3', friendly: ['g/L', 'mol/m^3'] });
const size = (name: string, symbol: string, says: string): Quantity => quantity(name, 'm', symbol, says, { friendly: ['m', 'mm', 'um'] });
const speed = (name: string, symbol: string, says: string): Quantity => quantity(name, 'm/s', symbol, says);
const number = (name: string, symbol: string, says: string): Quantity => quantity(name, '1', symbol, says);
const pressure = (name: string, symbol: string, says: string): Quantity =>
  quantity(name, 'Pa', symbol, says, { friendly: ['bar', 'mbar', 'Pa'] });
const mass = (name: string, symbol: string, says: string): Quantity => quantity(name, 'kg', symbol, says, { friendly: ['kg', 'g', 'mg'] });
const text = (name: string, says: string): Quantity => quantity(name, '', '', says, { kind: 'text' });
const coefficient = (name: string, symbol: string, says: string): Quantity => quantity(name, 'W/(m^2 K)', symbol, says);

const list: readonly Quantity[] = [
  // general
  temperature('temperature', 'T', 'temperature of the fluid (bulk)'),
  temperature('film_temperature', 'T_f', 'mean of bulk and wall temperature'),
  temperature('wall_temperature', 'T_w', 'temperature of the wall or surface'),
  temperature('ambient_temperature', 'T_amb', 'temperature of the surroundings'),
  temperature('inlet_temperature', 'T_in', 'temperature at the inlet'),
  temperature('outlet_temperature', 'T_out', 'temperature at the outlet'),
  pressure('pressure', 'p', 'absolute pressure'),
  pressure('ambient_pressure', 'p_amb', 'absolute pressure of the surroundings'),
  quantity('time', 's', 't', 'duration of the run', { friendly: ['s', 'min', 'h'] }),
  quantity('time_since_cleaning', 's', 't_c', 'running time since the surface was cleaned', { friendly: ['h', 'd'] }),
  quantity('area', 'm^2', 'A', 'area of transfer', { friendly: ['m^2', 'cm^2', 'mm^2'] }),
  number('mass_fraction', 'w', 'mass fraction of the dissolved or mixed component'),
  number('relative_humidity', 'φ', 'relative humidity'),
  // fluid
  quantity('density', 'kg/m^3', 'ρ', 'density of the fluid'),
  quantity('viscosity', 'Pa s', 'μ', 'dynamic viscosity of the fluid', { friendly: ['mPa s', 'Pa s'] }),
  quantity('wall_viscosity', 'Pa s', 'μ_w', 'dynamic viscosity at wall temperature', { friendly: ['mPa s', 'Pa s'] }),
  quantity('kinematic_viscosity', 'm^2/s', 'ν', 'kinematic viscosity of the fluid', { friendly: ['mm^2/s'] }),
  quantity('thermal_conductivity', 'W/(m K)', 'λ', 'thermal conductivity of the fluid'),
  quantity('heat_capacity', 'J/(kg K)', 'c_p', 'specific heat capacity of the fluid', { friendly: ['kJ/(kg K)'] }),
  quantity('diffusivity', 'm^2/s', 'D', 'diffusion coefficient in the fluid'),
  quantity('thermal_expansion', '1/K', 'α_V', 'cubic expansion coefficient'),
  quantity('surface_tension', 'N/m', 'σ', 'surface tension', { friendly: ['mN/m'] }),
  quantity('latent_heat', 'J/kg', 'r', 'specific latent heat', { friendly: ['kJ/kg'] }),
  number('flow_index', 'm', 'flow index of a power-law liquid'),
  quantity('consistency', 'Pa s', 'K', 'consistency of a power-law liquid: its viscosity at 1 1/s'),
  number('shear_constant', 'k_s', 'mean shear rate over rotation speed'),
  // for estimates of the diffusivity
  quantity('solute_molar_volume', 'm^3/mol', 'V_A', 'molar volume of the solute at its normal boiling point', { friendly: ['cm^3/mol'] }),
  quantity('solvent_molar_mass', 'kg/mol', 'M_B', 'molar mass of the solvent', { friendly: ['g/mol'] }),
  number(
    'association_factor',
    'φ_B',
    'association factor of the solvent: 2.6 water, 1.9 methanol, 1.5 ethanol, 1 others (Wilke and Chang 1955)',
  ),
  size('solute_radius', 'r_A', 'radius of the solute in the liquid'),
  quantity('carrier_molar_mass', 'kg/mol', 'M_C', 'molar mass of the gas that the solute moves in', { friendly: ['g/mol'] }),
  number('diffusion_volume', 'Σv_A', 'sum of diffusion volumes of the solute, cm^3/mol (Fuller, Schettler and Giddings 1966)'),
  number('carrier_diffusion_volume', 'Σv_C', 'sum of diffusion volumes of the gas that the solute moves in, cm^3/mol'),
  // flow
  speed('velocity', 'v', 'velocity (superficial in beds, largest in tube banks)'),
  quantity('volume_flow', 'm^3/s', 'q_V', 'volume flow rate', { friendly: ['L/min', 'm^3/h', 'mL/min'] }),
  quantity('mass_flow', 'kg/s', 'q_m', 'mass flow rate', { friendly: ['kg/h', 'kg/s'] }),
  speed('gas_velocity', 'v_g', 'superficial gas velocity'),
  quantity('film_flow_per_width', 'kg/(m s)', 'Γ', 'mass flow of a falling film per width'),
  // geometry
  size('diameter', 'd', 'diameter (bore, sphere, cylinder, channel)'),
  size('outer_diameter', 'd_o', 'outer diameter'),
  size('particle_diameter', 'd_p', 'particle diameter'),
  size('bubble_diameter', 'd_b', 'bubble diameter'),
  size('length', 'l', 'length'),
  size('depth', 'H', 'depth'),
  size('hydraulic_diameter', 'd_h', 'hydraulic diameter'),
  size('impeller_diameter', 'd_i', 'impeller diameter'),
  size('vessel_diameter', 'D_v', 'inner diameter of the vessel'),
  quantity('liquid_volume', 'm^3', 'V', 'volume of the liquid', { friendly: ['m^3', 'L', 'mL'] }),
  quantity('cross_section', 'm^2', 'S', 'cross section of the flow', { friendly: ['m^2', 'cm^2', 'mm^2'] }),
  number('voidage', 'ε', 'void fraction of a bed'),
  number('gas_holdup', 'ε_g', 'volume fraction of gas'),
  quantity('specific_area', '1/m', 'a', 'surface of packing per volume of bed'),
  quantity('interfacial_area', '1/m', 'a_i', 'interface per volume of clear liquid'),
  size('wall_thickness', 's', 'thickness of the wall or layer'),
  size('gap', 'δ', 'width of the gap'),
  size('coil_diameter', 'D_c', 'mean diameter of curvature of a coil'),
  size('transverse_pitch', 's_T', 'pitch of a tube bank across the flow'),
  size('longitudinal_pitch', 's_L', 'pitch of a tube bank along the flow'),
  size('nozzle_distance', 'H_n', 'distance from the nozzle to the plate'),
  size('target_radius', 'r_t', 'radius of the disk around the axis of a jet'),
  number('particle_count', 'N_p', 'number of particles'),
  number('sphericity', 'ψ', 'sphericity'),
  // agitation
  quantity('rotation_speed', '1/s', 'n', 'rotational frequency, in revolutions', { revolutions: true, friendly: ['rpm'] }),
  speed('tip_speed', 'u_tip', 'speed of the impeller tip'),
  quantity('just_suspended_speed', '1/s', 'n_js', 'rotational frequency at which no solid rests on the bottom longer than 1 s to 2 s', {
    revolutions: true,
    friendly: ['rpm'],
  }),
  number('suspension_constant', 'S_Z', 'constant of impeller and vessel in the just-suspended speed'),
  number('solids_loading', 'X', 'mass of solids per mass of liquid'),
  quantity('power', 'W', 'P', 'shaft power, net, as gassed', { friendly: ['W', 'kW'] }),
  quantity('power_ungassed', 'W', 'P_0', 'shaft power without gas', { friendly: ['W', 'kW'] }),
  number('power_number', 'N_P', 'power number of the impeller'),
  quantity('power_per_mass', 'W/kg', 'P_m', 'power per mass of liquid'),
  quantity('power_per_volume', 'W/m^3', 'P_V', 'power per volume of liquid'),
  // heat
  quantity('heat_rate', 'W', 'Φ', 'heat flow rate', { friendly: ['W', 'kW', 'MW'] }),
  quantity('heat_loss', 'W', 'Φ_l', 'heat flow lost to the surroundings', { friendly: ['W', 'kW'] }),
  quantity('loss_conductance', 'W/K', 'G_l', 'heat lost per kelvin above ambient'),
  coefficient('overall_coefficient', 'U', 'overall heat transfer coefficient'),
  coefficient('other_side_coefficient', 'h_2', "the other side's heat transfer coefficient"),
  quantity('wall_conductivity', 'W/(m K)', 'λ_w', 'thermal conductivity of the wall'),
  quantity('fouling_resistance', 'm^2 K/W', 'R_f', 'thermal resistance of fouling'),
  quantity('solid_density', 'kg/m^3', 'ρ_s', 'density of the solid'),
  quantity('solid_heat_capacity', 'J/(kg K)', 'c_p,s', 'specific heat capacity of the solid'),
  quantity('solid_conductivity', 'W/(m K)', 'λ_s', 'thermal conductivity of the solid'),
  quantity('equipment_heat_capacity', 'J/K', 'C_e', 'heat capacity of the equipment', { friendly: ['kJ/K'] }),
  number('emissivity', 'e', 'emissivity of the surface'),
  temperature('initial_temperature', 'T_0', 'temperature at the start'),
  temperature('final_temperature', 'T_1', 'temperature at the end'),
  // mass
  concentration('saturation_concentration', 'c_s', 'concentration at saturation'),
  concentration('bulk_concentration', 'c_b', 'concentration in the bulk'),
  concentration('inlet_concentration', 'c_in', 'concentration at the inlet'),
  concentration('outlet_concentration', 'c_out', 'concentration at the outlet'),
  quantity('molar_mass', 'kg/mol', 'M', 'molar mass', { friendly: ['g/mol'] }),
  mass('mass_loss', 'Δm', 'mass lost'),
  mass('initial_mass', 'm_0', 'mass at the start'),
  quantity('mass_rate', 'kg/s', 'q_N', 'mass transferred per time', { molar: 'mol/s', friendly: ['g/h', 'kg/h', 'mol/h'] }),
  quantity('volumetric_coefficient', '1/s', 'k_La', 'volumetric mass transfer coefficient per volume of clear liquid'),
  quantity('limiting_current', 'A', 'I_lim', 'limiting current', { friendly: ['mA', 'A'] }),
  number('electrons', 'z', 'electrons per ion'),
  number('partition_coefficient', 'K_p', 'c_gas/c_liquid or c_layer/c_fluid at equilibrium'),
  quantity('permeability', 'm^2/s', 'P_l', 'permeability of the layer'),
  quantity('probe_time', 's', 'τ_p', 'response time of the probe'),
  pressure('vapour_pressure', 'p_v', 'vapour pressure'),
  // results
  coefficient('heat_transfer_coefficient', 'h', 'heat transfer coefficient'),
  speed('mass_transfer_coefficient', 'k', 'mass transfer coefficient'),
  // geometry that the reader must compare
  text('impeller_type', 'kind of impeller'),
  text('packing_type', 'kind of packing'),
];

/** Every quantity of the study file by name, without the second stream's. */
export const quantities: Readonly<Record<string, Quantity>> = Object.freeze(Object.fromEntries(list.map((one) => [one.name, one])));

export const quantityNames: readonly string[] = list.map((one) => one.name);

const second = '_other';

/** A quantity by name, `_other` for the second stream; undefined for the user's own names. */
export function quantityOf(name: string): Quantity | undefined {
  if (Object.hasOwn(quantities, name)) return quantities[name];
  const first = name.endsWith(second) ? name.slice(0, -second.length) : '';
  if (!Object.hasOwn(quantities, first)) return undefined;
  const own = quantities[first]!;
  return { ...own, name, symbol: own.symbol === '' ? '' : secondSymbol(own.symbol), says: `${own.says}, second stream` };
}

const secondSymbol = (symbol: string): string => (symbol.includes('_') ? `${symbol},2` : `${symbol}_2`);
