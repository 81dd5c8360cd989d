import createNextIntlPlugin from 'next-intl/plugin';

const withMessages = createNextIntlPlugin({
  requestConfig: './app/request-words.ts',
  experimental: { messages: { path: './lib/messages', format: 'json', locales: ['en', 'es'], precompile: true } },
});

/** @type {import('next').NextConfig} */
const config = {
  // The test suite builds beside the build that `npm start` serves; rebuilding under a running server breaks it.
  distDir: process.env.NEXT_DIST_DIR ?? '.next',
  outputFileTracingRoot: import.meta.dirname,
  turbopack: { root: import.meta.dirname },
  poweredByHeader: false,
  experimental: {
    // Few and larger files: on a phone each request of a first visit costs more than the bytes that two pages both bring.
    turbopackChunking: {
      firstPageLoadPriority: 1,
      requestCost: 5_000_000,
      minChunkSize: 400_000,
      maxMergeChunkSize: 1_000_000,
      maxChunkCountPerGroup: 6,
    },
  },
  serverExternalPackages: ['@libsql/client', '@node-rs/argon2', 'pino'],
};

export default withMessages(config);
