// Finds a Chromium for the browser tests: CHROMIUM from the environment, else the system's, else the one that
// the npm package @sparticuz/chromium carries.
import { existsSync } from 'node:fs';

const installed = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome'];

/** @returns {Promise<{ path: string, from: string }>} the executable, and where it was found. */
export async function findChromium() {
  const named = process.env.CHROMIUM;
  if (named) {
    if (!existsSync(named)) throw new Error(`CHROMIUM names ${named}, which does not exist.`);
    return { path: named, from: 'CHROMIUM' };
  }
  const system = installed.find((path) => existsSync(path));
  if (system) return { path: system, from: system };
  // The package unpacks the libraries it needs only where it believes it runs as a cloud function.
  process.env.AWS_LAMBDA_JS_RUNTIME ??= 'nodejs20.x';
  const { default: chromium } = await import('@sparticuz/chromium');
  return { path: await chromium.executablePath(), from: 'the npm package @sparticuz/chromium' };
}

/** Flags under which the tests start it: no network of its own, no GPU. */
export const chromiumFlags = [
  '--headless',
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  '--font-render-hinting=none',
];
