import { createRequire } from 'node:module';
import type { AxeResults } from 'axe-core';
import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { test } from './visit.ts';

const axe = createRequire(import.meta.url).resolve('axe-core/axe.min.js');

/** What axe-core 4.14 finds serious or critical, as "rule: where". */
async function findings(page: Page): Promise<string[]> {
  await page.addScriptTag({ path: axe });
  const { violations } = await page.evaluate(() =>
    (Reflect.get(window, 'axe') as { run(): Promise<AxeResults> }).run(),
  );
  return violations
    .filter(({ impact }) => impact === 'serious' || impact === 'critical')
    .flatMap(({ id, nodes }) =>
      nodes.map(({ target, failureSummary }) => `${id}: ${target} ${failureSummary}`),
    );
}

for (const colorScheme of ['light', 'dark'] as const) {
  test(`no serious axe-core finding, ${colorScheme}`, async ({ visit }) => {
    const page = await visit({ colorScheme });
    expect(await findings(page)).toEqual([]);
    await page.getByRole('gridcell').first().click();
    for (const tab of ['Selected', 'Gas, day', 'Targets', 'Figures', 'Notes']) {
      await page.getByRole('tab', { name: tab, exact: true }).click();
      expect(await findings(page)).toEqual([]);
    }
    await page.locator('[data-verdict=level] .verdict-face').click();
    expect(await findings(page)).toEqual([]);
  });

  test(`no serious axe-core finding in the dialogs, ${colorScheme}`, async ({ visit }) => {
    const page = await visit({ colorScheme });
    for (const name of ['Crafts', 'New craft', 'Keys and gestures', 'Catalogue…', 'Paste…']) {
      await page.getByRole('button', { name, exact: true }).click();
      await page.getByRole('dialog').waitFor();
      expect(await findings(page)).toEqual([]);
      await page.keyboard.press('Escape');
      await page.getByRole('dialog').waitFor({ state: 'detached' });
    }
  });
}
