import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Craft } from '../../../src/craft/craft.ts';
import { valueOrNull } from '../../../src/numeric/outcome.ts';
import { type CraftState, craftStateOf } from '../../../src/physics/craftState.ts';
import { steadySpeed } from '../../../src/physics/thrust/speed.ts';
import { steadyCurve, type Turn, type TurnAsked, turnOf } from '../../../src/physics/turning/turn.ts';
import { turnFigures } from '../../../src/physics/turning/turnFigures.ts';
import { near } from '../hull/near.ts';
import {
  anyCraft,
  battery,
  craftWith,
  degrees,
  double,
  fins,
  fixedAt,
  mirroredCraft,
  sidePair,
  tailThruster,
  within,
} from './turningCrafts.ts';

const ASKED: TurnAsked = { throttle: 1, vector: null, speed: null };

function stateOf(craft: Craft): CraftState {
  const state = craftStateOf(craft);
  if (state.status !== 'solved') throw new Error(state.why);
  return state.value;
}

function turned(craft: Craft, asked = ASKED): Turn {
  const outcome = turnOf(stateOf(craft), asked);
  if (outcome.status !== 'solved') throw new Error(outcome.why);
  return outcome.value;
}

const tail = craftWith([battery, tailThruster(), fins()]);

/** Every number in it, however deep. */
const numbersIn = (value: unknown): number[] =>
  typeof value === 'number'
    ? [value]
    : typeof value === 'object' && value !== null
      ? Object.values(value).flatMap(numbersIn)
      : [];

test('any craft, throttle, angle and speed get an answer in plain numbers and sentences', () => {
  const asked = fc.record({
    throttle: fc.oneof(fc.constant(0), double(0, 1)),
    vector: fc.option(double(-3, 3)),
    speed: fc.option(double(0, 15)),
  });
  const targets = fc.record({ turnTime: fc.option(double(0.1, 30)), sideGust: fc.option(double(0, 5)) });
  fc.assert(
    fc.property(anyCraft, asked, targets, (craft, ask, wanted) => {
      const answer = turned({ ...craft, targets: { ...craft.targets, ...wanted } }, ask);
      expect(numbersIn(answer).filter((each) => !Number.isFinite(each))).toEqual([]);
      const curve = steadyCurve(stateOf(craft), ask);
      expect(numbersIn(curve).filter((each) => !Number.isFinite(each))).toEqual([]);
      expect(JSON.stringify([answer, curve])).not.toMatch(/NaN|undefined|Infinity/);
    }),
    { numRuns: 60 },
  );
});

test('without a thruster, or without mass, it says what is missing', () => {
  expect(turnOf(stateOf(craftWith([battery])), ASKED)).toMatchObject({
    status: 'infeasible',
    why: expect.stringContaining('thruster'),
  });
  const weightless = craftWith([{ ...tailThruster(), mass: 0 }]);
  weightless.film.arealDensity = 0;
  expect(turnOf(stateOf(weightless), ASKED)).toMatchObject({
    status: 'infeasible',
    why: 'There is no mass to turn.',
  });
});

test('the mirrored craft gives the same figures', () => {
  const lopsided = craftWith([
    { ...battery, place: { kind: 'free', x: 1.2, y: 0.02, z: -0.5 } },
    tailThruster(2.8, { yaw: within(35 * degrees) }),
    sidePair({ differential: false }),
    fins(0.3),
  ]);
  const [here, there] = [
    turned(lopsided, { ...ASKED, vector: -0.6, speed: 1 }),
    turned(mirroredCraft(lopsided), { ...ASKED, vector: 0.6, speed: 1 }),
  ];
  for (const key of ['fromRest', 'fromCruise', 'stop'] as const) {
    const [a, b] = [valueOrNull<{ time: number }>(here[key]), valueOrNull<{ time: number }>(there[key])];
    near(a!.time, b!.time, 1e-7);
  }
  near(valueOrNull(here.steady)!.yawRate, -valueOrNull(there.steady)!.yawRate, 1e-7);
  near(valueOrNull(here.gust)!, valueOrNull(there.gust)!, 1e-6);
});

