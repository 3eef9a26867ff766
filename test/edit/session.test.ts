import fc from 'fast-check';
import { expect, test } from 'vitest';
import { parse } from '../../src/craft/parse.ts';
import type { Part } from '../../src/craft/schema.ts';
import { serialize } from '../../src/craft/serialize.ts';
import { type Edit, inRun, runOf, step } from '../../src/edit/edit.ts';
import { setGas, setName, setNotes, setShape } from '../../src/edit/edits/craft.ts';
import { addHardpoint, removeHardpoints, setLeadAt } from '../../src/edit/edits/hardpoints.ts';
import { duplicateParts, placePart, removeParts, setPart, shiftParts } from '../../src/edit/edits/parts.ts';
import { removeWires } from '../../src/edit/edits/wires.ts';
import { Session } from '../../src/edit/session.ts';
import { fixtureCraft } from './craftFixture.ts';

const { battery, fins } = fixtureCraft().parts.byId as Record<'battery' | 'fins', Part>;
const station = (session: Session) => {
  const { place } = session.getState().craft.parts.byId.battery!;
  return place.kind === 'keel' ? place.station : Number.NaN;
};
const nudge = (id: string, by: number) => runOf(`nudge ${id}`, 'Nudge part', shiftParts([id], by));
const toStation = (at: number) => placePart('battery', { kind: 'keel', station: at, drop: 0.03 });

test('a drag is one step: each move starts from the start, release enters history once', () => {
  const session = new Session(fixtureCraft());
  const drag = session.beginDrag('Move battery');
  for (const at of [1.2, 0.9, 0.6]) drag.move(toStation(at));
  expect(station(session)).toBe(0.6);
  expect(session.getState()).toMatchObject({ dragging: true, undoLabel: null, revision: 0 });
  expect(drag.commit()).toEqual([]);
  expect(session.getState()).toMatchObject({ dragging: false, undoLabel: 'Move battery', revision: 1 });
  session.undo();
  expect(station(session)).toBe(1.3);
  session.redo();
  expect(station(session)).toBe(0.6);
});

test('a drag that ends where it began enters nothing', () => {
  const session = new Session(fixtureCraft());
  const drag = session.beginDrag('Move battery');
  drag.move(toStation(0.5));
  drag.move(toStation(1.3));
  drag.commit();
  expect(session.getState()).toMatchObject({ undoLabel: null, revision: 0 });
});

test('Escape puts back what the drag began with, the very object', () => {
  const craft = fixtureCraft();
  const session = new Session(craft);
  session.beginDrag('Move battery').move(toStation(0.5));
  expect(session.cancelDrag()).toBe(true);
  expect(session.getState().craft).toBe(craft);
  expect(session.cancelDrag()).toBe(false);
});

test('a drag that was cancelled moves nothing more', () => {
  const craft = fixtureCraft();
  const session = new Session(craft);
  const drag = session.beginDrag('Move battery');
  drag.cancel();
  drag.move(toStation(0.5));
  drag.commit();
  expect(session.getState().craft).toBe(craft);
});

test('undo in the middle of a drag drops the drag first', () => {
  const session = new Session(fixtureCraft());
  session.apply(setName('Heron'));
  session.beginDrag('Move battery').move(toStation(0.5));
  session.undo();
  expect(session.getState().craft.name).toBe('Fixture');
  expect(station(session)).toBe(1.3);
});

test('a run of nudges is one step; choosing something ends the run', () => {
  const session = new Session(fixtureCraft());
  for (let i = 0; i < 5; i++) session.apply(nudge('battery', 0.001));
  session.select([{ kind: 'part', id: 'fins' }]);
  session.apply(nudge('battery', 0.001));
  expect(station(session)).toBeCloseTo(1.306, 12);
  session.undo();
  expect(station(session)).toBeCloseTo(1.305, 12);
  session.undo();
  expect(station(session)).toBe(1.3);
  expect(session.getState().undoLabel).toBeNull();
});

