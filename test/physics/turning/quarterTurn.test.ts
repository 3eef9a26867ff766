import { expect, test } from 'vitest';
import { commandsOf, cruiseSpeedOf, straightAt } from '../../../src/physics/turning/asked.ts';
import { QUARTER, quarterTurn, quarterTurnOf, yawStop } from '../../../src/physics/turning/quarterTurn.ts';
import {
  COARSE,
  LONGEST,
  type Sailed,
  type SailOptions,
  TIME_ERROR,
} from '../../../src/physics/turning/sail.ts';
import { commandOf } from '../../../src/physics/turning/steer.ts';
import type { TurningCraft } from '../../../src/physics/turning/turningCraft.ts';
import { near } from '../hull/near.ts';
import {
  battery,
  coupled,
  craftWith,
  degrees,
  fins,
  fixedAt,
  gondolaCraft,
  noseCraft,
  pairCraft,
  slippery,
  tailCraft,
  tailThruster,
  turning,
  within,
} from './turningCrafts.ts';

const ASKED = { throttle: 1, vector: null, speed: null };

function turnFrom(craft: TurningCraft, speed: number, options?: SailOptions): Sailed {
  const { straight, turn } = commandsOf(craft, ASKED);
  const outcome = quarterTurn(craft, straightAt(speed, straight), turn, options);
  if (outcome.status !== 'solved') throw new Error(outcome.why);
  return outcome.value;
}

const timeFrom = (craft: TurningCraft, speed: number, options?: SailOptions): number =>
  turnFrom(craft, speed, options).trajectory.end;

// ψ = ½ (N/I) t²: any text on mechanics.
test('a constant couple without resistance: 90° after √(π I/N), and as long and as far again to stop', () => {
  const { craft, acceleration } = coupled();
  const quarter = turnFrom(craft, 0);
  const wanted = Math.sqrt(Math.PI / acceleration);
  near(quarter.trajectory.end, wanted, TIME_ERROR);
  const stop = yawStop(craft, quarter, ASKED.throttle);
  if (stop.status !== 'solved') throw new Error(stop.why);
  near(stop.value.time, wanted, TIME_ERROR);
  near(stop.value.angle, QUARTER, TIME_ERROR);
});

test.each([
  ['tail', tailCraft],
  ['nose', noseCraft],
  ['pair', pairCraft],
  ['gondola', gondolaCraft],
])('%s: ten and a hundred times finer steps change the time by less than its stated error', (_, craftOf) => {
  const craft = craftOf();
  for (const speed of [0, cruiseSpeedOf(craft, ASKED)]) {
    const time = timeFrom(craft, speed);
    for (const coarseness of [0.5, 0.1, 0.01]) near(timeFrom(craft, speed, { coarseness }), time, TIME_ERROR);
  }
});

test('the coarse steps with which needs and steady turns are sought still give the time to 1e-4', () => {
  for (const craftOf of [tailCraft, noseCraft, pairCraft, gondolaCraft]) {
    near(timeFrom(craftOf(), 0, { coarseness: COARSE }), timeFrom(craftOf(), 0), 1e-4);
  }
});

test('the longer the arm, the sooner the turn from rest', () => {
  const stations = [1.9, 2.1, 2.3, 2.5, 2.7, 2.95];
  const times = stations.map((station) =>
    timeFrom(turning(craftWith([battery, tailThruster(station), fins()])), 0),
  );
  for (const [i, time] of times.entries()) if (i > 0) expect(time).toBeLessThan(times[i - 1]!);
});

test('so does more thrust, a wider angle and a faster servo', () => {
  const with_ = (change: Parameters<typeof tailThruster>[1]) =>
    timeFrom(turning(craftWith([battery, tailThruster(2.95, change), fins()])), 0);
  const plain = with_({});
  expect(with_({ thrust: { kind: 'measured', staticThrust: 1.2 } })).toBeLessThan(plain);
  expect(with_({ yaw: within(60 * degrees) })).toBeLessThan(plain);
  expect(with_({ yaw: within(40 * degrees, 20) })).toBeLessThan(plain);
  expect(with_({ yaw: within(40 * degrees, 0.3) })).toBeGreaterThan(plain);
});

