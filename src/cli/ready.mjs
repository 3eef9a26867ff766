// Makes a fresh clone ready: installs from the lock when node_modules is absent or older than the lock,
// and with --browser sees that a Chromium for the tests can be found. Plain JavaScript on purpose: it runs
// before anything is installed.
import { spawnSync } from 'node:child_process';
import { existsSync, statSync } from 'node:fs';

const [major] = process.versions.node.split('.').map(Number);
if (major < 20) {
  console.error(`Steelyard needs Node 20 or newer; this is ${process.versions.node}.`);
  process.exit(2);
}

const marker = 'node_modules/.package-lock.json';
const stale = !existsSync(marker) || statSync(marker).mtimeMs < statSync('package-lock.json').mtimeMs;
if (stale) {
  console.error('Installing the packages named in package-lock.json …');
  const npm = process.platform === 'win32' ? 'npm.cmd' : 'npm';
  const { status } = spawnSync(npm, ['ci', '--no-audit', '--no-fund'], {
    stdio: ['ignore', 2, 2],
    shell: process.platform === 'win32',
  });
  if (status !== 0) process.exit(status ?? 1);
}

if (process.argv.includes('--browser')) {
  const { findChromium } = await import('./chromium.mjs');
  const found = await findChromium();
  console.error(`Browser for the tests: ${found.from}`);
}
