import { gzipSync } from 'node:zlib';
import { expect } from 'vitest';
import { savedText } from './craftFiles.ts';
import { headline, open, test } from './visit.ts';

test('a first visit opens on a craft and says what is wrong with it in one sentence', async ({ visit }) => {
  const page = await visit();
  expect(await page.title()).toBe('Museum atrium camera craft – Steelyard');
  expect(await headline(page)).toMatch(/^Tail-heavy: floats [\d.]+° nose-up\. [\d.]+ g of lead/);
});

test('the opening page takes at most 350 kB of script, gzipped', async ({ visit }) => {
  const page = await visit();
  const scripts = await page.evaluate(async () => {
    const names = performance.getEntriesByType('resource').map(({ name }) => name);
    const found = names.filter((name) => name.endsWith('.js'));
    return Promise.all(found.map(async (name) => (await fetch(name)).text()));
  });
  expect(scripts.length).toBeGreaterThan(0);
  const bytes = scripts.reduce((sum, text) => sum + gzipSync(text).length, 0);
  expect(bytes).toBeLessThanOrEqual(350_000);
});

test('a browser that refuses to store anything says so, and still works', async ({ visit }) => {
  const page = await visit({}, () => Reflect.deleteProperty(window, 'indexedDB'));
  await page.getByText('This browser window does not keep work.').waitFor();
  await page.getByRole('gridcell').first().click();
  await page.keyboard.press('Control+d');
  expect(JSON.parse(await savedText(page)).parts).toHaveLength(15);
});

test('in imperial units and in the dark every figure still stands', async ({ visit }) => {
  const page = await visit({ colorScheme: 'dark' });
  await page.getByRole('button', { name: 'Units: metric' }).click();
  expect(await headline(page)).toMatch(/[\d.]+ oz of lead/);
  const ground = () => page.evaluate(() => getComputedStyle(document.body).backgroundColor);
  const dark = await ground();
  await page.getByRole('button', { name: /^Colours/ }).click();
  expect(await ground()).not.toBe(dark);
  await open(page);
  expect(await headline(page)).toMatch(/[\d.]+ oz of lead/);
});
