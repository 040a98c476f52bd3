/** @type {import('next').NextConfig} */
const config = {
  typedRoutes: true,
  poweredByHeader: false,
  serverExternalPackages: ['better-sqlite3', '@node-rs/argon2', 'nodemailer', 'mailparser'],
};

export default config;
