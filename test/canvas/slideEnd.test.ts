import { expect, test } from 'vitest';
import { dragSlideEnd } from '../../src/canvas/gestures/dragSlideEnd.ts';
import { type Craft, keyed } from '../../src/craft/craft.ts';
import type { Load } from '../../src/craft/planningSchema.ts';
import { type Knob, knobsOfAll, railsOf, type SlideEnd } from '../../src/scene/rails.ts';
import { craft as fixture, PARTS } from '../scene/fixture.ts';
import { sideGround, type TestGround } from './ground.ts';

const PARCEL: Load = {
  id: 'parcel',
  name: 'Parcel',
  mass: 0.1,
  massTolerance: 0,
  must: false,
  rank: 1,
  options: [
    { kind: 'hardpoint', hardpoint: 'nose' },
    { kind: 'slide', place: { kind: 'keel', station: 0.8, drop: 0.02 }, from: 0.8, to: 1.3 },
  ],
};

const start: Craft = {
  ...fixture(
    PARTS.map((part) => (part.id === 'battery' ? { ...part, slide: { from: 0.85, to: 1.72 } } : part)),
  ),
  loads: keyed([PARCEL]),
};

function knob(ground: TestGround, kind: 'part' | 'load', end: SlideEnd): Knob {
  const { craft, geometry, figures, view } = ground.scene();
  const knobs = knobsOfAll(railsOf(craft, geometry.hull), figures, view.scale);
  return knobs.find((each) => each.rail.owner.kind === kind && each.end === end)!;
}

/** Drags by so many metres aft, with Alt so that nothing snaps. */
function drag(ground: TestGround, { kind, end, du }: { kind: 'part' | 'load'; end: SlideEnd; du: number }) {
  const taken = knob(ground, kind, end);
  const gesture = dragSlideEnd(ground, ground.at(taken.at), taken);
  const to = { u: taken.at.u + du, z: taken.at.z - 0.02 };
  for (const share of [0.3, 0.7, 1]) {
    gesture.move(ground.at({ ...to, u: taken.at.u + share * du }, { alt: true }));
  }
  return { gesture, release: () => gesture.end(ground.at(to), true) };
}

const slide = (ground: TestGround) => ground.craft().parts.byId.battery!.slide;

test('a stop goes with the hand; the part stays; one step of history, taken back in one', () => {
  const ground = sideGround(start);
  const before = ground.craft();
  drag(ground, { kind: 'part', end: 'from', du: -0.213 }).release();
  expect(slide(ground)).toEqual({ from: expect.closeTo(0.637, 9), to: 1.72 });
  expect(ground.craft().parts.byId.battery!.place).toEqual(before.parts.byId.battery!.place);
  expect(ground.session.getState().undoLabel).toBe('Change the slide of battery');
  ground.session.undo();
  expect(ground.craft()).toEqual(before);
  expect(ground.session.getState().undoLabel).toBeNull();
});

test('Escape leaves it as it was', () => {
  const ground = sideGround(start);
  const before = ground.craft();
  drag(ground, { kind: 'part', end: 'to', du: 0.3 }).gesture.cancel();
  expect(ground.craft()).toBe(before);
  expect(ground.session.getState()).toMatchObject({ dragging: false, undoLabel: null });
});

test('it snaps to the station of a part and says so', () => {
  const ground = sideGround(start);
  const taken = knob(ground, 'part', 'to');
  const gesture = dragSlideEnd(ground, ground.at(taken.at), taken);
  gesture.move(ground.at({ u: taken.at.u - 0.215, z: taken.at.z }));
  expect(slide(ground)).toEqual({ from: 0.85, to: 1.5 });
  expect(ground.overlay().guide).toMatchObject({ along: 'station', at: 1.5 });
  gesture.cancel();
});

test('dragged past the other stop the two change places', () => {
  const ground = sideGround(start);
  drag(ground, { kind: 'part', end: 'from', du: 1.1 }).release();
  expect(slide(ground)).toEqual({ from: 1.72, to: expect.closeTo(1.95, 9) });
});

test('a slide along skin or keel ends at the hull', () => {
  const ground = sideGround(start);
  drag(ground, { kind: 'part', end: 'to', du: 9 }).release();
  expect(slide(ground)).toEqual({ from: 0.85, to: ground.scene().geometry.hull.length });
});

test('the stretch where a load may go is dragged in the same way, and its other places stay', () => {
  const ground = sideGround(start);
  drag(ground, { kind: 'load', end: 'to', du: 0.117 }).release();
  expect(ground.craft().loads.byId.parcel!.options).toEqual([
    PARCEL.options[0],
    { ...PARCEL.options[1], to: expect.closeTo(1.417, 9) },
  ]);
  expect(ground.session.getState().undoLabel).toBe('Change the slide of Parcel');
});
