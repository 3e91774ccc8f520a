import { fileURLToPath } from 'node:url';

const ONE_HOUR = 'public, max-age=3600, stale-while-revalidate=86400';

// Headers of several rules add up and the strictest wins, so script-src is left to each page: stored pages carry theirs by hash
// (lib/pages), pages rendered per request get a nonce (proxy.ts).
const BASE_POLICY = [
  "connect-src 'self'",
  "img-src 'self' data:",
  "font-src 'self'",
  "style-src 'self'",
  "script-src-attr 'none'",
  "worker-src 'none'",
  "frame-src 'none'",
  "media-src 'none'",
  "form-action 'self'",
  "base-uri 'none'",
  "object-src 'none'",
  "frame-ancestors 'none'",
].join('; ');
const DATA_POLICY = "default-src 'none'; base-uri 'none'; form-action 'none'; frame-ancestors 'none'";
const UNUSED = ['camera', 'display-capture', 'geolocation', 'microphone', 'midi', 'payment', 'serial', 'usb'];

const header = (key, value) => ({ key, value });

/** @type {import('next').NextConfig} */
const config = {
  distDir: process.env.NEXT_DIST_DIR || '.next',
  poweredByHeader: false,
  serverExternalPackages: ['knex', 'mysql2', 'pino'],
  cacheHandler: fileURLToPath(new URL('./lib/pages/cache-handler.mjs', import.meta.url)),
  cacheMaxMemorySize: 0,
  images: { unoptimized: true },
  typedRoutes: false,
  headers: async () => [
    {
      source: '/:path*',
      headers: [
        header('Content-Security-Policy', BASE_POLICY),
        header('X-Content-Type-Options', 'nosniff'),
        header('Referrer-Policy', 'strict-origin-when-cross-origin'),
        header('Permissions-Policy', UNUSED.map((name) => `${name}=()`).join(', ')),
        header('Cross-Origin-Opener-Policy', 'same-origin'),
        header('Cross-Origin-Resource-Policy', 'same-origin'),
        header('Strict-Transport-Security', 'max-age=31536000'),
      ],
    },
    { source: '/api/:path*', headers: [header('Content-Security-Policy', DATA_POLICY)] },
    { source: '/settle.js', headers: [header('Cache-Control', ONE_HOUR)] },
  ],
};

export default config;
