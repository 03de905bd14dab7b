import type { Note, Section } from '../../pipeline/base/message.ts';
import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { type Child, html, type Markup } from '../html.ts';

const headings: Readonly<Record<Section, string>> = {
  answer: 'Which law, and where does it hold?',
  audit: 'Why not a published one?',
  plant: 'What does it say for the plant?',
  evidence: 'Can these trials tell that?',
  'next-trials': 'What should be run next?',
  trials: 'Which trials count?',
  method: 'How was this computed?',
  cautions: 'Before anybody builds on it',
};

/** A section of the page: its question, the answer in a sentence or two, then the rest. */
export const section = (id: Section, lead: Child, rest: Child): Markup =>
  html`<section id="${id}" aria-labelledby="${id}-question"><h2 id="${id}-question">${headings[id]}</h2>
<p class="lead">${lead}</p>
${rest}</section>
`;

/** Notes that belong to a section, warnings first and told as such. */
export function notesOf(result: StudyResult, id: Section, except: (note: Note) => boolean = () => false): Markup | false {
  const notes = result.notes.filter((note) => note.section === id && !except(note));
  const sorted = [...notes.filter((note) => note.level === 'warning'), ...notes.filter((note) => note.level !== 'warning')];
  return (
    sorted.length > 0 &&
    html`<ul class="notes">${sorted.map((note) => html`<li>${note.level === 'warning' && html`<strong>Warning.</strong> `}${about(note)}${note.text}</li>`)}</ul>`
  );
}

const about = ({ about: whom, text }: Note): string => (whom === undefined || text.includes(whom) ? '' : `${whom}: `);

/** The questions in their order, for the list at the head of the page. */
export const questions: readonly (readonly [Section, string])[] = Object.entries(headings) as [Section, string][];
