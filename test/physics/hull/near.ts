import { expect } from 'vitest';

/** Equal to within a share of the wanted value (of 1e-12 when that is 0). */
export const near = (found: number, wanted: number, relative = 1e-12): void =>
  expect(Math.abs(found - wanted)).toBeLessThanOrEqual(relative * Math.max(Math.abs(wanted), 1e-12));
