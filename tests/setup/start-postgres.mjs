import { spawnSync } from 'node:child_process';
import { chmodSync, existsSync, mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import os from 'node:os';
import path from 'node:path';

/** A server of our own in a temporary folder, from Debian's packages where there is none. */
export async function startPostgres() {
  const binaries = findBinaries() ?? installBinaries();
  if (!binaries) {
    console.error(
      'No PostgreSQL server was found and none can be installed from here. As root, "apt-get install postgresql", or set TEST_DATABASE_URL to a server where databases may be made.',
    );
    process.exit(1);
  }
  const folder = mkdtempSync(path.join(os.tmpdir(), 'setwell-postgres-'));
  chmodSync(folder, 0o777);
  const data = path.join(folder, 'data');
  const port = await freePort();
  const run = (program, args) => {
    const isRoot = process.getuid?.() === 0;
    const [command, all] = isRoot
      ? ['runuser', ['-u', 'postgres', '--', path.join(binaries, program), ...args]]
      : [path.join(binaries, program), args];
    const done = spawnSync(command, all, { encoding: 'utf8', cwd: folder });
    if (done.status !== 0) throw new Error(`${program}: ${done.stdout}${done.stderr}`);
  };
  run('initdb', [
    '-D',
    data,
    '-U',
    'setwell',
    '--auth=trust',
    '--encoding=UTF8',
    '--locale=C.UTF-8',
  ]);
  const options = `-p ${port} -c listen_addresses=127.0.0.1 -c unix_socket_directories=${folder} -c fsync=off -c max_connections=200`;
  run('pg_ctl', ['-D', data, '-o', options, '-l', path.join(folder, 'log'), '-w', 'start']);
  return {
    url: `postgres://setwell@127.0.0.1:${port}/postgres`,
    stop: () => {
      run('pg_ctl', ['-D', data, '-m', 'immediate', 'stop']);
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

function findBinaries() {
  const root = '/usr/lib/postgresql';
  if (!existsSync(root)) return null;
  const newest = readdirSync(root).sort((a, b) => Number(b) - Number(a));
  return (
    newest
      .map((version) => path.join(root, version, 'bin'))
      .find((folder) => existsSync(path.join(folder, 'initdb'))) ?? null
  );
}

function installBinaries() {
  if (process.getuid?.() !== 0 || !existsSync('/usr/bin/apt-get')) return null;
  console.log('· installing PostgreSQL from Debian');
  const quiet = { stdio: 'ignore', env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' } };
  spawnSync('apt-get', ['update'], quiet);
  spawnSync('apt-get', ['install', '-y', '--no-install-recommends', 'postgresql'], quiet);
  return findBinaries();
}

function freePort() {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const { port } = server.address();
      server.close(() => resolve(port));
    });
  });
}
