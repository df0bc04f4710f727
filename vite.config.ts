import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const apiOrigin = `http://127.0.0.1:${process.env['API_PORT'] ?? '4610'}`;

export default defineConfig({
  root: 'web',
  plugins: [react(), tailwindcss()],
  build: { outDir: '../dist/web', emptyOutDir: true, sourcemap: false, target: 'es2023' },
  server: {
    port: Number(process.env['PORT'] ?? '4600'),
    strictPort: true,
    proxy: { '/api': apiOrigin, '/media': apiOrigin },
  },
  test: {
    root: '.',
    projects: [
      {
        extends: true,
        test: {
          name: 'node',
          root: '.',
          environment: 'node',
          include: ['tests/**/*.test.ts'],
          exclude: ['tests/web/**'],
          globalSetup: ['tests/support/global-setup.ts'],
          testTimeout: 60_000,
          hookTimeout: 120_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'web',
          root: '.',
          environment: 'jsdom',
          include: ['tests/web/**/*.test.{ts,tsx}'],
          setupFiles: ['tests/support/web-setup.ts'],
        },
      },
    ],
    maxWorkers: 2,
  },
});
