import fc from 'fast-check';
import { expect, test } from 'vitest';
import { forwardThrust, pushOf } from '../../../src/physics/thrust/ahead.ts';
import { thrustAt, thrustersOf } from '../../../src/physics/thrust/thrusters.ts';
import { degrees, stateWith, thrusterPart, turning } from './thrustFixture.ts';

const [one] = thrustersOf(stateWith([thrusterPart({}, { reverse: 0.5 })]));

test('thrust falls on a straight line from static thrust to nil at the pitch speed', () => {
  // 1 N at rest, pitch speed 8 m/s.
  expect(thrustAt(one!, 1, 0)).toBe(1);
  expect(thrustAt(one!, 1, 4)).toBeCloseTo(0.5, 12);
  expect(thrustAt(one!, 1, 8)).toBe(0);
  expect(thrustAt(one!, 1, 20)).toBe(0);
  expect(thrustAt(one!, 1, -3)).toBe(1);
});

test('at part throttle it is the same propeller turning slower: T = a n² − b n V', () => {
  const share = fc.double({ min: 0.01, max: 1, noNaN: true });
  const advance = fc.double({ min: 0, max: 8, noNaN: true });
  fc.assert(
    fc.property(share, advance, (throttle, speed) => {
      const turns = Math.sqrt(throttle);
      const wanted = Math.max(turns * turns - turns * (speed / 8), 0);
      expect(thrustAt(one!, throttle, speed)).toBeCloseTo(wanted, 12);
    }),
  );
  expect(thrustAt(one!, 0.25, 4)).toBe(0);
});

test('backwards is forwards seen from behind', () => {
  expect(thrustAt(one!, -0.5, 0)).toBe(-0.5);
  expect(thrustAt(one!, -0.5, 3)).toBe(-0.5);
  expect(thrustAt(one!, -0.5, -2)).toBe(-thrustAt(one!, 0.5, 2));
  expect(thrustAt(one!, 0, 3)).toBe(0);
});

test('pitch speed from motor speed, gear ratio and pitch: 6000 rpm, 2 to 1, 0.1 m is 5 m/s', () => {
  const data = { kind: 'turning', motorSpeed: 200 * Math.PI, gearRatio: 2, pitch: 0.1 } as const;
  const [geared] = thrustersOf(stateWith([thrusterPart({}, { pitchSpeed: data })]));
  expect(geared!.pitchSpeed).toBeCloseTo(5, 12);
});

test('a pair throttled apart: more thrust to port turns the nose to starboard', () => {
  const place = { kind: 'free', x: 2, y: 0.6, z: 0 } as const;
  const pair = thrustersOf(
    stateWith([thrusterPart({ place, copies: { kind: 'pair' } }, { differential: true })]),
  );
  expect(pair.map(({ at, differ }) => [at[1], differ])).toEqual([
    [0.6, -1],
    [-0.6, 1],
  ]);
});

test('turned up, thrust points forward and up, and advances with both', () => {
  const [tilted] = thrustersOf(stateWith([thrusterPart({}, { pitch: turning(30 * degrees) })]));
  const { thrust, advance, forward, up } = pushOf(tilted!, { throttle: 1, vector: null }, 2, 1);
  expect(advance).toBeCloseTo(2 * Math.cos(30 * degrees) + 0.5, 12);
  expect(thrust).toBeCloseTo(1 - advance / 8, 12);
  expect([forward, up]).toEqual([thrust * Math.cos(30 * degrees), thrust * Math.sin(30 * degrees)]);
});

test('asked beyond its limit it stays at it; one that cannot turn stays as it is', () => {
  const helm = { throttle: 1, vector: 80 * degrees };
  const [limited] = thrustersOf(stateWith([thrusterPart({}, { pitch: turning(0, 60 * degrees) })]));
  expect(pushOf(limited!, helm, 0, 0).forward).toBeCloseTo(0.5, 12);
  expect(forwardThrust([one!, limited!], helm, 0)).toBeCloseTo(1.5, 12);
});

test('one that cannot point straight ahead in yaw gives the cosine of what is left', () => {
  const yaw = { least: 60 * degrees, most: 90 * degrees, set: 90 * degrees, slew: 1 };
  const [askew] = thrustersOf(stateWith([thrusterPart({}, { yaw })]));
  expect(pushOf(askew!, { throttle: 1, vector: null }, 0, 0).forward).toBeCloseTo(0.5, 12);
});
