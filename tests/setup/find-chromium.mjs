import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';

const places = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome'];

/** A Chromium of the machine, installed from Debian's packages where that is possible; null with the reason said. */
export function findChromium() {
  const given = process.env.CHROMIUM;
  const found = [given, ...places].find((place) => place && existsSync(place));
  if (found) return found;
  if (process.getuid?.() === 0 && existsSync('/usr/bin/apt-get')) {
    console.log('· installing Chromium from Debian (one to two minutes, once)');
    const quiet = { stdio: 'ignore', env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' } };
    spawnSync('apt-get', ['update'], quiet);
    spawnSync('apt-get', ['install', '-y', '--no-install-recommends', 'chromium'], quiet);
    if (existsSync(places[0])) return places[0];
  }
  console.error(
    'No Chromium was found, and it cannot be installed from here. The browser tests need one: as root, "apt-get install chromium", or set CHROMIUM to its path.',
  );
  return null;
}
