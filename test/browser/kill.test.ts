import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { openSample, sample, savedText } from './craftFiles.ts';
import { drag, partOnPage } from './drawing.ts';
import { dropProfile, newProfile, startKillable } from './killable.ts';
import { open, test } from './visit.ts';

/** Moves the battery by hand and gives the file as it then stands. */
async function changed(page: Page): Promise<string> {
  await openSample(page, 'worked-example');
  const { x, y } = await partOnPage(page, sample('worked-example'), 'battery');
  await drag(page, { x, y }, { x: x - 90, y });
  return savedText(page);
}

test('a browser killed outright gives the work back', async () => {
  const profile = newProfile();
  try {
    const first = await startKillable(profile);
    await open(first.page);
    const before = await changed(first.page);
    expect(before).not.toBe(sample('worked-example'));
    await first.kill();
    const second = await startKillable(profile);
    await open(second.page);
    expect(await savedText(second.page)).toBe(before);
    await second.kill();
  } finally {
    dropProfile(profile);
  }
});

test('a closed tab gives the work back, with its units, colours and tilt', async ({ visit }) => {
  const page = await visit();
  const before = await changed(page);
  await page.getByRole('button', { name: 'Units: metric' }).click();
  await page.getByRole('button', { name: 'Colours: as the system' }).click();
  await page.getByRole('button', { name: 'As it floats' }).click();
  const context = page.context();
  await page.close({ runBeforeUnload: false });
  const again = await context.newPage();
  await open(again);
  expect(await savedText(again)).toBe(before);
  expect(await again.getByRole('button', { name: 'Units: imperial' }).isVisible()).toBe(true);
  expect(await again.getByRole('button', { name: 'Colours: light' }).isVisible()).toBe(true);
  expect(await again.getByRole('button', { name: 'As it floats' }).getAttribute('aria-pressed')).toBe('true');
});

test('two tabs on two crafts each come back to their own', async ({ visit }) => {
  const one = await visit();
  await openSample(one, 'worked-example');
  const two = await one.context().newPage();
  await open(two);
  await openSample(two, 'micro-round');
  await one.reload();
  await open(one);
  expect(await savedText(one)).toBe(sample('worked-example'));
  expect(await savedText(two)).toBe(sample('micro-round'));
});
