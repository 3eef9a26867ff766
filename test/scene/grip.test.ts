import { expect, test } from 'vitest';
import { sideFigure } from '../../src/scene/figure.ts';
import { fromSide, hardpointPoints, wireLines } from '../../src/scene/flatten.ts';
import {
  DOT_PX,
  gripAt,
  handlesOf,
  type Reachable,
  sameGrip,
  stackAt,
  wireEnds,
} from '../../src/scene/grip.ts';
import {
  distanceToBox,
  distanceToSegment,
  figureAt,
  figuresIn,
  lineAt,
  pointAt,
} from '../../src/scene/hit.ts';
import { FigureCache } from '../../src/scene/keepSame.ts';
import { wireHandles } from '../../src/scene/wireHandle.ts';
import { craft, geometry, wire } from './fixture.ts';

const SCALE = 240;
const of = craft();
const drawn = geometry(of);
const figures = new FigureCache(sideFigure).figures(of, drawn, 1 / SCALE);
const lines = wireLines(drawn.wires, fromSide);
const things = (selection: Reachable['selection'] = []): Reachable => ({
  geometry: drawn,
  figures,
  lines,
  hardpoints: hardpointPoints(drawn, fromSide),
  support: { u: 2.4, z: -0.7 },
  selection,
  wireHandles: wireHandles(
    { craft: of, lines, figures },
    selection.filter(({ kind }) => kind === 'wire').map(({ id }) => id),
    SCALE,
  ),
  thrust: [],
});
const middleOf = (id: string) => figures.find(({ part }) => part === id)!.middle;

test('each thing can be taken where it is drawn', () => {
  const at = (point: { u: number; z: number }) => gripAt(things(), point, SCALE, 5);
  expect(at(middleOf('battery'))).toEqual({ kind: 'part', id: 'battery', copy: 0 });
  expect(at({ u: 0.06, z: 0 })).toEqual({ kind: 'hardpoint', id: 'nose' });
  expect(at(handlesOf(drawn, SCALE, []).tail)).toEqual({ kind: 'hull', end: 'tail' });
  expect(at(handlesOf(drawn, SCALE, []).waist)).toEqual({ kind: 'hull', end: 'waist' });
  const along = lines[0]!.at.find(({ u }) => u > 2 && u < 2.2)!;
  expect(at(along)).toEqual({ kind: 'wire', id: 'power' });
  expect(at({ u: 2.4, z: -0.69 })).toEqual({ kind: 'support' });
  expect(at({ u: 1.2, z: 0.2 })).toBeNull();
});

const POWER = { kind: 'wire', id: 'power' } as const;

test('the handle of a wire end stands off its part: the part is taken on itself, the end on its dot', () => {
  const [from, to] = things([POWER]).wireHandles;
  const { box } = figures.find(({ part }) => part === 'battery')!;
  expect(distanceToBox(from!.at, box) * SCALE).toBeGreaterThan(DOT_PX + 5);
  expect(distanceToBox(from!.at, box) * SCALE).toBeLessThan(30);
  expect(from!.end).toEqual(wireEnds(lines, 'power')!.from);
  const take = (point: { u: number; z: number }) => gripAt(things([POWER]), point, SCALE, 5);
  expect(take(from!.at)).toEqual({ kind: 'wireEnd', id: 'power', side: 'from' });
  expect(take(to!.at)).toEqual({ kind: 'wireEnd', id: 'power', side: 'to' });
  for (const u of [box.left, (box.left + box.right) / 2, box.right]) {
    for (const z of [box.bottom, (box.bottom + box.top) / 2, box.top]) {
      expect(take({ u, z })).toEqual({ kind: 'part', id: 'battery', copy: 0 });
    }
  }
});

test('a handle at a loose end is on it, and no handle passes the middle of its run', () => {
  const loose = { kind: 'loose', place: { kind: 'skin', station: 2, clock: Math.PI, standoff: 0 } } as const;
  const run = craft(undefined, [wire('power', { to: loose })]);
  const at = geometry(run);
  const runs = wireLines(at.wires, fromSide);
  const big = figures.map((figure) => ({ ...figure, box: { left: 0, right: 3, bottom: -1, top: 1 } }));
  const [from, to] = wireHandles({ craft: run, lines: runs, figures: big }, ['power'], SCALE);
  expect(to!.at).toEqual(to!.end);
  expect(from!.at.u).toBeLessThan((from!.end.u + to!.end.u) / 2);
});