test('it begins from the steady speed straight ahead, or from the speed asked for', () => {
  const speed = steadySpeed(stateOf(tail), 0.5);
  if (speed.status !== 'solved') throw new Error(speed.why);
  near(turned(tail, { ...ASKED, throttle: 0.5 }).cruiseSpeed, speed.value, 1e-9);
  const given = turned(tail, { ...ASKED, speed: 1.25 });
  expect(given.cruiseSpeed).toBe(1.25);
  if (given.fromCruise.status !== 'solved') throw new Error(given.fromCruise.why);
  expect(given.fromCruise.value.track.u[0]).toBe(1.25);
});

test('fixed thrust on the centreline: no yaw, no steady turn, no gust held, and each says why', () => {
  const turn = turned(craftWith([battery, tailThruster(2.9, { yaw: fixedAt(0) }), fins()]));
  for (const each of [
    turn.fromRest,
    turn.fromCruise,
    turn.stop,
    turn.steady,
    turn.gust,
    turn.gustCruise,
    turn.glide.after,
  ]) {
    expect(each).toMatchObject({ status: 'infeasible', why: expect.stringMatching(/^N(othing|o) .*\.$/) });
  }
});

test('nor does a fixed thruster beside the CG turn it, though Munk’s moment makes a turn of the least unevenness', () => {
  for (const y of [1e-12, 1e-6, 1e-3, 0.05]) {
    const off = {
      ...tailThruster(2.9, { yaw: fixedAt(0) }),
      place: { kind: 'free', x: 2.9, y, z: 0 },
    } as const;
    const file = craftWith([battery, off, fins()]);
    const craft = { ...file, targets: { ...file.targets, turnTime: 60 } };
    const { fromRest, fromCruise, stop, steady, authority } = turned(craft);
    for (const each of [fromRest, fromCruise, stop, steady, authority.need!.turnTime!.thrust]) {
      expect(each.status).toBe('infeasible');
    }
    expect(turnFigures(stateOf(craft), ASKED)).toMatchObject({
      timeTo90: null,
      radius: null,
      gustHeld: null,
    });
    const curve = steadyCurve(stateOf(craft), ASKED);
    expect(curve.status === 'solved' && curve.value.every(({ turn }) => turn.status === 'infeasible')).toBe(
      true,
    );
  }
});

test('targets are answered, and only when something is asked', () => {
  expect(turned(tail).authority.need).toBeNull();
  const asking = { ...tail, targets: { ...tail.targets, turnTime: 2 } };
  expect(turned(asking).authority.need).toMatchObject({ sideGust: null, turnTime: { asked: 2 } });
});

test('cautions: stuck servo, an angle beyond the limits, nothing that turns, air stronger than thrust', () => {
  const stuck = { least: -1, most: 1, set: 0.2, slew: 0 };
  expect(turned(craftWith([battery, tailThruster(2.9, { yaw: stuck }), fins()])).cautions).toEqual(
    expect.arrayContaining([
      'thruster has a range of angles in yaw but no slew rate, so it stays at {0.2 angle}.',
    ]),
  );
  expect(turned(tail, { ...ASKED, vector: 1 }).cautions).toEqual(
    expect.arrayContaining([`thruster turns to {${40 * degrees} angle}, not to the {1 angle} asked for.`]),
  );
  const pair = craftWith([battery, sidePair(), fins()]);
  expect(turned(pair, { ...ASKED, vector: 1 }).cautions).toEqual([
    'No thruster turns in yaw, so the vectoring asked for changes nothing.',
  ]);
  // A little ahead of the CG and turned far out: it pushes the craft sideways, and Munk's moment turns it the other way.
  const wayward = craftWith([
    battery,
    { ...sidePair({ yaw: within(80 * degrees), differential: false }, 1.2) },
    fins(),
  ]);
  expect(turned(wayward).cautions).toEqual([
    'In the steady turn the craft yaws to port, against the thrusters: the air turns it harder than they do.',
  ]);
});

test('a turn that is not reached in the time is said not to be', () => {
  expect(turned(tail, { ...ASKED, throttle: 1e-5, speed: 0.01 }).cautions).toEqual(
    expect.arrayContaining([expect.stringContaining('does not come to a steady turn within {600 time}')]),
  );
});

test('the few figures are those of everything', () => {
  const few = turnFigures(stateOf(tail), ASKED);
  const all = turned(tail);
  if (all.fromRest.status !== 'solved' || all.steady.status !== 'solved') throw new Error('no turn');
  expect(few).toEqual({
    arm: all.authority.arm,
    timeTo90: all.fromRest.value.time,
    radius: all.steady.value.radius,
    gustHeld: all.gust.status === 'solved' && all.gust.value,
  });
});
