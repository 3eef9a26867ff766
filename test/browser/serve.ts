/** Builds the page once, serves it on a free port of this machine, and starts one Chromium for all browser tests. */
import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type BrowserServer, chromium } from 'playwright-core';
import { preview } from 'vite';
import type { TestProject } from 'vitest/node';
import { chromiumFlags, findChromium } from '../../src/cli/chromium.mjs';

declare module 'vitest' {
  export interface ProvidedContext {
    /** Address of the page. */
    page: string;
    /** Where to reach the Chromium. */
    browser: string;
  }
}

export default async function serve(project: TestProject): Promise<() => Promise<void>> {
  const outDir = mkdtempSync(join(tmpdir(), 'steelyard-'));
  build(outDir);
  const server = await preview({
    configFile: 'vite.config.ts',
    logLevel: 'warn',
    build: { outDir },
    preview: { host: '127.0.0.1', port: 41_730, open: false },
  });
  const browser = await startChromium();
  project.provide('page', server.resolvedUrls!.local[0]!);
  project.provide('browser', browser.wsEndpoint());
  return async () => {
    await browser.close();
    await server.close();
    rmSync(outDir, { recursive: true, force: true });
  };
}

/** In a process of its own, because this one runs as a test and would build React for tests. */
function build(outDir: string): void {
  const vite = join('node_modules', 'vite', 'bin', 'vite.js');
  const { status, stderr } = spawnSync(
    process.execPath,
    [vite, 'build', '--logLevel', 'warn', '--outDir', outDir, '--emptyOutDir'],
    { env: { ...process.env, NODE_ENV: 'production', VITEST: '' }, encoding: 'utf8' },
  );
  if (status !== 0) throw new Error(`The page does not build:\n${stderr}`);
}

async function startChromium(): Promise<BrowserServer> {
  const { path } = await findChromium();
  return chromium.launchServer({ executablePath: path, args: chromiumFlags, headless: true });
}
