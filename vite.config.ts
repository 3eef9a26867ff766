import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

export default defineConfig({
  root: 'src/app',
  base: './',
  plugins: [react()],
  build: { outDir: '../../dist', emptyOutDir: true, target: 'es2022', reportCompressedSize: false },
  preview: { host: '127.0.0.1', port: 4173 },
  server: { host: '127.0.0.1' },
  test: {
    root: '.',
    include: ['test/**/*.test.ts', 'test/**/*.test.tsx'],
    testTimeout: 30_000,
    hookTimeout: 120_000,
  },
});
