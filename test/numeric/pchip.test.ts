import fc from 'fast-check';
import { expect, test } from 'vitest';
import { pchip } from '../../src/numeric/pchip.ts';

const step = fc.double({ min: 0.01, max: 5, noNaN: true });
const rise = fc.double({ min: -5, max: 5, noNaN: true });
const points = fc
  .array(fc.tuple(step, rise), { minLength: 2, maxLength: 12 })
  .map((list) => ({ xs: runningSum(list.map(([h]) => h)), ys: list.map(([, y]) => y) }));

function runningSum(steps: readonly number[]): number[] {
  let sum = 0;
  return steps.map((h) => {
    sum += h;
    return sum;
  });
}

const eachPiece = (xs: readonly number[], visit: (i: number, x: number) => void) => {
  for (let i = 0; i + 1 < xs.length; i += 1) {
    for (let k = 0; k <= 20; k += 1) visit(i, xs[i]! + ((xs[i + 1]! - xs[i]!) * k) / 20);
  }
};

test('it passes through its points and never leaves the band between two neighbours', () => {
  fc.assert(
    fc.property(points, ({ xs, ys }) => {
      const curve = pchip(xs, ys);
      xs.forEach((x, i) => {
        expect(curve.at(x)).toBeCloseTo(ys[i]!, 12);
      });
      eachPiece(xs, (i, x) => {
        expect(curve.at(x)).toBeGreaterThanOrEqual(Math.min(ys[i]!, ys[i + 1]!) - 1e-12);
        expect(curve.at(x)).toBeLessThanOrEqual(Math.max(ys[i]!, ys[i + 1]!) + 1e-12);
      });
    }),
  );
});

test('on each piece it is monotone: the slope has the sign of the secant', () => {
  fc.assert(
    fc.property(points, ({ xs, ys }) => {
      const curve = pchip(xs, ys);
      const steepest = Math.max(...xs.slice(1).map((x, i) => Math.abs((ys[i + 1]! - ys[i]!) / (x - xs[i]!))));
      eachPiece(xs, (i, x) => {
        // On a shared point the slope belongs to both pieces and is 0 where they disagree.
        const sign = Math.sign(ys[i + 1]! - ys[i]!);
        if (x < xs[i + 1]!) expect(curve.slope(x) * sign).toBeGreaterThanOrEqual(-1e-12 * (1 + steepest));
      });
    }),
  );
});

test('straight lines are exact, value and slope', () => {
  fc.assert(
    fc.property(points, rise, rise, ({ xs }, a, b) => {
      const curve = pchip(
        xs,
        xs.map((x) => a + b * x),
      );
      eachPiece(xs, (_, x) => {
        expect(curve.at(x)).toBeCloseTo(a + b * x, 9);
        expect(curve.slope(x)).toBeCloseTo(b, 9);
      });
    }),
  );
});

test('the slope is continuous across the points and is the derivative between them', () => {
  const curve = pchip([0, 1, 1.5, 4, 5], [0, 2, 2.1, 3, 0.5]);
  for (const x of [1, 1.5, 4]) {
    expect(curve.slope(x - 1e-9)).toBeCloseTo(curve.slope(x + 1e-9), 6);
  }
  for (const x of [0.3, 1.2, 2.7, 4.4]) {
    expect((curve.at(x + 1e-6) - curve.at(x - 1e-6)) / 2e-6).toBeCloseTo(curve.slope(x), 7);
  }
});

test('mirrored data give the mirrored curve', () => {
  fc.assert(
    fc.property(points, ({ xs, ys }) => {
      const curve = pchip(xs, ys);
      const mirrored = pchip(xs.map((x) => -x).reverse(), [...ys].reverse());
      eachPiece(xs, (_, x) => {
        expect(mirrored.at(-x)).toBeCloseTo(curve.at(x), 10);
      });
    }),
  );
});

test('a smooth monotone function is met with an error falling at least as h³ where no limit acts', () => {
  const worst = (n: number) => {
    const xs = Array.from({ length: n + 1 }, (_, i) => i / n);
    const curve = pchip(xs, xs.map(Math.exp));
    return Math.max(
      ...Array.from({ length: 997 }, (_, i) => Math.abs(curve.at(i / 997) - Math.exp(i / 997))),
    );
  };
  expect(worst(10) / worst(20)).toBeGreaterThan(7);
});

test('outside its points the end value holds; unusable points are refused', () => {
  const curve = pchip([1, 2], [5, 7]);
  expect([curve.at(0), curve.at(3), curve.slope(0), curve.slope(3)]).toEqual([5, 7, 0, 0]);
  expect(() => pchip([1], [1])).toThrow(RangeError);
  expect(() => pchip([1, 1], [1, 2])).toThrow(RangeError);
  expect(() => pchip([0, 1, Number.NaN], [1, 2, 3])).toThrow(RangeError);
});
