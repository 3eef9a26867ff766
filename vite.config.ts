import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const unit = ['test/**/*.test.ts', 'test/**/*.test.tsx'];
const browser = ['test/browser/**/*.test.ts'];

export default defineConfig({
  root: 'src/app',
  base: './',
  plugins: [react()],
  build: { outDir: '../../dist', emptyOutDir: true, target: 'es2022', reportCompressedSize: false },
  preview: { host: '127.0.0.1', port: 4173 },
  server: { host: '127.0.0.1' },
  test: {
    root: import.meta.dirname,
    testTimeout: 30_000,
    hookTimeout: 120_000,
    projects: [
      { extends: true, test: { name: 'unit', include: unit, exclude: browser } },
      {
        extends: true,
        test: {
          name: 'browser',
          include: browser,
          globalSetup: 'test/browser/serve.ts',
          fileParallelism: false,
          testTimeout: 60_000,
        },
      },
    ],
  },
});
