import { expect, test } from 'vitest';
import { takeInFront, takeInSide } from '../../src/canvas/gestures/take.ts';
import type { Place } from '../../src/craft/placeSchema.ts';
import { handlesOf } from '../../src/scene/grip.ts';
import { onSection } from '../../src/scene/outline.ts';
import { craft, PARTS, part } from '../scene/fixture.ts';
import { frontGround, middleOf, sideGround, type TestGround } from './ground.ts';

const placeOf = (ground: TestGround, id: string): Place => ground.craft().parts.byId[id]!.place;
const by = ({ u, z }: { u: number; z: number }, du: number, dz = 0) => ({ u: u + du, z: z + dz });

test('a part dragged along the keel keeps its drop, is one step of history, and goes back in one', () => {
  const ground = sideGround();
  const start = ground.craft();
  const from = middleOf(ground, 'battery');
  const gesture = takeInSide(ground, ground.at(from));
  for (const du of [0.05, 0.2, 0.313]) gesture.move(ground.at(by(from, -du, 0.01), { alt: true }));
  expect(ground.session.getState().dragging).toBe(true);
  expect([...ground.overlay().moving]).toEqual(['part battery', 'wire power']);
  gesture.end(ground.at(by(from, -0.313)), true);
  expect(placeOf(ground, 'battery')).toEqual({ kind: 'keel', station: 0.887, drop: 0.04 });
  expect(ground.session.getState()).toMatchObject({ dragging: false, undoLabel: 'Move battery' });
  ground.session.undo();
  expect(ground.craft()).toEqual(start);
  expect(ground.session.getState().undoLabel).toBeNull();
});

test('it snaps to the station of another part and says so, unless Alt is held', () => {
  const ground = sideGround();
  const from = middleOf(ground, 'battery');
  const gesture = takeInSide(ground, ground.at(from));
  gesture.move(ground.at(by(from, 0.31)));
  expect(placeOf(ground, 'battery')).toMatchObject({ station: 1.5 });
  expect(ground.overlay().guide).toMatchObject({ along: 'station', at: 1.5 });
  gesture.move(ground.at(by(from, 0.31), { alt: true }));
  expect(placeOf(ground, 'battery')).toMatchObject({ station: 1.51 });
  expect(ground.overlay().guide).toBeNull();
});

test('Escape leaves everything as it was, and later moves do nothing', () => {
  const ground = sideGround();
  const start = ground.craft();
  const from = middleOf(ground, 'camera');
  const gesture = takeInSide(ground, ground.at(from));
  gesture.move(ground.at(by(from, 0.4, 0.2)));
  gesture.cancel();
  expect(ground.craft()).toBe(start);
  expect(ground.overlay()).toMatchObject({ held: null, guide: null });
  expect(ground.session.getState().undoLabel).toBeNull();
});

test('a locked part stays and says why; alone or among others', () => {
  const parts = PARTS.map((each) => (each.id === 'battery' ? { ...each, locked: true } : each));
  const ground = sideGround(craft(parts));
  const from = middleOf(ground, 'battery');
  const gesture = takeInSide(ground, ground.at(from));
  gesture.move(ground.at(by(from, 0.3)));
  expect(ground.overlay().hint).toBe('battery is locked. Unlock it to move it.');
  gesture.end(ground.at(by(from, 0.3)), true);
  expect(placeOf(ground, 'battery')).toEqual(parts[1]!.place);

  ground.session.select(['battery', 'camera'].map((id) => ({ kind: 'part', id })));
  const camera = middleOf(ground, 'camera');
  const together = takeInSide(ground, ground.at(camera));
  together.move(ground.at(by(camera, 0.1)));
  together.end(ground.at(by(camera, 0.1)), true);
  expect(placeOf(ground, 'battery')).toEqual(parts[1]!.place);
  expect(placeOf(ground, 'camera')).toMatchObject({ x: expect.closeTo(1, 2) });
});

