import { spawn, spawnSync } from 'node:child_process';
import { randomUUID } from 'node:crypto';
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
  ['scheduler', '/days'],
  ['owner', '/numbers'],
  ['bench', '/bench'],
  ['measurer', '/today'],
];
/** The pages of people who stand in a kitchen or have never heard of the program: kept near the empty page. */
const light = /^\/(v|today|walls|snags)\b/;
const lightKB = 60;

export async function measureFirstLoad() {
  const empty = await emptyPageBytes();
  const dataDirectory = mkdtempSync(path.join(os.tmpdir(), 'setwell-bench-'));
  const port = 3417;
  const base = `http://localhost:${port}`;
  const child = await serve({ port, dataDirectory, demo: true, quiet: true });
  child.stdout.on('data', () => {});
  try {
    const rows = [];
    const people = await signInAll(base);
    for (const [role, address] of [...routes, ...(await routesOfTheDemo(base, people))]) {
      const bytes = await firstLoadBytes(`${base}${address}`, role ? people[role] : '');
      const over = bytes - empty;
      rows.push({
        route: address
          .replace(/[0-9a-f]{8}-[0-9a-f-]{27}/g, '[id]')
          .replace(/^\/v\/.*/, '/v/[token]'),
        'kB gzipped': kB(bytes),
        'over empty': kB(over),
        aim: light.test(address)
          ? over <= lightKB * 1000
            ? `≤ ${lightKB}`
            : `over ${lightKB}`
          : '',
      });
    }
    console.log(`empty page of the framework: ${kB(empty)} kB`);
    console.table(rows);
  } finally {
    child.kill('SIGKILL');
    rmSync(dataDirectory, { recursive: true, force: true });
  }
}

/** A room as the phone and the office show it, a stop of the day, and what a customer gets by link. */
async function routesOfTheDemo(base, people) {
  const asking = (role) => async (address, body) =>
    (
      await fetch(`${base}${address}`, {
        method: body ? 'POST' : 'GET',
        headers: { cookie: people[role], origin: base, 'content-type': 'application/json' },
        body: body ? JSON.stringify(body) : undefined,
      })
    ).json();
  const ask = asking('owner');
  const jobs = await ask('/api/jobs');
  const measured = jobs.find((job) => job.stage === 'measured');
  const [room] = await ask(`/api/rooms?jobId=${measured.id}`);
  const crew = (await ask('/api/crews')).find(({ does }) => does === 'measure');
  const waiting = (await ask('/api/waiting')).find(({ kind }) => kind === 'site-measure');
  const { email } = await ask(`/api/jobs/${waiting.jobId}`);
  let visit = {};
  // A weekend or a holiday is refused.
  for (let ahead = 40; !visit.id && ahead < 50; ahead += 1) {
    const date = new Date(Date.now() + ahead * 86_400_000).toISOString().slice(0, 10);
    const place = {
      jobId: waiting.jobId,
      kind: 'site-measure',
      crewId: crew.id,
      date,
      time: '09:00',
    };
    visit = await ask('/api/visits', { ...place, idempotencyKey: randomUUID() });
  }
  return [
    ['measurer', `/today/${visit.id}`],
    ['measurer', `/walls/${room.id}`],
    ['measurer', `/jobs/${measured.id}/rooms/${room.id}`],
    [null, await emailedLink(base, email)],
  ];
}

/** The customer's link, from the fake inbox once the worker has written to it. */
async function emailedLink(base, email) {
  for (let tries = 0; tries < 200; tries += 1) {
    const inbox = await fetch(`${base}/demo/phone?address=${encodeURIComponent(email)}`);
    const link = (await inbox.text()).match(/href="https?:[^"]*(\/v\/[^"]+)"/)?.[1];
    if (link) return link;
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
  throw new Error(`no link arrived for ${email}`);
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

/** Once each: tries at the door are counted. */
async function signInAll(base) {
  const people = {};
  for (const role of ['owner', 'scheduler', 'measurer', 'bench']) {
    people[role] = await cookieOf(base, role);
  }
  return people;
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
