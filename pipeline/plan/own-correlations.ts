import type { Correlation, Family } from '../../correlations/correlation.ts';
import { parseForm, parseLimit } from '../algebra/parse.ts';
import * as says from '../base/says/plan.ts';
import { basesOf, groupNames } from '../groups/groups.ts';
import { groupKey } from '../groups/key.ts';
import { isFault } from '../quantities/fault.ts';
import { unitFor } from '../quantities/unit-for.ts';
import { quantityNames, quantityOf } from '../quantities/vocabulary.ts';
import type { Key } from '../rules/rule.ts';
import type { OwnCorrelationEntry, Placed, Study } from '../study/study.ts';
import { families } from '../study/study-schema.ts';
import { Faults } from './faults.ts';

/** Users' own correlations settled: as complete as ours, but unchecked. Throws one InputError with all faults of the file. */
export function ownCorrelations(entries: readonly OwnCorrelationEntry[], study: Study): readonly Correlation[] {
  const faults = new Faults();
  const settled = entries.flatMap((entry) => ownCorrelation(entry, study, faults));
  faults.throwIfAny();
  return settled;
}

const reads = ['mean line', 'lower bound', 'upper bound'] as const;

function ownCorrelation(entry: OwnCorrelationEntry, study: Study, faults: Faults): readonly Correlation[] {
  const known = [...groupNames, ...quantityNames, ...Object.keys(study.groups), ...Object.keys(study.quantities)];
  const parsed = parseForm(entry.form.is, { known, parameters: [], needsParameter: false });
  if ('faults' in parsed) {
    for (const fault of parsed.faults) faults.add(fault.code, `"${entry.form.is}": ${fault.text}`, entry.form.place);
    return [];
  }
  const family = entry.family?.is ?? study.equipment.is;
  if (!(families as readonly string[]).includes(family))
    faults.add('unknown-equipment', says.unknownEquipment(family, families), entry.family!.place);
  const { form } = parsed;
  const limits = entry.limits.flatMap((limit) => {
    const read = parseLimit(limit.is, known);
    if (!('code' in read)) return [{ read, says: limit.is }];
    faults.add(read.code, `"${limit.is}": ${read.text}`, limit.place);
    return [];
  });
  const names = [...new Set([form.response, ...form.groups, ...limits.flatMap(({ read }) => read.names)])];
  const groups = Object.fromEntries(names.flatMap((name) => keyed(name, entry, study, faults)));
  const mass = /^(Sh|Sc|St_mass|j_mass|Pe_mass|mass_transfer_coefficient|volumetric_coefficient)$/.test(form.response);
  return [
    {
      id: entry.id.is,
      name: entry.id.is,
      authors: entry.authors,
      year: entry.year,
      title: entry.title ?? entry.id.is,
      family: family as Family,
      transfer: groupNames.includes(form.response) ? (mass ? 'mass' : 'heat') : study.transfer,
      average: 'mean',
      reads: reads.find((one) => one === entry.reads?.is) ?? 'mean line',
      form,
      values: {},
      groups,
      limits: limits.map(({ read, says: text }) => ({
        of: read.of,
        ...(read.from === undefined ? {} : { from: read.from }),
        ...(read.to === undefined ? {} : { to: read.to }),
        says: text,
      })),
      accuracy: entry.accuracy ?? 'not stated',
      source: entry.source ?? 'given by the study, no source stated',
      where: '',
      constantsFrom: 'memory',
      use: '',
      analogy: true,
      printed: [],
    },
  ];
}

/** What a name of the entry means: a group on the basis it states, or the study's own; a quantity in SI or in the unit it states. */
function keyed(name: string, entry: OwnCorrelationEntry, study: Study, faults: Faults): readonly (readonly [string, Key])[] {
  const bases = basesOf(name);
  if (bases === undefined) return quantityKey(name, entry.in[name], study, faults);
  if (study.groups[name]?.is.column !== undefined) return [[name, name]];
  const basis = entry.groups[name] ?? study.groups[name]?.is.basis;
  const at = (entry.at[name]?.is ?? 'bulk') as 'bulk' | 'film' | 'wall';
  if (bases.length === 0) return [[name, groupKey(name, undefined, at)]];
  if (basis !== undefined && bases.includes(basis.is)) return [[name, groupKey(name, basis.is, at)]];
  faults.add(
    'needs-basis',
    basis === undefined ? says.needsBasis(name, bases) : says.unknownBasis(name, basis.is, bases),
    basis?.place ?? entry.form.place,
  );
  return [];
}

function quantityKey(name: string, unit: Placed<string> | undefined, study: Study, faults: Faults): readonly (readonly [string, Key])[] {
  if (unit === undefined) return [[name, name]];
  const read = unitFor(quantityOf(name), unit.is);
  if (isFault(read)) {
    faults.add(read.code, `${name}: ${read.text}`, unit.place);
    return [];
  }
  if (quantityOf(name) === undefined && study.quantities[name] === undefined)
    faults.add('unknown-name', says.unitForWhat(name), unit.place);
  return [[name, `${name} [${read.text}]`]];
}
