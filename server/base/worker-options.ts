import { randomUUID } from 'node:crypto';
import type { InjectManifestOptions } from '@serwist/turbopack';
import { phoneAssets } from './phone-assets';

const buildFolder = '.next';
/** Letters that no word of the program has; a name that needs them is set in the phone's own. */
const rareFont = /-vietnamese-/;

/**
 * How the phone's worker is built: its list of files to keep is what the phone's pages load, and the page
 * that stands in for them, new with each build.
 */
export function workerOptions(): InjectManifestOptions {
  return {
    swSrc: 'app/sw.ts',
    useNativeEsbuild: true,
    // One classic script: not every browser starts a worker that is a module.
    esbuildOptions: { format: 'iife', sourcemap: false },
    globPatterns: [`${buildFolder}/static/**/*.{js,css,woff2}`, 'public/icon-192.png'],
    additionalPrecacheEntries: [{ url: '/no-signal', revision: randomUUID() }],
    manifestTransforms: [
      async (entries) => {
        const needed = phoneAssets(buildFolder);
        const isNeeded = (url: string) =>
          !url.startsWith(`${buildFolder}/`) || needed.has(url.slice(buildFolder.length + 1));
        const manifest = entries.filter(({ url }) => isNeeded(url) && !rareFont.test(url));
        return { manifest, warnings: [] };
      },
    ],
  };
}
