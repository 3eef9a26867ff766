import fc from 'fast-check';
import { expect, test } from 'vitest';
import { pchip } from '../../../src/numeric/pchip.ts';
import { heightAt, piecesOf, slopeAt } from '../../../src/physics/hull/cubicPiece.ts';
import { type OutlinePiece, tautOutline } from '../../../src/physics/hull/tautOutline.ts';

const patterns = fc
  .array(
    fc.record({
      step: fc.double({ min: 0.02, max: 1, noNaN: true }),
      r: fc.double({ min: 0.01, max: 1.5, noNaN: true }),
    }),
    { minLength: 3, maxLength: 10 },
  )
  .map((rows) => {
    let s = 0;
    const xs = rows.map(({ step }, i) => {
      if (i > 0) s += step;
      return s;
    });
    return pchip(
      xs,
      rows.map(({ r }) => r),
    );
  });

const radiusAt = (outline: readonly OutlinePiece[], s: number): number =>
  heightAt(outline.find(({ to }) => s <= to) ?? outline.at(-1)!, s);

// The definition itself, by brute force over a fine grid.
test.each(['closed', 'open'] as const)(
  'it is the greatest outline no steeper than the tape, ends %s',
  (ends) => {
    fc.assert(
      fc.property(patterns, (pattern) => {
        const outline = tautOutline(piecesOf(pattern), ends);
        const whole = pattern.xs.at(-1)!;
        const n = 600;
        const grid = Array.from({ length: n + 1 }, (_, i) => (whole * i) / n);
        // A dip between two knots may be narrower than a step of the grid; its foot is at a knot.
        const looked = [...grid, ...pattern.xs];
        const heights = looked.map((s) => pattern.at(s));
        for (let i = 0; i <= n; i += 20) {
          const s = grid[i]!;
          let least = ends === 'closed' ? Math.min(s, whole - s) : Number.POSITIVE_INFINITY;
          heights.forEach((height, j) => {
            least = Math.min(least, height + Math.abs(s - looked[j]!));
          });
          // The grid sees the minimum to within a few of its steps.
          const found = radiusAt(outline, s);
          expect(found).toBeLessThanOrEqual(least + 1e-9);
          expect(found).toBeGreaterThanOrEqual(least - (5 * whole) / n);
        }
      }),
      { numRuns: 200 },
    );
  },
);

test('its pieces join without gaps or jumps, keep to slopes of 1, and are marked slack off the pattern', () => {
  fc.assert(
    fc.property(patterns, (pattern) => {
      const outline = tautOutline(piecesOf(pattern), 'closed');
      const whole = pattern.xs.at(-1)!;
      expect(outline[0]!.from).toBeCloseTo(0, 12);
      expect(outline.at(-1)!.to).toBeCloseTo(whole, 12);
      outline.forEach((piece, i) => {
        const next = outline[i + 1];
        if (next) {
          expect(next.from).toBeCloseTo(piece.to, 12);
          expect(heightAt(next, next.from)).toBeCloseTo(heightAt(piece, piece.to), 9);
        }
        for (let k = 0; k <= 10; k += 1) {
          const s = piece.from + ((piece.to - piece.from) * k) / 10;
          expect(Math.abs(slopeAt(piece, s))).toBeLessThanOrEqual(1 + 1e-6);
          if (!piece.slack) expect(heightAt(piece, s)).toBeCloseTo(pattern.at(s), 9);
        }
      });
    }),
    { numRuns: 300 },
  );
});
