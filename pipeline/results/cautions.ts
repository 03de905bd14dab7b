import * as says from '../base/says/results.ts';
import type { Plan } from '../plan/plan.ts';

const gases = new Set(['nitrogen', 'carbon-dioxide', 'hydrogen', 'helium', 'argon', 'oxygen']);

/** The cautions that fit the case; the general ones always. */
export function cautionsFor({ study }: Plan): readonly string[] {
  const fluids = [study.fluid?.own?.is.name?.is, study.fluid?.other?.is.name?.is].filter((name) => name !== undefined);
  const stirred = ['vessel', 'suspended-solids', 'gas-liquid', 'coil'].includes(study.equipment.is);
  const dissolving = study.equipment.is === 'suspended-solids' || study.coefficient?.route.is === 'pellet-dissolution';
  return [
    ...(study.invented ? [says.inventedCaution()] : []),
    says.reviewCaution(),
    says.rangeCaution(),
    ...(study.transfer === 'heat' ? [...(stirred ? [says.heatCaution()] : []), says.pressureCaution()] : [says.transferCaution()]),
    ...fluids.filter((name) => gases.has(name)).map((name) => says.gasCaution(name)),
    ...(fluids.some((name) => gases.has(name)) ? [says.cryogenCaution()] : []),
    ...(dissolving ? [says.solidsCaution()] : []),
  ];
}
