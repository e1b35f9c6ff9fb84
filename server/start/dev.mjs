/** `npm run dev`: the demo shop with reloading pages, on its own data. */
import { spawn } from 'node:child_process';
import { ensureInstalled } from './ensure-installed.mjs';

ensureInstalled((words) => console.log(`· ${words}`));
const port = process.env.PORT ?? '3000';
const child = spawn(process.execPath, ['node_modules/next/dist/bin/next', 'dev', '-p', port], {
  stdio: 'inherit',
  env: {
    ...process.env,
    NEXT_TELEMETRY_DISABLED: '1',
    SETWELL_DATA: process.env.SETWELL_DATA ?? '.data/dev',
    SETWELL_DEMO: '1',
    PUBLIC_URL: process.env.PUBLIC_URL ?? `http://localhost:${port}`,
  },
});
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => child.kill(signal));
child.once('exit', (code) => process.exit(code ?? 0));
