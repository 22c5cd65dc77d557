import { fileURLToPath } from 'node:url';
import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const here = (path: string) => fileURLToPath(new URL(path, import.meta.url));

// Where `npm run dev` keeps the API behind the hot-reloading pages.
const apiAddress = process.env.BOREWRIGHT_API ?? 'http://127.0.0.1:3001';

export default defineConfig({
  root: here('./client'),
  plugins: [react(), tailwindcss()],
  build: { outDir: here('./var/client'), emptyOutDir: true, target: 'es2022' },
  worker: { format: 'es' },
  server: {
    host: '127.0.0.1',
    strictPort: true,
    proxy: { '/api': { target: apiAddress } },
    fs: { allow: [here('./client'), here('./shared'), here('./node_modules')] },
  },
  test: {
    root: here('.'),
    projects: [
      {
        test: {
          name: 'unit',
          testTimeout: 30_000,
          root: here('.'),
          include: [
            'shared/src/**/*.test.ts',
            'server/src/**/*.test.ts',
            'server/scripts/**/*.test.mjs',
            'client/src/**/*.test.{ts,tsx}',
          ],
          sequence: { groupOrder: 0 },
        },
      },
      {
        test: {
          name: 'reference',
          root: here('.'),
          include: ['tests/reference/**/*.test.ts'],
          testTimeout: 30_000,
          sequence: { groupOrder: 1 },
        },
      },
      {
        test: {
          name: 'api',
          root: here('.'),
          include: ['tests/api/**/*.test.ts'],
          globalSetup: ['tests/support/database-setup.ts'],
          testTimeout: 20_000,
          hookTimeout: 60_000,
          sequence: { groupOrder: 2 },
        },
      },
      {
        test: {
          name: 'e2e',
          root: here('.'),
          include: ['tests/e2e/**/*.test.ts'],
          globalSetup: [
            'tests/support/database-setup.ts',
            'tests/support/client-setup.ts',
            'tests/support/browser-setup.ts',
          ],
          testTimeout: 120_000,
          hookTimeout: 60_000,
          expect: { poll: { timeout: 15_000 } },
          // One browser at a time: two cores carry a server, a database and Chromium already.
          maxWorkers: 1,
          sequence: { groupOrder: 3 },
        },
      },
    ],
  },
});
