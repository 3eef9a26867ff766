import { expect, test } from 'vitest';
import { built } from './built.ts';
import { near } from './near.ts';

// I. H. Abbott & A. E. von Doenhoff, Theory of Wing Sections (1959), appendix I: half-thickness, per cent of the chord.
const NACA_0012: readonly [number, number][] = [
  [1.25, 1.8939],
  [5, 3.5547],
  [10, 4.6828],
  [30, 6.0017],
  [60, 4.5634],
  [90, 1.4477],
  [95, 0.8066],
  [100, 0.126],
];
const NACA_0018: readonly [number, number][] = [
  [30, 9.0026],
  [60, 6.8451],
  [95, 1.2098],
];

test.each([
  { thickness: 0.12, table: NACA_0012 },
  { thickness: 0.18, table: NACA_0018 },
])('ordinates of the printed table at thickness $thickness', ({ thickness, table }) => {
  const hull = built({ kind: 'naca4', length: 1, diameter: thickness, tail: 'open' });
  // The table rounds to four decimals; its last entries differ from the formula by up to two units there.
  for (const [x, y] of table) expect(Math.abs(100 * hull.radius(x / 100, 0) - y)).toBeLessThan(2e-4);
});

// Computed from the formula (references.md): volume/(D²L) and centroid/L of the body of revolution.
test('volume and CB of the body of revolution, open and closed tail', () => {
  const open = built({ kind: 'naca4', length: 3, diameter: 0.7, tail: 'open' });
  const closed = built({ kind: 'naca4', length: 3, diameter: 0.7, tail: 'closed' });
  near(open.volume / (0.49 * 3), 0.432577, 1.2e-6);
  near(open.cbStation / 3, 0.385303, 1.4e-6);
  near(closed.volume / (0.49 * 3), 0.430302, 1.2e-6);
  near(closed.cbStation / 3, 0.383461, 1.4e-6);
});

test('the open tail ends in a face that counts in area and tape, the closed one in a point', () => {
  const open = built({ kind: 'naca4', length: 2, diameter: 0.5, tail: 'open' });
  const closed = built({ kind: 'naca4', length: 2, diameter: 0.5, tail: 'closed' });
  near(open.radius(2, 0), 5 * 0.5 * 0.0021, 1e-9);
  expect(closed.radius(2, 0)).toBeLessThan(1e-12);
  near(open.seamLength - open.tapeAt(2, 0), 5 * 0.5 * 0.0021, 1e-9);
});
