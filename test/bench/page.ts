/** The built page in Chromium: how much script it loads, how soon it answers, and the frames of a five-second drag. */
import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { chromium, type Page } from 'playwright-core';
import { preview } from 'vite';
import { chromiumFlags, findChromium } from '../../src/cli/chromium.mjs';
import { serialize } from '../../src/craft/serialize.ts';
import { craftOf } from './craftOf.ts';

type Print = (label: string, ...figures: string[]) => void;

export async function benchPage(print: Print): Promise<void> {
  const folder = mkdtempSync(join(tmpdir(), 'steelyard-bench-'));
  const outDir = join(folder, 'dist');
  spawnSync(process.execPath, [
    'node_modules/vite/bin/vite.js',
    'build',
    '--logLevel',
    'warn',
    '--outDir',
    outDir,
  ]);
  const server = await preview({
    build: { outDir },
    preview: { port: 41_830, open: false },
    logLevel: 'warn',
  });
  const { path } = await findChromium();
  const browser = await chromium.launch({ executablePath: path, args: chromiumFlags });
  const address = server.resolvedUrls!.local[0]!;
  try {
    const page = await browser.newPage({ viewport: { width: 1440, height: 900 }, serviceWorkers: 'block' });
    await benchOpening(page, address, outDir, print);
    for (const parts of [40, 300]) await benchDrag(page, parts, folder, print);
  } finally {
    await browser.close();
    await server.close();
    rmSync(folder, { recursive: true, force: true });
  }
}

async function benchOpening(page: Page, address: string, outDir: string, print: Print): Promise<void> {
  const scripts: string[] = [];
  page.on('response', (response) => {
    const { pathname } = new URL(response.url());
    if (pathname.endsWith('.js')) scripts.push(pathname);
  });
  await page.goto(address);
  const ready: number[] = [];
  for (let i = 0; i < 5; i++) {
    await page.goto(address);
    // Drawn, and the keyboard answers: the canvas is there and the headline names the craft's state.
    ready.push(
      await page.evaluate(
        () =>
          new Promise<number>((resolve) => {
            const look = () =>
              document.querySelector('[data-testid="side-view"] canvas') &&
              document.querySelector('.headline')
                ? requestAnimationFrame(() => resolve(performance.now()))
                : requestAnimationFrame(look);
            look();
          }),
      ),
    );
  }
  const kilobytes = [...new Set(scripts)]
    .map((name) => gzipSync(readFileSync(join(outDir, name))).length / 1000)
    .reduce((a, b) => a + b, 0);
  print('script of the opening page', `${kilobytes.toFixed(0)} kB gzip`, 'reach 350 kB');
  print(
    'drawn and answering after navigation',
    `median ${ready.sort((a, b) => a - b)[2]!.toFixed(0)} ms`,
    'reach 1500 ms',
  );
}

async function benchDrag(page: Page, parts: number, folder: string, print: Print): Promise<void> {
  const file = join(folder, `${parts}.json`);
  writeFileSync(file, serialize(craftOf(parts)));
  const [chooser] = await Promise.all([
    page.waitForEvent('filechooser'),
    page.getByRole('button', { name: /^Open/ }).first().click(),
  ]);
  await chooser.setFiles(file);
  await page.waitForTimeout(1500);
  const at = await partOnScreen(page);
  await page.mouse.move(at.x, at.y);
  await page.mouse.down();
  const frames = page.evaluate(recordFrames);
  const end = Date.now() + 5000;
  for (let i = 0; Date.now() < end; i++) await page.mouse.move(at.x + 60 * Math.sin(i / 20), at.y);
  const times = (await frames).sort((a, b) => a - b);
  await page.mouse.up();
  const at95 = times[Math.floor(0.95 * times.length)]!;
  print(
    `frames of a drag, ${parts} parts`,
    `median ${times[times.length >> 1]!.toFixed(1)} ms`,
    `p95 ${at95.toFixed(1)} ms`,
    `${times.length} frames`,
    'reach 16.7 ms',
  );
}

/** Where the part hanging below the keel at mid-hull is on the page, from the view the frame tells. */
async function partOnScreen(page: Page): Promise<{ x: number; y: number }> {
  const frame = page.getByTestId('side-view');
  const box = (await frame.boundingBox())!;
  const view = await frame.evaluate((element) => ({ ...(element as HTMLElement).dataset }));
  const [scale, originX, originY] = [view.scale, view.originX, view.originY].map(Number) as [
    number,
    number,
    number,
  ];
  // The hull of the bench craft is 4 × 1.3 m; at mid-hull its keel parts hang 30 mm below −0.65 m.
  return { x: box.x + originX + 2 * scale, y: box.y + originY + 0.68 * scale };
}

function recordFrames(): Promise<number[]> {
  return new Promise((resolve) => {
    const times: number[] = [];
    let last = performance.now();
    const start = last;
    const tick = (now: number) => {
      times.push(now - last);
      last = now;
      if (now - start < 4800) requestAnimationFrame(tick);
      else resolve(times.slice(1));
    };
    requestAnimationFrame(tick);
  });
}
