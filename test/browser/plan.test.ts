import type { Locator, Page } from 'playwright-core';
import { expect } from 'vitest';
import { openFile, openSample, sample, savedText } from './craftFiles.ts';
import { partOnPage, planeOnPage, verdictText } from './drawing.ts';
import { findings } from './findings.ts';
import { open, test } from './visit.ts';

const planTab = (page: Page): Locator => page.getByRole('tab', { name: 'Plan', exact: true });
const plan = (page: Page): Locator => page.getByRole('region', { name: 'Ballast plan' });
const planText = (page: Page): Promise<string | null> => page.locator('.plan-headline').textContent();
const figure = (page: Page, key: string): Locator =>
  plan(page).locator(`.compared [data-figure="${key}"] td`);
const upToDate = (page: Page): Promise<void> => plan(page).getByText('Up to date.').waitFor();
const unfold = (page: Page, title: string): Promise<void> =>
  page.locator('.foldable > summary', { hasText: title }).click();

/** Goes on by Tab until the button has the focus. */
async function tabToButton(page: Page, name: string): Promise<void> {
  for (let i = 0; i < 60; i++) {
    const here = await page.evaluate(() => document.activeElement?.textContent);
    if (here === name) return;
    await page.keyboard.press('Tab');
  }
  throw new Error(`Tab does not lead to ${name}`);
}

test('by pointer: from the opening craft to an applied plan, and back', async ({ visit }) => {
  const page = await visit();
  const before = await savedText(page);
  await planTab(page).click();
  await upToDate(page);
  expect(await planText(page)).toMatch(/^You do not need [\d.]+ g of lead\. .* does it\.$/);
  const [today, then] = await figure(page, 'usefulLoad').allInnerTexts();
  expect(Number.parseFloat(then!)).toBeGreaterThan(Number.parseFloat(today!));
  await page.getByRole('button', { name: 'Apply the plan' }).click();
  await expect.poll(() => verdictText(page, 'level')).toMatch(/level/);
  await upToDate(page);
  const after = JSON.parse(await savedText(page));
  expect(after.parts.length).toBe(JSON.parse(before).parts.length + 3);
  expect((await figure(page, 'deadBallast').allInnerTexts()).map(Number.parseFloat)).toEqual(
    Array(2).fill(expect.closeTo(11.8, 1)),
  );
  await page.getByRole('button', { name: /^Undo/ }).click();
  expect(await savedText(page)).toBe(before);
});

test('by keyboard: from the opening craft to an applied plan, and back', async ({ visit }) => {
  const page = await visit();
  const before = await savedText(page);
  await page.getByRole('tab', { selected: true }).nth(1).focus();
  for (let i = 0; i < 12 && !(await planTab(page).getAttribute('aria-selected'))?.includes('true'); i++) {
    await page.keyboard.press('ArrowRight');
  }
  await upToDate(page);
  await tabToButton(page, 'Apply the plan');
  await page.keyboard.press('Enter');
  await expect.poll(() => verdictText(page, 'level')).toMatch(/level/);
  expect(await page.evaluate(() => document.activeElement?.textContent)).toBe('Apply the plan');
  await page.keyboard.press('Control+z');
  expect(await savedText(page)).toBe(before);
});

test('a craft for which there is no plan is made plannable by the program’s own advice', async ({
  visit,
}) => {
  const page = await visit();
  await openSample(page, 'cave-mapper');
  await planTab(page).click();
  const remedy = page.getByRole('listitem').filter({ hasText: /^Let Battery slide to/ });
  await remedy.getByRole('button', { name: 'Do this' }).click();
  await upToDate(page);
  await page.getByRole('button', { name: 'Apply the plan' }).click();
  await expect.poll(() => verdictText(page, 'level')).toMatch(/level/);
  await upToDate(page);
  expect(await figure(page, 'deadBallast').first().textContent()).toMatch(/^12\.9 g$/);
  for (let i = 0; i < 2; i++) await page.keyboard.press('Control+z');
  expect(await savedText(page)).toBe(sample('cave-mapper'));
});

