import { expect, test } from 'vitest';
import { duration, Progress } from '../../pipeline/cli/progress.ts';
import { Told } from '../../pipeline/cli/told.ts';
import { captured } from './captured.ts';

const shown = (text: string): readonly string[] => text.split('\r\u001b[K').slice(1);

test('a terminal sees how many are done, how many failed and how long the rest will take', () => {
  const terminal = captured();
  let now = 0;
  const progress = new Progress(4, { ...terminal, interactive: true }, () => now);
  progress.step(true, true);
  now = 3000;
  progress.step(true, false);
  now = 6000;
  progress.step(false, false);
  progress.step(true, false);
  progress.clear();
  expect(shown(terminal.messages())).toEqual([
    '1 of 4 studies',
    '2 of 4 studies, about 6 s left',
    '3 of 4 studies, 1 failed, about 3 s left',
    '',
  ]);
});

test('what is no terminal sees nothing, and neither does one study', () => {
  const plain = captured();
  new Progress(3, plain).step(true, false);
  const one = captured();
  new Progress(1, { ...one, interactive: true }).step(true, false);
  expect([plain.messages(), one.messages()]).toEqual(['', '']);
});

test.each([
  [400, '1 s'],
  [89_000, '89 s'],
  [91_000, '2 min'],
  [7_800_000, '2 h 10 min'],
])('%i ms is %s', (ms, text) => {
  expect(duration(ms)).toBe(text);
});

test('outcomes are told in the order of the studies, whatever the order in which they end', () => {
  const terminal = captured();
  const told = new Told(3, { json: false, quiet: false }, terminal);
  const refused = (text: string) => ({ kind: 'refused', messages: [{ code: 'x', text }], exit: 2 }) as const;
  told.add(2, refused('third'));
  told.add(1, refused('second'));
  expect(terminal.messages()).toBe('');
  told.add(0, refused('first'));
  expect(terminal.messages()).toBe('first\nsecond\nthird\n');
});
