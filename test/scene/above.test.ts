import { expect, test } from 'vitest';
import type { Craft } from '../../src/craft/craft.ts';
import { assess } from '../../src/report/assess.ts';
import { aboveInWords, aboveMarks, piecesAbove, yawMark } from '../../src/scene/above.ts';
import { aboveFigure } from '../../src/scene/figure.ts';
import { planOutline } from '../../src/scene/outline.ts';
import { LIGHT } from '../../src/scene/palette.ts';
import { geometryOf } from '../../src/scene/subject.ts';
import { DEGREE, pairCraft, tailCraft, thrusterData, upTo } from '../report/turning/turningCrafts.ts';
import { craft as fixture, geometry, VIEW } from './fixture.ts';

const geometryFor = (craft: Craft) => geometryOf(assess(craft))!;
const turned = (degrees: number) =>
  tailCraft({ thruster: thrusterData({ yaw: { ...upTo(60), set: degrees * DEGREE } }) });

test('the hull lies nose up, as broad to starboard as to port', () => {
  const { hull } = geometry();
  const outline = planOutline(hull);
  expect(Math.max(...outline.map(({ z }) => z))).toBeCloseTo(0, 9);
  expect(Math.min(...outline.map(({ z }) => z))).toBeCloseTo(-hull.length, 9);
  const us = outline.map(({ u }) => u);
  expect(Math.max(...us) - Math.min(...us)).toBeCloseTo(hull.breadth, 3);
  expect(Math.max(...us)).toBeCloseTo(-Math.min(...us), 9);
});

test('what is to starboard stands to the right, and a thruster is drawn turned as its thrust is', () => {
  const craft = pairCraft();
  const { pieces, hull } = geometryFor(craft);
  const piece = pieces.find(({ part, copy }) => part === 'thruster' && copy === 0)!;
  const part = craft.parts.byId.thruster!;
  expect(aboveFigure(part, piece, hull, 0.001).middle).toEqual({ u: 0.6, z: -1.5 });
  const turnedPart = { ...part, thruster: { ...part.thruster!, yaw: { ...upTo(90), set: Math.PI / 2 } } };
  const [before, after] = [part, turnedPart].map((each) => aboveFigure(each, piece, hull, 0.001).box);
  expect(after!.right - after!.left).toBeCloseTo(before!.top - before!.bottom, 9);
});

test('a fin on the side of the hull is seen in full, one on its keel on edge', () => {
  const craft = fixture();
  const { pieces, hull } = geometry(craft);
  const fin = { ...craft.parts.byId.fins!, size: { length: 0.3, width: 0.004, height: 0.2 } };
  const piece = pieces.find(({ part }) => part === 'fins')!;
  const wide = (roll: number) => {
    const at: typeof piece.middle = [piece.middle[0], 0.6 * Math.sin(roll), 0.6 * Math.cos(roll)];
    const { left, right } = aboveFigure(fin, { ...piece, middle: at, roll }, hull, 0.001).box;
    return right - left;
  };
  expect(wide(Math.PI / 2)).toBeGreaterThan(0.19);
  expect(wide(Math.PI)).toBeLessThan(1e-9);
});

test('thrusters, fins and what is selected are drawn', () => {
  const craft = fixture();
  const shown = (selected: string[]) =>
    new Set(piecesAbove(craft, geometry(craft), selected).map(({ part }) => part));
  expect(shown([])).toEqual(new Set(['thruster', 'fins', 'motors']));
  expect(shown(['camera'])).toEqual(new Set(['thruster', 'fins', 'motors', 'camera']));
});

test('no line hangs between CB and CG: it points at the eye', () => {
  const marks = aboveMarks({ ...VIEW, pivot: 0 }, geometry());
  expect(marks.line).toBe(0);
  expect(Math.abs(marks.lean)).toBeLessThan(1e-6);
  // The camera of the fixture hangs to starboard.
  expect(marks.bob!.x).toBeGreaterThan(marks.ring.x);
});

test('thrust to port at the tail turns the nose to starboard; its lever leads aft from the CG', () => {
  const of = geometryFor(turned(-20));
  const yaw = yawMark(of, 'metric')!;
  expect(yaw.sense).toBe(1);
  expect(yaw.words[0]).toBe('yaws to starboard');
  const [lever, more] = yaw.levers;
  expect(more).toBeUndefined();
  expect(lever!.from).toEqual({ u: of.cg![1], z: -of.cg![0] });
  const station = of.thrust[0]!.at[0];
  expect(lever!.to.z).toBeCloseTo(-station, 9);
  expect(lever!.words).toBe(`arm ${(station - of.cg![0]).toFixed(2)} m`);
  expect(yawMark(geometryFor(turned(20)), 'metric')!.sense).toBe(-1);
  expect(yawMark(geometryFor(turned(0)), 'metric')).toMatchObject({ sense: 0, words: [] });
});

test('a pair throttled apart has its lever athwart; without thrust there is nothing to mark', () => {
  const { levers } = yawMark(geometryFor(pairCraft()), 'metric')!;
  expect(levers.map(({ words }) => words)).toEqual(['arm 0.60 m']);
  expect(levers[0]!.to.u - levers[0]!.from.u).toBeCloseTo(0.6, 9);
  expect(yawMark(geometryFor(tailCraft({ thruster: null })), 'metric')).toBeNull();
});

test('the view is told in words', () => {
  const subject = (craft: Craft) => ({
    craft,
    assessment: assess(craft),
    units: 'metric' as const,
    palette: LIGHT,
  });
  const words = aboveInWords(subject(turned(-20)));
  expect(words).toContain('starboard on the right');
  expect(words).toContain('Thrust: Tail thruster 0.400 N, 20.0° to port.');
  expect(words).toMatch(/What turns in yaw is 1\.\d\d m aft of the CG\./);
  expect(words).toMatch(/As set it yaws to starboard, 0\.\d{3} N·m\./);
  expect(aboveInWords(subject(tailCraft({ thruster: null })))).not.toContain('Thrust');
});

test('thrust that passes the CG within 5 mm is not said to yaw the craft', () => {
  const aside = (side: number) => {
    const { cg, ...of } = geometryFor(turned(0));
    return yawMark({ ...of, cg: [cg![0], side, cg![2]] }, 'metric')!.sense;
  };
  expect([aside(0.004), aside(0.006), aside(-0.006)]).toEqual([0, 1, -1]);
});