test('two edits of one field are two steps, each named after the thing; a burst of them is one', () => {
  const session = new Session(fixtureCraft());
  for (const mass of [0.2, 0.3]) session.apply(setPart(battery, 'mass', { mass }));
  expect(session.getState().undoLabel).toBe('Change mass of battery');
  session.undo();
  expect(session.getState().craft.parts.byId.battery!.mass).toBe(0.2);
  session.undo();
  expect(session.getState().undoLabel).toBeNull();
  for (const notes of ['a', 'ab', 'abc']) session.apply(inRun(setNotes(notes), 'notes'));
  session.undo();
  expect(session.getState()).toMatchObject({ undoLabel: null, craft: { notes: fixtureCraft().notes } });
});

test('an edit that the loading gate would refuse is refused, with the field named', () => {
  const session = new Session(fixtureCraft());
  const before = session.getState();
  const problems = session.apply(setPart(battery, 'mass', { mass: -1 }));
  expect(problems).toMatchObject([{ path: 'parts[1].mass', found: '-1', allowed: 'at least 0' }]);
  expect(session.getState()).toBe(before);
  expect(session.apply(setPart(battery, 'mass', { mass: Number.NaN }))).toHaveLength(1);
});

test('what is removed is no longer selected, and undo does not select it again', () => {
  const session = new Session(fixtureCraft());
  session.select([
    { kind: 'part', id: 'battery' },
    { kind: 'wire', id: 'power' },
  ]);
  session.apply(removeParts(['battery'], 'Battery'));
  expect(session.getState().selection).toEqual([{ kind: 'wire', id: 'power' }]);
});

test('listeners hear every change and can leave', () => {
  const session = new Session(fixtureCraft());
  let heard = 0;
  const leave = session.subscribe(() => heard++);
  session.apply(setName('a'));
  leave();
  session.apply(setName('b'));
  expect(heard).toBe(1);
});

const anyEdit: fc.Arbitrary<Edit> = fc.oneof(
  fc
    .double({ min: 0, max: 3, noNaN: true })
    .map((at) => step('Move', placePart('battery', { kind: 'keel', station: at, drop: 0 }))),
  fc.constantFrom('thruster', 'battery', 'fins', 'lights').map((id) => removeParts([id], id)),
  fc.constantFrom('thruster', 'battery', 'fins', 'lights').map((id) => duplicateParts([id], id, 3)),
  fc.double({ min: 0, max: 2, noNaN: true }).map((mass) => setPart(fins, 'mass', { mass })),
  fc.double({ min: -0.01, max: 0.01, noNaN: true }).map((by) => nudge('lights', by)),
  fc.string({ maxLength: 20 }).map(setName),
  fc
    .double({ min: 0.5, max: 6, noNaN: true })
    .map((length) => setShape('length', { kind: 'spheroid', length, diameter: 1 })),
  fc.double({ min: 0, max: 1, noNaN: true }).map((purity) => setGas('purity', { purity })),
  fc.constant(addHardpoint('Tail', { kind: 'axis', station: 2.9 })),
  fc.constantFrom('nose', 'chin').map((id) => removeHardpoints([id], id)),
  fc.constantFrom('nose', 'chin').map(setLeadAt),
  fc.constant(removeWires(['power'], 'Power')),
);

/** Edits of things that are gone cannot come from the page; here they are passed over. */
const possible = (session: Session, edit: Edit): boolean => {
  try {
    return session.apply(edit).length === 0;
  } catch (error) {
    if (error instanceof TypeError) return false;
    throw error;
  }
};

test('undo to the start gives the opening file, redo to the end the last one', () => {
  fc.assert(
    fc.property(fc.array(anyEdit, { maxLength: 30 }), (edits) => {
      const session = new Session(fixtureCraft());
      const opening = serialize(session.getState().craft);
      for (const edit of edits) possible(session, edit);
      const last = serialize(session.getState().craft);
      while (session.getState().undoLabel !== null) session.undo();
      expect(serialize(session.getState().craft)).toBe(opening);
      while (session.getState().redoLabel !== null) session.redo();
      expect(serialize(session.getState().craft)).toBe(last);
      expect(parse(last).ok).toBe(true);
    }),
  );
});
