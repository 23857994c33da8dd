import { fileURLToPath } from 'node:url'

const root = fileURLToPath(new URL('.', import.meta.url))

const headers = [
  { key: 'X-Content-Type-Options', value: 'nosniff' },
  { key: 'Referrer-Policy', value: 'strict-origin-when-cross-origin' },
  { key: 'Permissions-Policy', value: 'camera=(), microphone=(), geolocation=(), payment=(), usb=()' },
  { key: 'Cross-Origin-Opener-Policy', value: 'same-origin' },
  { key: 'Cross-Origin-Resource-Policy', value: 'same-origin' },
  { key: 'X-Frame-Options', value: 'SAMEORIGIN' },
  { key: 'Strict-Transport-Security', value: 'max-age=31536000; includeSubDomains' },
]

/** @type {import('next').NextConfig} */
const config = {
  poweredByHeader: false,
  reactStrictMode: true,
  // Types are checked by a step of their own in `npm test` and `npm run check`; a start need not wait for them again.
  typescript: { ignoreBuildErrors: true },
  turbopack: { root },
  outputFileTracingRoot: root,
  distDir: process.env.NEXT_DIST_DIR ?? '.next',
  serverExternalPackages: [
    'knex',
    'mysql2',
    'pino',
    'thread-stream',
    '@node-rs/argon2',
    '@react-pdf/renderer',
    '@retorquere/bibtex-parser',
    'mathjax',
    'sharp',
    'astronomy-engine',
  ],
  experimental: {
    serverActions: { bodySizeLimit: '25mb' },
    proxyClientMaxBodySize: '26mb',
  },
  headers: async () => [{ source: '/:path*', headers }],
  // A file opened in a tab of its own has no page to name its icon, so the browser asks for this.
  rewrites: async () => [{ source: '/favicon.ico', destination: '/favicon.svg' }],
}

export default config
