import { describe, expect, test } from 'vitest';
import type { InputError } from '../../pipeline/base/input-error.ts';
import { studyOf } from '../scale-up/study-on-disk.ts';

/** What is told of a study of a tube that lacks something; all quantities are columns of one invented row. */
async function told(quantities: string, law = 'Sh = C * Re^a * Sc^(1/3)', more = 'coefficient: measured'): Promise<string> {
  const study = `pilotlaw: 1
title: invented
transfer: mass
equipment: tube
trials: trials.csv
quantities: {mass_transfer_coefficient: 1e-5 m/s, ${quantities}}
${more}
groups: {Re: pipe, Sh: pipe}
laws: ["${law}"]
audit: none
`;
  const error = await studyOf({ 'study.yaml': study, 'trials.csv': 'x\n1\n2\n' }).catch((one: unknown) => one);
  return (error as InputError).messages.map(({ text }) => text).join('\n');
}
const water = 'density: 997 kg/m^3, viscosity: 1 mPa s, diffusivity: 1e-9 m^2/s';

describe('what a study lacks is told with what it could be had from', () => {
  test('a velocity from the volume flow and the section of the tube', async () => {
    const text = await told(`${water}, volume_flow: 3 L/min`);
    expect(text).toContain('Re cannot be computed: diameter is not given');
    expect(text).toContain('velocity by u = q_V/S, which lacks cross_section');
  });

  test('a mass flow from the volume flow and the density', async () => {
    const text = await told('kinematic_viscosity: 1 mm^2/s, viscosity: 1 mPa s, diffusivity: 1e-9 m^2/s, diameter: 20 mm');
    expect(text).toContain('volume_flow is not given and cannot be derived from what is (or give velocity itself)');
    expect(text).toContain('q_m = q_V rho, which lacks volume_flow');
  });

  test('a quantity that two others would give is asked for itself, and no way leads in a circle', async () => {
    const text = await told('diffusivity: 1e-9 m^2/s, diameter: 20 mm, velocity: 1 m/s');
    expect(text).toContain('Re cannot be computed: kinematic_viscosity is not given');
    expect(text).toContain('kinematic_viscosity by nu = mu/rho, which lacks viscosity, density');
  });

  test('a diffusivity itself, or what it can be estimated from', async () => {
    const text = await told('temperature: 20 degC, diameter: 20 mm, velocity: 1 m/s', undefined, 'coefficient: measured\nfluid: water');
    expect(text).toContain('(or give diffusivity itself)');
    expect(text).toContain('which lacks solute_molar_volume');
  });

  test('a logged curve where the route reads one', async () => {
    const text = await told(water, 'volumetric_coefficient = C * density^a', 'coefficient: gassing-in');
    expect(text).toContain('say where it stands under coefficient.series');
  });
});
