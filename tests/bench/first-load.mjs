import { spawn, spawnSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { gzipSync } from 'node:zlib';
import { serve } from '../../server/start/serve.mjs';

const password = 'setwell-demo';
/** [who is signed in, address]; null: nobody. */
const routes = [
  [null, '/'],
  [null, '/check'],
  [null, '/sign-in'],
  [null, '/demo/phone'],
  ['scheduler', '/diary'],
  ['scheduler', '/jobs'],
  ['scheduler', '/messages'],
  ['owner', '/rules'],
  ['bench', '/bench'],
  ['measurer', '/today'],
];

export async function measureFirstLoad() {
  const empty = await emptyPageBytes();
  const dataDirectory = mkdtempSync(path.join(os.tmpdir(), 'setwell-bench-'));
  const port = 3417;
  const base = `http://localhost:${port}`;
  const child = await serve({ port, dataDirectory, demo: true, quiet: true });
  child.stdout.on('data', () => {});
  try {
    const rows = [];
    for (const [role, address] of await withRoomAndVisit(base)) {
      const cookie = role ? await cookieOf(base, role) : '';
      const bytes = await firstLoadBytes(`${base}${address}`, cookie);
      rows.push({
        route: address.replace(/[0-9a-f]{8}-[0-9a-f-]{27}/g, '[id]'),
        'kB gzipped': kB(bytes),
        'over empty': kB(bytes - empty),
      });
    }
    console.log(`empty page of the framework: ${kB(empty)} kB`);
    console.table(rows);
  } finally {
    child.kill('SIGKILL');
    rmSync(dataDirectory, { recursive: true, force: true });
  }
}

/** The fixed routes, and a room of the demo as the phone and the office show it. */
async function withRoomAndVisit(base) {
  const cookie = await cookieOf(base, 'measurer');
  const get = async (address) => (await fetch(`${base}${address}`, { headers: { cookie } })).json();
  const jobs = await get('/api/jobs');
  const measured = jobs.find((job) => job.stage === 'measured');
  const html = await (await fetch(`${base}/jobs/${measured.id}`, { headers: { cookie } })).text();
  const roomId = html.match(/\/rooms\/([0-9a-f-]{36})/)?.[1];
  return [
    ...routes,
    ['measurer', `/walls/${roomId}`],
    ['measurer', `/jobs/${measured.id}/rooms/${roomId}`],
  ];
}

/** The framework alone: one page with one word, built with the same versions. */
async function emptyPageBytes() {
  const folder = mkdtempSync(path.join(os.tmpdir(), 'setwell-empty-'));
  mkdirSync(path.join(folder, 'app'));
  symlinkSync(path.resolve('node_modules'), path.join(folder, 'node_modules'));
  writeFileSync(path.join(folder, 'package.json'), '{"private":true}');
  writeFileSync(
    path.join(folder, 'app/layout.js'),
    'export default function Layout({ children }) { return <html><body>{children}</body></html>; }',
  );
  writeFileSync(
    path.join(folder, 'app/page.js'),
    'export default function Page() { return <p>Empty</p>; }',
  );
  writeFileSync(
    path.join(folder, 'next.config.js'),
    `module.exports = { turbopack: { root: ${JSON.stringify(path.resolve('/'))} } };`,
  );
  const next = path.resolve('node_modules/next/dist/bin/next');
  const options = { cwd: folder, env: { ...process.env, NEXT_TELEMETRY_DISABLED: '1' } };
  const build = spawnSync(process.execPath, [next, 'build'], { ...options, encoding: 'utf8' });
  if (build.status !== 0) throw new Error(`the empty page was not built: ${build.stderr}`);
  const child = spawn(process.execPath, [next, 'start', '-p', '3418'], {
    ...options,
    stdio: 'ignore',
  });
  try {
    for (let tries = 0; tries < 100; tries += 1) {
      const bytes = await firstLoadBytes('http://localhost:3418/', '').catch(() => 0);
      if (bytes > 0) return bytes;
      await new Promise((resolve) => setTimeout(resolve, 200));
    }
    throw new Error('the empty page did not answer');
  } finally {
    child.kill('SIGKILL');
    rmSync(folder, { recursive: true, force: true });
  }
}

async function firstLoadBytes(url, cookie) {
  const response = await fetch(url, { headers: { cookie } });
  if (!response.ok) throw new Error(`${url}: ${response.status}`);
  const html = await response.text();
  const scripts = [...html.matchAll(/<script[^>]*\bsrc="([^"]+\.js[^"]*)"[^>]*>/g)]
    .filter(([tag]) => !/nomodule/i.test(tag))
    .map(([, source]) => new URL(source, url).href);
  const sizes = await Promise.all(
    [...new Set(scripts)].map(async (script) => {
      const code = Buffer.from(await (await fetch(script)).arrayBuffer());
      return gzipSync(code, { level: 9 }).length;
    }),
  );
  return sizes.reduce((sum, size) => sum + size, 0);
}

async function cookieOf(base, role) {
  const response = await fetch(`${base}/api/auth/sign-in/email`, {
    method: 'POST',
    headers: { 'content-type': 'application/json', origin: base },
    body: JSON.stringify({ email: `${role}@juniperbend.example`, password }),
  });
  return response.headers
    .getSetCookie()
    .map((cookie) => cookie.split(';')[0])
    .join('; ');
}

const kB = (bytes) => (bytes / 1000).toFixed(1);
