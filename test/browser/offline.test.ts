import { expect } from 'vitest';
import { headline, open, test } from './visit.ts';

test('once visited, the page opens again without a network', async ({ visit }) => {
  const page = await visit({ serviceWorkers: 'allow' });
  const said = await headline(page);
  await page.evaluate(() => navigator.serviceWorker.ready);
  await page.waitForFunction(async () => {
    const [name] = await caches.keys();
    return name !== undefined && (await (await caches.open(name)).keys()).length > 3;
  });
  await page.context().setOffline(true);
  await open(page);
  expect(await headline(page)).toBe(said);
});
