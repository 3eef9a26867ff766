import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { parse } from '../../src/craft/parse.ts';
import { openSample, savedText } from './craftFiles.ts';
import { test } from './visit.ts';

const HOSTILE = [
  '',
  '-1',
  '0',
  '1e308',
  '-1e308',
  'NaN',
  'Infinity',
  '1e-320',
  '1/0',
  '٣',
  '<b>x</b>',
  '9'.repeat(400),
];

/** Words that only a fault puts on the screen. */
const FAULT = /\bNaN\b|\bundefined\b|\bInfinity\b|∞|\[object /;

/** The text of the page, without what the builder typed himself and the sentence that quotes it. */
const shownText = (page: Page): Promise<string> =>
  page.evaluate(() => {
    const copy = document.body.cloneNode(true) as HTMLElement;
    for (const quoting of copy.querySelectorAll('.field-error, input, textarea')) quoting.remove();
    return copy.textContent;
  });

test('whatever is typed into whatever field, no NaN comes on the screen and the craft stays a craft', async ({
  visit,
}) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  for (const tab of ['Hull', 'Gas, day', 'Targets', 'Selected']) {
    if (tab === 'Selected') await page.getByRole('gridcell').first().click();
    await page.getByRole('tab', { name: tab, exact: true }).click();
    const fields = page.locator('.column input.number');
    for (let i = 0; i < (await fields.count()); i++) {
      for (const text of HOSTILE) {
        await fields.nth(i).fill(text);
        await fields.nth(i).press('Enter');
        expect(await shownText(page), `${tab}, field ${i}, ${text}`).not.toMatch(FAULT);
      }
      await fields.nth(i).press('Escape');
    }
  }
  expect(parse(await savedText(page)).ok).toBe(true);
}, 240_000);
