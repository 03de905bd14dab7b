import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { version } from '../../pipeline/base/version.ts';

test('the version is that of package.json', () => {
  const manifest: { version: string } = JSON.parse(readFileSync(join(import.meta.dirname, '../../package.json'), 'utf8'));
  expect(version).toBe(manifest.version);
});
