import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative, resolve } from 'node:path';
import { expect, test } from 'vitest';

/** A folder imports only from rooms above it in this list. */
const rooms = [
  'pipeline/base',
  'pipeline/files',
  'pipeline/numerics',
  'pipeline/quantities',
  'pipeline/algebra',
  'pipeline/rules',
  'pipeline/fluids',
  'pipeline/reduction',
  'pipeline/groups',
  'correlations',
  'pipeline/study',
  'pipeline/trials',
  'pipeline/plan',
  'pipeline/observations',
  'pipeline/regression',
  'pipeline/audit',
  'pipeline/scale-up',
  'pipeline/budget',
  'pipeline/results',
  'pipeline/analyse.ts',
  'reports',
  'pipeline/batch',
  'pipeline/index.ts',
  'pipeline/cli',
];

const root = resolve(import.meta.dirname, '..');
const sources = ['pipeline', 'correlations', 'reports'].flatMap((top) =>
  readdirSync(join(root, top), { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('.ts') && !file.endsWith('.generated.ts'))
    .map((file) => join(top, file)),
);

const roomOf = (file: string): number => rooms.findIndex((room) => file === room || file.startsWith(`${room}/`));

const importsOf = (file: string): readonly string[] =>
  [...readFileSync(join(root, file), 'utf8').matchAll(/(?:from|import\()\s*'(\.[^']+)'/g)].map((found) =>
    relative(root, resolve(root, dirname(file), found[1]!)),
  );

test('there is something to guard', () => {
  expect(sources.length).toBeGreaterThan(10);
});

test.each(sources)('%s stands in a room and imports only from rooms above it', (file) => {
  const own = roomOf(file);
  expect(own, `${file} stands in no room`).toBeGreaterThanOrEqual(0);
  const upward = importsOf(file).filter((target) => roomOf(target) > own);
  expect(upward).toEqual([]);
});

test('only pipeline/files touches the disk', () => {
  const touching = sources.filter(
    (file) => !file.startsWith('pipeline/files/') && /from 'node:fs/.test(readFileSync(join(root, file), 'utf8')),
  );
  expect(touching).toEqual([]);
});