test('what is selected wins within its brackets over what is smaller or nearer; all else keeps its order', () => {
  const { u, z } = middleOf('battery');
  const around = { left: u - 0.3, right: u + 0.3, bottom: z - 0.1, top: z + 0.1 };
  const pod = { ...figures[0]!, part: 'pod', copy: 0, box: around };
  const all = (selection: Reachable['selection']) => ({ ...things(selection), figures: [...figures, pod] });
  const point = { u, z };
  expect(gripAt(all([]), point, SCALE, 5)).toMatchObject({ id: 'battery' });
  const chosen = [{ kind: 'part', id: 'pod' }] as const;
  expect(gripAt(all(chosen), point, SCALE, 5)).toMatchObject({ id: 'pod' });
  expect(gripAt(all(chosen), { u: around.right + 4.9 / SCALE, z }, SCALE, 5)).toMatchObject({ id: 'pod' });
  expect(stackAt(all(chosen), point, SCALE, 5).map(({ id }) => id)).toEqual(['battery', 'pod', 'power']);
});

test('handles have a target of at least 32 px across', () => {
  const { tail } = handlesOf(drawn, SCALE, []);
  for (const [du, dz] of [
    [15.9, 0],
    [0, 15.9],
    [0, -15.9],
  ] as const) {
    expect(gripAt(things(), { u: tail.u + du / SCALE, z: tail.z + dz / SCALE }, SCALE, 5)).toMatchObject({
      kind: 'hull',
    });
  }
});

test('a fingertip reaches farther than a pointer, and no farther than its slop', () => {
  const { right, top, bottom } = figures.find(({ part }) => part === 'camera')!.box;
  const beside = { u: right + 12 / SCALE, z: (top + bottom) / 2 };
  expect(figureAt(figures, beside, 5 / SCALE)).toBeNull();
  expect(figureAt(figures, beside, 18 / SCALE)?.part).toBe('camera');
});

test('of two figures on one spot the smaller is taken', () => {
  const [big, small] = [
    figures[0]!,
    { ...figures[0]!, part: 'small', box: { left: 2.89, right: 2.91, bottom: -0.01, top: 0.01 } },
  ];
  for (const order of [
    [big, small],
    [small, big],
  ]) {
    expect(figureAt(order, { u: 2.9, z: 0 }, 0)?.part).toBe('small');
  }
});

test('distances', () => {
  expect(distanceToBox({ u: 4, z: 5 }, { left: 0, right: 1, bottom: 0, top: 1 })).toBe(5);
  expect(distanceToSegment({ u: 1, z: 2 }, { u: 0, z: 0 }, { u: 4, z: 0 })).toBe(2);
  expect(distanceToSegment({ u: -3, z: 4 }, { u: 0, z: 0 }, { u: 4, z: 0 })).toBe(5);
  expect(pointAt([{ id: 'a', at: { u: 0, z: 0 } }], { u: 1, z: 0 }, 0.5)).toBeNull();
  expect(
    lineAt(
      [
        {
          id: 'a',
          at: [
            { u: 0, z: 0 },
            { u: 1, z: 0 },
          ],
        },
      ],
      { u: 0.5, z: 0.2 },
      0.3,
    ),
  ).toBe('a');
});

test('a box catches the figures whose middle it holds', () => {
  const { u, z } = middleOf('battery');
  const caught = figuresIn(figures, { left: u - 0.01, right: u + 0.01, bottom: z - 0.01, top: z + 0.01 });
  expect(caught.map(({ part }) => part)).toEqual(['battery']);
});

test('grips are the same when they take the same', () => {
  expect(sameGrip({ kind: 'wire', id: 'a' }, { kind: 'wire', id: 'a' })).toBe(true);
  expect(sameGrip({ kind: 'wire', id: 'a' }, { kind: 'part', id: 'a', copy: 0 })).toBe(false);
  expect(sameGrip(null, { kind: 'wire', id: 'a' })).toBe(false);
  expect(sameGrip(null, null)).toBe(true);
});

test('the handle of the length keeps clear of arrows of thrust at the tail, and stays where it is without', () => {
  const { length } = drawn.hull;
  const arrow = (px: number, angle: number) => {
    const at = { u: length + px / SCALE, z: 0 };
    const out = (far: number) => ({
      u: at.u - (far * Math.cos(angle)) / SCALE,
      z: (far * Math.sin(angle)) / SCALE,
    });
    return { part: 't', copy: 0, way: 'pitch' as const, at, tip: out(60), angle, handle: out(72) };
  };
  const plain = handlesOf(drawn, SCALE, []).tail;
  for (const angle of [0, 0.5, Math.PI / 2, -Math.PI / 2, -0.7, Math.PI]) {
    for (const px of [0, 20, 60, 90]) {
      const mark = arrow(px, angle);
      const { tail } = handlesOf(drawn, SCALE, [mark]);
      expect(distanceToSegment(tail, mark.at, mark.handle) * SCALE).toBeGreaterThanOrEqual(29.9);
    }
  }
  expect(handlesOf(drawn, SCALE, [arrow(-60, 0)]).tail).toEqual(plain);
});
