import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import react from '@vitejs/plugin-react';
import type { Plugin } from 'vite';
import { defineConfig } from 'vitest/config';

const unit = ['test/**/*.test.ts', 'test/**/*.test.tsx'];
const browser = ['test/browser/**/*.test.ts'];

/** Writes `sw.js` beside the page: the service worker under the list of files that it keeps for offline use. */
const offline = (): Plugin => ({
  name: 'offline',
  apply: 'build',
  enforce: 'post',
  generateBundle(_, bundle) {
    const files = ['./index.html', ...Object.keys(bundle).filter((name) => name !== 'index.html')];
    const page = String((bundle['index.html'] as { source?: string | Uint8Array } | undefined)?.source);
    const version = createHash('sha256').update(page).update(files.join()).digest('hex').slice(0, 12);
    const code = readFileSync(new URL('src/app/serviceWorker.js', import.meta.url), 'utf8');
    const source = `const VERSION = '${version}';\nconst FILES = ${JSON.stringify(files)};\n${code}`;
    this.emitFile({ type: 'asset', fileName: 'sw.js', source });
  },
});

/** HiGHS asks for it when it runs in Node, and there alone: in a browser nothing is missing. Any other module is told of. */
const ASKED_IN_NODE = /^Module "node:module" has been externalized .*[\\/]highs[\\/]build[\\/]/;

export default defineConfig({
  root: 'src/app',
  base: './',
  plugins: [react(), offline()],
  build: {
    outDir: '../../dist',
    emptyOutDir: true,
    target: 'es2022',
    reportCompressedSize: false,
    chunkSizeWarningLimit: 1000,
    rolldownOptions: {
      onLog: (level, log, tell) => {
        if (!ASKED_IN_NODE.test(log.message)) tell(level, log);
      },
    },
  },
  // A port of its own: the work is kept by address, and other programs are served on the usual one.
  preview: { host: '127.0.0.1', port: 4793 },
  server: { host: '127.0.0.1' },
  // HiGHS asks for a module of Node when it runs there, so the planning thread is in more than one piece.
  worker: { format: 'es' },
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
