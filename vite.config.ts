import { fileURLToPath } from 'node:url';
import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const here = (path: string) => fileURLToPath(new URL(path, import.meta.url));

export default defineConfig({
  root: here('./client'),
  plugins: [react(), tailwindcss()],
  build: { outDir: here('./var/client'), emptyOutDir: true, target: 'es2022' },
  worker: { format: 'es' },
  test: {
    root: here('.'),
    projects: [
      {
        test: {
          name: 'unit',
          root: here('.'),
          include: ['shared/src/**/*.test.ts', 'server/src/**/*.test.ts', 'client/src/**/*.test.{ts,tsx}'],
        },
      },
      { test: { name: 'reference', root: here('.'), include: ['tests/reference/**/*.test.ts'] } },
    ],
  },
});
