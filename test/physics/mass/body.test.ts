import fc from 'fast-check';
import { expect, test } from 'vitest';
import {
  addSums,
  momentAbout,
  pitchInertia,
  pointMass,
  sumsOf,
  yawInertia,
} from '../../../src/physics/mass/body.ts';
import { boxSecond, secondOfInertia, turnedSecond } from '../../../src/physics/mass/inertia.ts';

/** Station of the CG of masses at stations. */
const cgOfTable = (table: readonly (readonly [number, number])[]) => {
  const sums = sumsOf(table.map(([mass, station]) => pointMass(mass, [station, 0, 0])));
  return { mass: sums.mass, moment: sums.moment[0], cg: sums.moment[0] / sums.mass };
};

test('an aircraft weighed in parts: FAA AC 43.13-1B, fig. 10-10 (lb, in)', () => {
  const { mass, moment, cg } = cgOfTable([
    [1169, 10.6],
    [17, -49],
    [170, 16],
    [83, 22],
  ]);
  expect(mass).toBe(1439);
  expect(moment).toBeCloseTo(16_104.4, 1);
  expect(cg).toBeCloseTo(11.2, 1);
});

test('a ship’s lading: Nicholls’s Seamanship p. 519 (tons, ft)', () => {
  const lading =
    '942@14, 115@26, 161@32, 1397@14, 80@25, 210@31, 804@14, 197@25, 6@31, 750@16, 1178@14, 60@25, 260@31, 933@16, 110@26, 660@16, 103@2, 27@12, 4450@13';
  const { mass, moment, cg } = cgOfTable(
    lading.split(', ').map((entry) => entry.split('@').map(Number) as [number, number]),
  );
  expect(mass).toBe(12_443);
  expect(moment).toBe(190_545);
  expect(cg).toBeCloseTo(15.3, 1);
});

test('200 lb at +25 in is answered by 100 lb at −50 in: FAA-H-8083-1', () => {
  expect(
    cgOfTable([
      [200, 25],
      [100, -50],
    ]).moment,
  ).toBe(0);
});

const coordinate = fc.double({ min: -10, max: 10, noNaN: true });
const body = fc
  .tuple(fc.double({ min: 0.001, max: 5, noNaN: true }), coordinate, coordinate, coordinate)
  .map(([mass, x, y, z]) => pointMass(mass, [x, y, z]));
const bodies = fc.array(body, { minLength: 1, maxLength: 20 });

test('the CG lies inside the box that holds the masses', () => {
  fc.assert(
    fc.property(bodies, (all) => {
      const { mass, moment } = sumsOf(all);
      for (const axis of [0, 1, 2] as const) {
        const stations = all.map(({ cg }) => cg[axis]);
        expect(moment[axis] / mass).toBeGreaterThanOrEqual(Math.min(...stations) - 1e-9);
        expect(moment[axis] / mass).toBeLessThanOrEqual(Math.max(...stations) + 1e-9);
      }
    }),
  );
});

test('moments about the CG vanish, wherever the datum is', () => {
  fc.assert(
    fc.property(bodies, (all) => {
      const sums = sumsOf(all);
      const [x, y, z] = sums.moment.map((each) => each / sums.mass) as [number, number, number];
      for (const each of momentAbout(sums, [x, y, z])) expect(Math.abs(each)).toBeLessThan(1e-9);
    }),
  );
});

test('sums add', () => {
  fc.assert(
    fc.property(bodies, bodies, (a, b) => {
      const together = sumsOf([...a, ...b]);
      const added = addSums(sumsOf(a), sumsOf(b));
      expect(added.mass).toBeCloseTo(together.mass, 9);
      added.moment.forEach((each, i) => {
        expect(each).toBeCloseTo(together.moment[i]!, 8);
      });
    }),
  );
});

test('a box about its end has the inertia m l²/3 of a slender rod (any text on statics)', () => {
  const rod = { mass: 2, cg: [0.5, 0, 0] as const, second: boxSecond(2, 1, 0, 0) };
  expect(pitchInertia([rod], [0, 0, 0])).toBeCloseTo(2 / 3, 12);
});

test('a box cut into small boxes keeps its inertia: parallel axes against a fine sum', () => {
  const whole = { mass: 3, cg: [0.4, 0, -0.2] as const, second: boxSecond(3, 0.8, 0.3, 0.5) };
  const n = 60;
  const grains = Array.from({ length: n * n }, (_, k) => {
    const x = 0.8 * (((k % n) + 0.5) / n);
    const z = -0.45 + 0.5 * ((Math.floor(k / n) + 0.5) / n);
    return pointMass(3 / (n * n), [x, 0, z]);
  });
  expect(pitchInertia([whole], [1, 0, 1])).toBeCloseTo(pitchInertia(grains, [1, 0, 1]), 3);
});

test('yaw is pitch with the body laid on its side', () => {
  fc.assert(
    fc.property(bodies, fc.double({ min: -7, max: 7, noNaN: true }), (all, turn) => {
      const boxes = all.map((each) => ({ ...each, second: turnedSecond(boxSecond(1, 0.5, 0.2, 0.1), turn) }));
      const laid = boxes.map(({ mass, cg: [x, y, z], second: [xx, yy, zz, xy, yz, zx] }) => ({
        mass,
        cg: [x, z, -y] as const,
        second: [xx, zz, yy, zx, -yz, -xy] as const,
      }));
      expect(yawInertia(boxes, [1, 2, 3])).toBeCloseTo(pitchInertia(laid, [1, 3, -2]), 8);
    }),
  );
});

test('turning a body leaves its trace and its moment of inertia about the axis of turning', () => {
  fc.assert(
    fc.property(fc.double({ min: -7, max: 7, noNaN: true }), (angle) => {
      const before = boxSecond(1, 0.5, 0.2, 0.1);
      const after = turnedSecond(before, angle);
      expect(after[0]).toBe(before[0]);
      expect(after[1] + after[2]).toBeCloseTo(before[1] + before[2], 12);
      const back = turnedSecond(after, -angle);
      back.forEach((each, i) => {
        expect(each).toBeCloseTo(before[i]!, 12);
      });
    }),
  );
});

test('a quarter turn swaps width and height', () => {
  const turned = turnedSecond(boxSecond(1, 0.5, 0.2, 0.1), Math.PI / 2);
  boxSecond(1, 0.5, 0.1, 0.2).forEach((each, i) => {
    expect(turned[i]).toBeCloseTo(each, 12);
  });
});

test('second moments from moments of inertia: those of a box come back', () => {
  const [m, l, w, h] = [1.2, 0.5, 0.2, 0.1];
  const inertia = [
    (m * (w * w + h * h)) / 12,
    (m * (l * l + h * h)) / 12,
    (m * (l * l + w * w)) / 12,
  ] as const;
  secondOfInertia(inertia).forEach((each, i) => {
    expect(each).toBeCloseTo(boxSecond(m, l, w, h)[i]!, 12);
  });
});
