/** Where things are on the drawing, worked out from the craft and from the view that the page says it shows. */
import type { Page } from 'playwright-core';
import { parse } from '../../src/craft/parse.ts';
import { assess } from '../../src/report/assess.ts';
import { toScreen, type View } from '../../src/scene/view.ts';

export interface Point {
  readonly x: number;
  readonly y: number;
}

/** The middle of a part in the side view, px on the page. */
export async function partOnPage(page: Page, text: string, part: string): Promise<Point> {
  const parsed = parse(text);
  if (!parsed.ok) throw new Error('The text is no craft.');
  const { geometry } = assess(parsed.craft);
  if (geometry.status !== 'solved') throw new Error(geometry.why);
  const piece = geometry.pieces.find((each) => each.part === part)!;
  const [x, , z] = piece.middle;
  return planeOnPage(page, x, z);
}

/** A point of the side view's plane, or of another view's, px on the page. */
export async function planeOnPage(
  page: Page,
  station: number,
  height: number,
  testId = 'side-view',
): Promise<Point> {
  const side = page.getByTestId(testId);
  const box = (await side.boundingBox())!;
  const view = await side.evaluate(({ dataset }): View => {
    const { scale, originX, originY, tilt, pivot } = dataset;
    const [width, height] = [0, 0];
    return {
      scale: Number(scale),
      originX: Number(originX),
      originY: Number(originY),
      tilt: Number(tilt),
      pivot: Number(pivot),
      width,
      height,
    };
  });
  const at = toScreen(view, { u: station, z: height });
  return { x: box.x + at.x, y: box.y + at.y };
}

/** Drags by mouse in steps, as a hand does. */
export async function drag(page: Page, from: Point, to: Point, steps = 12): Promise<void> {
  await page.mouse.move(from.x, from.y);
  await page.mouse.down();
  await page.mouse.move(to.x, to.y, { steps });
  await page.mouse.up();
}

/** What a verdict shows. */
export const verdictText = (page: Page, key: string): Promise<string> =>
  page.locator(`[data-verdict=${key}] .verdict-face`).evaluate((element) => element.textContent);
