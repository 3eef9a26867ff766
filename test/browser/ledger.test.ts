/** Typing into the cells of the ledger, as a builder does. */
import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { openSample, sample, savedText } from './craftFiles.ts';
import { test } from './visit.ts';

const cell = (page: Page, row: string, column: string) =>
  page.getByRole('grid', { name: 'Parts' }).locator(`[data-row="${row}"] > [data-cell="${column}"]`);

const focused = (page: Page) =>
  page.evaluate(() => {
    const active = document.activeElement as HTMLElement;
    return [active.parentElement?.dataset.row, active.dataset.cell];
  });

const undoable = (page: Page) => page.getByRole('button', { name: 'Undo' }).isEnabled();

test('Escape in a cell puts back what was there and leaves the cell focused', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  for (const [column, typed] of [
    ['name', 'XX'],
    ['mass', '99'],
  ] as const) {
    await cell(page, 'battery', column).click();
    await page.keyboard.press('Enter');
    await page.keyboard.type(typed);
    await page.keyboard.press('Escape');
    expect(await focused(page)).toEqual(['battery', column]);
    await page.keyboard.type(typed);
    await page.keyboard.press('Escape');
    expect(await focused(page)).toEqual(['battery', column]);
  }
  await cell(page, 'battery', 'kind').click();
  await page.keyboard.press('Enter');
  await page.keyboard.press('ArrowDown');
  await page.keyboard.press('Escape');
  expect(await focused(page)).toEqual(['battery', 'kind']);
  expect(await savedText(page)).toBe(sample('worked-example'));
});

test('two edits of one cell are two undo steps', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  await cell(page, 'battery', 'mass').click();
  for (const typed of ['100', '200']) {
    await page.keyboard.type(typed);
    await page.keyboard.press('Enter');
  }
  const mass = async () => JSON.parse(await savedText(page)).parts[3].mass;
  expect(await mass()).toBe(0.2);
  await page.keyboard.press('Control+z');
  expect(await mass()).toBe(0.1);
  await page.keyboard.press('Control+z');
  expect(await savedText(page)).toBe(sample('worked-example'));
  expect(await undoable(page)).toBe(false);
});

test('an opened cell keeps its width, and a sentence on what is wrong stands whole on the page', async ({
  visit,
}) => {
  for (const viewport of [
    { width: 1440, height: 900 },
    { width: 1024, height: 768 },
  ]) {
    const page = await visit({ viewport });
    await openSample(page, 'worked-example');
    const last = cell(page, 'battery', 'mass');
    await last.click();
    const before = await last.boundingBox();
    await page.keyboard.type('abc');
    expect(await last.boundingBox()).toEqual(before);
    await page.keyboard.press('Enter');
    const sentence = page.getByRole('alert').filter({ hasText: 'abc' });
    expect(await sentence.textContent()).toBe(
      'Mass of Battery: “abc” is not a number. Enter a mass: a number, in g, oz, kg, mg, lb.',
    );
    const box = (await sentence.boundingBox())!;
    expect(box.y + box.height).toBeLessThanOrEqual(viewport.height);
    expect(box.x + box.width).toBeLessThanOrEqual(viewport.width);
    const inFront = await page.evaluate(
      ({ x, y, width, height }) => document.elementFromPoint(x + width / 2, y + height / 2)?.textContent,
      box,
    );
    expect(inFront).toContain('“abc” is not a number');
    await page.keyboard.press('Escape');
    expect(await savedText(page)).toBe(sample('worked-example'));
  }
});

test('on a narrow page name, mass, place, station, moment and lock are all in sight', async ({ visit }) => {
  const page = await visit({ viewport: { width: 1024, height: 768 } });
  const pane = (await page.locator('.grid-scroll').boundingBox())!;
  for (const title of ['Name', 'Mass', '±', 'Place', 'Station', 'Moment', 'Lock']) {
    const head = (await page.getByRole('columnheader', { name: title, exact: true }).boundingBox())!;
    expect(head.x + head.width).toBeLessThanOrEqual(pane.x + pane.width + 1);
  }
});

