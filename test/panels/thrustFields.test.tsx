import { expect, test } from 'vitest';
import { catalogue } from '../../src/catalogue/catalogue.ts';
import type { Craft } from '../../src/craft/craft.ts';
import { firstThruster } from '../../src/craft/firstFigures.ts';
import type { Part } from '../../src/craft/schema.ts';
import type { ThrusterData } from '../../src/craft/thrustSchema.ts';
import { setTargets } from '../../src/edit/edits/craft.ts';
import { setPart } from '../../src/edit/edits/parts.ts';
import { run } from '../../src/edit/history.ts';
import { CatalogueDialog } from '../../src/panels/CatalogueDialog.tsx';
import { partFrom } from '../../src/panels/defaults.ts';
import { Inspector } from '../../src/panels/Inspector.tsx';
import { TargetsPanel } from '../../src/panels/TargetsPanel.tsx';
import { sampleCraft } from '../samples/readSamples.ts';
import { danglingIds, render, seen, unnamed } from './render.tsx';

const worked = sampleCraft('worked-example');
const thruster = worked.parts.byId['tail-thruster']!;
const first = firstThruster(thruster.size);

const changed = (id: string, change: Partial<Part>): Craft =>
  run(worked, setPart(worked.parts.byId[id]!, 'figures', change).recipe).craft;
const page = (id: string, change: Partial<Part> = {}, units: 'metric' | 'imperial' = 'metric') =>
  render(Inspector, {}, changed(id, change), { selection: [{ kind: 'part', id }], units });
const withData = (change: Partial<ThrusterData>, part: Partial<Part> = {}) =>
  page('tail-thruster', { ...part, thruster: { ...first, ...change } });

const turning = { least: -1, most: 1, set: 0, slew: 3 };
const PAGES: Readonly<Record<string, string>> = {
  unknown: page('tail-thruster', { thruster: null }),
  guessed: page('tail-thruster', { thruster: first }),
  turning: withData({ yaw: turning, pitch: turning }),
  'from power': withData({
    thrust: { kind: 'power', shaftPower: 20, figureOfMerit: 0.5 },
    pitchSpeed: { kind: 'turning', motorSpeed: 500, gearRatio: 2, pitch: 0.1 },
  }),
  pair: withData({}, { copies: { kind: 'pair' } }),
  fin: page('fins'),
  'fin without outline': page('fins', { fin: null }),
  'pod with a figure': page('gondola', { dragArea: 0.02 }),
  'gondola with a propeller': page('gondola', { thruster: first }),
  imperial: page('tail-thruster', { thruster: first }, 'imperial'),
};

test.each(Object.entries(PAGES))(
  '%s: every field has a name, and nothing is without a value',
  (_, markup) => {
    expect(unnamed(markup)).toEqual([]);
    expect(danglingIds(markup)).toEqual([]);
    expect(seen(markup)).not.toMatch(/NaN|undefined|\[object|\{/);
  },
);

const text = (name: string) => seen(PAGES[name]!);

test('a thruster of which nothing is known offers to begin; a guess says that it is one until it is changed', () => {
  expect(text('unknown')).toContain('Enter thrust figures');
  expect(text('unknown')).not.toContain('Propeller diameter');
  expect(text('guessed')).toContain('These are guesses');
  expect(seen(withData({ reverse: 0.5 }))).not.toContain('These are guesses');
});

test('one that is fixed shows no limits; one that turns does, with a caution', () => {
  expect(text('guessed')).toContain('Fixed in yaw');
  expect(text('guessed')).not.toMatch(/Smallest|Slew|A thruster that turns/);
  expect(text('turning')).toMatch(/Smallest yaw.*Greatest yaw.*Slew in yaw.*Smallest pitch/);
  expect(text('turning')).toContain('A thruster that turns');
});

test('only a pair can be throttled apart', () => {
  expect(text('pair')).toContain('Throttled apart');
  expect(text('guessed')).not.toContain('Throttled apart');
});

test('what follows from the figures stands below them, with what to mind', () => {
  expect(text('guessed')).toMatch(
    /Thrust at rest \d\.\d+ N.*Ideal power for it \d+\.\d W.*Pitch speed 8\.00 m\/s/,
  );
  expect(text('guessed')).not.toContain('low for outdoors');
  expect(seen(withData({ pitchSpeed: { kind: 'given', speed: 4 } }))).toContain('low for outdoors');
});

test('a propeller on what is no thruster brings its caution', () => {
  expect(text('gondola with a propeller')).toContain('A turning propeller cuts');
});

test('a fin shows its outline, and can be taken from its box', () => {
  expect(text('fin')).toMatch(/Outline area.*Aspect ratio.*Span, mean chord 500 mm, 300 mm.*From its box/);
  expect(text('fin without outline')).toContain('From its box');
});

test('an empty drag area shows what it is reckoned as', () => {
  // 0.8 × 80 mm × 60 mm of gondola.
  expect(page('gondola')).toMatch(/placeholder="0\.00384"/);
  expect(PAGES['pod with a figure']).toMatch(/Drag area.*?value="0\.02"/);
  expect(PAGES.fin).toContain('placeholder="by its outline"');
});

test('targets of turning are empty until they are asked for', () => {
  const markup = render(TargetsPanel, {}, worked);
  expect(markup.match(/placeholder="not asked for"/g)).toHaveLength(2);
  const asked = run(worked, setTargets('turning', { turnTime: 6, sideGust: 1.5 }).recipe).craft;
  expect(render(TargetsPanel, {}, asked)).toMatch(/First 90° within.*?value="6".*?Side gust.*?value="1\.5"/);
});

test('what is picked from the catalogue brings its figures, and the list tells them', () => {
  const entry = (id: string) => catalogue.parts.find((each) => each.id === id)!;
  const place = { kind: 'axis', station: 1 } as const;
  const motor = partFrom(entry('motor-2212-230'), place);
  expect(motor.thruster).toMatchObject({ ...entry('motor-2212-230').thruster, differential: false });
  expect(partFrom(entry('fin-frame-medium'), place).fin).toEqual(entry('fin-frame-medium').fin);
  expect(partFrom(entry('valve'), place)).toMatchObject({ thruster: null, fin: null });
  const list = seen(render(CatalogueDialog, { onClose: () => {} }, worked));
  // (14 W × 0.52 × √(2 × 1.199 kg/m³ × 78.5 cm²))^(2/3) = 0.9994 N.
  expect(list).toContain('1.0 N, ⌀ 100 mm');
  expect(list).toContain('outline 0.15 m²');
});
