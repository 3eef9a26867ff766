import fc from 'fast-check';
import { expect, test } from 'vitest';
import { integrateFixed } from '../../../src/numeric/quadrature.ts';
import { arcInside, meanOverDisc, sharedArea } from '../../../src/physics/flow/discRings.ts';

const size = fc.double({ min: 0.01, max: 3, noNaN: true });
const offset = fc.oneof(fc.constant(0), size);
const disc = fc.record({ offset, radius: size });

test('the mean of ϱ² over a disc is d² + R²/2, wherever it is cut', () => {
  fc.assert(
    fc.property(disc, size, ({ offset: d, radius: R }, cut) => {
      const mean = meanOverDisc({ offset: d, radius: R }, 0, [cut], (rho) => rho * rho)!;
      expect(mean / (d * d + (R * R) / 2)).toBeCloseTo(1, 6);
    }),
  );
});

test('the shared area is the arcs added up, at most the smaller circle, and all of the disc for a large one', () => {
  fc.assert(
    fc.property(disc, size, (each, a) => {
      const shared = sharedArea(each, a);
      const { offset: d, radius: R } = each;
      const cuts = [0, Math.abs(R - d), R + d].map((rho) => Math.min(a, rho));
      const summed = cuts
        .slice(1)
        .reduce((sum, to, i) => sum + integrateFixed((rho) => arcInside(each, rho), cuts[i]!, to, 16, 20), 0);
      expect(Math.abs(shared - summed)).toBeLessThan(1e-4 * Math.PI * a * a);
      expect(shared).toBeLessThanOrEqual(Math.PI * Math.min(a, each.radius) ** 2 * (1 + 1e-12));
      expect(sharedArea(each, each.offset + each.radius) / (Math.PI * each.radius ** 2)).toBeCloseTo(1, 12);
    }),
  );
});

test('two unit circles through each other’s centres share 2π/3 − √3/2', () => {
  expect(sharedArea({ offset: 1, radius: 1 }, 1)).toBeCloseTo((2 * Math.PI) / 3 - Math.sqrt(3) / 2, 14);
});

test('what lies inside the inner circle does not count; nothing outside, no mean', () => {
  const each = { offset: 0.3, radius: 0.5 };
  expect(meanOverDisc(each, 0.4, [], (rho) => (rho < 0.4 ? 100 : 7))).toBeCloseTo(7, 12);
  expect(meanOverDisc(each, 0.8, [], () => 1)).toBeNull();
  expect(sharedArea(each, 0)).toBe(0);
});
