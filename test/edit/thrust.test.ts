import { expect, test } from 'vitest';
import type { Craft } from '../../src/craft/craft.ts';
import { STRAIGHT } from '../../src/craft/firstFigures.ts';
import type { Part } from '../../src/craft/schema.ts';
import type { ThrusterData } from '../../src/craft/thrustSchema.ts';
import { step } from '../../src/edit/edit.ts';
import { setTargets } from '../../src/edit/edits/craft.ts';
import { setPart, setParts } from '../../src/edit/edits/parts.ts';
import * as thrust from '../../src/edit/edits/thrust.ts';
import { Session } from '../../src/edit/session.ts';
import { fixtureCraft } from './craftFixture.ts';
import { testEdit } from './testEdit.ts';

const DATA: ThrusterData = {
  thrust: { kind: 'measured', staticThrust: 1.2 },
  diameter: 0.23,
  pitchSpeed: { kind: 'given', speed: 9 },
  reverse: 0,
  yaw: { least: -1, most: 1.1, set: 0.2, slew: 3 },
  pitch: STRAIGHT,
  differential: false,
};

const plain = fixtureCraft();
const withPart = (craft: Craft, id: string, change: Partial<Part>): Craft => ({
  ...craft,
  parts: { ...craft.parts, byId: { ...craft.parts.byId, [id]: { ...craft.parts.byId[id]!, ...change } } },
});
const box = { length: 0.05, width: 0.23, height: 0.21 };
const craft = withPart(plain, 'thruster', { thruster: DATA, size: box });
const part = craft.parts.byId.thruster!;
const fins = craft.parts.byId.fins!;

const turn = (way: thrust.Way, angle: number) => step('Turn', thrust.turnThrust('thruster', way, angle));

test('thrust turned by hand stops at its limits, and not at all where it does not turn', () => {
  const setAt = (angle: number) => testEdit(craft, turn('yaw', angle)).parts.byId.thruster!.thruster!.yaw.set;
  expect(setAt(0.5)).toBe(0.5);
  expect(setAt(2)).toBe(1.1);
  expect(setAt(-2)).toBe(-1);
  expect(testEdit(craft, turn('pitch', 0.3))).toBe(craft);
  expect(testEdit(plain, turn('yaw', 0.3))).toBe(plain);
});

test('a drag of the thrust is one step', () => {
  const session = new Session(craft);
  const drag = session.beginDrag('Turn Thruster');
  for (const angle of [0.3, 0.4, 5]) drag.move(thrust.turnThrust('thruster', 'yaw', angle));
  drag.commit();
  expect(session.getState().craft.parts.byId.thruster!.thruster!.yaw.set).toBe(1.1);
  session.undo();
  expect(session.getState().craft).toEqual(craft);
});

test('a thruster takes figures that pass the gate whatever its box, and gives them back', () => {
  for (const size of [box, { length: 0, width: 0, height: 0 }, { length: 50, width: 50, height: 50 }]) {
    const boxed = withPart(plain, 'thruster', { size });
    const given = testEdit(boxed, thrust.giveThruster(boxed.parts.byId.thruster!));
    expect(given.parts.byId.thruster!.thruster).not.toBeNull();
    expect(testEdit(given, thrust.takeThruster(part))).toEqual(boxed);
  }
  const { thruster } = testEdit(plain, thrust.giveThruster({ ...part, size: box })).parts.byId.thruster!;
  expect(thruster).toMatchObject({ diameter: 0.23, yaw: STRAIGHT, pitch: STRAIGHT, differential: false });
});

test('limits that change take the angle set along with them', () => {
  const limited = (yaw: Partial<ThrusterData['yaw']>) =>
    testEdit(craft, thrust.setThruster(part, 'yaw', { yaw: { ...DATA.yaw, ...yaw } })).parts.byId.thruster!
      .thruster!.yaw;
  expect(limited({ most: 0.1 })).toEqual({ ...DATA.yaw, most: 0.1, set: 0.1 });
  expect(limited({ least: 0.4 })).toEqual({ ...DATA.yaw, least: 0.4, set: 0.4 });
  expect(limited({ least: -2 })).toEqual({ ...DATA.yaw, least: -2 });
});

