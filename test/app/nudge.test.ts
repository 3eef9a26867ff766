import { expect, test } from 'vitest';
import { along, nudge, up } from '../../src/app/nudge.ts';
import { blankCraft } from '../../src/craft/blank.ts';
import type { Craft } from '../../src/craft/craft.ts';
import type { Place } from '../../src/craft/placeSchema.ts';
import { addParts, type PartFields, setPart } from '../../src/edit/edits/parts.ts';
import { Session } from '../../src/edit/session.ts';

const fields = (place: Place): PartFields => ({
  kind: 'load',
  name: 'thing',
  mass: 0.1,
  massTolerance: 0,
  massSource: 'estimated',
  place,
  copies: { kind: 'together', count: 1 },
  size: { length: 0.1, width: 0.1, height: 0.1 },
  cgOffset: 0,
  locked: false,
  slide: null,
  notes: '',
});

const PLACES: Place[] = [
  { kind: 'keel', station: 1, drop: 0.03 },
  { kind: 'skin', station: 1, clock: 0, standoff: 0.02 },
  { kind: 'skin', station: 1, clock: Math.PI, standoff: 0.02 },
  { kind: 'free', x: 1, y: 0.1, z: -0.2 },
  { kind: 'axis', station: 1 },
];

function withParts(): { session: Session; ids: string[] } {
  const session = new Session(blankCraft('C', { kind: 'spheroid', length: 3, diameter: 1 }, 3));
  session.apply(addParts(PLACES.map(fields)));
  return { session, ids: session.getState().craft.parts.order };
}

const placesIn = (craft: Craft): Place[] => craft.parts.order.map((id) => craft.parts.byId[id]!.place);
const picked = (ids: string[]) => ids.map((id) => ({ kind: 'part', id }) as const);

test('aft moves every kind of place along the hull', () => {
  const { session, ids } = withParts();
  session.apply(nudge(picked(ids), along(0.01))!);
  const stations = placesIn(session.getState().craft).map((p) => (p.kind === 'free' ? p.x : p.station));
  expect(stations).toEqual([1.01, 1.01, 1.01, 1.01, 1.01]);
});

test('up is less drop, outward at the top, inward at the keel, more height; the axis stays', () => {
  const { session, ids } = withParts();
  session.apply(nudge(picked(ids), up(0.01))!);
  expect(placesIn(session.getState().craft)).toEqual([
    { kind: 'keel', station: 1, drop: 0.02 },
    { kind: 'skin', station: 1, clock: 0, standoff: 0.03 },
    { kind: 'skin', station: 1, clock: expect.closeTo(Math.PI, 8), standoff: 0.01 },
    { kind: 'free', x: 1, y: 0.1, z: -0.19 },
    { kind: 'axis', station: 1 },
  ]);
});

test('a burst of nudges is undone at once, and a locked part stays', () => {
  const { session, ids } = withParts();
  session.apply(setPart(ids[4]!, 'locked', { locked: true }));
  const before = session.getState().craft;
  for (let i = 0; i < 5; i++) session.apply(nudge(picked(ids), along(0.001))!);
  expect(session.getState().craft.parts.byId[ids[4]!]!.place).toEqual(PLACES[4]);
  session.undo();
  expect(session.getState().craft).toEqual(before);
});

test('parts and hardpoints move together; with nothing selected there is no edit', () => {
  const { session, ids } = withParts();
  const edit = nudge([...picked([ids[0]!]), { kind: 'hardpoint', id: 'nose' }], along(0.01))!;
  session.apply(edit);
  const { craft } = session.getState();
  expect(craft.hardpoints.byId.nose!.place).toEqual({ kind: 'axis', station: 0.07 });
  expect(placesIn(craft)[0]).toMatchObject({ station: 1.01 });
  expect(nudge([], along(0.01))).toBeNull();
  expect(nudge([{ kind: 'wire', id: 'w' }], along(0.01))).toBeNull();
});
