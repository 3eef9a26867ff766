import fc from 'fast-check';
import { expect, test } from 'vitest';
import { TAIL_HANDLE_PX } from '../../src/scene/grip.ts';
import { frontMargins, sideMargins } from '../../src/scene/margins.ts';

const bare = (pane: { width: number; height: number }) => sideMargins(pane, false);

test('a small pane has smaller margins, never so small that ruler, tape or handle fall off', () => {
  const size = fc.record({
    width: fc.integer({ min: 60, max: 2000 }),
    height: fc.integer({ min: 60, max: 1200 }),
  });
  fc.assert(
    fc.property(size, size, (a, b) => {
      const [small, large] = [
        { width: Math.min(a.width, b.width), height: Math.min(a.height, b.height) },
        { width: Math.max(a.width, b.width), height: Math.max(a.height, b.height) },
      ];
      for (const margins of [bare, frontMargins]) {
        const [of, than] = [margins(small), margins(large)];
        for (const edge of ['left', 'right', 'top', 'bottom'] as const) {
          expect(of[edge]).toBeLessThanOrEqual(than[edge]);
        }
      }
      expect(bare(a).right).toBeGreaterThan(TAIL_HANDLE_PX + 13);
      expect(bare(a).bottom).toBeGreaterThan(24);
      // The ruler's strip, the wedge and half a line of text beside it.
      expect(sideMargins(a, true).bottom).toBeGreaterThanOrEqual(24 + 14 + 8);
    }),
  );
});
