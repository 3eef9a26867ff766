import { beforeAll, expect, test } from 'vitest';
import type { Craft } from '../../src/craft/craft.ts';
import { infeasible } from '../../src/numeric/outcome.ts';
import { craftStateOf } from '../../src/physics/craftState.ts';
import { turnOf } from '../../src/physics/turning/turn.ts';
import { assess } from '../../src/report/assess.ts';
import { geometryOf } from '../../src/scene/subject.ts';
import {
  durationOf,
  ghostsOf,
  layTurn,
  pathOf,
  placedAt,
  runInWords,
  runsOf,
  sailorOf,
  standAt,
  standFigures,
  type Track,
  type Turn,
  thrustAt,
} from '../../src/scene/turnPath.ts';
import { toScreen } from '../../src/scene/view.ts';
import { DEGREE, pairCraft, tailCraft } from '../report/turning/turningCrafts.ts';

/** A quarter circle of radius 2 m to starboard in 4 s, at an even rate. */
const RADIUS = 2;
const circle = (count = 81): Track => {
  const share = Array.from({ length: count }, (_, i) => i / (count - 1));
  const heading = share.map((s) => (s * Math.PI) / 2);
  const speed = (RADIUS * Math.PI) / 8;
  return {
    time: share.map((s) => 4 * s),
    x: heading.map((h) => RADIUS * Math.sin(h)),
    y: heading.map((h) => RADIUS * (1 - Math.cos(h))),
    heading,
    u: share.map(() => speed),
    v: share.map(() => 0),
    r: share.map(() => Math.PI / 8),
    vector: share.map((s) => -0.5 * s),
    thrusters: [{ share: 1, angles: share.map((s) => -0.5 * s) }],
  };
};

const turnFor = (craft: Craft): Turn => {
  const state = craftStateOf(craft);
  if (state.status === 'infeasible') throw new Error(state.why);
  const turn = turnOf(state.value, { throttle: 1, vector: null, speed: null });
  if (turn.status === 'infeasible') throw new Error(turn.why);
  return turn.value;
};
const sailorFor = (craft: Craft) => sailorOf(geometryOf(assess(craft))!);

let tail: Turn;
let pair: Turn;
beforeAll(() => {
  tail = turnFor(tailCraft());
  pair = turnFor(pairCraft());
});

test('a moment lies between the points of the track, and never beyond its ends', () => {
  const track = circle();
  const half = standAt(track, 2);
  expect(half.at.u).toBeCloseTo(RADIUS * (1 - Math.SQRT1_2), 9);
  expect(half.at.z).toBeCloseTo(RADIUS * Math.SQRT1_2, 9);
  expect(half.thrusters[0]!.angle).toBeCloseTo(-0.25, 9);
  const coarse = standAt(circle(3), 1);
  expect(coarse.heading).toBeCloseTo(Math.PI / 8, 9);
  expect(standAt(track, -1)).toEqual(standAt(track, 0));
  expect(standAt(track, 99)).toEqual(standAt(track, 4));
  expect(standAt(track, 1.3).speed).toBeCloseTo((RADIUS * Math.PI) / 8, 9);
});

test('the craft lies along its heading: the nose ahead of the CB, to starboard once turned there', () => {
  const at = { u: 3, z: 5 };
  expect(placedAt({ at, heading: 0 }, { u: 0.2, z: 1 })).toEqual({ u: 3.2, z: 6 });
  const east = placedAt({ at, heading: Math.PI / 2 }, { u: 0.2, z: 1 });
  expect(east.u).toBeCloseTo(4, 12);
  expect(east.z).toBeCloseTo(4.8, 12);
  const { nose, outline } = sailorFor(tailCraft());
  expect(nose).toEqual({ u: 0, z: expect.closeTo(1.5, 9) });
  expect(Math.max(...outline.map(({ z }) => z))).toBeCloseTo(1.5, 9);
});

test('there is a ghost at both ends and at every 30° between', () => {
  const headings = ghostsOf(circle()).map(({ heading }) => heading / DEGREE);
  for (const [i, wanted] of [0, 30, 60, 90, 90].entries()) {
    expect(Math.abs(headings[i]! - wanted)).toBeLessThan(90 / 80);
  }
  expect(headings).toHaveLength(5);
  const straight: Track = { ...circle(), heading: circle().heading.map(() => 0.2) };
  expect(ghostsOf(straight)).toHaveLength(2);
});

