import { expect } from 'vitest';
import { openSample, sample, savedText } from './craftFiles.ts';
import { type Point, partOnPage, planeOnPage } from './drawing.ts';
import { touch } from './fingers.ts';
import { test } from './visit.ts';

const by = ({ x, y }: Point, dx: number, dy: number): Point => ({ x: x + dx, y: y + dy });

for (const viewport of [
  { width: 1280, height: 800 },
  { width: 1024, height: 768 },
]) {
  const tablet = { viewport, hasTouch: true, isMobile: true };

  test(`on a tablet of ${viewport.width} × ${viewport.height} a finger drags a part, and two zoom`, async ({
    visit,
  }) => {
    const page = await visit(tablet);
    await openSample(page, 'worked-example');
    const from = await partOnPage(page, sample('worked-example'), 'battery');
    await touch(page, [[from, by(from, -80, 0)]]);
    const moved = JSON.parse(await savedText(page)).parts[3];
    expect(moved.id).toBe('battery');
    expect(moved.place.station).toBeLessThan(1.2);
    await page.getByRole('button', { name: /^Undo/ }).tap();
    expect(await savedText(page)).toBe(sample('worked-example'));

    const scale = async () => Number(await page.getByTestId('side-view').getAttribute('data-scale'));
    const before = await scale();
    const middle = await planeOnPage(page, 1.5, 0.25);
    await touch(page, [
      [by(middle, -40, 0), by(middle, -90, 0)],
      [by(middle, 40, 0), by(middle, 90, 0)],
    ]);
    expect(await scale()).toBeGreaterThan(before * 1.5);
    expect(await savedText(page)).toBe(sample('worked-example'));
  });
}
