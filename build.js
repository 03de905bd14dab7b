// Builds dist/: the compiler, then the JSON Schema of the study file, then the executable bit of the command.
import { execFileSync } from 'node:child_process';
import { chmodSync, existsSync, rmSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';

const manifest = createRequire(import.meta.url).resolve('typescript/package.json');
rmSync('dist', { recursive: true, force: true });
execFileSync(process.execPath, [join(dirname(manifest), 'bin/tsc'), '-p', 'tsconfig.json'], { stdio: 'inherit' });
if (existsSync('dist/pipeline/study/json-schema.js')) {
  const { studyJsonSchema } = await import('./dist/pipeline/study/json-schema.js');
  if (typeof studyJsonSchema === 'function') writeFileSync('dist/study.schema.json', `${JSON.stringify(studyJsonSchema(), null, 2)}\n`);
}
chmodSync('dist/pipeline/cli/main.js', 0o755);
