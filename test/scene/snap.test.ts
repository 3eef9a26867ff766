import fc from 'fast-check';
import { expect, test } from 'vitest';
import { keyOf } from '../../src/scene/grip.ts';
import { clockRule, clockTargets, snapped, stationRule, stationTargets } from '../../src/scene/snap.ts';
import { craft, geometry } from './fixture.ts';

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const targets = fc.array(fc.record({ at: number(0, 3), label: fc.constant('x') }), { maxLength: 20 });
const rules = fc.record({ tolerance: number(0, 0.1), grid: number(0.001, 0.2), suspended: fc.boolean() });

test('nothing is drawn farther than the tolerance, and what it names is where it went', () => {
  fc.assert(
    fc.property(number(0, 3), targets, rules, (value, all, rule) => {
      const result = snapped(value, all, rule);
      expect(Math.abs(result.value - value)).toBeLessThanOrEqual(rule.tolerance);
      if (result.to) expect(result.value).toBe(result.to.at);
      if (rule.suspended) expect(result).toEqual({ value, to: null });
    }),
  );
});

test('of several targets the nearest wins, and any of them before the grid', () => {
  const all = [
    { at: 1.02, label: 'far' },
    { at: 1.004, label: 'near' },
  ];
  const rule = { tolerance: 0.03, grid: 0.01, suspended: false };
  expect(snapped(1.001, all, rule)).toEqual({ value: 1.004, to: all[1] });
  expect(snapped(2.013, all, rule).value).toBeCloseTo(2.01, 12);
});

test('whole centimetres or quarter inches, within seven pixels', () => {
  expect(stationRule(700, 'metric', false)).toEqual({ tolerance: 0.01, grid: 0.01, suspended: false });
  // 1 in = 25.4 mm exactly (international yard and pound, 1959)
  expect(stationRule(700, 'imperial', true).grid).toBeCloseTo(0.0254 / 4, 15);
});

test('stations of other things are targets, those in hand are not, by kind and id', () => {
  const of = craft();
  const labels = (moving: string[]) =>
    stationTargets(of, geometry(of), new Set(moving)).map(({ label }) => label);
  expect(labels([])).toEqual(['CB', 'thruster', 'battery', 'gondola', 'camera', 'fins', 'motors', 'Nose']);
  expect(labels([keyOf('part', 'battery')])).not.toContain('battery');
  expect(labels([keyOf('wire', 'battery')])).toContain('battery');
});

test('clock angles snap every 15° and to other parts on the skin', () => {
  const all = clockTargets(craft(), new Set());
  const near = (clock: number) => snapped(clock, all, clockRule(240, 0.5, false));
  expect(near(Math.PI / 2 + 0.01).value).toBeCloseTo(Math.PI / 2, 12);
  expect(near(2.01).to?.label).toBe('motors');
});
