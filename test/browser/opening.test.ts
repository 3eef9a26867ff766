import { expect } from 'vitest';
import { headline, test } from './visit.ts';

test('a first visit opens on a craft and says what is wrong with it in one sentence', async ({ visit }) => {
  const page = await visit();
  expect(await page.title()).toMatch(/Steelyard$/);
  expect(await headline(page)).toMatch(/\d/);
});