test('the order of wishes is changed by buttons and by arrow keys, and the plan follows', async ({
  visit,
}) => {
  const page = await visit();
  // Level already, and allowed to be so light that the loads may stay ashore: only carrying them moves the battery.
  const craft = JSON.parse(sample('museum-atrium'));
  craft.targets.heaviness.least = -0.4;
  craft.parts.find(({ id }: { id: string }) => id === 'battery').place.station = 1.694;
  await openFile(page, 'light.json', `${JSON.stringify(craft, null, 2)}\n`);
  await page.getByText('Opened light.json.').waitFor();
  const before = await savedText(page);
  await planTab(page).click();
  await upToDate(page);
  expect(await planText(page)).toMatch(/Slide Battery .* Sound recorder .* Row of lamps/);
  await unfold(page, 'Wishes');
  await page.getByRole('button', { name: 'Lower Most useful load' }).click();
  expect(JSON.parse(await savedText(page)).wishes).toEqual(['fewestMoved', 'usefulLoad', 'leastWire']);
  await expect.poll(() => planText(page)).not.toMatch(/Slide Battery/);
  await page.locator('[data-wish=usefulLoad]').focus();
  await page.keyboard.press('ArrowUp');
  await expect.poll(() => planText(page)).toMatch(/Slide Battery/);
  for (let i = 0; i < 2; i++) await page.keyboard.press('ArrowDown');
  expect(JSON.parse(await savedText(page)).wishes).toEqual(['fewestMoved', 'leastWire', 'usefulLoad']);
  expect(await page.evaluate(() => document.activeElement?.getAttribute('data-wish'))).toBe('usefulLoad');
  for (let i = 0; i < 4; i++) await page.keyboard.press('Control+z');
  expect(await savedText(page)).toBe(before);
});

test('the other orders of the wishes are tried when asked for; one that changes the plan can be taken', async ({
  visit,
}) => {
  const page = await visit();
  await planTab(page).click();
  await upToDate(page);
  await unfold(page, 'Wishes');
  await page.getByRole('button', { name: 'Would another order change it?' }).click();
  await page.getByText('Another order would not change this plan: the other 5 were tried.').waitFor();
  await openSample(page, 'aviary-counter');
  await upToDate(page);
  await page.getByRole('button', { name: 'Would another order change it?' }).click();
  const other = page.getByRole('list', { name: 'Orders that change the plan' }).getByRole('listitem');
  expect(await other.textContent()).toMatch(/^Useful load, wire, parts moved: 1 part moved instead of 0/);
  await other.getByRole('button', { name: 'Take it' }).click();
  expect(JSON.parse(await savedText(page)).wishes).toEqual(['usefulLoad', 'leastWire', 'fewestMoved']);
  await other.waitFor({ state: 'detached' });
});

test('what was unfolded or folded stays so while other tabs are in front', async ({ visit }) => {
  const page = await visit();
  const tab = (name: string) => page.getByRole('tab', { name, exact: true }).click();
  const isOpen = (title: string) =>
    page
      .locator('.foldable', { has: page.getByRole('heading', { name: title, exact: true }) })
      .evaluate((part) => (part as HTMLDetailsElement).open);
  await tab('Plan');
  await unfold(page, 'Wishes');
  await tab('Turn');
  await unfold(page, 'Where should it sit?');
  await tab('Plan');
  expect([await isOpen('Wishes'), await isOpen('Useful loads')]).toEqual([true, false]);
  await unfold(page, 'Wishes');
  await tab('Turn');
  expect(await isOpen('Where should it sit?')).toBe(false);
  await tab('Plan');
  expect(await isOpen('Wishes')).toBe(false);
});

test('while a part is dragged the plan follows before it is let go', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'library-scanner');
  await planTab(page).click();
  await upToDate(page);
  const before = await planText(page);
  const { x, y } = await partOnPage(page, sample('library-scanner'), 'gondola');
  await page.mouse.move(x, y);
  await page.mouse.down();
  const seen = new Set<string | null>();
  for (let i = 1; i <= 12; i++) {
    await page.mouse.move(x - 6 * i, y);
    await page.waitForTimeout(40);
    seen.add(await planText(page));
  }
  expect(seen.size).toBeGreaterThan(2);
  await page.keyboard.press('Escape');
  await page.mouse.up();
  await expect.poll(() => planText(page)).toBe(before);
  expect(await savedText(page)).toBe(sample('library-scanner'));
});

