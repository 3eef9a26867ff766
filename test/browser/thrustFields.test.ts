import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { openSample, savedText } from './craftFiles.ts';
import { test } from './visit.ts';

const saved = async (page: Page) => JSON.parse(await savedText(page));
const thruster = async (page: Page) =>
  (await saved(page)).parts.find(({ id }: { id: string }) => id === 'tail-thruster');

/** Types into the field of that label, as keys do, and takes it with Enter. */
async function type(page: Page, label: string, text: string): Promise<void> {
  await page.getByLabel(label, { exact: true }).focus();
  await page.keyboard.press('Control+a');
  if (text) await page.keyboard.type(text);
  else await page.keyboard.press('Delete');
  await page.keyboard.press('Enter');
}

async function press(page: Page, button: string): Promise<void> {
  await page.getByRole('button', { name: button }).focus();
  await page.keyboard.press('Enter');
}

test('by keys alone: thrust figures begun, changed, refused with a sentence, and taken back', async ({
  visit,
}) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  await page.getByText('Tail thruster', { exact: true }).first().click();
  const before = await savedText(page);
  await press(page, 'Remove the thrust figures');
  expect((await thruster(page)).thruster).toBeNull();
  await press(page, 'Enter thrust figures');
  const section = page.getByRole('region', { name: 'Thrust', exact: true });
  await section.getByText('These are guesses from its size.').waitFor();

  await type(page, 'Thrust at rest', '0.9');
  await type(page, 'Propeller diameter', '25 cm');
  expect(await thruster(page)).toMatchObject({
    size: { width: 0.25, height: 0.25 },
    thruster: { thrust: { staticThrust: 0.9 }, diameter: 0.25 },
  });
  expect(await section.getByText('These are guesses').count()).toBe(0);

  await page.getByLabel('Turns in yaw').focus();
  await page.keyboard.press('Space');
  await type(page, 'Turned in yaw', '25');
  await type(page, 'Greatest yaw', '20');
  const { yaw } = (await thruster(page)).thruster;
  expect(yaw.set).toBe(yaw.most);
  await type(page, 'Smallest yaw', '45');
  await section.getByText('Smallest yaw: found “45”; allowed: at most 20°.').waitFor();
  await type(page, 'Greatest yaw', '-45');
  await section.getByText('Greatest yaw: found “-45”; allowed: at least -30°.').waitFor();
  await type(page, 'Turned in yaw', '70');
  await section.getByText('Turned in yaw: found “70”; allowed: an angle from -30° to 20°.').waitFor();
  expect((await thruster(page)).thruster.yaw).toEqual(yaw);

  while (await page.getByRole('button', { name: /^Undo/ }).isEnabled())
    await page.keyboard.press('Control+z');
  expect(await savedText(page)).toBe(before);
});

test('a target of turning is asked for, and emptied again', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  await page.getByRole('tab', { name: 'Targets' }).click();
  await type(page, 'First 90° within', '6');
  await type(page, 'Side gust to hold', '3.6 km/h');
  expect((await saved(page)).targets).toMatchObject({ turnTime: 6, sideGust: 1 });
  await type(page, 'Side gust to hold', 'strong');
  await page.getByText(/Side gust to hold: “strong” is not a number/).waitFor();
  await page.keyboard.press('Escape');
  await type(page, 'First 90° within', '');
  expect((await saved(page)).targets).toMatchObject({ turnTime: null, sideGust: 1 });
});

test('what is newly selected is read from its top; fins stepped through the kinds of place end on the skin', async ({
  visit,
}) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  await page.getByText('Tail thruster', { exact: true }).first().click();
  const panel = page.getByRole('tabpanel', { name: 'Selected' });
  const scrolled = () => panel.evaluate((element) => element.scrollTop);
  await panel.evaluate((element) => element.scrollTo(0, 400));
  expect(await scrolled()).toBeGreaterThan(100);
  await page.getByText('Fins', { exact: true }).first().click();
  await expect.poll(scrolled).toBe(0);

  await panel.getByText('Fins: inside the hull').waitFor();
  for (const kind of ['keel', 'axis', 'skin'])
    await page.getByLabel('Place', { exact: true }).selectOption(kind);
  const fins = (await saved(page)).parts.find(({ id }: { id: string }) => id === 'fins');
  expect(fins.place).toMatchObject({ kind: 'skin', standoff: 0 });
  expect(await panel.getByText('inside the hull').count()).toBe(0);
});
