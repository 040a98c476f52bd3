/** @type {import('next').NextConfig} */
const config = {
  typedRoutes: true,
  poweredByHeader: false,
  // `npm test` checks types; a build need not do it again.
  typescript: { ignoreBuildErrors: true },
  // forbidden() answers 403 with the nearest forbidden.tsx.
  experimental: { authInterrupts: true },
  serverExternalPackages: ['better-sqlite3', '@node-rs/argon2', 'nodemailer', 'mailparser'],
};

export default config;
