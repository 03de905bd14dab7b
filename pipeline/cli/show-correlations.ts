import { resolve } from 'node:path';
import { catalogue } from '../../correlations/catalogue.ts';
import type { Correlation } from '../../correlations/correlation.ts';
import { evaluateCorrelation } from '../../correlations/evaluate-correlation.ts';

import { says } from '../base/says/cli.ts';
import { replaceFile } from '../files/write.ts';
import { wrongCommandLine } from './arguments.ts';
import { atValues } from './at-values.ts';
import { correlationRecord, matching, type Wanted } from './correlation-record.ts';
import { listText, numbers, wholeText } from './correlation-text.ts';
import { EXIT, type Exit } from './exit.ts';
import { groupsOf } from './groups-of.ts';
import type { Terminal } from './terminal.ts';

/** What `pilotlaw correlations` was asked for. */
export interface CorrelationsRequest extends Wanted {
  readonly id?: string;
  readonly at?: string;
  /** File to write the entries to as a page for reference. */
  readonly page?: string;
  readonly json: boolean;
}

/** Lists the published correlations, shows one in full, or evaluates one. */
export async function showCorrelations(asked: CorrelationsRequest, terminal: Terminal): Promise<Exit> {
  const { id, at, page, json } = asked;
  if (id === undefined && at !== undefined) throw wrongCommandLine(says.atNeedsId);
  const entries = id === undefined ? matching(catalogue, asked) : [byId(id)];
  if (entries.length === 0 && !json) throw wrongCommandLine(says.noneMatch);
  if (page !== undefined) {
    const { cataloguePage } = await import('../../reports/catalogue-page.ts');
    replaceFile(resolve(page), cataloguePage(entries));
    terminal.out(`${says.pageWritten(entries.length, page)}\n`);
  } else if (at !== undefined) terminal.out(`${valueAt(entries[0]!, at, json)}\n`);
  else if (json) terminal.out(`${JSON.stringify(entries.map(correlationRecord), null, 2)}\n`);
  else terminal.out(`${id === undefined ? listText(entries) : wholeText(entries[0]!)}\n`);
  return EXIT.done;
}

function byId(id: string): Correlation {
  const entry = catalogue.find((one) => one.id === id);
  if (entry === undefined)
    throw wrongCommandLine(
      says.noCorrelation(
        id,
        catalogue.map((one) => one.id),
      ),
    );
  return entry;
}

/** A limit that looks at a group that is not given is neither inside nor outside. */
interface LimitAt {
  readonly says: string;
  readonly inside: boolean | null;
}

function valueAt(entry: Correlation, at: string, json: boolean): string {
  const gives = entry.form.response;
  const also = Object.keys(entry.groups).filter((name) => name !== gives && !entry.form.groups.includes(name));
  const values = atValues(at, entry.form.groups, also);
  const { value, limits } = evaluateCorrelation(entry, values);
  if (!Number.isFinite(value)) throw wrongCommandLine(says.atNoValue(gives));
  const known = limits.map(
    ({ says: text, inside }, k): LimitAt => ({
      says: text,
      inside: groupsOf(entry.limits[k]!.of).every((name) => name in values) ? inside : null,
    }),
  );
  const inRange = together(known);
  if (json) return JSON.stringify({ id: entry.id, gives, value, in_range: inRange, limits: known });
  const lines = known.map((limit) => `    ${limit.says}: ${says.standing(limit.inside)}`);
  return [`${gives} = ${Number(value.toPrecision(6))} at ${numbers(values)}: ${says.rangeStanding(inRange)}`, ...lines].join('\n');
}

/** Outside one is outside; inside all is inside. */
function together(limits: readonly LimitAt[]): boolean | null {
  if (limits.some(({ inside }) => inside === false)) return false;
  return limits.some(({ inside }) => inside === null) ? null : true;
}
