import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

export default defineConfig({
  plugins: [react(), tailwindcss()],
  build: { outDir: 'dist/client', emptyOutDir: true, assetsInlineLimit: 0, sourcemap: true },
  server: { proxy: { '/api': `http://127.0.0.1:${process.env.PORT ?? 4310}` } },
  test: {
    pool: 'forks',
    maxWorkers: 2,
    testTimeout: 30_000,
    hookTimeout: 120_000,
    allowOnly: false,
    globalSetup: 'tests/support/template-database.ts',
    projects: [
      {
        extends: true,
        test: {
          name: 'unit',
          include: ['{shared,server,src,tests}/**/*.test.{ts,tsx}'],
          exclude: ['tests/{api,e2e,properties,mutation}/**'],
          // These tests change nothing outside themselves; the books are read once per process.
          isolate: false,
        },
      },
      {
        extends: true,
        test: { name: 'properties', include: ['tests/{properties,mutation}/**/*.test.ts'] },
      },
      { extends: true, test: { name: 'api', include: ['tests/api/**/*.test.ts'] } },
      {
        extends: true,
        test: {
          name: 'e2e',
          include: ['tests/e2e/**/*.test.ts'],
          // After everything else: a browser and its server keep a processor busy.
          sequence: { groupOrder: 1 },
        },
      },
    ],
  },
});