test('plans are kept over a reload, compared, shown and dropped; a mistyped load gets a sentence', async ({
  visit,
}) => {
  const page = await visit();
  await openSample(page, 'orchard-counter');
  await planTab(page).click();
  await upToDate(page);
  await page.getByRole('button', { name: 'Keep this plan' }).click();
  await unfold(page, 'Useful loads');
  await page.locator('.load > summary', { hasText: 'rank 1' }).click();
  const mass = page.getByRole('textbox', { name: 'Mass', exact: true });
  await mass.fill('heavy');
  await page.keyboard.press('Enter');
  await page.getByText(/^Mass: .*“heavy”/).waitFor();
  await mass.fill('150');
  await page.keyboard.press('Enter');
  await upToDate(page);
  await page.getByRole('button', { name: 'Keep this plan' }).click();
  expect(await page.locator('.kept-plans tbody th').allInnerTexts()).toHaveLength(2);
  await page.getByRole('button', { name: 'Show plan 1' }).click();
  await page.getByText('The drawing shows kept plan 1.').waitFor();
  await page.getByRole('combobox', { name: 'Plan 1 beside' }).selectOption('Plan 2');
  const beside = page.getByRole('table', { name: 'Plan 2 and plan 1' });
  expect(await beside.getByRole('columnheader').allInnerTexts()).toEqual(['Figure', 'Plan 2', 'Plan 1']);
  await beside.getByText('What differs').waitFor();
  await page.getByRole('button', { name: 'Drop plan 1' }).click();
  expect(await page.locator('.kept-plans tbody th').allInnerTexts()).toEqual([expect.stringMatching(/^2\b/)]);
  await open(page);
  await page.getByRole('button', { name: 'Show plan 2' }).waitFor();
  expect(await page.locator('.kept-plans tbody th').count()).toBe(1);
});

test('loads are compared, and a curve is drawn along the keel', async ({ visit }) => {
  const page = await visit();
  await planTab(page).click();
  await upToDate(page);
  await unfold(page, 'What can I carry where');
  await page.getByRole('combobox', { name: 'Curve' }).selectOption('keel');
  await page.getByRole('progressbar', { name: 'Working out the curve' }).waitFor({ state: 'detached' });
  await page.getByRole('button', { name: 'Compare the loads' }).click();
  await page.getByRole('button', { name: 'Compare the loads again' }).waitFor();
  expect(await page.locator('.carry-table tbody tr').count()).toBe(2);
  expect(await page.getByText('Best set by the exact plan:').textContent()).toBe(
    'Best set by the exact plan:',
  );
});

test('a click on the curve hangs the chosen load there, as one step', async ({ visit }) => {
  const page = await visit();
  const before = await savedText(page);
  await planTab(page).click();
  await upToDate(page);
  await unfold(page, 'What can I carry where');
  await page.getByRole('combobox', { name: 'Curve' }).selectOption('keel');
  await page.getByRole('progressbar', { name: 'Working out the curve' }).waitFor({ state: 'detached' });
  await page
    .getByRole('combobox', { name: 'A click hangs' })
    .selectOption({ label: 'Row of lamps for the ribs' });
  const plot = page.getByTestId('carry-plot');
  const { y, height } = (await plot.boundingBox())!;
  const { x } = await planeOnPage(page, 1.2, 0);
  await page.mouse.click(x, y + height / 2);
  const { loads, parts } = JSON.parse(await savedText(page));
  const [load] = loads.filter(({ name }: { name: string }) => name.startsWith('Row of lamps'));
  const part = parts.find(({ id }: { id: string }) => id === load.id);
  expect(part.place.kind).toBe('keel');
  expect(part.place.station).toBeCloseTo(1.2, 1);
  await page.getByRole('button', { name: /^Undo/ }).click();
  expect(await savedText(page)).toBe(before);
});

test('the solver comes with the plan, not with the page; without a network it is there too', async ({
  visit,
}) => {
  const page = await visit({ serviceWorkers: 'allow' });
  const names = () =>
    page.evaluate(() => performance.getEntriesByType('resource').map(({ name }) => name.split('/').at(-1)!));
  expect((await names()).filter((name) => /planWorker|wasm/.test(name))).toEqual([]);
  await page.evaluate(() => navigator.serviceWorker.ready);
  await page.waitForFunction(async () => {
    const [name] = await caches.keys();
    const kept = name === undefined ? [] : await (await caches.open(name)).keys();
    return kept.some(({ url }) => url.endsWith('.wasm'));
  });
  await page.context().setOffline(true);
  await open(page);
  await planTab(page).click();
  await upToDate(page);
});

for (const colorScheme of ['light', 'dark'] as const) {
  test(`no serious axe-core finding in the plan, ${colorScheme}`, async ({ visit }) => {
    const page = await visit({ colorScheme });
    await planTab(page).click();
    await upToDate(page);
    await page.getByRole('button', { name: 'Keep this plan' }).click();
    await page.getByRole('button', { name: 'Show plan 1' }).click();
    for (const summary of await page.locator('.foldable > summary').all()) await summary.click();
    for (const summary of await page.locator('.load > summary').all()) await summary.click();
    expect(await findings(page)).toEqual([]);
    await openSample(page, 'cave-mapper');
    await page.getByRole('button', { name: 'Do this' }).first().waitFor();
    expect(await findings(page)).toEqual([]);
  });
}
