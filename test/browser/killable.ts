/** A Chromium of the test's own, with a profile on disk, that can be killed as a power cut would. */
import { type ChildProcess, spawn } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { chromium, type Page } from 'playwright-core';
import { expect } from 'vitest';
import { chromiumFlags, findChromium } from '../../src/cli/chromium.mjs';

export interface Killable {
  readonly page: Page;
  /** Ends every process of it at once, without a word to the page. */
  kill(): Promise<void>;
}

export const newProfile = (): string => mkdtempSync(join(tmpdir(), 'steelyard-profile-'));

export const dropProfile = (profile: string): void =>
  rmSync(profile, { recursive: true, force: true, maxRetries: 5 });

export async function startKillable(profile: string): Promise<Killable> {
  const { path } = await findChromium();
  const portFile = join(profile, 'DevToolsActivePort');
  rmSync(portFile, { force: true });
  const flags = [
    ...chromiumFlags,
    '--window-size=1440,900',
    '--remote-debugging-port=0',
    `--user-data-dir=${profile}`,
    'about:blank',
  ];
  // A process group of its own, so that its helpers end with it.
  const child = spawn(path, flags, { detached: true, stdio: 'ignore' });
  await expect.poll(() => linesOf(portFile).length, { timeout: 20_000 }).toBe(2);
  const [port, way] = linesOf(portFile);
  const browser = await chromium.connectOverCDP(`ws://127.0.0.1:${port}${way}`);
  const context = browser.contexts()[0]!;
  return { page: context.pages()[0] ?? (await context.newPage()), kill: () => kill(child) };
}

/** The lines written so far; none while there is no file. */
const linesOf = (file: string): string[] =>
  existsSync(file) ? readFileSync(file, 'utf8').split('\n').filter(Boolean) : [];

async function kill(child: ChildProcess): Promise<void> {
  const ended = new Promise((resolve) => child.once('exit', resolve));
  process.kill(-child.pid!, 'SIGKILL');
  await ended;
}
