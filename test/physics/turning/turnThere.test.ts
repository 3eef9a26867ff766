import { expect, test } from 'vitest';
import { commandsOf, counterTo, straightAt } from '../../../src/physics/turning/asked.ts';
import { quarterTurn } from '../../../src/physics/turning/quarterTurn.ts';
import { type Sailed, sail, TIME_ERROR } from '../../../src/physics/turning/sail.ts';
import type { TurningCraft } from '../../../src/physics/turning/turningCraft.ts';
import { type TurnedThere, turnThere } from '../../../src/physics/turning/turnThere.ts';
import { near } from '../hull/near.ts';
import {
  battery,
  coupled,
  craftWith,
  degrees,
  pairCraft,
  slippery,
  tailCraft,
  tailThruster,
  turning,
  within,
} from './turningCrafts.ts';

const ASKED = { throttle: 1, vector: null, speed: null };

function quarterOf(craft: TurningCraft, vector: number | null = null): Sailed {
  const { straight, turn } = commandsOf(craft, { ...ASKED, vector });
  const outcome = quarterTurn(craft, straightAt(0, straight), turn);
  if (outcome.status !== 'solved') throw new Error(outcome.why);
  return outcome.value;
}

function there(craft: TurningCraft, quarter = quarterOf(craft)): TurnedThere {
  const outcome = turnThere(craft, quarter, 1);
  if (outcome.status !== 'solved') throw new Error(outcome.why);
  return outcome.value;
}

// By hand: ½ a s² while it speeds up and as much again while it slows down make π/2, so s = √(π/2 ÷ a), a = N/I.
test('a constant couple without resistance: 2 √(π/2 · I/N), half of it against the turn', () => {
  const { craft, acceleration } = coupled();
  const { time, switching } = there(craft);
  const half = Math.sqrt(Math.PI / 2 / acceleration);
  near(time, 2 * half, TIME_ERROR);
  near(switching, half, TIME_ERROR);
});

test.each([
  ['tail', tailCraft],
  ['pair', pairCraft],
])('%s: sailed anew with that switching time, the heading is 90° and the yaw has stopped', (_, craftOf) => {
  const craft = craftOf();
  const { time, switching } = there(craft);
  const { straight, turn } = commandsOf(craft, ASKED);
  const first = sail(craft, straightAt(0, straight), turn, { until: switching });
  if (first.status !== 'solved') throw new Error(first.why);
  const until = time - switching;
  const second = sail(craft, first.value.end, counterTo(craft, 1, 1), { until });
  if (second.status !== 'solved') throw new Error(second.why);
  const { last } = second.value.trajectory;
  near(last[5]!, Math.PI / 2, 1e-5);
  expect(Math.abs(last[2]!)).toBeLessThan(1e-5);
  expect(time).toBeGreaterThan(quarterOf(craft).trajectory.end);
});

test('with a small angle by hand it is stopped with all there is, to either side alike', () => {
  const craft = tailCraft();
  const [starboard, port] = [-12, 12].map((angle) => there(craft, quarterOf(craft, angle * degrees)));
  near(starboard!.time, port!.time, 1e-6);
  expect(starboard!.time).toBeGreaterThan(there(craft).time);
  // Hardest it loses its yaw sooner than it won it.
  expect(starboard!.time - starboard!.switching).toBeLessThan(starboard!.switching);
});

test('what cannot be stopped there says so', () => {
  const oneSided = { least: -40 * degrees, most: 0, set: 0, slew: 3 };
  const craft = slippery(turning(craftWith([battery, tailThruster(2.9, { yaw: oneSided })])));
  expect(turnThere(craft, quarterOf(craft), 1)).toMatchObject({
    status: 'infeasible',
    why: expect.stringContaining('cannot be stopped at 90°'),
  });
});

test('where the air takes over there is a heading beyond which countering comes too late', () => {
  // Without fins Munk’s moment soon outweighs what thrust turned by 8° can do.
  const weak = tailThruster(2.9, {
    thrust: { kind: 'measured', staticThrust: 0.8 },
    yaw: within(8 * degrees),
  });
  const craft = turning(craftWith([battery, weak]));
  const outcome = turnThere(craft, quarterOf(craft), 1);
  if (outcome.status === 'solved') throw new Error('it is stopped');
  const heading = Number(/^Once it has yawed \{([\d.]+) angle\}/.exec(outcome.why)![1]);
  const before = (share: number) => {
    const { straight, turn } = commandsOf(craft, ASKED);
    const event = (_: number, state: Float64Array) => Math.abs(state[5]!) - share * heading;
    const first = sail(craft, straightAt(0, straight), turn, { event });
    if (first.status !== 'solved') throw new Error(first.why);
    const stops = (_: number, state: Float64Array) => Math.max(-state[2]!, state[5]! - Math.PI);
    const second = sail(craft, first.value.end, counterTo(craft, 1, 1), { event: stops });
    if (second.status !== 'solved') throw new Error(second.why);
    return second.value.trajectory.last[5]!;
  };
  expect(before(0.99)).toBeLessThan(Math.PI / 2);
  expect(before(1.01)).toBeCloseTo(Math.PI, 6);
});
