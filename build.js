// Builds what the sources leave to be made. `node build.js live`: only the script of the report's page. `node build.js`: that, then dist/ by the compiler,
// the JSON Schema of the study file, and the executable bit of the command.
import { execFileSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { chmodSync, existsSync, rmSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { build } from 'esbuild';

/** The distributions ask by eval whether the browser knows generators; the page's policy forbids eval, and every browser that inflates knows them. */
const generatorsAreKnown = {
  name: 'generators are known',
  setup({ onResolve, onLoad }) {
    onResolve({ filter: /^@stdlib\/assert-has-generator-support$/ }, ({ path }) => ({ path, namespace: 'known' }));
    onLoad({ filter: /./, namespace: 'known' }, () => ({ contents: 'module.exports = () => true;' }));
  },
};

/** The live script as one text, inflated by the page: reports/assets/live.generated.ts holds it as gzip in base64, and the hash for the page's policy. */
async function bundleLive() {
  const { outputFiles } = await build({
    entryPoints: ['reports/assets/live/main.ts'],
    bundle: true,
    minify: true,
    format: 'iife',
    target: 'es2022',
    legalComments: 'none',
    write: false,
    plugins: [generatorsAreKnown],
    define: { 'process.env.NODE_ENV': '"production"' },
  });
  const code = outputFiles[0].text.trimEnd();
  const hash = createHash('sha256').update(code).digest('base64');
  const gzip = gzipSync(code, { level: 9 }).toString('base64');
  writeFileSync(
    'reports/assets/live.generated.ts',
    `/** Made by build.js from reports/assets/live. */\nexport const liveScript = { hash: 'sha256-${hash}', gzip: '${gzip}' } as const;\n`,
  );
}

function compile() {
  const manifest = createRequire(import.meta.url).resolve('typescript/package.json');
  rmSync('dist', { recursive: true, force: true });
  execFileSync(process.execPath, [join(dirname(manifest), 'bin/tsc'), '-p', 'tsconfig.json'], { stdio: 'inherit' });
}

async function writeSchema() {
  if (!existsSync('dist/pipeline/study/json-schema.js')) return;
  const { studyJsonSchema } = await import('./dist/pipeline/study/json-schema.js');
  if (typeof studyJsonSchema === 'function') writeFileSync('dist/study.schema.json', `${JSON.stringify(studyJsonSchema(), null, 2)}\n`);
}

await bundleLive();
if (process.argv[2] !== 'live') {
  compile();
  await writeSchema();
  chmodSync('dist/pipeline/cli/main.js', 0o755);
}
