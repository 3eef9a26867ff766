import { text } from 'node:stream/consumers';
import { expect } from 'vitest';
import { openSample, sample } from './craftFiles.ts';
import { test } from './visit.ts';

test('when the page itself fails, the craft can be saved, and undoing the last change goes on', async ({
  visit,
  faults,
}) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  await page.getByRole('gridcell').first().click();
  await page.keyboard.press('Control+d');
  await page.evaluate(() => {
    const { toFixed } = Number.prototype;
    const mend = () => {
      Number.prototype.toFixed = toFixed;
    };
    Number.prototype.toFixed = () => {
      throw new Error('no digits today');
    };
    Object.assign(window, { mend });
  });
  await page.getByRole('button', { name: 'Units: metric' }).click();
  await page.getByRole('heading', { name: 'The page failed' }).waitFor();
  expect(faults.splice(0).join()).toContain('no digits today');
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Save the craft to a file' }).click(),
  ]);
  expect(JSON.parse(await text(await download.createReadStream())).parts).toHaveLength(5);
  await page.evaluate(() => (Reflect.get(window, 'mend') as () => void)());
  await page.getByRole('button', { name: 'Undo the last change and go on' }).click();
  await page.getByTestId('side-view').waitFor();
  expect(await page.getByRole('row').count()).toBe(JSON.parse(sample('worked-example')).parts.length + 1);
});
