/** @type {import('next').NextConfig} */
const config = {
  distDir: process.env.WITNESSMARK_DIST ?? '.next',
  reactStrictMode: true,
  poweredByHeader: false,
  turbopack: { root: import.meta.dirname },
  outputFileTracingRoot: import.meta.dirname,
  serverExternalPackages: ['knex', 'pg', '@node-rs/argon2', 'nodemailer'],
  env: { NEXT_PUBLIC_VERSION: process.env.npm_package_version ?? '' },
};

export default config;