test('limits the wrong way round are refused', () => {
  const session = new Session(craft);
  const problems = session.apply(thrust.setThruster(part, 'yaw', { yaw: { ...DATA.yaw, least: 1.2 } }));
  expect(problems).toMatchObject([
    { path: 'parts[0].thruster.yaw.least', allowed: /at most .*\(1\.1 rad\)/ },
  ]);
  expect(session.getState().craft).toBe(craft);
});

test('the box follows the propeller where it was as large', () => {
  const { size, thruster } = testEdit(craft, thrust.setThruster(part, 'diameter', { diameter: 0.3 })).parts
    .byId.thruster!;
  expect(thruster!.diameter).toBe(0.3);
  expect(size).toEqual({ length: 0.05, width: 0.3, height: 0.21 });
});

test('figures of what is no thruster or no fin are not set', () => {
  expect(testEdit(plain, thrust.setThruster(part, 'diameter', { diameter: 0.3 }))).toBe(plain);
  expect(testEdit(plain, thrust.setFin(fins, 'area', { area: 0.3 }))).toBe(plain);
});

test('a fin is taken from its box, changed, and taken away', () => {
  const boxed = testEdit(craft, thrust.finFromBox({ ...fins, size: { length: 0.4, width: 0, height: 0.2 } }));
  expect(boxed.parts.byId.fins!.fin).toEqual({ area: 0.08, aspectRatio: 0.5 });
  const larger = testEdit(boxed, thrust.setFin(fins, 'area', { area: 0.1 }));
  expect(larger.parts.byId.fins!.fin).toEqual({ area: 0.1, aspectRatio: 0.5 });
  expect(testEdit(larger, thrust.takeFin(fins))).toEqual(craft);
  expect(testEdit(craft, thrust.finFromBox({ ...fins, size: { length: 0, width: 0, height: 1 } }))).toBe(
    craft,
  );
});

test('what becomes a fin is one as large as its box; one that has figures keeps them', () => {
  const become = (from: Craft) => testEdit(from, setPart(from.parts.byId.battery!, 'kind', { kind: 'fin' }));
  expect(become(craft).parts.byId.battery!.fin).toEqual({ area: 0.005, aspectRatio: 0.5 });
  const known = { area: 0.3, aspectRatio: 2 };
  expect(become(withPart(craft, 'battery', { fin: known })).parts.byId.battery!.fin).toEqual(known);
  const both = testEdit(craft, setParts(['battery', 'lights'], 'Change kind', { kind: 'fin' }));
  expect(both.parts.byId.lights!.fin).not.toBeNull();
  const noMore = (from: Craft) =>
    testEdit(from, setParts(['lights'], 'Change kind', { kind: 'load' })).parts.byId.lights!.fin;
  expect(noMore(both)).toBeNull();
  expect(noMore(withPart(both, 'lights', { fin: known }))).toEqual(known);
});

test('a fin as large as its box follows it, one with an outline of its own does not', () => {
  const size = { length: 0.2, width: 0.05, height: 0.3 };
  const resized = (fin: Part['fin']) => {
    const before = withPart(craft, 'fins', { fin });
    return testEdit(before, setPart(fins, 'size', { size })).parts.byId.fins!.fin;
  };
  expect(resized({ area: 0.005, aspectRatio: 0.5 })).toEqual({ area: 0.06, aspectRatio: 1.5 });
  expect(resized({ area: 0.004, aspectRatio: 0.5 })).toEqual({ area: 0.004, aspectRatio: 0.5 });
  expect(resized(null)).toBeNull();
});

test('a drag area is given, and left to be reckoned again', () => {
  const given = testEdit(craft, thrust.setDragArea(part, 0.004));
  expect(given.parts.byId.thruster!.dragArea).toBe(0.004);
  expect(testEdit(given, thrust.setDragArea(part, null))).toEqual(craft);
});

test('targets of turning are asked for, and no more', () => {
  const asked = testEdit(craft, setTargets('turn time', { turnTime: 6, sideGust: 1.5 }));
  expect(asked.targets).toMatchObject({ turnTime: 6, sideGust: 1.5 });
  expect(testEdit(asked, setTargets('turn time', { turnTime: null, sideGust: null }))).toEqual(craft);
});