test('the page shows the whole path and every ghost, ahead at the start up, with a bar of a round length', () => {
  const track = circle();
  const size = { width: 340, height: 260 };
  for (const units of ['metric', 'imperial'] as const) {
    const { view, path, ghosts, bar } = layTurn(track, null, sailorFor(tailCraft()), size, units)!;
    for (const point of [...path, ...ghosts.flat()]) {
      const { x, y } = toScreen(view, point);
      expect(x).toBeGreaterThan(0);
      expect(x).toBeLessThan(size.width);
      expect(y).toBeGreaterThan(0);
      expect(y).toBeLessThan(size.height);
    }
    const [start, end] = [toScreen(view, path[0]!), toScreen(view, path.at(-1)!)];
    expect(end.y).toBeLessThan(start.y);
    expect(end.x).toBeGreaterThan(start.x);
    const [, number, unit] = /^([\d.]+) (m|in)$/.exec(bar.words)!;
    const metres = Number(number) * (unit === 'm' ? 1 : 0.0254);
    expect(bar.px).toBeCloseTo(metres * view.scale, 6);
    expect(bar.px).toBeGreaterThan(50);
    expect(bar.px).toBeLessThan(200);
  }
  expect(layTurn(track, null, sailorFor(tailCraft()), { width: 0, height: 260 }, 'metric')).toBeNull();
});

test('a turn from the physics is laid as it is told: hardest to starboard ends 90° to starboard', () => {
  const [rest, cruise, stop] = runsOf(tail, 'metric') as [Run, Run, Run];
  for (const run of [rest, cruise]) {
    expect(standAt(run.track!, durationOf(run.track!)).heading / DEGREE).toBeCloseTo(90, 3);
  }
  const last = pathOf(cruise.track!).at(-1)!;
  const first = pathOf(stop.track!)[0]!;
  expect(Math.hypot(last.u - first.u, last.z - first.z)).toBeLessThan(1e-9);
  expect(stop.before).toBe(cruise.track);
  expect(standAt(stop.track!, durationOf(stop.track!)).yawRate).toBeCloseTo(0, 6);
});

type Run = ReturnType<typeof runsOf>[number];

test('at the tail thrust turned to port points to port of the hull; of a pair the starboard one pushes back', () => {
  const [{ track }] = runsOf(tail, 'metric') as [Run];
  const end = standAt(track!, 1);
  const [arrow] = thrustAt(sailorFor(tailCraft()), { ...end, heading: 0 }, 0.5);
  expect(arrow!.tip.u).toBeLessThan(arrow!.at.u);
  expect(Math.hypot(arrow!.tip.u - arrow!.at.u, arrow!.tip.z - arrow!.at.z)).toBeCloseTo(0.5, 9);

  const [{ track: turning }] = runsOf(pair, 'metric') as [Run];
  const arrows = thrustAt(sailorFor(pairCraft()), { ...standAt(turning!, 0), heading: 0 }, 0.5);
  const by = (side: -1 | 1) => arrows.find(({ at }) => Math.sign(at.u) === side)!;
  expect(by(-1).tip.z - by(-1).at.z).toBeCloseTo(0.5, 9);
  expect(by(1).tip.z - by(1).at.z).toBeCloseTo(-0.5 * 0.6, 9);
});

test('what cannot be turned says why instead', () => {
  const fromRest = infeasible('It yaws only {0.5236 angle}.', 'Let a thruster turn in yaw.');
  const [rest] = runsOf({ ...tail, fromRest }, 'metric') as [Run];
  expect(rest).toMatchObject({ track: null, why: 'It yaws only 30.0°. Let a thruster turn in yaw.' });
  expect(runInWords(rest, 'metric')).toBe(`From rest: ${rest.why}`);
});

test('a moment in figures, and a run in words', () => {
  const track = circle();
  expect(standFigures(standAt(track, 2), 2, 'metric').map(({ name, value }) => `${name}: ${value}`)).toEqual([
    'Time: 2.0 s',
    'Heading: 45.0° to starboard',
    'Speed: 0.79 m/s',
    'Yaw rate: 22.5 °/s',
  ]);
  expect(runInWords({ label: 'From rest', track, why: '', before: null }, 'metric')).toBe(
    'From rest: in 4.0 s it yaws 90.0° to starboard and moves 2.000 m ahead and 2.000 m to starboard, as it headed at the start of the turn.',
  );
});
