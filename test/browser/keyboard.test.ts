import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { openSample, sample, savedText } from './craftFiles.ts';
import { verdictText } from './drawing.ts';
import { test } from './visit.ts';

/** Goes on by Tab until what has the focus is called so. */
async function tabTo(page: Page, name: RegExp, back = false): Promise<void> {
  const seen: string[] = [];
  for (let i = 0; i < 120; i++) {
    await page.keyboard.press(back ? 'Shift+Tab' : 'Tab');
    const called = await focusName(page);
    if (name.test(called)) return;
    seen.push(called);
  }
  throw new Error(`Tab does not lead to ${name}; it led to ${seen.join(', ')}`);
}

/** What has the focus: its tag, and its accessible name as far as the page writes it. */
const focusName = (page: Page): Promise<string> =>
  page.evaluate(() => {
    const element = document.activeElement as HTMLInputElement | null;
    const label = element?.getAttribute('aria-label') ?? element?.labels?.[0]?.textContent;
    return `${element?.tagName} ${label ?? element?.textContent?.slice(0, 40)}`;
  });

const battery = (text: string) => JSON.parse(text).parts.find(({ id }: { id: string }) => id === 'battery');

test('by keys alone: reach a part, change its mass, nudge it, undo all', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  const [opening, level] = [sample('worked-example'), await verdictText(page, 'level')];

  await tabTo(page, /side view/i);
  for (let i = 0; i < 4; i++) await page.keyboard.press(']');
  await tabTo(page, /^INPUT Mass/);
  await page.keyboard.press('Control+a');
  await page.keyboard.type('200');
  await page.keyboard.press('Enter');
  expect(battery(await savedText(page)).mass).toBe(0.2);
  await expect.poll(() => verdictText(page, 'level')).not.toBe(level);

  await tabTo(page, /side view/i, true);
  await page.keyboard.press('ArrowLeft');
  await page.keyboard.press('Shift+ArrowLeft');
  const moved = battery(await savedText(page));
  expect(moved.place.station).toBeCloseTo(1.3 - 0.011, 9);
  expect(moved.mass).toBe(0.2);

  for (let i = 0; i < 2; i++) await page.keyboard.press('Control+z');
  expect(await savedText(page)).toBe(opening);
  expect(await verdictText(page, 'level')).toBe(level);
  for (let i = 0; i < 2; i++) await page.keyboard.press('Control+Shift+z');
  expect(battery(await savedText(page))).toEqual(moved);
});

test('undo in a field takes back the typing first, and never loses what was typed', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  await page.getByRole('tab', { name: 'Hull' }).click();
  const field = page.getByRole('textbox', { name: 'Length', exact: true });
  await field.fill('4');
  await page.keyboard.press('Control+z');
  expect(await page.getByRole('button', { name: 'Undo' }).isDisabled()).toBe(true);
  await field.fill('4');
  await page.keyboard.press('Enter');
  expect(JSON.parse(await savedText(page)).hull.shape.length).toBe(4);
  await page.keyboard.press('Control+z');
  expect(await savedText(page)).toBe(sample('worked-example'));
});

test('keys reach every command: duplicate, select all, remove, tilt, the list of keys', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  await tabTo(page, /side view/i);
  await page.keyboard.press('Control+a');
  await page.keyboard.press('Control+d');
  expect(JSON.parse(await savedText(page)).parts).toHaveLength(8);
  await page.keyboard.press('Delete');
  expect(JSON.parse(await savedText(page)).parts).toHaveLength(4);
  await page.keyboard.press('Control+z');
  await page.keyboard.press('Control+z');
  expect(await savedText(page)).toBe(sample('worked-example'));
  await page.keyboard.press('t');
  expect(await page.getByRole('button', { name: 'As it floats' }).getAttribute('aria-pressed')).toBe('true');
  await page.keyboard.press('?');
  await page.getByRole('dialog', { name: 'Keys and gestures' }).waitFor();
  await page.keyboard.press('Delete');
  await page.keyboard.press('Escape');
  expect(await savedText(page)).toBe(sample('worked-example'));
});

test('the bars between the panes move by arrow keys, fold away and come back', async ({ visit }) => {
  const page = await visit();
  const bar = page.getByRole('separator', { name: 'Width of the panels' });
  const width = async () => (await page.locator('.column').boundingBox())?.width;
  const before = (await width())!;
  await bar.focus();
  await page.keyboard.press('ArrowLeft');
  expect(await width()).toBeGreaterThan(before);
  await page.keyboard.press('Enter');
  expect(await width()).toBeUndefined();
  await page.keyboard.press('Enter');
  expect(await width()).toBe(before);
});
