import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { openSample, sample, savedText } from './craftFiles.ts';
import { drag, type Point, planeOnPage } from './drawing.ts';
import { touch } from './fingers.ts';
import { test } from './visit.ts';

const NAME = 'worked-example';
/** The tail thruster of the worked example sits on the axis here, turned straight ahead. m */
const STATION = 2.97;
const DEGREE = Math.PI / 180;

type View = 'side-view' | 'above-view';

async function openTurn(page: Page): Promise<void> {
  await openSample(page, NAME);
  await page.getByRole('tab', { name: 'Turn', exact: true }).click();
  await page.getByTestId('above-view').locator('canvas').first().waitFor();
}

/** So far from the disc in the direction of an angle from the nose, + up or to starboard. */
async function outOf(page: Page, view: View, angle: number, px: number): Promise<Point> {
  const side = view === 'side-view';
  const { x, y } = side ? await planeOnPage(page, STATION, 0) : await planeOnPage(page, 0, -STATION, view);
  const [ahead, across] = [px * Math.cos(angle * DEGREE), px * Math.sin(angle * DEGREE)];
  return side ? { x: x - ahead, y: y - across } : { x: x + across, y: y - ahead };
}

/** From the disc to the handle of the longest arrow, px. */
async function reach(page: Page, view: View): Promise<number> {
  const { width, height } = (await page.getByTestId(view).boundingBox())!;
  return 12 + (view === 'side-view' ? 60 : Math.min(60, 0.2 * Math.min(width, height)));
}

const thruster = (text: string) =>
  JSON.parse(text).parts.find(({ kind }: { kind: string }) => kind === 'thruster').thruster;

const degrees = (text: string, way: 'yaw' | 'pitch'): number => thruster(text)[way].set / DEGREE;

const undo = (page: Page) => page.getByRole('button', { name: 'Undo' });

test('the tip of the arrow turns the thrust in pitch; undone at once; Escape bails', async ({ visit }) => {
  const page = await visit();
  await openTurn(page);
  const far = await reach(page, 'side-view');
  const [from, to] = [await outOf(page, 'side-view', 0, far), await outOf(page, 'side-view', 21.5, far)];
  await page.mouse.move(from.x, from.y);
  await page.mouse.down();
  await page.mouse.move(to.x, to.y, { steps: 8 });
  const side = page.getByTestId('side-view');
  await side.getByText('thrust 20.0° up').waitFor();
  await side.getByText('limits 30.0° either way').waitFor();
  await page.keyboard.press('Escape');
  await page.mouse.up();
  expect(await savedText(page)).toBe(sample(NAME));

  await drag(page, from, to);
  const turned = await savedText(page);
  expect(degrees(turned, 'pitch')).toBeCloseTo(20, 6);
  expect(degrees(turned, 'yaw')).toBe(0);
  await undo(page).click();
  expect(await savedText(page)).toBe(sample(NAME));
  expect(await undo(page).isDisabled()).toBe(true);
});

test('from above it turns in yaw, to its limit and no farther, and says what that does', async ({
  visit,
}) => {
  const page = await visit();
  await openTurn(page);
  const far = await reach(page, 'above-view');
  await drag(page, await outOf(page, 'above-view', 0, far), await outOf(page, 'above-view', -80, far));
  expect(degrees(await savedText(page), 'yaw')).toBeCloseTo(-60, 6);
  const above = page.getByRole('application', { name: 'View from above' });
  // Thrust to port at the tail brings the nose to starboard.
  await expect.poll(() => above.locator('p').first().textContent()).toContain('yaws to starboard');
  await undo(page).click();
  await expect.poll(() => above.locator('p').first().textContent()).toContain('does not yaw');
});

test('by keys alone: comma and full stop turn it, in pitch from the side and in yaw from above', async ({
  visit,
}) => {
  const page = await visit();
  await openTurn(page);
  await page.getByTestId('side-view').focus();
  await page.keyboard.press(']');
  for (const key of ['.', '.', 'Shift+Period', ',']) await page.keyboard.press(key);
  expect(degrees(await savedText(page), 'pitch')).toBeCloseTo(11, 6);
  const above = page.getByTestId('above-view');
  await above.focus();
  await page.keyboard.press('Shift+Comma');
  await page.keyboard.press(',');
  expect(degrees(await savedText(page), 'yaw')).toBeCloseTo(-11, 6);
  await expect.poll(() => above.getByRole('status').textContent()).toContain('thrust 11.0° to port');
  // Each burst is one step.
  await page.keyboard.press('Control+z');
  await page.keyboard.press('Control+z');
  expect(await savedText(page)).toBe(sample(NAME));
});

