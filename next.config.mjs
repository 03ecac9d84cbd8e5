/** @type {import('next').NextConfig} */
const config = {
  poweredByHeader: false,
  reactStrictMode: true,
  // Packages with native parts or with optional requires that a bundler cannot follow.
  serverExternalPackages: ['knex', 'pg', '@node-rs/argon2', 'pino', 'nodemailer', 'rate-limiter-flexible'],
  // The project is its own root, whatever lock files lie in the folders above it.
  turbopack: { root: import.meta.dirname },
};

export default config;