test('a letter typed in a list of choices goes to its entry and is no command', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  await page.getByRole('tab', { name: 'Hull' }).click();
  await page.getByRole('combobox', { name: 'Shape' }).focus();
  for (const key of ['t', 'f', '?', 'Delete']) await page.keyboard.press(key);
  expect(await page.getByRole('button', { name: 'As it floats' }).getAttribute('aria-pressed')).toBe('false');
  expect(await page.getByRole('dialog').count()).toBe(0);
});

test('what is added is named next, and a copy is called one', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  await page.getByRole('button', { name: 'Add part' }).click();
  await page.keyboard.type('Lamp');
  await page.keyboard.press('Enter');
  await page.getByRole('button', { name: 'Duplicate', exact: true }).click();
  const names = async () =>
    JSON.parse(await savedText(page))
      .parts.slice(4)
      .map((part: { name: string }) => part.name);
  expect(await names()).toEqual(['Lamp', 'Lamp copy']);
  await page.getByRole('tab', { name: 'Wires (0)' }).click();
  await page.getByRole('button', { name: 'Add wire run' }).click();
  await page.keyboard.type('Signal');
  await page.keyboard.press('Enter');
  expect(JSON.parse(await savedText(page)).wires[0].name).toBe('Signal');
});

test('rows copied in a spreadsheet and pasted onto the page are looked at first', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  const paste = (text: string) =>
    page.evaluate((plain) => {
      const clipboardData = new DataTransfer();
      clipboardData.setData('text/plain', plain);
      document.activeElement!.dispatchEvent(
        new ClipboardEvent('paste', { bubbles: true, cancelable: true, clipboardData }),
      );
    }, text);
  await cell(page, 'battery', 'mass').click();
  await paste('only a sentence');
  expect(await page.getByRole('dialog').count()).toBe(0);
  await paste('name\tmass\tstation\nCamera\t34\t0.7');
  const dialog = page.getByRole('dialog', { name: 'Add rows of parts' });
  await dialog.getByRole('row', { name: /Camera.*34.0 g.*0.700 m/ }).waitFor();
  await dialog.getByRole('button', { name: 'Add the part' }).click();
  expect(JSON.parse(await savedText(page)).parts[4].place).toEqual({ kind: 'keel', station: 0.7, drop: 0 });
});

test('with “Pick several” on, a plain click adds a row to what is selected', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  await page.getByRole('button', { name: 'Pick several' }).click();
  for (const row of ['battery', 'gondola']) await cell(page, row, 'kind').click();
  expect(await page.locator('[data-row][aria-selected=true]').count()).toBe(2);
  await cell(page, 'gondola', 'kind').click();
  expect(await page.locator('[data-row][aria-selected=true]').count()).toBe(1);
});

test('advice is carried out by the button beside it, as one step', async ({ visit }) => {
  const page = await visit();
  await openSample(page, 'worked-example');
  await page.locator('.headline-frame').getByRole('button', { name: 'Hang this lead' }).click();
  expect(JSON.parse(await savedText(page)).parts[4]).toMatchObject({ kind: 'ballast', name: 'Lead at Nose' });
  await page.locator('[data-verdict=level][data-state=met]').waitFor();
  await page.getByRole('button', { name: 'Undo' }).click();
  expect(await savedText(page)).toBe(sample('worked-example'));
});

test('a figure opens into its working, and from there into those that went in', async ({ visit }) => {
  const page = await visit();
  await page.getByRole('tab', { name: 'Figures' }).click();
  await page.locator('[data-figure="lead.mass"] > button').click();
  const working = page.locator('[data-figure="lead.mass"] .figure-working');
  await working.getByText(/FAA-H-8083-1/).waitFor();
  await working.getByRole('button', { name: 'CG station' }).click();
  await page.locator('[data-figure="cg.station"] .formula').waitFor();
  expect(
    await page
      .locator('[data-figure="cg.station"] > button')
      .evaluate((face) => face === document.activeElement),
  ).toBe(true);
});
