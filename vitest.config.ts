import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const root = import.meta.dirname;

// The wrong zone on purpose: code that forgets the household's time zone fails here and not at somebody's pool.
const env = { TZ: 'Asia/Kathmandu' };

// The suite shares two cores with a build: a test that is slow there is not a test that hangs.
const patience = { testTimeout: 30_000, hookTimeout: 60_000 };

const unit = {
  env,
  ...patience,
  include: ['tests/**/*.test.ts'],
  exclude: ['tests/e2e/**', 'tests/bench/**', '**/node_modules/**'],
  setupFiles: ['tests/support/seed.ts'],
  globalSetup: ['tests/support/base-database.ts', 'tests/support/print-seed.ts'],
};
const component = {
  env,
  ...patience,
  environment: 'jsdom',
  include: ['tests/**/*.test.tsx'],
  exclude: ['**/node_modules/**'],
  setupFiles: ['tests/support/seed.ts', 'tests/support/dom.ts'],
};
const standingIn = 'tests/components/{navigation,pool,start}/*.test.tsx';
const routes = 'tests/api/**/*.test.ts';

export default defineConfig({
  resolve: { alias: { '@': root, 'server-only': `${root}/tests/support/empty.ts` } },
  test: {
    projects: [
      // What a file imports is kept for the next one: importing it anew for each would take as long as the tests.
      { extends: true, test: { ...unit, name: 'unit', isolate: false, exclude: [...unit.exclude, routes] } },
      // The routes keep one database and one clock for the whole process, so each of these files has a process of its own.
      { extends: true, test: { ...unit, name: 'routes', include: [routes] } },
      {
        extends: true,
        plugins: [react()],
        test: { ...component, name: 'component', isolate: false, exclude: [...component.exclude, standingIn] },
      },
      // These put something of their own in the place of a module, which the next file must not get.
      { extends: true, plugins: [react()], test: { ...component, name: 'stand-ins', include: [standingIn] } },
    ],
  },
});
