import { readFileSync } from 'node:fs';
import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

/** Where the pages under development send what is not theirs; the start script says. */
const api = process.env.BENCHLEAF_API ?? 'http://127.0.0.1:3000';
const { TLS_CERT: certificate, TLS_KEY: key } = process.env;

export default defineConfig({
  plugins: [react(), tailwindcss()],
  worker: { format: 'es' },
  build: {
    outDir: 'dist',
    target: 'es2022',
    // The content policy allows nothing that is not a file of ours: no data: addresses.
    assetsInlineLimit: 0,
    chunkSizeWarningLimit: 1500,
  },
  server: {
    proxy: { '/api': { target: api, xfwd: true } },
    ...(certificate && key ? { https: { cert: readFileSync(certificate), key: readFileSync(key) } } : {}),
  },
  test: {
    // Two cores carry two files at a time, the database between them.
    maxWorkers: 2,
    projects: [
      {
        extends: true,
        test: {
          name: 'engine',
          include: ['tests/{unit,property,reference,corpus}/**/*.test.ts'],
          environment: 'node',
          testTimeout: 60_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'api',
          include: ['tests/api/**/*.test.ts'],
          environment: 'node',
          globalSetup: ['tests/global-setup.ts'],
          testTimeout: 60_000,
          hookTimeout: 120_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'browser',
          include: ['tests/browser/**/*.test.ts'],
          environment: 'node',
          globalSetup: ['tests/global-setup.ts'],
          testTimeout: 120_000,
          hookTimeout: 120_000,
          // One browser at a time leaves the second core to the server and the database.
          fileParallelism: false,
        },
      },
    ],
  },
});
