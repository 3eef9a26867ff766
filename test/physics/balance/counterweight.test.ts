import fc from 'fast-check';
import { expect, test } from 'vitest';
import { attitudeOf } from '../../../src/physics/balance/attitude.ts';
import { levellingWeight, levellingWithin } from '../../../src/physics/balance/counterweight.ts';
import { floatOf, pitchPerMass } from '../../../src/physics/balance/float.ts';
import { hangOf, heavinessOf, type Loading, withWeight } from '../../../src/physics/balance/loading.ts';
import { oneWeight } from '../../../src/physics/balance/oneWeight.ts';

const degrees = Math.PI / 180;

/** A craft of that mass with its CG at (x, y, z) from the CB, and that gross lift. */
const craft = (mass: number, [x, y, z]: readonly [number, number, number], grossLift = 10): Loading => ({
  solid: { mass, moment: [mass * (1.5 + x), mass * y, mass * z] },
  cb: [1.5, 0, 0],
  grossLift,
});

const arbitraryCraft = fc
  .record({
    mass: fc.double({ min: 0.05, max: 5, noNaN: true }),
    x: fc.double({ min: -0.5, max: 0.5, noNaN: true }),
    y: fc.double({ min: -0.05, max: 0.05, noNaN: true }),
    z: fc.double({ min: -0.5, max: -0.02, noNaN: true }),
  })
  .map(({ mass, x, y, z }) => craft(mass, [x, y, z]));

test('lead computed then added floats level to 1e-9 rad', () => {
  fc.assert(
    fc.property(arbitraryCraft, fc.double({ min: 0.1, max: 1.4, noNaN: true }), (loading, arm) => {
      const side = hangOf(loading)[0] > 0 ? 1.5 - arm : 1.5 + arm;
      const lead = levellingWeight(loading, [side, 0, -0.1]);
      expect(lead.status).toBe('solved');
      if (lead.status === 'infeasible') return;
      expect(lead.value).toBeGreaterThanOrEqual(0);
      const after = floatOf(withWeight(loading, lead.value, [side, 0, -0.1]));
      expect(after.status === 'solved' && Math.abs(after.value.pitch)).toBeLessThan(1e-9);
    }),
  );
});

test('the least lead within a tolerance lands on the tolerance, and a gram less does not', () => {
  fc.assert(
    fc.property(arbitraryCraft, fc.double({ min: 0.005, max: 0.2, noNaN: true }), (loading, tolerance) => {
      const at = [hangOf(loading)[0] > 0 ? 0.1 : 2.9, 0, -0.05] as const;
      const lead = levellingWithin(loading, at, tolerance);
      expect(lead.status).toBe('solved');
      if (lead.status === 'infeasible') return;
      const pitch = (mass: number) => Math.abs(attitudeOf(hangOf(withWeight(loading, mass, at)))!.pitch);
      expect(pitch(lead.value)).toBeLessThanOrEqual(tolerance + 1e-9);
      if (lead.value > 1e-6) expect(pitch(lead.value * 0.99)).toBeGreaterThan(tolerance);
    }),
  );
});

test('it agrees with a search by bisection', () => {
  const loading = craft(0.9, [0.2, 0.03, -0.19]);
  const at = [0.05, 0.1, -0.3] as const;
  const outside = (mass: number) =>
    Math.abs(attitudeOf(hangOf(withWeight(loading, mass, at)))!.pitch) > 2 * degrees;
  const level = levellingWeight(loading, at);
  let [low, high] = [0, level.status === 'solved' ? level.value : 0];
  for (let i = 0; i < 60; i++) {
    const middle = (low + high) / 2;
    if (outside(middle)) low = middle;
    else high = middle;
  }
  const least = levellingWithin(loading, at, 2 * degrees);
  expect(least.status === 'solved' && least.value).toBeCloseTo(high, 9);
});

test('permanent ballast: FAA-H-8083-1, 1876 lb, CG 32.2, limit 33.0, ballast station 228 → 7.7 lb (last two from memory)', () => {
  const loading: Loading = {
    solid: { mass: 1876, moment: [1876 * 32.2, 0, -1876] },
    cb: [33, 0, 0],
    grossLift: 0,
  };
  const ballast = levellingWeight(loading, [228, 0, 0]);
  expect(ballast.status === 'solved' && ballast.value).toBeCloseTo(7.7, 1);
});

