/** Fingers on a touch screen. */
import type { Page } from 'playwright-core';
import type { Point } from './drawing.ts';

/** Moves fingers over the glass, in steps. */
export async function touch(
  page: Page,
  fingers: readonly (readonly [from: Point, to: Point])[],
): Promise<void> {
  const cdp = await page.context().newCDPSession(page);
  const at = (share: number) =>
    fingers.map(([from, to], id) => ({
      x: from.x + (to.x - from.x) * share,
      y: from.y + (to.y - from.y) * share,
      id,
    }));
  await cdp.send('Input.dispatchTouchEvent', { type: 'touchStart', touchPoints: at(0) });
  for (let i = 1; i <= 12; i++) {
    await cdp.send('Input.dispatchTouchEvent', { type: 'touchMove', touchPoints: at(i / 12) });
  }
  await cdp.send('Input.dispatchTouchEvent', { type: 'touchEnd', touchPoints: [] });
}
