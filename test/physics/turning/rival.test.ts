import * as math from 'mathjs';
import { expect, test } from 'vitest';
import { craftStateOf } from '../../../src/physics/craftState.ts';
import { motionOf } from '../../../src/physics/turning/motion.ts';
import { sail } from '../../../src/physics/turning/sail.ts';
import { commandOf } from '../../../src/physics/turning/steer.ts';
import { rivalOf } from './rival.ts';
import {
  battery,
  craftWith,
  degrees,
  fins,
  fixedAt,
  gondolaCraft,
  noseCraft,
  pairCraft,
  sidePair,
  tailCraft,
  tailThruster,
  turning,
} from './turningCrafts.ts';

type Slope = (t: number, y: number[]) => number[];

/** The types that come with mathjs leave this function out. */
const { solveODE } = math as unknown as {
  solveODE(
    f: Slope,
    span: readonly number[],
    from: readonly number[],
    options: object,
  ): { t: number[]; y: number[][] };
};

const SECONDS = 8;
const solved = (f: Slope, from: readonly number[], tol: number) => {
  const { t, y } = solveODE(f, [0, SECONDS], from, { tol, maxStep: 0.2, firstStep: 0.01 });
  return { times: t, states: y };
};

// mathjs 15.2.0, solveODE: the same pair of formulas in another hand, with a step control of its own.
test.each([
  ['tail thruster', tailCraft],
  ['side pair', pairCraft],
  ['nose thruster', noseCraft],
  ['pair under the gondola', gondolaCraft],
])('%s: another solver on the same equations goes the same way', (_, craftOf) => {
  const craft = craftOf();
  const straight = commandOf(craft, { throttle: 1, steer: 0, vector: null });
  const hard = commandOf(craft, { throttle: 1, steer: 1, vector: null });
  const from = { state: [1.5, 0, 0, 0, 0, 0], angles: straight.angles };
  const ours = sail(craft, from, hard, { until: SECONDS });
  if (ours.status !== 'solved') throw new Error(ours.why);
  const { slope } = motionOf(craft, hard, straight.angles);
  const theirs = solved(
    (t, y) => {
      const rates = new Float64Array(6);
      slope(t, Float64Array.from(y), rates);
      return [...rates];
    },
    from.state,
    1e-9,
  );
  for (const [i, t] of theirs.times.entries()) {
    const here = ours.value.trajectory.at(t);
    for (const [k, each] of theirs.states[i]!.entries()) {
      expect(Math.abs(here[k]! - each)).toBeLessThan(1e-6);
    }
  }
});

test('the same craft by other equations, other strips and another solver', () => {
  const parts = [
    { ...battery, place: { kind: 'free' as const, x: 1.2, y: 0.15, z: -0.5 } },
    tailThruster(2.9, { yaw: fixedAt(-25 * degrees) }),
    sidePair({ differential: false, yaw: fixedAt(-25 * degrees) }),
    fins(),
  ];
  const file = craftWith(parts);
  const state = craftStateOf(file);
  if (state.status !== 'solved') throw new Error(state.why);
  const craft = turning(file);
  const masses = state.value.bodies.map(({ mass, cg, second }) => ({
    mass,
    ahead: 1.5 - cg[0],
    side: cg[1],
    own: second[0] + second[1],
  }));
  // η at fineness 3, between 0.567 at 2 and 0.617 at 5, from the strips themselves: their sum is the outline's.
  const outline = craft.strips.drag.reduce((sum, each) => sum + each, 0);
  const eta = outline / (0.6 * (Math.PI / 4) * 3 * 1);
  expect(eta).toBeGreaterThan(0.567);
  expect(eta).toBeLessThan(0.617);
  const bodies = { masses, gasDensity: state.value.gasDensity };
  const rival = rivalOf(craft, { length: 3, diameter: 1 }, bodies, -25 * degrees, eta);
  const command = commandOf(craft, { throttle: 1, steer: 0, vector: null });
  const from = [1, 0.2, 0.1];
  const ours = sail(craft, { state: [...from, 0, 0, 0], angles: command.angles }, command, {
    until: SECONDS,
  });
  if (ours.status !== 'solved') throw new Error(ours.why);
  const theirs = solved(rival.slope, rival.start(from), 1e-7);
  for (const [i, t] of theirs.times.entries()) {
    const here = ours.value.trajectory.at(t);
    const there = theirs.states[i]!;
    for (const [k, each] of [...rival.velocityAt(there), ...there.slice(3)].entries()) {
      expect(Math.abs(here[k]! - each)).toBeLessThan(2e-5);
    }
  }
});
