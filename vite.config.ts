import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';
import { terminalEntry } from './server/services/terminal-entry.ts';

/** Builds the desk and the terminal as two entries of one site, and lays out the test projects. */
export default defineConfig({
  plugins: [react(), tailwindcss(), terminalEntry()],
  publicDir: 'src/public',
  build: {
    outDir: 'dist',
    manifest: true,
    rolldownOptions: { input: { desk: 'index.html', kiosk: 'kiosk/index.html' } },
  },
  test: {
    // A busy machine of two cores is no failure.
    testTimeout: 20_000,
    projects: [
      {
        extends: true,
        test: {
          name: 'unit',
          environment: 'node',
          include: ['shared/**/*.test.ts', 'server/**/*.test.ts', 'tests/{checks,run}/**/*.test.ts'],
        },
      },
      {
        extends: true,
        test: {
          name: 'ui',
          environment: 'jsdom',
          include: ['src/**/*.test.{ts,tsx}', 'kiosk/**/*.test.{ts,tsx}'],
          setupFiles: ['tests/support/ui-setup.ts'],
        },
      },
      {
        extends: true,
        test: {
          name: 'api',
          environment: 'node',
          include: ['tests/api/**/*.test.ts'],
          globalSetup: ['tests/support/postgres-setup.ts'],
          hookTimeout: 60_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'e2e',
          environment: 'node',
          include: ['tests/e2e/**/*.test.ts'],
          globalSetup: ['tests/support/postgres-setup.ts', 'tests/support/clients-setup.ts'],
          // A browser on a busy machine may miss a moment once; what is broken fails twice.
          retry: 1,
          testTimeout: 180_000,
          hookTimeout: 120_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'faults',
          environment: 'node',
          include: ['tests/faults/**/*.test.ts'],
          globalSetup: ['tests/support/postgres-setup.ts', 'tests/support/clients-setup.ts'],
          testTimeout: 180_000,
          hookTimeout: 120_000,
          fileParallelism: false,
        },
      },
    ],
  },
});
