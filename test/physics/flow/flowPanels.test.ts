import { expect, test } from 'vitest';
import type { HullShape } from '../../../src/craft/hullSchema.ts';
import { type FlowPanel, flowPanel, powerSum, samplePlaces } from '../../../src/physics/flow/flowPanel.ts';
import { flowPanels } from '../../../src/physics/flow/flowPanels.ts';
import { benchShapes } from '../../bench/shapes.ts';
import { built } from '../hull/built.ts';
import { nameOf, SHAPES } from '../hull/shapes.ts';

const end = ({ xs, rs }: FlowPanel, t: number) => ({ x: powerSum(xs, t), r: powerSum(rs, t) });

test('a panel through points of an arc lies on the arc, with its length and directions', () => {
  const angle = (t: number) => 0.6 + 0.3 * t;
  const panel = flowPanel(
    samplePlaces.map((t) => -Math.cos(angle(t))),
    samplePlaces.map((t) => Math.sin(angle(t))),
  );
  expect(2 * panel.reach).toBeCloseTo(0.6, 9);
  for (const { t, x, r, tangent, normal } of panel.nodes) {
    expect(Math.hypot(x, r)).toBeCloseTo(1, 9);
    expect(normal.x).toBeCloseTo(x, 7);
    expect(normal.r).toBeCloseTo(r, 7);
    expect(tangent.x).toBeCloseTo(Math.sin(angle(t)), 7);
    expect(tangent.x * normal.x + tangent.r * normal.r).toBeCloseTo(0, 12);
  }
});

const every: [string, HullShape][] = [
  ...Object.entries(benchShapes),
  ...SHAPES.map((shape): [string, HullShape] => [nameOf(shape), shape]),
];

test.each(every)('%s: panels join from tip to tip and enclose the volume of the hull', (_, shape) => {
  const hull = built(shape);
  const panels = flowPanels(hull, 1);
  const [first, last] = [end(panels[0]!, -1), end(panels.at(-1)!, 1)];
  expect(first.r).toBeCloseTo(0, 9);
  expect(first.x).toBeCloseTo(0, 9);
  expect(last.r).toBeCloseTo(0, 9);
  expect(last.x).toBeCloseTo(hull.length, 9);
  panels.slice(1).forEach((panel, i) => {
    const [before, here] = [end(panels[i]!, 1), end(panel, -1)];
    expect(Math.hypot(here.x - before.x, here.r - before.r)).toBeLessThan(1e-8 * hull.length);
  });
  const volume = panels
    .flatMap(({ nodes }) => nodes)
    .reduce((sum, { r, ds, tangent }) => sum + Math.PI * r * r * ds * tangent.x, 0);
  expect(Math.abs(volume / hull.volume - 1)).toBeLessThan(5e-4);
});

test('panels are short beside a corner and long along a straight side', () => {
  const panels = flowPanels(
    built({
      kind: 'cylinder',
      diameter: 1,
      noseEnd: 'flat',
      noseLength: 0,
      middleLength: 10,
      tailEnd: 'cone',
      tailLength: 2,
    }),
    1,
  );
  const nearest = (x: number, r: number) =>
    panels.reduce((best, each) =>
      Math.hypot(each.x - x, each.r - r) < Math.hypot(best.x - x, best.r - r) ? each : best,
    );
  for (const [x, r] of [
    [0, 0.5],
    [10, 0.5],
    [12, 0],
  ] as const)
    expect(nearest(x, r).reach).toBeLessThan(0.3 * nearest(5, 0.5).reach);
});
