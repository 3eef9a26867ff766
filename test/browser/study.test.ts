import type { Locator, Page } from 'playwright-core';
import { expect } from 'vitest';
import { openSample, savedText } from './craftFiles.ts';
import { planeOnPage } from './drawing.ts';
import { findings } from './findings.ts';
import { test } from './visit.ts';

const turnTab = (page: Page): Locator => page.getByRole('tab', { name: 'Turn', exact: true });
const plot = (page: Page): Locator => page.getByTestId('place-plot');
const begin = (page: Page): Locator => page.getByRole('button', { name: 'Try every station', exact: true });
const again = (page: Page): Locator => page.getByRole('button', { name: 'Try every station again' });
const goOn = (page: Page): Locator => page.getByRole('button', { name: 'Go on', exact: true });
const focused = (page: Page) => page.evaluate(() => document.activeElement?.textContent ?? '');
const progress = (page: Page): Locator => page.getByRole('progressbar', { name: 'Trying every station' });
const moveThere = (page: Page): Locator => page.getByRole('button', { name: /^Move it there/ });

interface Saved {
  readonly parts: readonly {
    readonly id: string;
    readonly place: Readonly<Record<string, number | string>>;
  }[];
}

/** Where the thruster of the opening craft is, in what Save writes. */
const thrusterPlace = async (page: Page) =>
  (JSON.parse(await savedText(page)) as Saved).parts.find(({ id }) => id === 'tail-thruster')!.place;

/** Goes on by Tab until something whose text begins so has the focus. */
async function tabTo(page: Page, beginning: string): Promise<void> {
  for (let i = 0; i < 80; i++) {
    const here = await page.evaluate(() => document.activeElement?.textContent ?? '');
    if (here.startsWith(beginning)) return;
    await page.keyboard.press('Tab');
  }
  throw new Error(`Tab does not lead to ${beginning}`);
}

async function study(page: Page): Promise<void> {
  await turnTab(page).click();
  await begin(page).click();
  await again(page).waitFor();
}

test('by pointer: stopped half-way, run to the end, a best station applied, and back', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'library-scanner');
  const before = await savedText(page);
  await turnTab(page).click();
  await begin(page).click();
  await expect
    .poll(() => progress(page).evaluate((bar) => (bar as HTMLProgressElement).value), {
      interval: 10,
      timeout: 20_000,
    })
    .toBeGreaterThan(0.1);
  await page.getByRole('button', { name: 'Stop', exact: true }).click();
  await page.getByText('Stopped before the last station was worked out.').waitFor();
  const stopped = Number(await plot(page).getAttribute('data-tried'));
  expect(stopped).toBeGreaterThan(5);
  expect(stopped).toBeLessThan(61);

  await page.getByText('So far:').waitFor();
  await goOn(page).click();
  await again(page).waitFor();
  expect(await plot(page).getAttribute('data-tried')).toBe('61');
  expect(await page.getByText('So far:').count()).toBe(0);
  // The one that is told of is where it is already.
  await page.getByText('It is there now.').waitFor();
  await page.locator('[data-station] [aria-expanded=false]').last().click();
  const best = await page.locator('[data-station]:has([aria-expanded=true])').getAttribute('data-station');
  await moveThere(page).click();
  const { station } = await thrusterPlace(page);
  expect(station).toBeCloseTo(Number(best), 6);
  expect(await page.getByText('Worked out before the last change').count()).toBe(0);
  await page.getByRole('button', { name: /^Undo/ }).click();
  expect(await savedText(page)).toBe(before);
});

test('a click in the curves moves the thruster to the station under it, with another one back', async ({
  visit,
}) => {
  const page = await visit();
  const before = await savedText(page);
  await study(page);
  const { y, height } = (await plot(page).boundingBox())!;
  const { x } = await planeOnPage(page, 1, 0);
  await page.mouse.move(x, y + height / 2);
  await page.mouse.down();
  await page.mouse.up();
  const place = await thrusterPlace(page);
  expect(place.kind).toBe('keel');
  expect(place.station).toBeCloseTo(1, 1);
  await page.getByRole('button', { name: /^Undo/ }).click();
  expect(await savedText(page)).toBe(before);
  await page.getByRole('button', { name: 'Close the study' }).click();
  await page.getByTestId('beam-view').waitFor();
});

test('where the propeller would strike a click moves nothing and says what is in the way', async ({
  visit,
}) => {
  const page = await visit();
  const before = await savedText(page);
  await study(page);
  const { y, height } = (await plot(page).boundingBox())!;
  const { x } = await planeOnPage(page, 1.8, 0);
  await page.mouse.click(x, y + height / 2);
  await page.getByText(/There the propeller would strike .* Drag it there, or type its station/).waitFor();
  expect(await savedText(page)).toBe(before);
});

test('a tap in the curves reads the station; only its button moves the thruster there', async ({ visit }) => {
  const page = await visit({ hasTouch: true });
  const before = await savedText(page);
  await study(page);
  const { y, height } = (await plot(page).boundingBox())!;
  const { x } = await planeOnPage(page, 1, 0);
  await page.touchscreen.tap(x, y + height / 2);
  const button = page.getByRole('button', { name: 'Move it there', exact: true });
  await button.waitFor();
  expect(await savedText(page)).toBe(before);
  await button.tap();
  expect((await thrusterPlace(page)).station).toBeCloseTo(1, 1);
  await page.getByRole('button', { name: /^Undo/ }).click();
  expect(await savedText(page)).toBe(before);
});

