import type { Rule } from '../rule.ts';
import { agitationRules } from './agitation.ts';
import { flowRules } from './flow.ts';
import { gasVelocity } from './gas-velocity.ts';
import { filmFlow, geometryRules } from './geometry.ts';
import { massRules } from './mass.ts';
import { propertyIdentities } from './properties.ts';
import { forOtherStream } from './stream.ts';

/**
 * Derived quantities in order of preference, for a family of equipment: there `diameter` is a bore, a sphere or a column, and only what is unambiguous is derived.
 * `other` equipment takes `diameter` for a round bore, and says so.
 */
export function derivedRulesFor(equipment: string): readonly Rule[] {
  return [
    ...propertyIdentities,
    ...forOtherStream(propertyIdentities, sharedByStreams),
    ...flowRules,
    ...forOtherStream(flowRules),
    ...geometryRules(equipment),
    ...otherBore(equipment),
    ...filmFlow(equipment),
    ...(equipment === 'gas-liquid' ? gasVelocity : []),
    ...agitationRules,
    ...massRules,
  ];
}

/** Both streams stand in the same vessel. */
const sharedByStreams = ['rotation_speed'];

/** The second stream of a tube runs in the annulus around it, that of an annulus in the tube inside. */
function otherBore(equipment: string): readonly Rule[] {
  if (equipment === 'annulus')
    return forOtherStream(geometryRules('tube').filter(({ gives, from }) => gives === 'cross_section' && from.includes('diameter')));
  if (equipment !== 'tube') return [];
  return forOtherStream(
    geometryRules('annulus').filter(({ gives }) => gives === 'cross_section' || gives === 'hydraulic_diameter' || gives === 'gap'),
    ['outer_diameter'],
  );
}

/** For equipment of no particular family. */
export const derivedRules: readonly Rule[] = derivedRulesFor('other');
