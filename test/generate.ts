import { execFileSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { join } from 'node:path';

/** Tests run from source without a build: the one module that a build generates is made here where it is missing. */
export default function generate(): void {
  const root = join(import.meta.dirname, '..');
  if (existsSync(join(root, 'reports/assets/live.generated.ts'))) return;
  execFileSync(process.execPath, ['build.js', 'live'], { cwd: root, stdio: 'inherit' });
}
