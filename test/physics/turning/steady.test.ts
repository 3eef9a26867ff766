import { expect, test } from 'vitest';
import { commandsOf, cruiseSpeedOf, straightAt, type TurnAsked } from '../../../src/physics/turning/asked.ts';
import { motionOf } from '../../../src/physics/turning/motion.ts';
import { sail } from '../../../src/physics/turning/sail.ts';
import { type Settled, steadyTurn } from '../../../src/physics/turning/steady.ts';
import { steadyPoints } from '../../../src/physics/turning/steadyCurve.ts';
import { settlesAt, sizesOf, steadyNear, type Velocity } from '../../../src/physics/turning/steadyRoot.ts';
import type { TurningCraft } from '../../../src/physics/turning/turningCraft.ts';
import { near } from '../hull/near.ts';
import {
  battery,
  craftWith,
  degrees,
  fins,
  fixedAt,
  gondolaCraft,
  noseCraft,
  pairCraft,
  tailCraft,
  tailThruster,
  turning,
} from './turningCrafts.ts';

const ASKED: TurnAsked = { throttle: 1, vector: null, speed: null };

function settled(craft: TurningCraft, asked = ASKED): Settled {
  const { straight, turn } = commandsOf(craft, asked);
  const outcome = steadyTurn(craft, straight, turn, cruiseSpeedOf(craft, asked));
  if (outcome.status !== 'solved') throw new Error(outcome.why);
  return outcome.value;
}

const CRAFTS: [string, () => TurningCraft, number | null][] = [
  ['tail', tailCraft, null],
  ['tail, a little', tailCraft, -5 * degrees],
  ['tail, to port', tailCraft, 20 * degrees],
  ['nose', noseCraft, null],
  ['pair', pairCraft, null],
  ['gondola', gondolaCraft, 40 * degrees],
  ['large fins', () => turning(craftWith([battery, tailThruster(), fins(0.5)])), null],
];

test.each(CRAFTS)(
  '%s: Newton’s steady turn is the one the motion comes to, to 1e-6',
  (_, craftOf, vector) => {
    const craft = craftOf();
    const asked = { ...ASKED, vector };
    const { turn, velocity, reached } = settled(craft, asked);
    expect(reached).toBe(true);
    const { straight, turn: command } = commandsOf(craft, asked);
    const long = sail(craft, straightAt(cruiseSpeedOf(craft, asked), straight), command, {
      until: 300,
      coarseness: 0.01,
    });
    if (long.status !== 'solved') throw new Error(long.why);
    const [u, v, r, ...place] = long.value.trajectory.last;
    near(Math.hypot(u!, v!), turn.speed, 1e-6);
    near(r!, turn.yawRate, 1e-6);
    near(Math.hypot(u!, v!) / Math.abs(r!), turn.radius, 1e-6);
    near(u!, velocity[0], 1e-6);
    // The path itself: half a turn later the CB is a diameter away.
    const before = long.value.trajectory.at(300 - Math.PI / Math.abs(r!));
    near(Math.hypot(place[0]! - before[3]!, place[1]! - before[4]!), 2 * turn.radius, 1e-5);
    near(turn.lengths, turn.radius / 3, 1e-12);
  },
);

test('in the steady turn nothing is left over', () => {
  const craft = tailCraft();
  const { velocity } = settled(craft);
  const rates = new Float64Array(6);
  motionOf(craft, commandsOf(craft, ASKED).turn).slope(0, Float64Array.of(...velocity, 0, 0, 0), rates);
  for (const i of [0, 1, 2]) expect(Math.abs(rates[i]!)).toBeLessThan(1e-10);
});

test('to port it is the same turn mirrored, drift inside the turn both ways', () => {
  const [port, starboard] = [20, -20].map(
    (vector) => settled(tailCraft(), { ...ASKED, vector: vector * degrees }).turn,
  );
  expect(starboard!.yawRate).toBeGreaterThan(0);
  near(port!.yawRate, -starboard!.yawRate, 1e-9);
  near(port!.radius, starboard!.radius, 1e-9);
  near(port!.drift, starboard!.drift, 1e-9);
  expect(port!.drift).toBeGreaterThan(0);
});

