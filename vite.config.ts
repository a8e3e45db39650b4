import { resolve } from 'node:path';

import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

/** One configuration: the client by default, the server bundle with `--ssr`, and the Vitest projects. */
export default defineConfig(({ isSsrBuild }) => ({
  root: isSsrBuild || process.env.VITEST ? import.meta.dirname : resolve(import.meta.dirname, 'client'),
  plugins: isSsrBuild ? [] : [react(), tailwindcss()],
  publicDir: isSsrBuild ? false : 'public',
  build: isSsrBuild
    ? {
        ssr: true,
        target: 'node20',
        outDir: 'dist/server',
        sourcemap: true,
        rollupOptions: { input: { index: 'server/index.ts', worker: 'server/compute/worker.ts' } },
      }
    : {
        outDir: '../dist/client',
        emptyOutDir: true,
        sourcemap: false,
      },
  worker: { format: 'es' as const },
  server: { port: 4301, proxy: { '/api': 'http://127.0.0.1:4300' } },
  test: {
    projects: [
      {
        extends: true,
        test: {
          name: 'node',
          environment: 'node',
          include: ['shared/**/*.test.ts', 'server/**/*.test.ts', 'scripts/**/*.test.ts'],
          testTimeout: 30_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'dom',
          environment: 'jsdom',
          include: ['client/**/*.test.{ts,tsx}'],
          setupFiles: ['client/testSetup.ts'],
          testTimeout: 30_000,
        },
      },
    ],
  },
}));