test('what is selected together goes together, until the first would leave the hull', () => {
  const ground = sideGround();
  ground.session.select([
    { kind: 'part', id: 'battery' },
    { kind: 'part', id: 'camera' },
    { kind: 'hardpoint', id: 'nose' },
  ]);
  const from = middleOf(ground, 'camera');
  const gesture = takeInSide(ground, ground.at(from));
  gesture.move(ground.at(by(from, 0.4), { alt: true }));
  expect(placeOf(ground, 'battery')).toMatchObject({ station: expect.closeTo(1.6, 9), drop: 0.04 });
  expect(placeOf(ground, 'camera')).toMatchObject({ x: expect.closeTo(1.3, 9), z: -0.6 });
  expect(ground.craft().hardpoints.byId.nose!.place).toMatchObject({ station: expect.closeTo(0.46, 9) });
  gesture.move(ground.at(by(from, 4), { alt: true }));
  expect(placeOf(ground, 'battery')).toMatchObject({ station: 3 });
  expect(placeOf(ground, 'camera')).toMatchObject({ x: expect.closeTo(2.7, 9) });
  gesture.end(ground.at(by(from, 4)), true);
  ground.session.undo();
  expect(ground.session.getState().undoLabel).toBeNull();
});

test('a hardpoint is dragged as a part is', () => {
  const ground = sideGround();
  const gesture = takeInSide(ground, ground.at({ u: 0.06, z: 0 }));
  gesture.move(ground.at({ u: 0.463, z: 0.1 }));
  gesture.end(ground.at({ u: 0.463, z: 0.1 }), true);
  expect(ground.craft().hardpoints.byId.nose!.place).toEqual({ kind: 'axis', station: 0.46 });
  expect(ground.session.getState().undoLabel).toBe('Move Nose');
});

test('the handle beyond the tail changes the length, the one on the waist the diameter', () => {
  const ground = sideGround();
  const { tail, waist } = handlesOf(ground.scene().geometry, ground.view().scale, []);
  const pull = takeInSide(ground, ground.at(tail));
  pull.move(ground.at(by(tail, 0.502, 0.3)));
  pull.end(ground.at(by(tail, 0.502, 0.3)), true);
  expect(ground.craft().hull.shape).toEqual({ kind: 'spheroid', length: 3.5, diameter: 1 });
  const now = handlesOf(ground.scene().geometry, ground.view().scale, []).waist;
  expect(now.u).toBeGreaterThan(waist.u);
  const lift = takeInSide(ground, ground.at(now));
  lift.move(ground.at(by(now, 0, 0.1)));
  lift.end(ground.at(by(now, 0, 0.1)), true);
  expect(ground.craft().hull.shape).toEqual({ kind: 'spheroid', length: 3.5, diameter: 1.2 });
  expect(ground.session.getState().undoLabel).toBe('Change hull diameter');
});

test('the end of a wire run joins the part under it, or stays loose on its meridian', () => {
  const ground = sideGround();
  ground.session.select([{ kind: 'wire', id: 'power' }]);
  const end = ground.scene().wireHandles[0]!.at;
  const gesture = takeInSide(ground, ground.at(end));
  gesture.move(ground.at(middleOf(ground, 'gondola')));
  expect(ground.overlay()).toMatchObject({ join: 'gondola', hint: null });
  expect(ground.craft().wires.byId.power!.from).toEqual({ kind: 'part', part: 'gondola' });
  gesture.move(ground.at({ u: 2.004, z: 0.3 }));
  expect(ground.overlay().join).toBeNull();
  expect(ground.overlay().hint).toBe('Unjoined from battery; drop it on a part to join it');
  gesture.end(ground.at({ u: 2.004, z: 0.3 }), true);
  expect(ground.overlay().hint).toContain('Unjoined');
  expect(ground.craft().wires.byId.power!.from).toEqual({
    kind: 'loose',
    place: { kind: 'skin', station: 2, clock: Math.PI, standoff: 0 },
  });
  expect(ground.session.getState().undoLabel).toBe('Move the end of power');
});

test('in the front view a part on the skin goes round it; the port piece of a pair mirrors the hand', () => {
  const ground = frontGround();
  const reach = Math.hypot(middleOf(ground, 'motors').u, middleOf(ground, 'motors').z);
  const gesture = takeInFront(ground, ground.at(onSection(-2, reach)));
  gesture.move(ground.at(onSection(-2.3, reach), { alt: true }));
  gesture.end(ground.at(onSection(-2.3, reach)), true);
  expect(placeOf(ground, 'motors')).toMatchObject({
    station: 1.4,
    clock: expect.closeTo(2.3, 6),
    standoff: 0.05,
  });
});

