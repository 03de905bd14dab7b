import { expect, test } from 'vitest';
import { InputError } from '../../pipeline/base/input-error.ts';
import { EXIT, tell, together } from '../../pipeline/cli/exit.ts';
import { captured } from './captured.ts';

test('an input error tells every message and gives its code', () => {
  const terminal = captured();
  const messages = [
    { code: 'a', text: 'first', place: { file: 's.yaml', line: 1, column: 2 } },
    { code: 'b', text: 'second' },
  ];
  expect(tell(new InputError(messages, 3), terminal)).toBe(EXIT.unusableData);
  expect(terminal.messages()).toBe('s.yaml:1:2: first\nsecond\n');
  expect(terminal.output()).toBe('');
});

test('anything else is a defect of ours: short, with how to report it, the stack only when asked for', () => {
  const quiet = captured();
  expect(tell(new TypeError('x is not a function\nat y'), quiet)).toBe(EXIT.defect);
  expect(quiet.messages()).toMatch(/^This is a defect of pilotlaw, not of your files: x is not a function\nPlease report it/);
  expect(quiet.messages()).not.toMatch(/\n\s+at /);
  const debug = captured(true);
  tell(new TypeError('x'), debug);
  expect(debug.messages()).toMatch(/\n\s+at /);
  expect(tell('thrown text', captured())).toBe(EXIT.defect);
});

test('several studies: 0 when all are done, 4 when some failed, else the gravest', () => {
  expect(together([])).toBe(0);
  expect(together([0, 0])).toBe(0);
  expect(together([0, 2])).toBe(4);
  expect(together([0, 1])).toBe(4);
  expect(together([2, 3])).toBe(3);
  expect(together([2])).toBe(2);
  expect(together([2, 1])).toBe(1);
});