test('without vectoring and without thrust apart there is no yaw, and it says so', () => {
  const craft = turning(craftWith([battery, tailThruster(2.9, { yaw: fixedAt(0) }), fins()]));
  const { straight, turn } = commandsOf(craft, ASKED);
  expect(quarterTurn(craft, straightAt(0, straight), turn)).toMatchObject({
    status: 'infeasible',
    why: expect.stringContaining('Nothing turns the craft'),
    remedy: expect.stringContaining('throttle a pair apart'),
  });
});

test('too little to get there in the time: how far it got, and with what moment', () => {
  const craft = tailCraft();
  const { straight } = commandsOf(craft, ASKED);
  const little = commandOf(craft, { throttle: 1e-6, steer: 1, vector: null });
  expect(quarterTurn(craft, straightAt(0, straight), little)).toMatchObject({
    status: 'infeasible',
    why: expect.stringMatching(
      new RegExp(`^In \\{${LONGEST} time\\} it yaws only \\{[\\d.e-]+ angle\\}: .* \\{[\\d.e-]+ torque\\}`),
    ),
  });
});

test('a thruster that turns to one side only cannot stop the yaw', () => {
  const oneSided = { least: -40 * degrees, most: 0, set: 0, slew: 3 };
  // Without fins the air does not stop it either.
  const craft = slippery(turning(craftWith([battery, tailThruster(2.9, { yaw: oneSided })])));
  const quarter = turnFrom(craft, 0);
  const stop = yawStop(craft, quarter, ASKED.throttle);
  expect(stop).toMatchObject({ status: 'infeasible', why: expect.stringContaining('still turns on') });
});

test('with a small angle by hand the yaw is stopped hardest, as by the whole of the limits', () => {
  const craft = tailCraft();
  const { straight, turn } = commandsOf(craft, { ...ASKED, vector: -12 * degrees });
  const quarter = quarterTurn(craft, straightAt(0, straight), turn);
  if (quarter.status !== 'solved') throw new Error(quarter.why);
  const stop = yawStop(craft, quarter.value, 1);
  if (stop.status !== 'solved') throw new Error(stop.why);
  // The limit is 40°; at 3 rad/s it has come from −12° to there before the yaw is nil, or it is on its way.
  const reached = Math.max(...stop.value.track.vector);
  near(reached, Math.min(40 * degrees, 3 * stop.value.time - 12 * degrees), 1e-6);
  expect(reached).toBeGreaterThan(12 * degrees);
});

test('the track: equal steps from the start to 90°, along its own velocities, the thruster at its slew rate', () => {
  const craft = tailCraft();
  const sailed = turnFrom(craft, 1);
  const { track, time } = quarterTurnOf(craft, sailed);
  expect(track.time.length).toBeLessThanOrEqual(600);
  expect(track.time[0]).toBe(0);
  near(track.time.at(-1)!, time);
  near(track.heading.at(-1)!, QUARTER, 1e-9);
  expect([track.x[0], track.y[0], track.heading[0], track.u[0]]).toEqual([0, 0, 0, 1]);
  for (const [i, t] of track.time.entries()) {
    near(track.vector[i]!, Math.max(-3 * t, -40 * degrees), 1e-9);
    if (i === 0) continue;
    // Trapezium rule over a small step.
    const dt = t - track.time[i - 1]!;
    expect(
      Math.abs(track.heading[i]! - track.heading[i - 1]! - (dt * (track.r[i]! + track.r[i - 1]!)) / 2),
    ).toBeLessThan(1e-5);
  }
  const stop = yawStop(craft, sailed, ASKED.throttle);
  if (stop.status !== 'solved') throw new Error(stop.why);
  expect(stop.value.track.x[0]).toBe(track.x.at(-1));
  expect(Math.abs(stop.value.track.r.at(-1)!)).toBeLessThan(1e-9);
});
