import fc from 'fast-check';
import { expect, test } from 'vitest';
import { type Order, ringSource } from '../../../src/physics/flow/ringSource.ts';

/** The same ring as many single sources: φ = −Σ σ/(4πR), evenly spread, so the sum converges beyond all powers. */
function manySources(order: Order, dx: number, rho: number, ring: number, count = 4000) {
  const sum = { potential: 0, axial: 0, radial: 0 };
  for (let i = 0; i < count; i += 1) {
    const angle = (2 * Math.PI * i) / count;
    const strength = (order === 0 ? 1 : Math.cos(angle)) * ((2 * Math.PI * ring) / count);
    const across = rho - ring * Math.cos(angle);
    const distance = Math.hypot(dx, across, ring * Math.sin(angle));
    sum.potential -= strength / (4 * Math.PI * distance);
    sum.axial += (strength * dx) / (4 * Math.PI * distance ** 3);
    sum.radial += (strength * across) / (4 * Math.PI * distance ** 3);
  }
  return sum;
}

const away = fc.double({ min: 0.05, max: 3, noNaN: true });

test.each([0, 1] as const)('order %i is what many single sources on the ring do', (order) => {
  fc.assert(
    fc.property(away, fc.double({ min: 0, max: 3, noNaN: true }), away, (dx, rho, ring) => {
      const wanted = manySources(order, dx, rho, ring);
      const found = { potential: 0, axial: 0, radial: 0 };
      ringSource(order, dx, rho, ring, found);
      for (const key of ['potential', 'axial', 'radial'] as const)
        expect(Math.abs(found[key] - wanted[key])).toBeLessThan(1e-10 * Math.max(1, Math.abs(wanted[key])));
    }),
    { numRuns: 60 },
  );
});

test('it keeps its digits close to the axis', () => {
  for (const order of [0, 1] as const) {
    const [near, nearer] = [
      { potential: 0, axial: 0, radial: 0 },
      { potential: 0, axial: 0, radial: 0 },
    ];
    ringSource(order, 1, 1e-5, 1, near);
    ringSource(order, 1, 1e-9, 1, nearer);
    // Close to the axis φ of order 0 is level, of order 1 in proportion to the distance.
    const scale = order === 0 ? 1 : 1e4;
    expect(near.potential / (scale * nearer.potential)).toBeCloseTo(1, 9);
    expect(near.axial / (scale * nearer.axial)).toBeCloseTo(1, 9);
    expect(near.radial / ((order === 0 ? 1e4 : 1) * nearer.radial)).toBeCloseTo(1, 9);
  }
});

test('on the ring itself it is finite', () => {
  const found = { potential: 0, axial: 0, radial: 0 };
  for (const order of [0, 1] as const) {
    ringSource(order, 0, 1, 1, found);
    for (const value of Object.values(found)) expect(Number.isFinite(value)).toBe(true);
  }
});
