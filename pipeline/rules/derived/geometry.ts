import { says } from '../../base/says/derived.ts';
import type { Key, Rule } from '../rule.ts';
import { definition } from './definition.ts';

const circle = (d: number): number => (Math.PI / 4) * d * d;

/** Equipment whose stream runs through a round bore of the quantity `diameter`. */
const bores = new Set(['tube', 'coil', 'wetted-wall', 'membrane', 'impinging-jet', 'other']);
/** Equipment whose stream fills the cross section of a column or vessel. */
const columns = new Set(['packed-bed', 'fluidised-bed', 'bed-wall', 'packed-column', 'gas-liquid', 'other']);
const tubes = new Set(['tube', 'wetted-wall', 'membrane']);

/** Geometry that means the same in all equipment. */
const everywhere: readonly Rule[] = [
  definition('outer_diameter', ['diameter', 'wall_thickness'], (d, s) => d! + 2 * s!, 'd_o = d + 2 s'),
  definition(
    'specific_area',
    ['voidage', 'particle_diameter', 'sphericity'],
    (e, d, psi) => (6 * (1 - e!)) / (psi! * d!),
    'a = 6 (1 - voidage)/(sphericity d_p)',
  ),
  definition('specific_area', ['voidage', 'particle_diameter'], (e, d) => (6 * (1 - e!)) / d!, 'a = 6 (1 - voidage)/d_p', says.spheres),
  definition(
    'interfacial_area',
    ['gas_holdup', 'bubble_diameter'],
    (e, d) => (6 * e!) / ((1 - e!) * d!),
    'a_i = 6 gas_holdup/((1 - gas_holdup) d_b), per volume of clear liquid',
    says.bubbles,
  ),
  definition(
    'initial_mass',
    ['particle_count', 'solid_density', 'particle_diameter'],
    (n, rho, d) => (n! * rho! * Math.PI * d! ** 3) / 6,
    'm_0 = N_p rho_s pi d_p^3/6',
    says.spheres,
  ),
  definition(
    'particle_diameter',
    ['initial_mass', 'particle_count', 'solid_density'],
    (m, n, rho) => Math.cbrt((6 * m!) / (Math.PI * n! * rho!)),
    'd_p = (6 m_0/(pi N_p rho_s))^(1/3)',
    says.spheres,
  ),
  definition('liquid_volume', ['vessel_diameter', 'depth'], (d, h) => circle(d!) * h!, 'V = pi/4 D^2 H', says.flatBottom),
];

/** Geometry that depends on what the letters stand for in this family of equipment. */
export function geometryRules(equipment: string): readonly Rule[] {
  return [...everywhere, ...sections(equipment), ...hydraulic(equipment), ...areas(equipment), ...sizes(equipment)];
}

function sections(equipment: string): readonly Rule[] {
  const round = (from: Key, assumes: string): Rule => definition('cross_section', [from], (d) => circle(d!), `S = pi/4 ${from}^2`, assumes);
  if (equipment === 'annulus')
    return [
      definition(
        'cross_section',
        ['diameter', 'outer_diameter'],
        (bore, inner) => circle(bore!) - circle(inner!),
        'S = pi/4 (d^2 - d_o^2)',
        says.annulus,
      ),
    ];
  return [
    ...(bores.has(equipment) ? [round('diameter', says.roundBore('diameter'))] : []),
    ...(columns.has(equipment) ? [round('vessel_diameter', says.roundBore('vessel_diameter'))] : []),
    ...(equipment === 'packed-column' ? [round('diameter', says.roundBore('diameter'))] : []),
  ];
}

function hydraulic(equipment: string): readonly Rule[] {
  if (equipment === 'annulus')
    return [
      definition('hydraulic_diameter', ['diameter', 'outer_diameter'], (bore, inner) => bore! - inner!, 'd_h = d - d_o', says.annulus),
      definition('gap', ['diameter', 'outer_diameter'], (bore, inner) => (bore! - inner!) / 2, 's = (d - d_o)/2', says.annulus),
    ];
  const slit = definition('hydraulic_diameter', ['gap'], (gap) => 2 * gap!, 'd_h = 2 s', says.wideSlit);
  const bore = definition('hydraulic_diameter', ['diameter'], (d) => d!, 'd_h = d', says.roundBore('diameter'));
  if (equipment === 'plate-exchanger') return [slit];
  if (equipment === 'membrane') return [slit, bore];
  return tubes.has(equipment) || equipment === 'coil' ? [bore] : [];
}

const length: Key = 'length';

function areas(equipment: string): readonly Rule[] {
  const mantle = (d: Key): Rule => definition('area', [d, length], (d, l) => Math.PI * d! * l!, `A = pi ${d} L`, says.mantle(d));
  if (tubes.has(equipment)) return [mantle('diameter')];
  if (equipment === 'bed-wall') return [mantle('vessel_diameter')];
  if (equipment === 'annulus') return [mantle('outer_diameter')];
  if (equipment === 'cylinder' || equipment === 'rotating')
    return [mantle('outer_diameter'), ...(equipment === 'cylinder' ? [mantle('diameter')] : [])];
  if (equipment === 'sphere')
    return ['particle_diameter', 'diameter'].map((d) => definition('area', [d], (d) => Math.PI * d! * d!, `A = pi ${d}^2`, says.oneSphere));
  if (equipment === 'suspended-solids')
    return [
      definition('area', ['particle_count', 'particle_diameter'], (n, d) => n! * Math.PI * d! * d!, 'A = N_p pi d_p^2', says.spheres),
    ];
  if (equipment === 'packed-bed' || equipment === 'packed-column')
    return [definition('area', ['specific_area', 'cross_section', length], (a, s, l) => a! * s! * l!, 'A = a S L', says.wholePacking)];
  return [];
}

/** Volume over surface of a body, for Bi and Fo. */
function sizes(equipment: string): readonly Rule[] {
  const body = (from: Key, share: number, says: string): Rule =>
    definition('volume_per_area', [from], (d) => d! / share, `V/A = ${from}/${share}`, says);
  if (equipment === 'cylinder') return [body('outer_diameter', 4, says.longCylinder), body('diameter', 4, says.longCylinder)];
  const sphere = ['particle_diameter', ...(equipment === 'sphere' ? ['diameter'] : [])];
  return sphere.map((d) => body(d, 6, says.spheres));
}

/** Flow of a falling film per wetted width. */
export const filmFlow = (equipment: string): readonly Rule[] =>
  equipment === 'wetted-wall' || equipment === 'other'
    ? [
        definition(
          'film_flow_per_width',
          ['mass_flow', 'diameter'],
          (flow, d) => flow! / (Math.PI * d!),
          'G = q_m/(pi d)',
          says.wettedAllRound,
        ),
      ]
    : [];