test('a hardpoint on the CB levels nothing, and says how near it is', () => {
  const answer = levellingWeight(craft(1, [0.1, 0, -0.1]), [1.5, 0, -0.4]);
  expect(answer.status).toBe('infeasible');
  expect(answer.status === 'infeasible' && answer.why).toContain('stands on the CB');
});

test('a hardpoint on the heavy side makes it worse, and says by how much', () => {
  const answer = levellingWeight(craft(1, [0.1, 0, -0.1]), [2.5, 0, 0]);
  expect(answer).toMatchObject({ status: 'infeasible' });
  if (answer.status === 'infeasible') {
    expect(answer.why).toContain('{0.1');
    expect(answer.why).toContain('tail-heavy');
    expect(answer.remedy).toContain('forward of the CB');
  }
});

test('CG above CB: level, but not upright', () => {
  const answer = levellingWithin(craft(1, [0.1, 0, 0.1]), [0.2, 0, 0], 2 * degrees);
  expect(answer.status === 'infeasible' && answer.why).toContain('would not stay upright');
});

test('a low hardpoint can bring a top-heavy craft upright', () => {
  const loading = craft(1, [0.1, 0, 0.05]);
  const answer = levellingWithin(loading, [0.5, 0, -1.2], 2 * degrees);
  expect(answer.status).toBe('solved');
  if (answer.status === 'infeasible') return;
  expect(hangOf(withWeight(loading, answer.value, [0.5, 0, -1.2]))[2]).toBeLessThan(0);
});

test('a level craft needs none', () => {
  expect(levellingWeight(craft(1, [0, 0, -0.1]), [0.1, 0, 0])).toEqual({ status: 'solved', value: 0 });
  expect(levellingWithin(craft(1, [0.0001, 0, -0.1]), [2.9, 0, 0], 2 * degrees)).toEqual({
    status: 'solved',
    value: 0,
  });
});

test('turn per mass is the slope of pitch over mass', () => {
  fc.assert(
    fc.property(arbitraryCraft, fc.double({ min: 0, max: 3, noNaN: true }), (each, x) => {
      const loading = {
        ...each,
        solid: { ...each.solid, moment: [each.solid.moment[0], 0, each.solid.moment[2]] as const },
      };
      const at = [x, 0, -0.2] as const;
      const slope = pitchPerMass(loading, at);
      const pitch = (mass: number) => attitudeOf(hangOf(withWeight(loading, mass, at)))!.pitch;
      const step = 1e-6 * loading.solid.mass;
      const found = (pitch(step) - pitch(-step)) / (2 * step);
      expect(slope.status === 'solved' && slope.value).toBeCloseTo(found, 4);
    }),
  );
});

test('one weight for both: added, the craft is level and neutral', () => {
  fc.assert(
    fc.property(arbitraryCraft, (loading) => {
      const weight = oneWeight(loading, 3, 1);
      if (weight.status === 'infeasible') return;
      const after = withWeight(loading, weight.value.mass, [weight.value.station, 0, -0.5]);
      expect(Math.abs(heavinessOf(after))).toBeLessThan(1e-9);
      expect(Math.abs(hangOf(after)[0])).toBeLessThan(1e-9);
    }),
  );
});

test('one weight: no lift left says by how much, and how much hull would help', () => {
  const answer = oneWeight(craft(1, [0, 0, -0.1], 0.9), 3, 1);
  expect(answer.status).toBe('infeasible');
  if (answer.status === 'infeasible') {
    expect(answer.why).toContain('{0.09999999999999998 mass} heavy');
    expect(answer.remedy).toContain('volume}');
  }
});

test('one weight: too little lift for the moment would hang it beyond the nose', () => {
  const answer = oneWeight(craft(1, [0.2, 0, -0.1], 1.1), 3, 1);
  expect(answer.status === 'infeasible' && answer.why).toContain('ahead of the nose');
});
