import { spawn } from 'node:child_process';
import path from 'node:path';

/** Starts the built program and waits until its database answers. Gives the child process. */
export async function serve({ port, dataDirectory, demo, quiet }) {
  const address = `http://localhost:${port}`;
  const next = path.resolve('node_modules/next/dist/bin/next');
  const child = spawn(process.execPath, [next, 'start', '-p', String(port)], {
    stdio: ['ignore', quiet ? 'pipe' : 'inherit', 'inherit'],
    env: {
      ...process.env,
      NODE_ENV: 'production',
      NEXT_TELEMETRY_DISABLED: '1',
      SETWELL_DATA: dataDirectory,
      SETWELL_DEMO: demo ? '1' : '0',
      PUBLIC_URL: process.env.PUBLIC_URL ?? address,
    },
  });
  let ended = false;
  child.once('exit', () => {
    ended = true;
  });
  for (let tries = 0; tries < 600; tries += 1) {
    if (ended) throw new Error('The program stopped while starting: see the lines above.');
    if (await answers(`${address}/api/health`)) return child;
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
  child.kill('SIGKILL');
  throw new Error(`Nothing answered on ${address} within two minutes.`);
}

async function answers(url) {
  try {
    return (await fetch(url)).ok;
  } catch {
    return false;
  }
}
