/** Typing into the cells of the ledger, as a builder does. */
import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { openSample, sample, savedText } from './craftFiles.ts';
import { test } from './visit.ts';

const cell = (page: Page, row: string, column: string) =>
  page.getByRole('grid', { name: 'Parts' }).locator(`[data-row="${row}"] > [data-cell="${column}"]`);

const focused = (page: Page) =>
  page.evaluate(() => {
    const active = document.activeElement as HTMLElement;
    return [active.parentElement?.dataset.row, active.dataset.cell];
  });

const undoable = (page: Page) => page.getByRole('button', { name: 'Undo' }).isEnabled();

test('Escape in a cell puts back what was there and leaves the cell focused', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  for (const [column, typed] of [
    ['name', 'XX'],
    ['mass', '99'],
  ] as const) {
    await cell(page, 'battery', column).click();
    await page.keyboard.press('Enter');
    await page.keyboard.type(typed);
    await page.keyboard.press('Escape');
    expect(await focused(page)).toEqual(['battery', column]);
    await page.keyboard.type(typed);
    await page.keyboard.press('Escape');
    expect(await focused(page)).toEqual(['battery', column]);
  }
  await cell(page, 'battery', 'kind').click();
  await page.keyboard.press('Enter');
  await page.keyboard.press('ArrowDown');
  await page.keyboard.press('Escape');
  expect(await focused(page)).toEqual(['battery', 'kind']);
  expect(await savedText(page)).toBe(sample('worked-example'));
});

test('two edits of one cell are two undo steps', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  await cell(page, 'battery', 'mass').click();
  for (const typed of ['100', '200']) {
    await page.keyboard.type(typed);
    await page.keyboard.press('Enter');
  }
  const mass = async () => JSON.parse(await savedText(page)).parts[3].mass;
  expect(await mass()).toBe(0.2);
  await page.keyboard.press('Control+z');
  expect(await mass()).toBe(0.1);
  await page.keyboard.press('Control+z');
  expect(await savedText(page)).toBe(sample('worked-example'));
  expect(await undoable(page)).toBe(false);
});
