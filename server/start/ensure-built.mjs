import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';

const stampFile = '.next/setwell-built-from';
const folders = ['app', 'components', 'lib', 'server', 'db', 'public'];
const files = [
  'package-lock.json',
  'next.config.ts',
  'tailwind.config.ts',
  'postcss.config.mjs',
  'tsconfig.json',
  'instrumentation.ts',
  'proxy.ts',
];

/** Builds when the sources differ from those of the last build. */
export function ensureBuilt(say) {
  const stamp = sourceHash();
  if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === stamp) return;
  say('building (about a minute, once)');
  const build = spawnSync('npx', ['next', 'build'], {
    stdio: ['ignore', 'pipe', 'pipe'],
    env: {
      ...process.env,
      NEXT_TELEMETRY_DISABLED: '1',
      NODE_ENV: 'production',
      // Where nothing can be opened: a build that wanted a database would fail here, and not on a shop's data.
      DATABASE_URL: 'postgres://nowhere.invalid/none',
      SETWELL_DATA: '/dev/null/none',
    },
    encoding: 'utf8',
  });
  if (build.status !== 0) {
    console.error(build.stdout, build.stderr);
    console.error('The build failed: see the lines above. Nothing was started.');
    process.exit(1);
  }
  writeFileSync(stampFile, stamp);
}

function sourceHash() {
  const hash = createHash('sha256');
  for (const file of [...files.filter(existsSync), ...folders.flatMap(listFiles)]) {
    hash.update(file).update(readFileSync(file));
  }
  return hash.digest('hex');
}

function listFiles(folder) {
  return readdirSync(folder, { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile())
    .map((entry) => path.join(entry.parentPath ?? entry.path, entry.name))
    .sort();
}