/** Small departures followed in time: whether the craft is nearer to the root afterwards. */
function comesBack(craft: TurningCraft, root: Velocity): boolean {
  const { turn } = commandsOf(craft, ASKED);
  const sizes = sizesOf(craft, turn, cruiseSpeedOf(craft, ASKED));
  const off = (state: ArrayLike<number>) =>
    Math.hypot(...root.map((each, i) => (state[i]! - each) / sizes[i]!));
  const state = [...root.map((each, i) => each + 1e-5 * sizes[i]!), 0, 0, 0];
  const sailed = sail(craft, { state, angles: turn.angles }, turn, { until: 60, coarseness: 0.001 });
  if (sailed.status !== 'solved') throw new Error(sailed.why);
  return off(sailed.value.trajectory.last) < off(state);
}

test('whether small departures die out is as the motion shows it, for a turn and for straight flight', () => {
  const straightOn = (area: number): readonly [TurningCraft, Velocity] => {
    const craft = turning(craftWith([battery, tailThruster(2.95, { yaw: fixedAt(0) }), fins(area)]));
    return [craft, [cruiseSpeedOf(craft, ASKED), 0, 0]];
  };
  const cases: (readonly [TurningCraft, Velocity])[] = [
    [tailCraft(), settled(tailCraft()).velocity],
    straightOn(0.01),
    straightOn(0.5),
  ];
  const verdicts = cases.map(([craft, root]) => {
    const { turn } = commandsOf(craft, ASKED);
    const settles = settlesAt(craft, turn, root, sizesOf(craft, turn, 3));
    expect(settles).toBe(comesBack(craft, root));
    return settles;
  });
  expect(verdicts).toEqual([true, false, true]);
});

test('from anywhere near Newton’s method finds the same root', () => {
  const craft = tailCraft();
  const { turn } = commandsOf(craft, ASKED);
  const sizes = sizesOf(craft, turn, 3);
  const { velocity } = settled(craft);
  for (const share of [0.7, 0.9, 1.2]) {
    const found = steadyNear(craft, turn, velocity.map((each) => share * each) as unknown as Velocity, sizes);
    for (const [i, each] of velocity.entries()) near(found![i]!, each, 1e-8);
  }
});

test('straight ahead, or without thrust, there is no steady turn, and it says why', () => {
  const fixed = turning(craftWith([battery, tailThruster(2.95, { yaw: fixedAt(0) }), fins()]));
  const { straight, turn } = commandsOf(fixed, ASKED);
  expect(steadyTurn(fixed, straight, turn, 3)).toMatchObject({
    status: 'infeasible',
    why: expect.stringContaining('Nothing turns the craft'),
  });
  const shut = commandsOf(tailCraft(), { ...ASKED, throttle: 0 });
  expect(steadyTurn(tailCraft(), shut.straight, shut.turn, 3)).toMatchObject({
    status: 'infeasible',
    why: expect.stringContaining('Without thrust'),
  });
});

test('too slow to settle in the time: the turn is found all the same, and marked as not reached', () => {
  const craft = tailCraft();
  const asked = { ...ASKED, throttle: 1e-5, speed: 0.01 };
  const { turn, velocity, reached } = settled(craft, asked);
  expect(reached).toBe(false);
  const sums = new Float64Array(3);
  motionOf(craft, commandsOf(craft, asked).turn).forces(0, Float64Array.from(velocity), sums);
  for (const each of sums) expect(Math.abs(each)).toBeLessThan(1e-5 * 1e-6);
  expect(turn.yawRate).toBeGreaterThan(0);
});

test('the curve ends in the turn asked for, and each of its points is a turn the motion comes to', () => {
  const craft = noseCraft();
  const points = steadyPoints(craft, ASKED);
  for (const [i, { share }] of points.entries()) near(share, (i + 1) / points.length, 1e-12);
  const end = points.at(-1)!;
  near(end.vector, 40 * degrees, 1e-12);
  if (end.turn.status !== 'solved') throw new Error(end.turn.why);
  near(end.turn.value.radius, settled(craft).turn.radius, 1e-9);
  for (const { vector, turn, settles } of points.filter((_, i) => i % 5 === 3)) {
    if (turn.status !== 'solved') throw new Error(turn.why);
    expect(settles).toBe(true);
    near(turn.value.radius, settled(craft, { ...ASKED, vector }).turn.radius, 1e-6);
  }
});

test('with large fins little vectoring gives a wide turn: radius in inverse proportion to the angle', () => {
  const craft = turning(craftWith([battery, tailThruster(), fins(0.5)]));
  const radius = (angle: number) => settled(craft, { ...ASKED, vector: -angle * degrees }).turn.radius;
  near(radius(0.2) / radius(0.4), 2, 0.02);
});
