import { chmodSync, mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, relative } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { InputError } from '../../pipeline/base/input-error.ts';
import { says } from '../../pipeline/base/says/files.ts';
import { causeOf } from '../../pipeline/files/cause.ts';
import { decodeText } from '../../pipeline/files/decode.ts';
import { findStudies } from '../../pipeline/files/find-studies.ts';
import { globPattern } from '../../pipeline/files/glob.ts';
import { sha256, sha256OfFile } from '../../pipeline/files/hash.ts';
import { newPathInside, pathInside } from '../../pipeline/files/inside.ts';
import { readBytes, readPieces } from '../../pipeline/files/read.ts';
import { makeFolder, removeFile, replaceFile } from '../../pipeline/files/write.ts';

const root = mkdtempSync(join(tmpdir(), 'files-'));
afterAll(() => rmSync(root, { recursive: true, force: true }));

const fault = (act: () => unknown): InputError => {
  try {
    act();
  } catch (error) {
    if (error instanceof InputError) return error;
    throw error;
  }
  throw new Error('nothing was refused');
};
const code = (act: () => unknown): string => fault(act).messages[0]!.code;

describe('paths named by a study stay in its folder', () => {
  const study = join(root, 'paths');
  mkdirSync(join(study, 'data'), { recursive: true });
  writeFileSync(join(study, 'data', 'a.csv'), 'x');
  writeFileSync(join(root, 'secret.csv'), 'x');
  symlinkSync('../secret.csv', join(study, 'out.csv'));
  symlinkSync(root, join(study, 'up'));
  symlinkSync('data/a.csv', join(study, 'in.csv'));
  const place = { file: 'study.yaml', line: 3, key: 'trials.file' };

  test.each(['data/a.csv', './data/a.csv', 'data/../data/a.csv', 'in.csv'])('%s is inside', (path) => {
    expect(relative(study, pathInside(study, path, place))).toBe(join('data', 'a.csv'));
  });

  test.each(['../secret.csv', 'data/../../secret.csv', '/etc/hostname', 'out.csv', 'up/secret.csv', 'C:\\x.csv', 'a\0.csv', '..'])(
    '%s is refused',
    (path) => {
      expect(code(() => pathInside(study, path, place))).toBe('path-outside');
      expect(fault(() => pathInside(study, path, place)).messages[0]!.place).toBe(place);
      expect(code(() => newPathInside(study, path, place))).toBe('path-outside');
    },
  );

  test('a missing file is a fault of the study file, at its place', () => {
    const error = fault(() => pathInside(study, 'data/b.csv', place));
    expect([error.exit, error.messages[0]!.code, error.messages[0]!.place]).toEqual([2, 'file-missing', place]);
  });

  test('a result folder need not exist yet', () => {
    expect(newPathInside(study, 'results/new', place)).toBe(join(study, 'results', 'new'));
    expect(code(() => newPathInside(study, 'up/results', place))).toBe('path-outside');
  });
});

describe('reading', () => {
  test('a file larger than allowed, a folder, a missing file', () => {
    writeFileSync(join(root, 'big'), Buffer.alloc(2000));
    expect(code(() => readBytes(join(root, 'big'), { most: 1999 }))).toBe('file-too-large');
    expect(readBytes(join(root, 'big'), { most: 2000 }).length).toBe(2000);
    expect(code(() => readBytes(root, { most: 10 }))).toBe('file-no-file');
    expect(code(() => readBytes(join(root, 'nothing'), { most: 10 }))).toBe('file-missing');
    expect(code(() => readBytes('/dev/zero', { most: 10 }))).toBe('file-no-file');
  });

  test('pieces are the whole', () => {
    writeFileSync(join(root, 'pieces'), 'abcdefghij');
    const read = [...readPieces(join(root, 'pieces'), { most: 100 }, 3)].map(String);
    expect(read.length).toBe(4);
    expect([...readPieces(join(root, 'pieces'), { most: 100 }, 100)].map(String)).toEqual(['abcdefghij']);
  });

  // FIPS 180-4 example: SHA-256 of "abc" (NIST, Secure Hash Standard examples)
  test('SHA-256', () => {
    const digest = 'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad';
    writeFileSync(join(root, 'abc'), 'abc');
    expect(sha256('abc')).toBe(digest);
    expect(sha256OfFile(join(root, 'abc'), { most: 10 })).toBe(digest);
  });
});

