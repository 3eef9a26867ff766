import { expect, test } from 'vitest';
import { keyed } from '../../src/craft/craft.ts';
import type { Load } from '../../src/craft/planningSchema.ts';
import { sideFigure } from '../../src/scene/figure.ts';
import { FigureCache } from '../../src/scene/keepSame.ts';
import {
  isOpen,
  knobAt,
  knobKey,
  knobsOf,
  knobsOfAll,
  type Rail,
  railsOf,
  railsShown,
  sameRail,
} from '../../src/scene/rails.ts';
import { toScreen } from '../../src/scene/view.ts';
import { craft as fixture, geometry, PARTS, VIEW } from './fixture.ts';

const PARCEL: Load = {
  id: 'parcel',
  name: 'Parcel',
  mass: 0.1,
  massTolerance: 0,
  must: false,
  rank: 1,
  options: [{ kind: 'slide', place: { kind: 'keel', station: 0.8, drop: 0.02 }, from: 0.8, to: 1.3 }],
};

const sliding = (slide: { from: number; to: number }) => ({
  ...fixture(PARTS.map((part) => (part.id === 'battery' ? { ...part, slide } : part))),
  loads: keyed([PARCEL]),
});
const craft = sliding({ from: 0.9, to: 1.6 });
const drawn = geometry(craft);
const { hull } = drawn;
const figures = new FigureCache(sideFigure).figures(craft, drawn, 1 / VIEW.scale);
const rails = railsOf(craft, hull);
const of = (kind: 'part' | 'load'): Rail => rails.find(({ owner }) => owner.kind === kind)!;

test('a rail runs from stop to stop along its kind of place, and its knobs stand off the craft', () => {
  const { line, out } = of('part');
  expect(line[0]).toEqual({ u: 0.9, z: expect.closeTo(-hull.radius(0.9, Math.PI) - 0.04, 9) });
  expect(line.at(-1)!.u).toBe(1.6);
  expect(out).toBe(-1);
  for (const knob of knobsOf(of('part'), figures, VIEW.scale)) expect(knob.at.z).toBeLessThan(knob.stop.z);
});

test('a knob clears the part that lies over its stop, so that the part can be taken as before', () => {
  const here = railsOf(sliding({ from: 0.9, to: 1.2 }), hull)[0]!;
  const { box } = figures.find(({ part }) => part === 'battery')!;
  const [, to] = knobsOf(here, figures, VIEW.scale);
  expect(to!.at.u).toBe(1.2);
  expect(to!.at.z).toBeLessThan(box.bottom - 9 / VIEW.scale);
});

test('the knobs of a rail of no length can be told apart', () => {
  const [from, to] = knobsOf(railsOf(sliding({ from: 1.2, to: 1.2 }), hull)[0]!, [], VIEW.scale);
  expect((to!.at.u - from!.at.u) * VIEW.scale).toBeGreaterThan(20);
});

test('a fingertip has a target of 32 px across, and takes the nearest', () => {
  const knobs = knobsOfAll(rails, figures, VIEW.scale);
  for (const knob of knobs) {
    const { x, y } = toScreen(VIEW, knob.at);
    expect(knobAt(knobs, VIEW, { x: x + 7, y, touch: true })).not.toBeNull();
    const found = knobAt(knobs, VIEW, { x, y: y + 4, touch: true })!;
    expect(knobKey(found)).toBe(knobKey(knob));
  }
  const alone = knobs.slice(0, 1);
  const { x, y } = toScreen(VIEW, alone[0]!.at);
  expect(knobAt(alone, VIEW, { x: x + 15.9, y, touch: true })).toBe(alone[0]);
  expect(knobAt(alone, VIEW, { x: x + 12, y, touch: false })).toBeNull();
});

test('stops can be taken of what is selected; of a load ashore while no part is', () => {
  expect(isOpen(of('part'), craft, [])).toBe(false);
  expect(isOpen(of('part'), craft, ['battery'])).toBe(true);
  expect(isOpen(of('load'), craft, [])).toBe(true);
  expect(isOpen(of('load'), craft, ['battery'])).toBe(false);
});

test('a rail found again is the same until its slide, its place or the hull changes', () => {
  expect(railsOf(craft, hull).every((rail, i) => sameRail(rail, rails[i]!))).toBe(true);
  const other = (changed: typeof craft) => railsOf(changed, geometry(changed).hull)[0]!;
  expect(sameRail(of('part'), other(sliding({ from: 0.9, to: 1.61 })))).toBe(false);
  const wider = { ...craft.hull, shape: { kind: 'spheroid', length: 3, diameter: 1.1 } } as const;
  expect(sameRail(of('part'), other({ ...craft, hull: wider }))).toBe(false);
});

test('where loads may go is drawn only while planning; slides of parts always', () => {
  expect(railsShown(rails, true)).toEqual(rails);
  const kinds = railsShown(rails, false).map(({ owner }) => owner.kind);
  expect(new Set(kinds)).toEqual(new Set(['part']));
  expect(kinds.length).toBe(rails.filter(({ owner }) => owner.kind === 'part').length);
});
