import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { openSample, sample } from './craftFiles.ts';
import { partOnPage } from './drawing.ts';
import { test } from './visit.ts';

const SIZES = [
  { width: 1440, height: 900 },
  { width: 1280, height: 800 },
  { width: 1024, height: 768 },
];

/** How far the page itself can be scrolled, px. */
const scrollRoom = (page: Page) =>
  page.evaluate(() => {
    const { scrollWidth, clientWidth, scrollHeight, clientHeight } = document.documentElement;
    return { across: scrollWidth - clientWidth, down: scrollHeight - clientHeight };
  });

/** Buttons whose words do not fit in them, and fields too narrow to read a number in. */
const clipped = (page: Page) =>
  page.evaluate(() => {
    const shown = (element: Element) => element.getClientRects().length > 0;
    const buttons = [...document.querySelectorAll('.bar button, .tabs button, .toolbar button')]
      .filter(shown)
      .filter((button) => button.scrollWidth > button.clientWidth + 1)
      .map((button) => button.textContent);
    const fields = [...document.querySelectorAll('.panel input.number')]
      .filter(shown)
      .filter((input) => input.clientWidth < 34)
      .map((input) => input.getAttribute('aria-label') ?? input.id);
    return [...buttons, ...fields];
  });

for (const viewport of SIZES) {
  test(`nothing scrolls the page or is cut off at ${viewport.width} × ${viewport.height}`, async ({
    visit,
  }) => {
    const page = await visit({ viewport });
    for (const tab of ['Selected', 'Hull', 'Gas, day', 'Targets', 'Plan', 'Turn', 'Figures', 'Notes']) {
      await page.getByRole('tab', { name: tab, exact: true }).click();
      expect(await scrollRoom(page)).toEqual({ across: 0, down: 0 });
      expect(await clipped(page)).toEqual([]);
      const panel = page.getByRole('tabpanel', { name: tab, exact: true });
      expect(await panel.evaluate((box) => box.scrollWidth - box.clientWidth)).toBe(0);
    }
    const side = (await page.getByTestId('side-view').boundingBox())!;
    expect(side.width).toBeGreaterThan(viewport.width / 2);
    expect(side.height).toBeGreaterThan(200);
  });
}

/** How many tabs of the column stand in each row, and the least width and height of one, px. */
const tabRows = (page: Page) =>
  page.locator('.column [role="tab"]').evaluateAll((tabs) => {
    const boxes = tabs.map((tab) => tab.getBoundingClientRect());
    const tops = boxes.map(({ top }) => Math.round(top));
    return {
      rows: [...new Set(tops)].map((row) => tops.filter((top) => top === row).length),
      width: Math.min(...boxes.map(({ width }) => width)),
      height: Math.min(...boxes.map(({ height }) => height)),
    };
  });

/** Makes the column as narrow as it goes. */
async function narrow(page: Page): Promise<void> {
  const splitter = page.getByRole('separator', { name: 'Width of the panels' });
  await splitter.focus();
  await page.keyboard.press('Enter');
  await page.keyboard.press('ArrowLeft');
}

test('the tabs of the column stand in one row, in a narrow column in two even ones', async ({ visit }) => {
  for (const viewport of SIZES) {
    const page = await visit({ viewport });
    expect((await tabRows(page)).rows).toEqual([8]);
    await narrow(page);
    expect((await tabRows(page)).rows).toEqual([4, 4]);
    expect(await clipped(page)).toEqual([]);
  }
});

test('for a finger the tabs stand in two even rows, each as wide as a fingertip', async ({ visit }) => {
  for (const viewport of SIZES) {
    const page = await visit({ viewport, hasTouch: true, isMobile: true });
    for (const make of [async () => {}, narrow]) {
      await make(page);
      const { rows, width, height } = await tabRows(page);
      expect(rows).toEqual([4, 4]);
      expect(Math.min(width, height)).toBeGreaterThanOrEqual(40);
      expect(await clipped(page)).toEqual([]);
    }
  }
});

test('the beam stands under the side view on the same scale of stations', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  const [side, beam] = [page.getByTestId('side-view'), page.getByTestId('beam-view')];
  const [above, below] = [(await side.boundingBox())!, (await beam.boundingBox())!];
  expect(below.x).toBe(above.x);
  expect(below.width).toBe(above.width);
  expect(below.y).toBeGreaterThanOrEqual(above.y + above.height - 1);
  for (const name of ['data-scale', 'data-origin-x']) {
    expect(await beam.getAttribute(name)).toBe(await side.getAttribute(name));
  }
});

test('whatever the sentence and the verdicts say in a drag, the drawing under them stays where it is', async ({
  visit,
}) => {
  for (const viewport of SIZES) {
    const page = await visit({ viewport });
    await openSample(page, 'worked-example');
    const side = page.getByTestId('side-view');
    const before = await side.boundingBox();
    const cards = () =>
      page
        .locator('.verdict-face')
        .evaluateAll((faces) => [...new Set(faces.map((face) => face.getBoundingClientRect().height))]);
    const [height, ...others] = await cards();
    expect(others).toEqual([]);
    const { x, y } = await partOnPage(page, sample('worked-example'), 'battery');
    await page.mouse.move(x, y);
    await page.mouse.down();
    for (let to = -260; to <= 260; to += 20) {
      await page.mouse.move(x + to, y);
      expect(await side.boundingBox()).toEqual(before);
      expect(await cards()).toEqual([height]);
      expect(await spilling(page)).toEqual([]);
    }
    await page.mouse.up();
  }
});

/** Verdicts whose text stands out of their card. */
const spilling = (page: Page) =>
  page.locator('.verdict-face > span:not(.verdict-state)').evaluateAll((spans) =>
    spans
      .filter((span) => {
        const [text, card] = [span.getBoundingClientRect(), span.parentElement!.getBoundingClientRect()];
        return text.right > card.right || text.bottom > card.bottom;
      })
      .map((span) => span.textContent),
  );
