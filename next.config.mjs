/**
 * The page policy (Content-Security-Policy) is not here: it carries a nonce and is set per request in `proxy.ts`.
 */
const securityHeaders = [
  { key: 'X-Content-Type-Options', value: 'nosniff' },
  { key: 'Referrer-Policy', value: 'same-origin' },
  { key: 'X-Frame-Options', value: 'DENY' },
  { key: 'Permissions-Policy', value: 'camera=(), microphone=(), geolocation=()' },
  { key: 'Cross-Origin-Opener-Policy', value: 'same-origin' },
]

/** @type {import('next').NextConfig} */
const config = {
  poweredByHeader: false,
  reactStrictMode: true,
  // These read files beside themselves or load native code, so they must stay outside the bundle.
  serverExternalPackages: [
    '@electric-sql/pglite',
    '@node-rs/argon2',
    'date-holidays',
    'nodemailer',
    'pg',
    'pg-boss',
    'pino',
    'twilio',
  ],
  outputFileTracingIncludes: { '/**': ['./db/migrations/**/*'] },
  // Types are a step of their own (`npm run types`), tests included: a newcomer's first start need not wait for it.
  typescript: { ignoreBuildErrors: true },
  async headers() {
    return [{ source: '/:path*', headers: securityHeaders }]
  },
}

export default config
