import { expect, test } from 'vitest';
import type { ThrusterData } from '../../src/craft/thrustSchema.ts';
import { step } from '../../src/edit/edit.ts';
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
  pitch: { least: 0, most: 0, set: 0, slew: 0 },
  differential: false,
};

const plain = fixtureCraft();
const craft = {
  ...plain,
  parts: {
    ...plain.parts,
    byId: { ...plain.parts.byId, thruster: { ...plain.parts.byId.thruster!, thruster: DATA } },
  },
};

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
