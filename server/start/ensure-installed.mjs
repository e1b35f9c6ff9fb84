import { spawnSync } from 'node:child_process';
import { existsSync, statSync } from 'node:fs';

/** Installs what the lock file names, when nothing is installed or the lock is newer. Plain Node: nothing is there yet. */
export function ensureInstalled(say) {
  const [major] = process.versions.node.split('.').map(Number);
  if (major < 20) {
    console.error(`Setwell needs Node 20 or newer; this is ${process.version}.`);
    process.exit(1);
  }
  const marker = 'node_modules/.package-lock.json';
  const isCurrent =
    existsSync(marker) && statSync(marker).mtimeMs >= statSync('package-lock.json').mtimeMs - 1000;
  if (isCurrent) return;
  say('installing packages (one to two minutes, once)');
  const install = spawnSync('npm', ['ci', '--no-audit', '--no-fund'], { stdio: 'inherit' });
  if (install.status !== 0) {
    console.error('The packages could not be installed: see the lines above. Nothing was started.');
    process.exit(1);
  }
}
