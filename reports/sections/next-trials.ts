import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { type Pictures, picturesOf } from '../figure.ts';
import { html, type Markup } from '../html.ts';
import { percent, plainNumber } from '../numbers.ts';
import * as says from '../says/sections.ts';
import { columns, table } from '../table.ts';
import { prettyUnit } from '../units.ts';
import { notesOf, section } from './section.ts';

/** What should be run next? */
export function nextTrials(result: StudyResult, pictures: Pictures): Markup {
  const found = result.nextTrials;
  if (found === null) return section('next-trials', says.noNext(), notesOf(result, 'next-trials'));
  const settings = [...new Set(found.proposals.flatMap((one) => Object.keys(one.settings)))];
  const unit = (name: string): string =>
    prettyUnit(found.proposals.find((one) => one.settings[name] !== undefined)?.settings[name]?.unit ?? '1');
  const groups = [...new Set(found.proposals.flatMap((one) => Object.keys(one.groups)))];
  return section(
    'next-trials',
    found.says,
    html`${picturesOf(pictures, 'proposals')}
${
  found.proposals.length > 0 &&
  table(
    'Proposed trials, the most useful first',
    columns(
      'trial',
      'campaign',
      ...settings.map((name) => `#${name}${unit(name) === '' ? '' : ` in ${unit(name)}`}`),
      ...groups.map((name) => `#${name}`),
      '#gain',
    ),
    found.proposals.map((one, k) => [
      `${k + 1}`,
      one.campaign,
      ...settings.map((name) => plainNumber(one.settings[name]?.value ?? Number.NaN)),
      ...groups.map((name) => plainNumber(one.groups[name] ?? Number.NaN)),
      percent(one.gain),
    ]),
  )
}
${picturesOf(pictures, 'narrowing')}
${
  found.cases.length > 0 &&
  table(
    'Half-width of the prediction interval',
    columns('case', '#now', '#after these trials', '#floor no trial can pass'),
    found.cases.map((one) => [one.name, ...[one.now, one.after, one.floor].map((half) => `±${plainNumber(100 * half)} %`)]),
  )
}
${found.notes.map((note) => html`<p class="fine">${note.text}</p>`)}
${notesOf(result, 'next-trials', (note) => found.notes.some((one) => one.text === note.text))}`,
  );
}
