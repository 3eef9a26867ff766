/** What axe-core 4.14 finds serious or critical on a page, as "rule: where". */
import { createRequire } from 'node:module';
import type { AxeResults } from 'axe-core';
import type { Page } from 'playwright-core';

const axe = createRequire(import.meta.url).resolve('axe-core/axe.min.js');

export async function findings(page: Page): Promise<string[]> {
  await page.addScriptTag({ path: axe });
  const { violations } = await page.evaluate(() =>
    (Reflect.get(window, 'axe') as { run(): Promise<AxeResults> }).run(),
  );
  return violations
    .filter(({ impact }) => impact === 'serious' || impact === 'critical')
    .flatMap(({ id, nodes }) => nodes.map(({ target }) => `${id}: ${target}`));
}
