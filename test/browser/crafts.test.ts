import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { openSample, sample, savedText } from './craftFiles.ts';
import { headline, test } from './visit.ts';

const openCrafts = async (page: Page) => {
  await page.getByRole('button', { name: 'Crafts', exact: true }).click();
  const dialog = page.getByRole('dialog', { name: 'Crafts' });
  await dialog.waitFor();
  return dialog;
};

test('a new craft asks for length, diameter and shape, and answers at once', async ({ visit }) => {
  const page = await visit();
  await page.getByRole('button', { name: 'New craft' }).click();
  const dialog = page.getByRole('dialog', { name: 'New craft' });
  // The name stands selected.
  await page.keyboard.type('Heron');
  await dialog.getByRole('textbox', { name: 'Length', exact: true }).fill('2.4');
  await dialog.getByRole('textbox', { name: 'Greatest diameter' }).fill('0.8');
  await dialog.getByRole('textbox', { name: 'Part mass' }).fill('120');
  await dialog.getByRole('button', { name: 'Make the craft' }).click();
  await dialog.waitFor({ state: 'detached' });
  expect(await page.evaluate(() => (document.activeElement as HTMLElement).dataset.testid)).toBe('side-view');
  const craft = JSON.parse(await savedText(page));
  expect(craft.name).toBe('Heron');
  expect(await page.getByRole('textbox', { name: 'Name of the craft' }).inputValue()).toBe('Heron');
  expect(craft.hull.shape).toMatchObject({ kind: 'spheroid', length: 2.4, diameter: 0.8 });
  expect(craft.parts).toHaveLength(1);
  expect(await headline(page)).toMatch(/\d/);
});

test('several crafts are kept: go from one to the other, rename, duplicate and delete', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  await openSample(page, 'micro-round');
  let dialog = await openCrafts(page);
  await dialog.getByRole('button', { name: 'Open Worked example' }).click();
  await dialog.waitFor({ state: 'detached' });
  await expect.poll(() => page.title()).toMatch(/^Worked example/);
  expect(await savedText(page)).toBe(sample('worked-example'));

  dialog = await openCrafts(page);
  await dialog.getByRole('button', { name: 'Duplicate Reading-room micro craft' }).click();
  await dialog.getByRole('button', { name: 'Open Reading-room micro craft (copy)' }).waitFor();
  await dialog.getByRole('textbox', { name: 'Name of Reading-room micro craft (copy)' }).fill('Spare');
  await page.keyboard.press('Enter');
  await dialog.getByRole('button', { name: 'Delete Reading-room micro craft', exact: true }).click();
  await dialog.getByRole('button', { name: 'Delete for good' }).click();
  await dialog.getByRole('button', { name: 'Open Spare' }).click();
  await dialog.waitFor({ state: 'detached' });
  await expect.poll(() => page.title()).toMatch(/^Spare/);
  const before = sample('micro-round');
  expect(JSON.parse(await savedText(page))).toEqual({ ...JSON.parse(before), name: 'Spare' });
});

test('a sample starts as a craft of its own', async ({ visit }) => {
  const page = await visit();
  const dialog = await openCrafts(page);
  await dialog.getByRole('button', { name: 'Start from Worked example' }).click();
  await expect.poll(() => page.title()).toMatch(/^Worked example/);
  expect(await savedText(page)).toBe(sample('worked-example'));
});

test('two tabs on one craft: the other’s work is said to be kept, and is there under earlier versions', async ({
  visit,
}) => {
  const one = await visit();
  await openSample(one, 'worked-example');
  const two = await one.context().newPage();
  await two.goto(one.url());
  const name = async (page: Page, text: string) => {
    await page.getByRole('tab', { name: 'Notes' }).click();
    await page.getByRole('textbox', { name: 'Craft name' }).fill(text);
    await page.keyboard.press('Enter');
  };
  await name(two, 'From two');
  await name(one, 'From one');
  await one.getByText('Another tab changed this craft too.').waitFor();
  const dialog = await openCrafts(one);
  await dialog.getByText('Earlier versions').first().click();
  await dialog.getByRole('button', { name: /^Open From two as it was/ }).click();
  await expect.poll(() => one.title()).toMatch(/^From two/);
});

test('a dropped table of parts is looked at before anything is added', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  await page.evaluate(() => {
    const dataTransfer = new DataTransfer();
    const text = 'name,mass g,station mm\nCamera,34,700\nLamp,12,900\n';
    dataTransfer.items.add(new File([text], 'parts.csv', { type: 'text/csv' }));
    document.body.dispatchEvent(new DragEvent('drop', { bubbles: true, cancelable: true, dataTransfer }));
  });
  const dialog = page.getByRole('dialog', { name: 'Add rows of parts' });
  await dialog.getByRole('button', { name: 'Add all 2 parts' }).click();
  await dialog.waitFor({ state: 'detached' });
  const { parts } = JSON.parse(await savedText(page));
  expect(parts.slice(4).map(({ name, mass }: { name: string; mass: number }) => [name, mass])).toEqual([
    ['Camera', 0.034],
    ['Lamp', 0.012],
  ]);
});
