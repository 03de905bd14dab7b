import { InputError } from '../base/input-error.ts';
import { says } from '../base/says/cli.ts';
import { computeStudy } from '../batch/run-study.ts';
import { findStudies } from '../files/find-studies.ts';
import type { NextTrialsResult } from '../scale-up/plant-result.ts';
import { EXIT, type Exit } from './exit.ts';
import { fromHere } from './results-folders.ts';
import type { Terminal } from './terminal.ts';

export interface ProposeRequest {
  readonly study: string;
  readonly count: number;
  readonly seed?: number;
  readonly json: boolean;
}

/** Computes the study and prints what its rig section allows to propose; writes nothing. */
export async function proposeTrials({ study, count, seed, json }: ProposeRequest, terminal: Terminal): Promise<Exit> {
  const [file] = findStudies([study]);
  const { nextTrials } = await computeStudy(fromHere(file!), seed, count);
  if (nextTrials === null) throw new InputError([{ code: 'no-rig', text: says.noRig(), place: { file: fromHere(file!), key: 'rig' } }]);
  if (json) terminal.out(`${JSON.stringify(nextTrials)}\n`);
  else {
    terminal.out(`${nextTrials.says}\n${tableOf(nextTrials)}\n`);
    for (const { text } of nextTrials.notes) terminal.err(`${text}\n`);
  }
  return EXIT.done;
}

/** One line a proposal, tab separated, settings with their units in the header. */
function tableOf({ proposals }: NextTrialsResult): string {
  const first = proposals[0];
  if (first === undefined) return '';
  const names = Object.keys(first.settings);
  const groups = Object.keys(first.groups);
  const header = ['trial', 'campaign', ...names.map((name) => `${name} [${first.settings[name]!.unit}]`), ...groups, 'gain'];
  const short = (value: number): string => String(Number(value.toPrecision(5)));
  const rows = proposals.map(({ campaign, settings, groups: values, gain }, k) => [
    String(k + 1),
    campaign,
    ...names.map((name) => short(settings[name]!.value)),
    ...groups.map((name) => short(values[name]!)),
    `${(100 * gain).toFixed(1)} %`,
  ]);
  return [header, ...rows].map((cells) => cells.join('\t')).join('\n');
}
