import { basename } from 'node:path';
import { InputError } from '../base/input-error.ts';
import * as says from '../base/says/results.ts';
import { decodeText } from '../files/decode.ts';
import { readBytes } from '../files/read.ts';
import { Faults } from '../plan/faults.ts';
import { planPlant } from '../plan/plant-plan.ts';
import { readLaws, type SavedLaws } from '../results/read-laws.ts';
import type { PlantResult } from '../scale-up/plant-result.ts';
import { scaleUp } from '../scale-up/scale-up.ts';
import { standingLaws } from '../scale-up/standing-laws.ts';
import { caps } from '../trials/caps.ts';
import { readTable } from '../trials/read-table.ts';

export interface PredictRequest {
  readonly laws: string;
  readonly plant: string;
  /** Which law leads; the study's choice where left out. */
  readonly law?: string;
  readonly conservative: 'low' | 'high';
}

const MOST_LAWS = 1 << 26;

/** Plant cases by the laws of a `laws.json` alone: no study, no trials. Published correlations are not in that file and are not asked. */
export function predictPlant({ laws: file, plant, law, conservative }: PredictRequest): PlantResult {
  const saved = readLaws(decodeText(readBytes(file, { most: MOST_LAWS, name: basename(file) }), basename(file)), basename(file));
  const chosen = law ?? saved.chosen;
  if (!saved.laws.some((one) => one.name === chosen))
    throw new InputError([
      {
        code: 'no-such-law',
        text: says.noSuchLaw(
          chosen,
          saved.laws.map(({ name }) => name),
        ),
        place: { file: basename(file) },
      },
    ]);
  const table = readTable(readBytes(plant, { most: caps.tableBytes, name: basename(plant) }), { file: basename(plant) });
  const faults = new Faults();
  const plan = planPlant(
    { ...askedOf(saved), settings: { conservative, quantities: {} }, table, place: { file: basename(plant) } },
    faults,
  );
  faults.throwIfAny();
  const { forPlant, coefficient } = saved;
  return scaleUp({
    plan: plan!,
    coefficient,
    equipment: forPlant.basis.equipment,
    laws: standingLaws(saved.laws, forPlant.accepted, chosen),
    largestSpread: forPlant.largestSpreads[chosen] ?? 0,
    correlations: [],
    tried: forPlant.tried,
    anchor: forPlant.anchor,
    texts: forPlant.basis.texts,
  });
}

function askedOf({ laws, coefficient, forPlant }: SavedLaws) {
  const first = laws[0]!;
  const response = first.groups[first.form.response]!;
  const own = coefficient.key === response;
  const keys = new Map(laws.flatMap((one) => one.form.groups.map((name) => [one.groups[name]!, name] as const)));
  if (!own) keys.set(response, first.form.response);
  return { basis: forPlant.basis, keys, response, coefficient: own ? undefined : coefficient.key, others: [] };
}
