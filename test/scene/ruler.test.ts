import fc from 'fast-check';
import { expect, test } from 'vitest';
import { rulerUnit, stationTicks, tapeTicks } from '../../src/scene/ruler.ts';
import { geometry } from './fixture.ts';

const { hull } = geometry();
const systems = fc.constantFrom('metric' as const, 'imperial' as const);
const scales = fc.double({ min: 20, max: 15_000, noNaN: true });

test('ticks lie in the stretch asked for, evenly, and labels have room', () => {
  fc.assert(
    fc.property(scales, systems, (scale, units) => {
      const [from, to] = [-200 / scale, 1200 / scale];
      const ticks = stationTicks(from, to, scale, units);
      const gap = ticks[1]!.at - ticks[0]!.at;
      ticks.forEach(({ at }, i) => {
        expect(at).toBeGreaterThanOrEqual(from - 1e-6 * gap);
        expect(at).toBeLessThanOrEqual(to + 1e-6 * gap);
        if (i > 0) expect((at - ticks[i - 1]!.at) / gap).toBeCloseTo(1, 6);
      });
      const named = ticks.filter(({ label }) => label !== null);
      if (named.length > 1) expect((named[1]!.at - named[0]!.at) * scale).toBeGreaterThan(63.9);
    }),
  );
});

test('a label says where its tick is', () => {
  fc.assert(
    fc.property(scales, systems, (scale, units) => {
      const unit = units === 'metric' ? 1 : 0.0254;
      for (const { at, label } of stationTicks(0, 900 / scale, scale, units)) {
        if (label !== null) expect(Number(label) * unit).toBeCloseTo(at, 9);
      }
    }),
  );
});

test('tape ticks stand where a tape along the skin reaches', () => {
  for (const units of ['metric', 'imperial'] as const) {
    for (const { at, station } of tapeTicks(hull, 0, 240, units)) {
      expect(hull.tapeAt(station, 0)).toBeCloseTo(at, 6);
    }
  }
});

test('metres or inches', () => {
  expect(rulerUnit('metric')).toBe('m');
  expect(rulerUnit('imperial')).toBe('in');
});
