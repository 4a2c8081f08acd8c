/** @type {import('next').NextConfig} */
const config = {
  distDir: process.env.WITNESSMARK_DIST ?? '.next',
  reactStrictMode: true,
  poweredByHeader: false,
  turbopack: { root: import.meta.dirname },
  outputFileTracingRoot: import.meta.dirname,
  serverExternalPackages: ['knex', 'pg', '@node-rs/argon2', 'nodemailer'],
  headers: async () => [
    {
      source: '/:path*',
      headers: [
        { key: 'x-content-type-options', value: 'nosniff' },
        { key: 'referrer-policy', value: 'same-origin' },
        { key: 'x-frame-options', value: 'DENY' },
        {
          key: 'content-security-policy',
          value: "object-src 'none'; base-uri 'none'; frame-ancestors 'none'; form-action 'self'",
        },
        { key: 'permissions-policy', value: 'geolocation=(), microphone=(), payment=()' },
      ],
    },
  ],
};

export default config;
