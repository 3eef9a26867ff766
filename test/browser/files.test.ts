import { readdirSync } from 'node:fs';
import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { openFile, openSample, sample, savedText } from './craftFiles.ts';
import { test } from './visit.ts';

const names = readdirSync('samples').map((file) => file.replace(/\.json$/, ''));

test('every sample opened and saved gives the same bytes', async ({ visit }) => {
  const page = await visit();
  for (const name of names) {
    await openSample(page, name);
    expect(await savedText(page)).toBe(sample(name));
  }
});

test('where the browser has a file picker for saving, the file is written there and then again without asking', async ({
  visit,
}) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  await page.evaluate(() => {
    let asked = 0;
    Object.assign(window, {
      asked: () => asked,
      showSaveFilePicker: async () => {
        asked++;
        const folder = await navigator.storage.getDirectory();
        return folder.getFileHandle('saved.json', { create: true });
      },
    });
  });
  for (let i = 0; i < 2; i++) {
    await page.keyboard.press('Control+s');
    await page.getByText('Saved as saved.json.').waitFor();
    await page.getByRole('button', { name: 'Dismiss' }).last().click();
  }
  const written = await page.evaluate(async () => {
    const folder = await navigator.storage.getDirectory();
    const file = await (await folder.getFileHandle('saved.json')).getFile();
    return { text: await file.text(), asked: (Reflect.get(window, 'asked') as () => number)() };
  });
  expect(written).toEqual({ text: sample('worked-example'), asked: 1 });
});

const BROKEN: readonly (readonly [string, string, RegExp])[] = [
  ['not JSON', 'one, two, three', /not JSON/],
  ['empty', '', /not JSON/],
  ['a list', '[]', /a list of 0/],
  ['a newer version', '{"steelyard": 99}', /newer Steelyard/],
  [
    'a mass that is text',
    sample('worked-example').replace('"mass": 0.172', '"mass": "heavy"'),
    /parts\[3\]\.mass.*"heavy".*a finite number/,
  ],
];

test('a broken file names the field, what was found and what is allowed, and leaves the craft before', async ({
  visit,
}) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  for (const [name, content, says] of BROKEN) {
    await openFile(page, `${name}.json`, content);
    const dialog = page.getByRole('dialog', { name: 'Not opened' });
    await dialog.waitFor();
    expect(await dialog.evaluate((element) => element.textContent)).toMatch(says);
    await page.keyboard.press('Escape');
    await dialog.waitFor({ state: 'detached' });
    expect(await savedText(page)).toBe(sample('worked-example'));
  }
});

/** Lets go of a file above the page. */
async function drop(page: Page, name: string, content: string): Promise<void> {
  await page.evaluate(
    ([fileName, text]) => {
      const dataTransfer = new DataTransfer();
      dataTransfer.items.add(new File([text!], fileName!));
      for (const type of ['dragover', 'drop']) {
        const event = new DragEvent(type, { bubbles: true, cancelable: true, dataTransfer });
        document.body.dispatchEvent(event);
      }
    },
    [name, content],
  );
}

test('a dropped craft file opens; another kind of file is turned away in words', async ({ visit }) => {
  const page = await visit();
  await drop(page, 'micro-round.json', sample('micro-round'));
  await page.getByText('Opened micro-round.json.').waitFor();
  expect(await savedText(page)).toBe(sample('micro-round'));
  await drop(page, 'picture.png', 'x');
  await page.getByText('picture.png is neither a craft file').waitFor();
  expect(await savedText(page)).toBe(sample('micro-round'));
});
