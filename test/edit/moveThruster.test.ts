import { expect, test } from 'vitest';
import { stowed } from '../../src/craft/stowage.ts';
import { moveAndHang, moveThruster } from '../../src/edit/edits/moveThruster.ts';
import { Session } from '../../src/edit/session.ts';
import { planningCraft } from './planningFixture.ts';
import { testEdit } from './testEdit.ts';

const craft = planningCraft();
const part = craft.parts.byId.thruster!;
const place = { kind: 'keel', station: 1.1, drop: 0.2 } as const;
const stowage = {
  weights: [{ hardpoint: 'nose', pieces: [{ mass: 0.0123, count: 1 }] }],
  slides: [{ part: 'battery', to: 0.5 }],
  loads: [{ load: 'horn', place: craft.hardpoints.byId.nose!.place, slide: null }],
};

test('a thruster is put where it was tried, whatever kind of place that is, and nothing else changes', () => {
  const moved = testEdit(craft, moveThruster(part, place));
  expect(moved.parts.byId.thruster!.place).toEqual(place);
  const back = testEdit(moved, moveThruster(moved.parts.byId.thruster!, part.place));
  expect(back).toEqual(craft);
  expect(testEdit(craft, moveThruster(part, part.place))).toBe(craft);
});

test('moved and ballasted it is the craft moved, then ballasted; undone at once', () => {
  const session = new Session(craft);
  expect(session.apply(moveAndHang(part, place, stowage))).toEqual([]);
  const { craft: result, undoLabel } = session.getState();
  expect(result).toEqual(stowed(testEdit(craft, moveThruster(part, place)), stowage));
  expect(undoLabel).toBe(`Move ${part.name} and hang the ballast`);
  session.undo();
  expect(session.getState().craft).toEqual(craft);
});
