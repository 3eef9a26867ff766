import fc from 'fast-check';
import { expect, test } from 'vitest';
import { hullOf } from '../../../src/physics/hull/hullOf.ts';
import { built } from './built.ts';
import { near } from './near.ts';

const base = { kind: 'series58', length: 4, diameter: 1 } as const;

// y²/D² = X − X²: the ball, the polynomial (1, −1, 0 …); m = 1/2, r0 = r1 = 1/2, Cp = (π/6)/(π/4) = 2/3.
test('the polynomial of a ball gives a ball', () => {
  const ball = built({
    kind: 'series58',
    length: 1.2,
    diameter: 1.2,
    widest: 0.5,
    noseRadius: 0.5,
    tailRadius: 0.5,
    prismatic: 2 / 3,
  });
  near(ball.volume, (Math.PI / 6) * 1.2 ** 3);
  near(ball.area, Math.PI * 1.2 ** 2);
  near(ball.cbStation, 0.6);
  for (const x of [0.1, 0.3, 0.6, 1]) near(ball.radius(x, 0), Math.sqrt(x * (1.2 - x)));
});

const forms = fc.record({
  widest: fc.double({ min: 0.35, max: 0.5, noNaN: true }),
  noseRadius: fc.double({ min: 0.2, max: 0.8, noNaN: true }),
  tailRadius: fc.double({ min: 0, max: 0.3, noNaN: true }),
  prismatic: fc.double({ min: 0.5, max: 0.75, noNaN: true }),
});

// Gertler's conditions (DTMB Report C-297, 1950), read back from the hull itself.
test('every hull it gives keeps the six conditions, V/(D²L) = Cp π/4 among them', () => {
  let kept = 0;
  fc.assert(
    fc.property(forms, (form) => {
      const outcome = hullOf({ ...base, ...form });
      if (outcome.status !== 'solved') return;
      kept += 1;
      const hull = outcome.value;
      near(hull.volume, ((form.prismatic * Math.PI) / 4) * 4, 1e-11);
      near(hull.radius(form.widest * 4, 0), 0.5, 1e-11);
      for (let i = 0; i <= 100; i += 1) expect(hull.radius(0.04 * i, 0)).toBeLessThanOrEqual(0.5 + 1e-12);
      // Radius of curvature at a tip: r²/(2x) as x → 0; r0 L/D² there.
      near((hull.radius(4e-7, 0) ** 2 / 8e-7) * 4, form.noseRadius, 1e-4);
      const aft = hull.length - 4e-7;
      const tail = (hull.radius(aft, 0) ** 2 / (2 * (hull.length - aft))) * 4;
      expect(Math.abs(tail - form.tailRadius)).toBeLessThan(1e-4);
    }),
  );
  expect(kept).toBeGreaterThan(30);
});

test('a polynomial that would turn negative or swell is refused, and the offered range of Cp is right', () => {
  const form = { ...base, widest: 0.4, noseRadius: 0.5, tailRadius: 0.1 };
  const fat = hullOf({ ...form, prismatic: 0.85 });
  const thin = hullOf({ ...form, prismatic: 0.31 });
  if (fat.status === 'solved' || thin.status === 'solved') throw new Error('must be refused');
  expect(fat.why).toMatch(/swells past the greatest diameter/);
  expect(thin.why).toMatch(/falls to nothing/);
  const [, from, to] = fat.remedy.match(/between \{([\d.]+) ratio\} and \{([\d.]+) ratio\}/)!;
  expect(thin.remedy).toBe(fat.remedy);
  const statusAt = (prismatic: number) => hullOf({ ...form, prismatic }).status;
  expect(statusAt(Number(from) + 1e-4)).toBe('solved');
  expect(statusAt(Number(to) - 1e-4)).toBe('solved');
  expect(statusAt(Number(from) - 1e-4)).toBe('infeasible');
  expect(statusAt(Number(to) + 1e-4)).toBe('infeasible');
});

test('where no Cp would do it says so', () => {
  const outcome = hullOf({ ...base, widest: 0.1, noseRadius: 2, tailRadius: 2, prismatic: 0.6 });
  if (outcome.status === 'solved') throw new Error('must be refused');
  expect(outcome.remedy).toMatch(/^No prismatic coefficient fits/);
});
