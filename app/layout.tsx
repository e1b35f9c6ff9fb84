import type { Metadata, Viewport } from 'next';
import type { ReactNode } from 'react';
import { themeScript } from '@/components/shell/theme';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Setwell', template: '%s · Setwell' },
  description:
    'Books site measures and installs for cabinet shops, proves the walls on site, and works out the scribes and fillers.',
  applicationName: 'Setwell',
  formatDetection: { telephone: false, date: false, address: false, email: false },
};

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  viewportFit: 'cover',
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#f6f4ee' },
    { media: '(prefers-color-scheme: dark)', color: '#14181b' },
  ],
};

export default function RootLayout({ children }: { children: ReactNode }) {
  return (
    <html lang="en" suppressHydrationWarning>
      <head>
        <script>{themeScript}</script>
      </head>
      <body>{children}</body>
    </html>
  );
}