test('by keyboard: run, read, applied from the list and from the curves, and back', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'library-scanner');
  const before = await savedText(page);
  await turnTab(page).focus();
  for (let i = 0; i < 12 && (await turnTab(page).getAttribute('aria-selected')) !== 'true'; i++) {
    await page.keyboard.press('ArrowRight');
  }
  await turnTab(page).focus();
  await page.keyboard.press('Enter');
  await begin(page).waitFor();
  await tabTo(page, 'Try every station');
  await page.keyboard.press('Enter');
  // The focus stays where it was, on what can be done there now.
  expect(await focused(page)).toBe('Stop');
  await again(page).waitFor();
  expect(await focused(page)).toBe('Try every station again');
  await tabTo(page, 'today');
  await page.keyboard.press('Tab');
  if ((await focused(page)).startsWith('Hang')) await page.keyboard.press('Tab');
  await page.keyboard.press('Enter');
  await tabTo(page, 'Move it, hang the ballast');
  await page.keyboard.press('Enter');
  await page.getByText('Worked out before the last change: try every station again.').waitFor();
  await expect
    .poll(() => page.getByRole('button', { name: /^Undo/ }).getAttribute('title'))
    .toMatch(/ballast/);
  await page.keyboard.press('Control+z');
  expect(await savedText(page)).toBe(before);

  await plot(page).focus();
  await page.keyboard.press('Home');
  await page.keyboard.press('ArrowRight');
  await page.keyboard.press('ArrowRight');
  const read = await plot(page).getAttribute('aria-valuetext');
  expect(read).toMatch(/^Station [\d.]+ m: .*Lead and wire .* g, Time to 90° .* s, Side gust held .* m\/s/);
  await page.keyboard.press('Enter');
  expect(await thrusterPlace(page)).toMatchObject({
    station: expect.closeTo(Number(/Station ([\d.]+) m/.exec(read!)![1]), 3),
  });
  await page.keyboard.press('Control+z');
  expect(await savedText(page)).toBe(before);
});

test('with another throttle the study is of before, and nothing moves', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'library-scanner');
  await study(page);
  await page.locator('[data-station] [aria-expanded=false]').last().click();
  await page.getByRole('slider', { name: 'Throttle' }).fill('0.5');
  await page.getByText('Worked out before the last change: try every station again.').waitFor();
  const before = await savedText(page);
  await moveThere(page).click({ force: true });
  const { x, y, width, height } = (await plot(page).boundingBox())!;
  await page.mouse.click(x + width / 2, y + height / 2);
  expect(await savedText(page)).toBe(before);
});

test('whoever turns an arrow in yaw steers by it; the list goes back to the limit', async ({ visit }) => {
  const page = await visit();
  // Its first part is the thruster, which the first ] selects.
  await openSample(page, 'worked-example');
  await turnTab(page).click();
  const steering = page.getByRole('combobox', { name: 'Turn with' });
  expect(await steering.inputValue()).toBe('limit');
  await page.getByTestId('above-view').focus();
  for (const key of [']', 'Shift+Period']) await page.keyboard.press(key);
  await expect.poll(() => steering.inputValue()).toBe('set');
  expect(await steering.locator('option:checked').textContent()).toMatch(/^Arrow: .* starboard$/);
  await steering.selectOption('limit');
  expect(await steering.inputValue()).toBe('limit');
});

test('a craft without thrust is told so, and there is nothing to try', async ({ visit }) => {
  const page = await visit();
  await turnTab(page).click();
  await openSample(page, 'two-sheet-advert');
  await page.getByText('The craft has no thruster: add a part of that kind').first().waitFor();
  expect(await begin(page).count()).toBe(0);
});

for (const colorScheme of ['light', 'dark'] as const) {
  test(`no serious axe-core finding in turn and study, ${colorScheme}`, async ({ visit }) => {
    const page = await visit({ colorScheme });
    await study(page);
    await page.locator('.turn details').evaluateAll((all) => {
      for (const each of all) (each as HTMLDetailsElement).open = true;
    });
    await page.locator('[data-figure="turn.timeTo90"] > button').click();
    expect(await findings(page)).toEqual([]);
  });
}

for (const viewport of [
  { width: 1440, height: 900 },
  { width: 1024, height: 768 },
]) {
  test(`nothing is cut off at ${viewport.width} × ${viewport.height}`, async ({ visit }) => {
    const page = await visit({ viewport });
    await study(page);
    const panel = page.getByRole('tabpanel', { name: 'Turn', exact: true });
    expect(await panel.evaluate((box) => box.scrollWidth - box.clientWidth)).toBe(0);
    expect(
      await page
        .locator('.column .tabs button')
        .evaluateAll((tabs) =>
          tabs.filter((tab) => tab.scrollWidth > tab.clientWidth + 1).map((tab) => tab.textContent),
        ),
    ).toEqual([]);
    expect((await plot(page).boundingBox())!.height).toBeGreaterThan(110);
  });
}