for (const viewport of [
  { width: 1280, height: 800 },
  { width: 1024, height: 768 },
]) {
  test(`a finger turns both arrows on a tablet of ${viewport.width} × ${viewport.height}`, async ({
    visit,
  }) => {
    const page = await visit({ viewport, hasTouch: true, isMobile: true });
    await openTurn(page);
    for (const view of ['side-view', 'above-view'] as const) {
      const far = await reach(page, view);
      // A fingertip lands some px beside what it aims at.
      const { x, y } = await outOf(page, view, 0, far);
      const off = await outOf(page, view, 20, far);
      await touch(page, [
        [
          { x: x - 5, y: y - 6 },
          { x: off.x - 5, y: off.y - 6 },
        ],
      ]);
    }
    const text = await savedText(page);
    expect(degrees(text, 'pitch')).toBeGreaterThan(10);
    expect(degrees(text, 'yaw')).toBeGreaterThan(10);
    expect(JSON.parse(text).parts[0].place).toEqual(JSON.parse(sample(NAME)).parts[0].place);
  });
}

test('without the Turn tab in front an arrow shows where its thruster is selected, and the view from above is away', async ({
  visit,
}) => {
  const page = await visit();
  await openSample(page, NAME);
  expect(await page.getByTestId('above-view').count()).toBe(0);
  const side = page.getByTestId('side-view');
  const far = await reach(page, 'side-view');
  const [from, to] = [await outOf(page, 'side-view', 0, far), await outOf(page, 'side-view', 15, far)];
  await page.mouse.move(from.x, from.y);
  // The fins lie there.
  await side.getByText('Fins', { exact: true }).waitFor();
  await side.focus();
  await page.keyboard.press(']');
  await page.mouse.move(from.x + 1, from.y);
  await side.getByText('limits 30.0° either way').waitFor();
  await drag(page, from, to);
  expect(degrees(await savedText(page), 'pitch')).toBeCloseTo(15, 6);
});

test('the path of the turn is played to its end, stopped half-way, and moved by keys', async ({ visit }) => {
  const page = await visit();
  await openTurn(page);
  const player = page.getByTestId('turn-player');
  const title = page.getByText('Path of the turn', { exact: true });
  await title.waitFor();
  if (!(await player.isVisible())) await title.click();
  const time = player.getByRole('slider', { name: 'Time in the turn' });
  const at = async () => Number(await time.inputValue());
  const whole = Number(await time.getAttribute('max'));
  await player.getByRole('button', { name: 'Play' }).click();
  await expect.poll(at).toBeGreaterThan(0.2);
  await player.getByRole('button', { name: 'Pause' }).click();
  const stopped = await at();
  expect(stopped).toBeLessThan(whole);
  await time.focus();
  await page.keyboard.press('ArrowRight');
  expect(await at()).toBeGreaterThan(stopped);
  await page.keyboard.press('Home');
  expect(await at()).toBe(0);
  expect(await time.getAttribute('aria-valuetext')).toContain('Heading straight ahead');
  await player.getByRole('button', { name: 'Play' }).click();
  await expect.poll(at, { timeout: 20_000 }).toBeCloseTo(whole, 6);
  await player.getByRole('button', { name: 'Play' }).waitFor();
  expect(await player.textContent()).toContain('90.0° to starboard');
  expect(await savedText(page)).toBe(sample(NAME));
});

test('with the ballast plan the figures are of the craft it makes, the drawing and the file are not; and back', async ({
  visit,
}) => {
  const page = await visit();
  await openSample(page, 'museum-atrium');
  await page.getByRole('tab', { name: 'Turn', exact: true }).click();
  const turning = page.getByRole('region', { name: 'Turning' });
  await turning.getByText('Pitch', { exact: true }).click();
  const figure = turning.locator('[data-figure="cruise.pitch"]');
  const pitch = async () => {
    const old = await figure.evaluate((element) => element.closest('.plan-old') !== null);
    return old ? Number.NaN : Number.parseFloat((await figure.locator('.number').first().textContent())!);
  };
  await expect.poll(pitch).toBeGreaterThan(20);
  const asItIs = await pitch();
  const floats = await page.locator('[data-verdict="level"]').textContent();
  const choice = turning.getByLabel('Of the craft');
  await choice.selectOption('With the ballast plan');
  await turning
    .getByText(/^With the ballast plan carried out, [\d.]+ g of dead ballast: slide Battery/)
    .waitFor();
  await expect.poll(pitch).toBeLessThan(asItIs - 5);
  expect(await page.locator('[data-verdict="level"]').textContent()).toBe(floats);
  await choice.selectOption('As it is');
  await expect.poll(pitch).toBe(asItIs);
  expect(await savedText(page)).toBe(sample('museum-atrium'));
});

test('where no plan can be made that is said, and the figures stay those of the craft as it is', async ({
  visit,
}) => {
  const page = await visit();
  await openTurn(page);
  const turning = page.getByRole('region', { name: 'Turning' });
  const headline = turning.locator('.plan-headline');
  const asItIs = await headline.textContent();
  await turning.getByLabel('Of the craft').selectOption('With the ballast plan');
  await turning.getByText(/^There is no ballast plan to carry out: .* No ballast, slide/).waitFor();
  await expect.poll(() => turning.locator('.plan-old').count()).toBe(0);
  expect(await headline.textContent()).toBe(asItIs);
});
