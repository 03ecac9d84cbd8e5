/** Headers of every answer; the pages' content security policy, with its nonce, is in proxy.ts. */
const everywhere = [
  { key: 'X-Content-Type-Options', value: 'nosniff' },
  { key: 'Referrer-Policy', value: 'same-origin' },
  { key: 'X-Frame-Options', value: 'DENY' },
  { key: 'Cross-Origin-Opener-Policy', value: 'same-origin' },
  { key: 'Permissions-Policy', value: 'geolocation=(self), camera=(), microphone=(), payment=(), usb=()' },
];
const nothingLoads = "default-src 'none'; frame-ancestors 'none'; base-uri 'none'; form-action 'none'";

/** @type {import('next').NextConfig} */
const config = {
  poweredByHeader: false,
  // Tests build beside what is being served.
  distDir: process.env.TWOBOW_DIST_DIR ?? '.next',
  reactStrictMode: true,
  // Packages with native parts or with optional requires that a bundler cannot follow.
  serverExternalPackages: ['knex', 'pg', '@node-rs/argon2', 'pino', 'nodemailer', 'rate-limiter-flexible'],
  headers: async () => [
    { source: '/:path*', headers: everywhere },
    { source: '/api/:path*', headers: [{ key: 'Content-Security-Policy', value: nothingLoads }] },
  ],
  // The project is its own root, whatever lock files lie in the folders above it.
  turbopack: { root: import.meta.dirname },
};

export default config;
