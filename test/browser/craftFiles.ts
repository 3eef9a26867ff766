/** Opening and saving craft files on the page, as a builder does. */
import { readFileSync } from 'node:fs';
import { text } from 'node:stream/consumers';
import type { Page } from 'playwright-core';

export const sample = (name: string): string => readFileSync(`samples/${name}.json`, 'utf8');

/** Opens a file through the page's own file picker. */
export async function openFile(page: Page, name: string, content: string): Promise<void> {
  const [chooser] = await Promise.all([
    page.waitForEvent('filechooser'),
    page.getByRole('button', { name: 'Open a craft file' }).click(),
  ]);
  await chooser.setFiles({ name, mimeType: 'application/json', buffer: Buffer.from(content) });
}

/** Opens a sample and waits until it is on the page. */
export async function openSample(page: Page, name: string): Promise<void> {
  await openFile(page, `${name}.json`, sample(name));
  await page.getByText(`Opened ${name}.json.`).waitFor();
}

/** What Save writes, as a browser without a file picker for saving gets it: a download. */
export async function savedText(page: Page): Promise<string> {
  await page.evaluate(() => Reflect.deleteProperty(window, 'showSaveFilePicker'));
  const [download] = await Promise.all([page.waitForEvent('download'), page.keyboard.press('Control+s')]);
  return text(await download.createReadStream());
}