test('in the front view a clock angle snaps to every 15°', () => {
  const ground = frontGround();
  const { u, z } = middleOf(ground, 'fins');
  const reach = Math.hypot(u, z);
  const gesture = takeInFront(ground, ground.at({ u, z }));
  gesture.move(ground.at(onSection(0.53, reach)));
  expect(placeOf(ground, 'fins')).toMatchObject({ clock: expect.closeTo(Math.PI / 6, 8) });
  expect(ground.overlay().guide).toMatchObject({ along: 'clock', label: '30°' });
});

test('in the front view what sits on the axis stays and says why', () => {
  const ground = frontGround(craft([part('motor', { kind: 'axis', station: 2 })], []));
  const gesture = takeInFront(ground, ground.at({ u: 0.02, z: 0 }));
  gesture.move(ground.at({ u: 0.3, z: 0 }));
  expect(ground.overlay().hint).toContain('motor sits on the hull axis');
  expect(placeOf(ground, 'motor')).toEqual({ kind: 'axis', station: 2 });
});

test('the support point is dragged in its kind of place, in one step', () => {
  const ground = sideGround({ ...craft(), support: { kind: 'keel', station: 2.2, drop: 0.2 } });
  const at = ground.scene().support!;
  const gesture = takeInSide(ground, ground.at(at));
  gesture.move(ground.at(by(at, -0.4), { alt: true }));
  gesture.end(ground.at(by(at, -0.4)), true);
  expect(ground.craft().support).toEqual({ kind: 'keel', station: 1.8, drop: 0.2 });
  expect(ground.session.getState().undoLabel).toBe('Move the support point');
});

test('with a wire run selected the part it ends at is dragged with its end joined', () => {
  const ground = sideGround();
  ground.session.select([{ kind: 'wire', id: 'power' }]);
  const from = middleOf(ground, 'battery');
  const gesture = takeInSide(ground, ground.at(from));
  gesture.move(ground.at(by(from, -0.3)));
  gesture.end(ground.at(by(from, -0.3)), true);
  expect(placeOf(ground, 'battery')).toMatchObject({ station: expect.closeTo(0.9, 2) });
  expect(ground.craft().wires.byId.power!.from).toEqual({ kind: 'part', part: 'battery' });
});

test('without snapping the part goes where the hand is, and Alt snaps it', () => {
  const ground = sideGround(craft(), { snap: false });
  const from = middleOf(ground, 'battery');
  const gesture = takeInSide(ground, ground.at(from));
  gesture.move(ground.at(by(from, 0.313)));
  expect(placeOf(ground, 'battery')).toMatchObject({ station: 1.513 });
  gesture.move(ground.at(by(from, 0.31), { alt: true }));
  expect(placeOf(ground, 'battery')).toMatchObject({ station: 1.5 });
});

test('in the front view what is selected goes together, each as its kind of place allows; locked parts stay', () => {
  const parts = PARTS.map((each) => ({ ...each, locked: each.id === 'gondola' }));
  const ground = frontGround(craft(parts));
  const chosen = ['fins', 'motors', 'battery', 'gondola', 'camera', 'thruster'];
  ground.session.select(chosen.map((id) => ({ kind: 'part', id })));
  const from = middleOf(ground, 'fins');
  const reach = Math.hypot(from.u, from.z);
  const to = onSection(0.2, reach);
  const gesture = takeInFront(ground, ground.at(onSection(0, reach)));
  gesture.move(ground.at(to, { alt: true }));
  gesture.end(ground.at(to), true);
  const [du, dz] = [to.u, to.z - reach];
  expect(placeOf(ground, 'fins')).toMatchObject({ clock: expect.closeTo(0.2, 6) });
  expect(placeOf(ground, 'motors')).toMatchObject({ clock: expect.closeTo(2.2, 6) });
  expect(placeOf(ground, 'battery')).toMatchObject({ drop: expect.closeTo(0.04 - dz, 6) });
  expect(placeOf(ground, 'camera')).toMatchObject({
    y: expect.closeTo(0.1 + du, 6),
    z: expect.closeTo(-0.6 + dz, 6),
  });
  for (const id of ['gondola', 'thruster'])
    expect(placeOf(ground, id)).toEqual(parts.find((p) => p.id === id)!.place);
  ground.session.undo();
  expect(ground.session.getState().undoLabel).toBeNull();
});
