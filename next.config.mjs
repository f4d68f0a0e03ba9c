/** For every answer; what differs per page (the content security policy) is set by proxy.ts. */
const fixedHeaders = [
  { key: 'X-Content-Type-Options', value: 'nosniff' },
  { key: 'X-Frame-Options', value: 'DENY' },
  { key: 'Referrer-Policy', value: 'same-origin' },
  { key: 'Permissions-Policy', value: 'camera=(), microphone=(), geolocation=(), payment=(), usb=()' },
  { key: 'Cross-Origin-Opener-Policy', value: 'same-origin' },
  { key: 'Cross-Origin-Resource-Policy', value: 'same-origin' },
  { key: 'Strict-Transport-Security', value: 'max-age=31536000' },
];

/** Addresses that are secrets: not indexed, not passed on, not kept. */
const secretLinkHeaders = [
  { key: 'Referrer-Policy', value: 'no-referrer' },
  { key: 'X-Robots-Tag', value: 'noindex, nofollow' },
  { key: 'Cache-Control', value: 'private, no-store' },
];

/** @type {import('next').NextConfig} */
const config = {
  distDir: process.env.CHAFFLINE_NEXT_DIR ?? '.next',
  poweredByHeader: false,
  reactStrictMode: true,
  // npm test checks the types of everything; a user who starts the product need not wait for it.
  typescript: { ignoreBuildErrors: true },
  async headers() {
    return [
      { source: '/:path*', headers: fixedHeaders },
      // After the general ones: the last value of a header counts.
      ...['/s/:path*', '/api/s/:path*', '/reset/:path*', '/verify/:path*', '/invitation/:path*'].map((source) => ({
        source,
        headers: secretLinkHeaders,
      })),
    ];
  },
  // Code that reads files beside itself or loads native parts must not be bundled.
  serverExternalPackages: [
    '@mikro-orm/core',
    '@mikro-orm/migrations',
    '@mikro-orm/postgresql',
    '@node-rs/argon2',
    'pg',
    'pg-boss',
    'pg-copy-streams',
    'pino',
    'piscina',
    'rate-limiter-flexible',
  ],
};

export default config;
