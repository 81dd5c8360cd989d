import createNextIntlPlugin from 'next-intl/plugin';

const withMessages = createNextIntlPlugin({
  requestConfig: './lib/messages/request.ts',
  experimental: { messages: { path: './lib/messages', format: 'json', locales: ['en'], precompile: true } },
});

/** @type {import('next').NextConfig} */
const config = {
  // The test suite builds beside the build that `npm start` serves; rebuilding under a running server breaks it.
  distDir: process.env.NEXT_DIST_DIR ?? '.next',
  outputFileTracingRoot: import.meta.dirname,
  turbopack: { root: import.meta.dirname },
  poweredByHeader: false,
  serverExternalPackages: ['@libsql/client', '@node-rs/argon2', 'pino'],
};

export default withMessages(config);
