import { withSerwist } from '@serwist/turbopack';
import type { NextConfig } from 'next';

const isDevelopment = process.env.NODE_ENV === 'development';

/**
 * Next writes its own inline scripts into every page, so 'unsafe-inline' stays for scripts: the other
 * way, a nonce, would make every page wait for the server. Nothing is loaded from other hosts.
 */
const contentSecurityPolicy = [
  "default-src 'self'",
  `script-src 'self' 'unsafe-inline'${isDevelopment ? " 'unsafe-eval'" : ''}`,
  "style-src 'self' 'unsafe-inline'",
  "img-src 'self' data: blob:",
  "font-src 'self' data:",
  `connect-src 'self'${isDevelopment ? ' ws:' : ''}`,
  "worker-src 'self'",
  "manifest-src 'self'",
  "object-src 'none'",
  "base-uri 'self'",
  "form-action 'self'",
  // The demo shows its phone screens in a frame of the same site.
  "frame-src 'self'",
  "frame-ancestors 'self'",
].join('; ');

const securityHeaders = [
  { key: 'Content-Security-Policy', value: contentSecurityPolicy },
  { key: 'X-Content-Type-Options', value: 'nosniff' },
  { key: 'X-Frame-Options', value: 'SAMEORIGIN' },
  { key: 'Referrer-Policy', value: 'strict-origin-when-cross-origin' },
  { key: 'Cross-Origin-Opener-Policy', value: 'same-origin' },
  // Browsers heed this over https only, so a laptop on http://localhost is not locked out.
  { key: 'Strict-Transport-Security', value: 'max-age=31536000' },
  {
    key: 'Permissions-Policy',
    value: 'camera=(self), geolocation=(self), microphone=(), payment=(), usb=()',
  },
];

const nextConfig: NextConfig = {
  poweredByHeader: false,
  reactStrictMode: true,
  // Loaded by Node as they are: WebAssembly, native sockets, or their own data files beside the code.
  serverExternalPackages: [
    '@electric-sql/pglite',
    'pg',
    'twilio',
    'nodemailer',
    'smtp-server',
    'mailparser',
    'moment',
    'moment-timezone',
    'pdfkit',
  ],
  async headers() {
    return [
      { source: '/:path*', headers: securityHeaders },
      // A newer worker is found the next time anybody asks, whatever stands between.
      { source: '/serwist/:path*', headers: [{ key: 'Cache-Control', value: 'no-cache' }] },
      // The token in a customer's address is the permission itself: it goes to no other site. Within this
      // one it may: with no referrer at all, browsers hide the origin of the form that answers.
      {
        source: '/v/:path*',
        headers: [
          { key: 'Referrer-Policy', value: 'same-origin' },
          { key: 'X-Robots-Tag', value: 'noindex' },
        ],
      },
    ];
  },
};

export default withSerwist(nextConfig);
