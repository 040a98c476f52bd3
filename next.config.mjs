/** @type {import('next').NextConfig} */
const config = {
  typedRoutes: true,
  poweredByHeader: false,
  // forbidden() answers 403 with the nearest forbidden.tsx.
  experimental: { authInterrupts: true },
  serverExternalPackages: ['better-sqlite3', '@node-rs/argon2', 'nodemailer', 'mailparser'],
};

export default config;
