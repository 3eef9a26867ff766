import { expect, test } from 'vitest';
import { shapeAs } from '../../src/edit/shapeAs.ts';
import { valueOrNull } from '../../src/numeric/outcome.ts';
import { hullOf } from '../../src/physics/hull/hullOf.ts';
import { keelOutline } from '../../src/report/outline.ts';
import { benchShapes } from '../bench/shapes.ts';

const smooth = ['spheroid', 'twoSpheroid', 'naca4', 'series58', 'cylinder'] as const;

test.each(smooth)('a %s traced as offsets and as flat patterns keeps its volume and CB to 1 %%', (kind) => {
  const hull = valueOrNull(hullOf(benchShapes[kind]))!;
  for (const to of ['offsets', 'gores', 'twoSheet'] as const) {
    const traced = valueOrNull(hullOf(shapeAs(to, benchShapes[kind], keelOutline(hull))))!;
    expect(Math.abs(traced.volume / hull.volume - 1)).toBeLessThan(0.01);
    expect(Math.abs(traced.cbStation - hull.cbStation)).toBeLessThan(0.01 * hull.length);
  }
});
