import { expect, test } from 'vitest';
import { STRAIGHT } from '../../src/craft/firstFigures.ts';
import { type ThrusterData, thrusterSchema } from '../../src/craft/thrustSchema.ts';
import { pitchSpeedAs, thrustAs, thrusterFacts } from '../../src/report/thrusterAs.ts';

const AIR = 1.225;
/** A 9 × 4.7 in propeller at rest at 6026 rpm: 4.022 N from 37.50 W of shaft power (measured at UIUC, second-hand). */
const INCH = 0.0254;
const measured: ThrusterData = {
  thrust: { kind: 'power', shaftPower: 37.5, figureOfMerit: 0.678 },
  diameter: 9 * INCH,
  pitchSpeed: {
    kind: 'turning',
    motorSpeed: (6026 * 2 * Math.PI) / 60,
    gearRatio: 1,
    pitch: 4.7 * INCH,
  },
  reverse: 0,
  yaw: STRAIGHT,
  pitch: STRAIGHT,
  differential: false,
};

test('the facts of a propeller measured elsewhere', () => {
  const facts = thrusterFacts(measured, AIR);
  expect(facts.staticThrust).toBeCloseTo(4.022, 1);
  expect(facts.idealPower / 37.5).toBeCloseTo(0.678, 6);
  // 100.43 turns a second of 119.38 mm.
  expect(facts.pitchSpeed).toBeCloseTo(11.99, 2);
  expect(facts.note).toBeNull();
});

test('known another way it is the same thruster, there and back', () => {
  const before = thrusterFacts(measured, AIR);
  const atBench: ThrusterData = {
    ...measured,
    thrust: thrustAs('measured', measured, AIR),
    pitchSpeed: pitchSpeedAs('given', measured),
  };
  expect([atBench.thrust.kind, atBench.pitchSpeed.kind]).toEqual(['measured', 'given']);
  const again: ThrusterData = {
    ...atBench,
    thrust: thrustAs('power', atBench, AIR),
    pitchSpeed: pitchSpeedAs('turning', atBench),
  };
  for (const each of [atBench, again]) {
    expect(thrusterSchema.safeParse(each).success).toBe(true);
    const after = thrusterFacts(each, AIR);
    expect(after.staticThrust / before.staticThrust).toBeCloseTo(1, 4);
    expect(after.pitchSpeed / before.pitchSpeed).toBeCloseTo(1, 4);
  }
  expect(thrustAs('power', measured, AIR)).toBe(measured.thrust);
  expect(pitchSpeedAs('turning', measured)).toBe(measured.pitchSpeed);
});

test('without thrust it still passes the gate known another way', () => {
  const idle: ThrusterData = { ...measured, thrust: { kind: 'measured', staticThrust: 0 } };
  const asPower: ThrusterData = { ...idle, thrust: thrustAs('power', idle, AIR) };
  expect(thrusterSchema.safeParse(asPower).success).toBe(true);
  expect(thrusterFacts(asPower, AIR).staticThrust).toBe(0);
});

test('a low pitch speed is told', () => {
  const slow: ThrusterData = { ...measured, pitchSpeed: { kind: 'given', speed: 4.9 } };
  expect(thrusterFacts(slow, AIR).note).toMatch(/low for outdoors/);
});
