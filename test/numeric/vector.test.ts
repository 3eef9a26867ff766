import fc from 'fast-check';
import { expect, test } from 'vitest';
import { add, cross, dot, norm, scale, sub, type Vec3 } from '../../src/numeric/vector.ts';

const part = fc.double({ min: -100, max: 100, noNaN: true });
const vectors = fc.tuple(part, part, part) as fc.Arbitrary<Vec3>;
const near = (a: number, b: number) => expect(Math.abs(a - b)).toBeLessThan(1e-6);

test('x × y = z, y × z = x, z × x = y', () => {
  expect(cross([1, 0, 0], [0, 1, 0])).toEqual([0, 0, 1]);
  expect(cross([0, 1, 0], [0, 0, 1])).toEqual([1, 0, 0]);
  expect(cross([0, 0, 1], [1, 0, 0])).toEqual([0, 1, 0]);
});

test('3, 4, 12 has length 13', () => {
  expect(norm([3, 4, 12])).toBe(13);
});

test('a cross product stands square on both, and Lagrange’s identity |a×b|² + (a·b)² = |a|²|b|² holds', () => {
  fc.assert(
    fc.property(vectors, vectors, (a, b) => {
      const c = cross(a, b);
      near(dot(c, a), 0);
      near(dot(c, b), 0);
      near(
        (dot(c, c) + dot(a, b) ** 2) / (1 + dot(a, a) * dot(b, b)),
        (dot(a, a) * dot(b, b)) / (1 + dot(a, a) * dot(b, b)),
      );
    }),
  );
});

test('what is added can be taken away; norms obey the triangle', () => {
  fc.assert(
    fc.property(vectors, vectors, (a, b) => {
      near(norm(sub(sub(add(a, b), b), a)), 0);
      expect(norm(add(a, b))).toBeLessThanOrEqual(norm(a) + norm(b) + 1e-9);
      expect(scale(a, -1)).toEqual(sub([-0, -0, -0], a));
    }),
  );
});
