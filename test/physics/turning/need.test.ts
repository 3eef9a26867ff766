import { expect, test } from 'vitest';
import type { Outcome } from '../../../src/numeric/outcome.ts';
import { commandsOf, straightAt } from '../../../src/physics/turning/asked.ts';
import { gustHeld } from '../../../src/physics/turning/gust.ts';
import { leverageOf } from '../../../src/physics/turning/leverage.ts';
import { type Need, needsOf, type Targets } from '../../../src/physics/turning/need.ts';
import { quarterTurn } from '../../../src/physics/turning/quarterTurn.ts';
import type { TurningCraft } from '../../../src/physics/turning/turningCraft.ts';
import { near } from '../hull/near.ts';
import {
  battery,
  craftWith,
  degrees,
  fins,
  fixedAt,
  pairCraft,
  tailCraft,
  tailThruster,
  turning,
  within,
} from './turningCrafts.ts';

const ASKED = { throttle: 1, vector: null, speed: null };

function timeOf(craft: TurningCraft): number {
  const { straight, turn } = commandsOf(craft, ASKED);
  const outcome = quarterTurn(craft, straightAt(0, straight), turn);
  if (outcome.status !== 'solved') throw new Error(outcome.why);
  return outcome.value.trajectory.end;
}

const wanted = (outcome: Outcome<number>): number => {
  if (outcome.status !== 'solved') throw new Error(outcome.why);
  return outcome.value;
};

function needsFor(craft: TurningCraft, targets: Partial<Targets>) {
  const needs = needsOf(craft, { turnTime: null, sideGust: null, ...targets }, 1);
  if (!needs) throw new Error('nothing asked');
  return needs;
}

const scaled = (craft: TurningCraft, times: number): TurningCraft => ({
  ...craft,
  thrusters: craft.thrusters.map((each) => ({ ...each, staticThrust: times * each.staticThrust })),
});
const turnedTo = (craft: TurningCraft, limit: number): TurningCraft => ({
  ...craft,
  thrusters: craft.thrusters.map((each) => ({ ...each, yaw: within(limit) })),
});
const moved = (craft: TurningCraft, aft: number): TurningCraft => ({
  ...craft,
  thrusters: craft.thrusters.map((each) => ({
    ...each,
    at: [craft.cb - craft.mass.cgAhead + aft, each.at[1], each.at[2]],
  })),
});

test('nothing asked, nothing needed', () => {
  expect(needsOf(tailCraft(), { turnTime: null, sideGust: null }, 1)).toBeNull();
});

/** A craft whose thruster is halfway out and turns 25°, so that each alone can do it. */
const middling = () =>
  turning(craftWith([battery, tailThruster(2.2, { yaw: within(25 * degrees) }), fins()]));

test('put to the test, each answer alone just meets the time asked for', () => {
  const craft = middling();
  const asked = 0.93 * timeOf(craft);
  const { thrust, vector, arm, needed, available } = needsFor(craft, { turnTime: asked }).turnTime as Need;
  near(timeOf(scaled(craft, wanted(thrust))), asked, 1e-3);
  near(timeOf(turnedTo(craft, wanted(vector))), asked, 1e-3);
  near(timeOf(moved(craft, wanted(arm))), asked, 1e-3);
  near(available, leverageOf(craft, 1).yawMoment, 1e-12);
  near(wanted(needed), wanted(thrust) * available, 1e-12);
  expect(wanted(thrust)).toBeGreaterThan(1);
  expect(wanted(vector)).toBeGreaterThan(25 * degrees);
  expect(wanted(arm)).toBeGreaterThan(leverageOf(craft, 1).arm);
});

test('and the gust asked for, at rest', () => {
  const craft = middling();
  const asked = 1.15 * gustHeld(craft, 1, 0);
  const { thrust, vector, arm } = needsFor(craft, { sideGust: asked }).sideGust as Need;
  near(gustHeld(scaled(craft, wanted(thrust)), 1, 0), asked, 1e-3);
  near(gustHeld(turnedTo(craft, wanted(vector)), 1, 0), asked, 1e-3);
  near(gustHeld(moved(craft, wanted(arm)), 1, 0), asked, 1e-3);
});

test('with more than enough, how little would do', () => {
  const craft = tailCraft();
  const { thrust, vector, arm } = needsFor(craft, { turnTime: 2 * timeOf(craft) }).turnTime as Need;
  expect(wanted(thrust)).toBeLessThan(1);
  expect(wanted(vector)).toBeLessThan(40 * degrees);
  expect(wanted(arm)).toBeLessThan(leverageOf(craft, 1).arm);
});

test('what cannot be had says so', () => {
  const pair = needsFor(pairCraft(), { turnTime: 0.1 }).turnTime as Need;
  expect(pair.vector).toMatchObject({ status: 'infeasible', why: 'No thruster turns in yaw.' });
  expect(pair.arm).toMatchObject({ status: 'infeasible', why: expect.stringContaining('{') });
  const fixed = turning(craftWith([battery, tailThruster(2.9, { yaw: fixedAt(0) }), fins()]));
  const { thrust, needed, arm } = needsFor(fixed, { turnTime: 5 }).turnTime as Need;
  for (const each of [thrust, needed, arm]) expect(each.status).toBe('infeasible');
});
