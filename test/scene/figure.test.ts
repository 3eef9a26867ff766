import { expect, test } from 'vitest';
import { firstThruster } from '../../src/craft/firstFigures.ts';
import { PART_KINDS } from '../../src/craft/schema.ts';
import { aboutGrip } from '../../src/scene/about.ts';
import { aboveFigure, apparentSize, frontFigure, LEAST_PX, sideFigure } from '../../src/scene/figure.ts';
import { keelAt } from '../../src/scene/outline.ts';
import { sideReadout } from '../../src/scene/readout.ts';
import { craft, geometry, part, subject } from './fixture.ts';

const PX = 1 / 400;

const figuresOf = (parts: Parameters<typeof craft>[0], make = sideFigure, px = PX) => {
  const of = craft(parts, []);
  const { pieces, hull } = geometry(of);
  return pieces.map((piece) => make(of.parts.byId[piece.part]!, piece, hull, px));
};

test.each(PART_KINDS)(
  'a %s on the axis is drawn at its true size and place, from the side and from astern',
  (kind) => {
    const size = { length: 0.2, width: 0.1, height: 0.12 };
    const one = part('one', { kind: 'axis', station: 1.1 }, { kind, size });
    const [side] = figuresOf([one]);
    expect(side!.box.left).toBeCloseTo(1, 9);
    expect(side!.box.right).toBeCloseTo(1.2, 9);
    expect(side!.box.top - side!.box.bottom).toBeCloseTo(0.12, 2);
    expect(side!.enlarged).toBe(false);
    const [front] = figuresOf([one], frontFigure);
    expect(front!.box.right - front!.box.left).toBeCloseTo(0.1, 9);
    expect(front!.box.top).toBeCloseTo(0.06, 9);
  },
);

test('a speck is drawn as large as a fingertip can find, says so, and keeps its middle', () => {
  const speck = part(
    'speck',
    { kind: 'axis', station: 1 },
    { size: { length: 0.001, width: 0.001, height: 0.001 } },
  );
  const [figure] = figuresOf([speck]);
  expect(figure!.enlarged).toBe(true);
  expect((figure!.box.right - figure!.box.left) / PX).toBeCloseTo(LEAST_PX, 6);
  expect((figure!.box.left + figure!.box.right) / 2).toBeCloseTo(1, 9);
  expect(apparentSize(0, 0, PX).across).toBeCloseTo(LEAST_PX * PX, 12);
});

test('what hangs below the keel is tied to it by an upright line from its top, a gondola by two', () => {
  const [battery, gondola, touching] = figuresOf([
    part('battery', { kind: 'keel', station: 1.2, drop: 0.1 }, { kind: 'battery' }),
    part('gondola', { kind: 'keel', station: 1.5, drop: 0.1 }, { kind: 'gondola' }),
    part('touching', { kind: 'keel', station: 1.5, drop: 0 }),
  ]);
  const { hull } = geometry();
  expect(battery!.struts).toHaveLength(1);
  const [keel, top] = battery!.struts[0]!;
  expect(keel).toEqual({ u: 1.2, z: keelAt(hull, 1.2) });
  expect(top!.z).toBeCloseTo(battery!.box.top, 9);
  expect(gondola!.struts).toHaveLength(2);
  expect(touching!.struts).toEqual([]);
});

test('a fin stands on the skin: its root on the outline, its tip its span beyond', () => {
  const size = { length: 0.3, width: 0.004, height: 0.2 };
  const fin = part('fin', { kind: 'skin', station: 2.4, clock: 0, standoff: 0.1 }, { kind: 'fin', size });
  const { hull } = geometry();
  const [plate] = figuresOf([fin])[0]!.paths;
  const root = plate!.points.slice(0, 9);
  for (const { u, z } of root) expect(z).toBeCloseTo(hull.radius(u, 0), 9);
  expect(Math.max(...plate!.points.map(({ z }) => z))).toBeCloseTo(hull.radius(2.4, 0) + 0.2, 9);
});

test('three fins at 120° are seen under their clock angles, two on one side of the eye', () => {
  const fins = figuresOf(undefined).filter(({ part: id }) => id === 'fins');
  expect(fins).toHaveLength(3);
  const tips = fins.map(({ box }) => Math.max(Math.abs(box.top), Math.abs(box.bottom)));
  expect(tips[1]! / tips[0]!).toBeCloseTo(0.5, 6);
  expect(fins.map(({ far }) => far)).toEqual([false, true, false]);
});

test('a thruster is drawn as wide as its propeller, a fin as large as its outline, whatever their boxes', () => {
  const box = { length: 0.1, width: 0.05, height: 0.05 };
  const place = { kind: 'axis', station: 1 } as const;
  const propeller = part('a', place, {
    kind: 'thruster',
    size: box,
    thruster: { ...firstThruster(box), diameter: 0.3 },
  });
  const [side, front] = [sideFigure, frontFigure].map((make) => figuresOf([propeller], make)[0]!.box);
  expect(side!.top - side!.bottom).toBeCloseTo(0.3, 9);
  expect(side!.right - side!.left).toBeCloseTo(0.1, 9);
  expect(front!.right - front!.left).toBeCloseTo(0.3, 9);
  // 0.06 m² at an aspect ratio of 1.5: 0.3 m out, 0.2 m along.
  const fin = part('b', place, { kind: 'fin', size: box, fin: { area: 0.06, aspectRatio: 1.5 } });
  const [outline] = figuresOf([fin]);
  expect(outline!.box.top - outline!.box.bottom).toBeCloseTo(0.3, 9);
  expect(outline!.box.right - outline!.box.left).toBeCloseTo(0.2, 9);
});

test('a propeller inside the hull is drawn as amiss and says so in the notes, one beside it is not', () => {
  const motor = { kind: 'thruster' as const, thruster: firstThruster({ width: 0.2, height: 0.2 }) };
  const parts = [
    part('inside', { kind: 'axis', station: 1.4 }, motor),
    part('beyond', { kind: 'keel', station: 1.4, drop: 0.2 }, motor),
    part('load', { kind: 'axis', station: 1.4 }),
  ];
  for (const make of [sideFigure, frontFigure, aboveFigure]) {
    expect(figuresOf(parts, make).map(({ amiss }) => amiss)).toEqual([true, false, false]);
  }
  const lines = (id: string) => [
    ...aboutGrip(subject(craft(parts, [])), { kind: 'part', id, copy: 0 })!.lines,
    ...sideReadout(subject(craft(parts, [])), { kind: 'part', id, copy: 0 })!.lines,
  ];
  const said = (id: string) => lines(id).filter((line) => line.includes('into the hull'));
  expect(said('inside')).toHaveLength(2);
  expect(said('beyond')).toEqual([]);
});
