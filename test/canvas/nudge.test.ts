import { expect, test } from 'vitest';
import { neighbour, nudgeEdit, nudgeFor } from '../../src/canvas/gestures/nudge.ts';
import type { Place } from '../../src/craft/placeSchema.ts';
import { Session } from '../../src/edit/session.ts';
import { craft, PARTS } from '../scene/fixture.ts';

const nudged = (place: Place, key: string, shift = false, facing: 'side' | 'front' = 'side') =>
  nudgeFor(key, shift, facing)!(place);

const KEEL: Place = { kind: 'keel', station: 1, drop: 0.1 };
const FREE: Place = { kind: 'free', x: 1, y: 0.1, z: 0.2 };
const TOP: Place = { kind: 'skin', station: 1, clock: 0.2, standoff: 0.05 };
const UNDER: Place = { kind: 'skin', station: 1, clock: 3, standoff: 0.05 };

test('a millimetre, with Shift ten, along the hull', () => {
  expect(nudged(KEEL, 'ArrowLeft')).toEqual({ ...KEEL, station: 0.999 });
  expect(nudged(FREE, 'ArrowRight', true)).toEqual({ ...FREE, x: 1.01 });
  expect(nudgeFor('a', false, 'side')).toBeNull();
});

test('up goes up on the screen, as far as the kind of place lets it', () => {
  expect(nudged(KEEL, 'ArrowUp')).toEqual({ ...KEEL, drop: 0.099 });
  expect(nudged(FREE, 'ArrowDown')).toEqual({ ...FREE, z: 0.199 });
  expect(nudged(TOP, 'ArrowUp')).toEqual({ ...TOP, standoff: expect.closeTo(0.051, 9) });
  expect(nudged(UNDER, 'ArrowUp')).toEqual({ ...UNDER, standoff: expect.closeTo(0.049, 9) });
  expect(nudged({ kind: 'axis', station: 1 }, 'ArrowUp')).toEqual({ kind: 'axis', station: 1 });
});

test('in the front view right is starboard: over the top clockwise, under the keel the other way', () => {
  const degree = Math.PI / 180;
  expect(nudged(TOP, 'ArrowRight', true, 'front')).toMatchObject({ clock: 0.2 + degree });
  expect(nudged(UNDER, 'ArrowRight', true, 'front')).toMatchObject({ clock: 3 - degree });
  expect(nudged(FREE, 'ArrowLeft', false, 'front')).toEqual({ ...FREE, y: 0.099 });
  expect(nudged(KEEL, 'ArrowLeft', false, 'front')).toBe(KEEL);
});

test('a burst of nudges undoes at once; locked parts stay; nothing selected is no edit', () => {
  const locked = PARTS.map((each) => ({ ...each, locked: each.id === 'camera' }));
  const session = new Session(craft(locked));
  const selection = ['battery', 'camera'].map((id) => ({ kind: 'part', id }) as const);
  for (let i = 0; i < 3; i++) session.apply(nudgeEdit(selection, nudgeFor('ArrowRight', false, 'side')!)!);
  const { byId } = session.getState().craft.parts;
  expect(byId.battery!.place).toMatchObject({ station: 1.203 });
  expect(byId.camera!.place).toMatchObject({ x: 0.9 });
  session.undo();
  expect(session.getState()).toMatchObject({ undoLabel: null, redoLabel: 'Nudge 2 things' });
  expect(nudgeEdit([], nudgeFor('ArrowRight', false, 'side')!)).toBeNull();
});

test('brackets go round the parts in the builder’s order', () => {
  const order = ['a', 'b', 'c'];
  const from = (id: string | null, way: 1 | -1) =>
    neighbour(order, id === null ? [] : [{ kind: 'part', id }], way).map(({ id: at }) => at);
  expect([from('a', 1), from('c', 1), from('a', -1), from(null, 1), from(null, -1)]).toEqual([
    ['b'],
    ['a'],
    ['c'],
    ['a'],
    ['c'],
  ]);
  expect(neighbour([], [], 1)).toEqual([]);
});
