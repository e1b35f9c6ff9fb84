import type { MetadataRoute } from 'next';
import { paths } from '@/lib/paths';

/** Setwell as a program on the phone's home screen: it opens on the day's visits. */
export default function manifest(): MetadataRoute.Manifest {
  return {
    id: paths.today(),
    name: 'Setwell',
    short_name: 'Setwell',
    description: 'The day’s visits and the wall books, with or without a signal.',
    start_url: paths.today(),
    scope: '/',
    display: 'standalone',
    background_color: '#f6f4ee',
    theme_color: '#f6f4ee',
    icons: [
      { src: '/icon-192.png', sizes: '192x192', type: 'image/png' },
      { src: '/icon-512.png', sizes: '512x512', type: 'image/png' },
      { src: '/icon-maskable-512.png', sizes: '512x512', type: 'image/png', purpose: 'maskable' },
    ],
  };
}