describe('decoding', () => {
  const text = 'T [°C];ṁ / kg h⁻¹\n1,5;2\n';
  const utf16be = Buffer.from(`\uFEFF${text}`, 'utf16le').swap16();

  test.each([
    ['UTF-8', Buffer.from(text)],
    ['UTF-8 with a mark', Buffer.from(`\uFEFF${text}`)],
    ['UTF-16 LE', Buffer.from(`\uFEFF${text}`, 'utf16le')],
    ['UTF-16 BE', utf16be],
  ])('%s', (_, bytes) => {
    expect(decodeText(bytes, 'a.csv')).toBe(text);
  });

  test('a byte of Windows-1252 is refused with its place and what it would be', () => {
    const error = fault(() => decodeText(Buffer.concat([Buffer.from('run,µ\nT ('), Buffer.from([0xb0]), Buffer.from('C)\n')]), 'a.csv'));
    expect(error.exit).toBe(3);
    expect(error.messages[0]!.place).toEqual({ file: 'a.csv', line: 2, column: 4 });
    expect(error.messages[0]!.text).toContain('0xB0');
    expect(error.messages[0]!.text).toContain('°');
    expect(error.messages[0]!.text).toContain('UTF-8');
  });

  test('UTF-16 without a mark, odd, and with a lone surrogate', () => {
    expect(code(() => decodeText(Buffer.from(text, 'utf16le'), 'a.csv'))).toBe('encoding-unmarked');
    expect(code(() => decodeText(Buffer.concat([Buffer.from(`\uFEFF${text}`, 'utf16le'), Buffer.from([1])]), 'a.csv'))).toBe(
      'encoding-broken',
    );
    expect(code(() => decodeText(Buffer.from([0xff, 0xfe, 0x00, 0xd8, 0x41, 0x00]), 'a.csv'))).toBe('encoding-broken');
  });
});

describe('writing', () => {
  test('a file is replaced and nothing else is left', () => {
    const folder = join(root, 'results');
    makeFolder(folder);
    replaceFile(join(folder, 'a.json'), 'one');
    replaceFile(join(folder, 'a.json'), 'two');
    expect(readFileSync(join(folder, 'a.json'), 'utf8')).toBe('two');
    expect(readdirSync(folder)).toEqual(['a.json']);
    removeFile(join(folder, 'a.json'));
    removeFile(join(folder, 'a.json'));
    expect(readdirSync(folder)).toEqual([]);
  });

  test('a folder or file in the way is refused in words, and the old stays', () => {
    mkdirSync(join(root, 'way', 'a.json'), { recursive: true });
    writeFileSync(join(root, 'way', 'file'), '');
    expect(code(() => replaceFile(join(root, 'way', 'a.json'), 'x'))).toBe('file-not-written');
    expect(code(() => replaceFile(join(root, 'way', 'none', 'b.json'), 'x'))).toBe('file-not-written');
    expect(code(() => makeFolder(join(root, 'way', 'file', 'deep')))).toBe('folder-not-made');
    expect(readdirSync(join(root, 'way')).sort()).toEqual(['a.json', 'file']);
  });

  test('every cause has words, a defect of ours has none', () => {
    const cause = (code: string): string => causeOf(Object.assign(new Error(code), { code }));
    expect(['ENOSPC', 'EDQUOT', 'EROFS', 'EACCES', 'EMFILE'].map(cause)).toEqual([
      'full',
      'full',
      'read-only',
      'not allowed',
      'too many open files',
    ]);
    expect(says.notWritten('a', cause('ENOSPC'))).toContain('make room');
    expect(says.notWritten('a', cause('EROFS'))).toContain('read-only');
    expect(says.notWritten('a', cause('EIO'))).toContain('refused');
    expect(() => causeOf(new TypeError('x'))).toThrow(TypeError);
    expect(() => causeOf(Object.assign(new Error(), { code: 'ERR_INVALID_ARG_TYPE' }))).toThrow(Error);
  });

  test.skipIf(process.getuid?.() === 0)('a read-only folder is refused in words', () => {
    const folder = join(root, 'locked');
    mkdirSync(folder);
    chmodSync(folder, 0o500);
    expect(fault(() => replaceFile(join(folder, 'a'), 'x')).messages[0]!.text).toContain('permission');
  });
});

describe('finding studies', () => {
  const base = join(root, 'site');
  for (const unit of ['a', 'b/deep', 'b/node_modules/x', '.git/y']) {
    mkdirSync(join(base, unit), { recursive: true });
    writeFileSync(join(base, unit, 'study.yaml'), 'pilotlaw: 1');
  }
  writeFileSync(join(base, 'b', 'other.yaml'), 'pilotlaw: 1');
  symlinkSync(base, join(base, 'a', 'circle'));
  const names = (given: readonly string[]): readonly string[] => findStudies(given).map((file) => relative(base, file));

  test('folders are walked, files taken, nothing twice', () => {
    expect(names([base])).toEqual(['a/study.yaml', 'b/deep/study.yaml']);
    expect(names([join(base, 'b', 'other.yaml'), join(base, 'a'), base])).toEqual(['a/study.yaml', 'b/deep/study.yaml', 'b/other.yaml']);
  });

  test('globs', () => {
    expect(names([join(base, '*', '*.yaml')])).toEqual(['a/study.yaml', 'b/other.yaml']);
    expect(names([join(base, '**', 'study.yaml')])).toEqual(['a/study.yaml', 'b/deep/study.yaml']);
    expect(names([join(base, '?')])).toEqual(['a/study.yaml']);
    expect(globPattern('a+b/*.c').test('aab/x.c')).toBe(false);
  });

  test('what leads to no study is refused, all at once', () => {
    const error = fault(() => findStudies([join(base, 'nothing'), join(base, 'b', 'node_modules', 'none'), join(base, 'z*')]));
    expect(error.messages.map((message) => message.code)).toEqual(['no-study', 'no-study', 'no-study']);
    expect(code(() => findStudies([]))).toBe('no-study');
  });
});
