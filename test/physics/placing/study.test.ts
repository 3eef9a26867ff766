/** A thruster moved along the hull: against plans made one by one, brute force, symmetry, and facts of the trade. */
import { expect, test } from 'vitest';
import type { Craft } from '../../../src/craft/craft.ts';
import { valueOrNull } from '../../../src/numeric/outcome.ts';
import { planOf } from '../../../src/physics/ballast/plan.ts';
import { craftStateOf } from '../../../src/physics/craftState.ts';
import { cruisePitch } from '../../../src/physics/cruise/cruise.ts';
import { heldAt } from '../../../src/physics/placing/moved.ts';
import type { PlacedPoint } from '../../../src/physics/placing/placedPoint.ts';
import { judged } from '../../../src/physics/placing/placedPoint.ts';
import { placementStudy } from '../../../src/physics/placing/study.ts';
import { turnOf } from '../../../src/physics/turning/turn.ts';
import { solvedValue } from '../thrust/thrustFixture.ts';
import { BLUNT_CB, placingCraft, solver, studyOf, vectored } from './placingCrafts.ts';

const withSlide = (craft: Craft): Craft => {
  const battery = { ...craft.parts.byId.battery!, slide: { from: 1.2, to: 2 } };
  return { ...craft, parts: { ...craft.parts, byId: { ...craft.parts.byId, battery } } };
};

const withPieces = (craft: Craft): Craft => ({
  ...craft,
  targets: { ...craft.targets, pitchTolerance: 0.02 },
  pieces: [
    { mass: 0.05, count: 10 },
    { mass: 0.02, count: 10 },
    { mass: 0.005, count: 4 },
  ],
  hardpoints: {
    ...craft.hardpoints,
    byId: Object.fromEntries(
      Object.entries(craft.hardpoints.byId).map(([id, each]) => [id, { ...each, fill: 'pieces' as const }]),
    ),
  },
});

test.each([
  ['lead cut to measure', placingCraft()],
  ['a battery that slides', withSlide(placingCraft())],
  ['lead in pieces', withPieces(placingCraft())],
])(
  'at each station the ballast is that of the plan for the craft with the thruster there: %s',
  (_, craft) => {
    const { points, today } = studyOf(craft);
    for (const { place, ballast, stowage, ballastProven } of [today, ...points]) {
      const plan = planOf(heldAt(craft, craft.parts.byId.thruster!, place), solver, { explain: false });
      if ('why' in plan) throw new Error(plan.why);
      expect(ballast).toBeCloseTo(plan.deadBallast, 6);
      expect(ballastProven).toBe(true);
      const hung = stowage!.weights.flatMap(({ pieces }) => pieces);
      expect(hung.reduce((sum, { mass, count }) => sum + mass * count, 0)).toBeCloseTo(ballast!, 9);
    }
  },
);

test('without a plan a station says why, and is never the best', () => {
  const craft = placingCraft();
  const { points, today } = studyOf({
    ...craft,
    targets: { ...craft.targets, heaviness: { least: 100, most: 101 } },
  });
  for (const point of [today, ...points]) {
    expect(point).toMatchObject({ ballast: null, stowage: null, best: false });
    expect(point.why).toMatch(/\.$/);
    expect(point.timeTo90).toBeGreaterThan(0);
  }
});

test('a thruster of no mass and no wire costs no ballast wherever it is', () => {
  const { points, today } = studyOf(placingCraft({ part: { mass: 0 }, wires: [] }));
  for (const point of points) {
    expect(point.ballast).toBeCloseTo(today.ballast!, 9);
    expect(point).toMatchObject({ wire: 0, wireChange: 0 });
  }
});

test('wire follows the thruster: the farther from the battery, the more of it', () => {
  const { points, today } = studyOf(
    placingCraft({ part: { place: { kind: 'keel', station: 4, drop: 0.1 } } }),
  );
  const aft = points.filter(({ station }) => station > BLUNT_CB);
  for (const [i, { wire, wireChange }] of aft.entries()) {
    expect(wireChange).toBeCloseTo(wire - today.wire, 12);
    if (i > 0) expect(wire).toBeGreaterThan(aft[i - 1]!.wire);
  }
});

test('in the tail it takes more lead than its own mass, the CB being forward of mid-length', () => {
  // Common practice, no source: the lead at the nose has the shorter arm. By moments it is mass × arm ÷ arm of the lead.
  const tail = (mass: number) =>
    studyOf(placingCraft({ wires: [], part: { mass } }), { stations: 2 }).points.at(-1)!.ballast!;
  const lead = tail(0.1) - tail(0);
  expect(lead).toBeGreaterThan(0.1);
  expect(lead).toBeCloseTo((0.1 * (4.2 - BLUNT_CB)) / BLUNT_CB, 4);
});

test('the longer the arm aft of the CB, the less time to 90° and the more gust is held', () => {
  // Common practice, no source. Of one mass without wires, so that only the place differs.
  const { points } = studyOf(placingCraft({ wires: [], part: { mass: 0 }, others: [] }), { stations: 13 });
  const aft = points.filter(({ arm }) => arm! > 0.2);
  expect(aft.length).toBeGreaterThan(4);
  for (const [i, { arm, timeTo90, gustHeld }] of aft.entries()) {
    if (i === 0) continue;
    expect(arm).toBeGreaterThan(aft[i - 1]!.arm!);
    expect(timeTo90).toBeLessThan(aft[i - 1]!.timeTo90!);
    expect(gustHeld).toBeGreaterThan(aft[i - 1]!.gustHeld!);
  }
});

const figuresOf = ({ ballast, wire, arm, timeTo90, radius, gustHeld, perWatt, cruisePitch }: PlacedPoint) => [
  ballast,
  wire,
  arm,
  timeTo90,
  radius,
  gustHeld,
  perWatt,
  cruisePitch,
];

test('a pair given by its port piece does what one given by its starboard piece does', () => {
  const pair = (clock: number) =>
    studyOf(
      placingCraft({
        part: {
          place: { kind: 'skin', station: 3, clock, standoff: 0.15 },
          copies: { kind: 'pair' },
        },
        data: vectored({ differential: true }),
      }),
    );
  const [starboard, port] = [pair(1.8), pair(2 * Math.PI - 1.8)];
  starboard.points.forEach((point, i) => {
    const [a, b] = [figuresOf(point), figuresOf(port.points[i]!)];
    a.forEach((figure, k) => {
      if (figure === null) expect(b[k]).toBe(null);
      else expect(b[k]).toBeCloseTo(figure, 6);
    });
  });
});

test('the figures are those of the craft with the plan carried out, turned and flown by itself', () => {
  const craft = placingCraft();
  const asked = { throttle: 0.7, vector: null, speed: null };
  const { points } = studyOf(craft, { stations: 5, asked });
  for (const { place, arm, timeTo90, radius, gustHeld, cruisePitch: pitch } of points) {
    const plan = planOf(heldAt(craft, craft.parts.byId.thruster!, place), solver, { explain: false });
    if ('why' in plan) throw new Error(plan.why);
    const state = solvedValue(craftStateOf(plan.craft));
    const turn = solvedValue(turnOf(state, asked));
    const figures = [
      [arm, turn.authority.arm],
      [timeTo90, valueOrNull(turn.fromRest)?.time],
      [radius, valueOrNull(turn.steady)?.radius],
      [gustHeld, valueOrNull(turn.gust)],
      [pitch, valueOrNull(cruisePitch(state, { throttle: 0.7 }))?.pitch],
    ] as const;
    for (const [figure, alone] of figures) {
      if (figure === null) expect(alone ?? null).toBe(null);
      else expect(figure).toBeCloseTo(alone!, 5);
    }
  }
  expect(points.filter(({ timeTo90 }) => timeTo90 !== null).length).toBeGreaterThan(2);
});

test('one that only pushes straight has no arm, no time and holds no gust', () => {
  const { points } = studyOf(placingCraft({ data: {} }), { stations: 3 });
  for (const point of points) {
    expect(point).toMatchObject({ arm: null, timeTo90: null, radius: null, gustHeld: null });
  }
});

test('behind the tail the air is slower, and thrust per watt greater than in free air', () => {
  const tail = studyOf(placingCraft()).points.at(-1)!;
  expect(tail.station).toBeCloseTo(4.2, 12);
  expect(tail.inflowRatio).toBeLessThan(0.95);
  expect(tail.perWatt).toBeGreaterThan(1);
});

/** Whether `a` is the greater by more than a share of the less and more than a step: the bands as the notes tell them. */
const above = (a: number, b: number, step: number, share: number): boolean =>
  a - b > step * (1 + 1e-9) && a > b * (1 + share) * (1 + 1e-9);

test('the best are those that no other place beats by more than the model can tell, by brute force', () => {
  const { points, today } = studyOf(placingCraft(), { stations: 31 });
  const able = [...points, today].filter(({ ballast, strikes }) => ballast !== null && !strikes);
  const lead = ({ ballast, wire }: PlacedPoint) => ballast! + wire;
  const time = ({ timeTo90 }: PlacedPoint) => timeTo90 ?? 1e9;
  const gust = ({ gustHeld }: PlacedPoint) => gustHeld ?? 0;
  const clearlyBetter = (a: PlacedPoint, b: PlacedPoint): boolean[] => [
    above(lead(b), lead(a), 1e-3, 0.01),
    above(time(b), time(a), 0.01, 0.03),
    above(gust(a), gust(b), 0.01, 0.03),
    above(a.perWatt!, b.perWatt!, 0, 0.01),
  ];
  for (const best of able.filter((point) => point.best)) {
    // Whoever is clearly better in two things or more, and clearly worse in none, would beat it.
    for (const other of able) {
      const wins = clearlyBetter(other, best).filter(Boolean).length;
      expect(wins > 1 && !clearlyBetter(best, other).some(Boolean)).toBe(false);
    }
  }
  for (const beaten of able.filter((point) => !point.best)) {
    expect(
      able.some(
        (other) => clearlyBetter(other, beaten).some(Boolean) && !clearlyBetter(beaten, other).some(Boolean),
      ),
    ).toBe(true);
  }
  for (const point of points) if (!able.includes(point)) expect(point.best).toBe(false);
  expect(able.filter(({ best }) => best).length).toBeGreaterThan(1);
  expect(able.length).toBeLessThan(points.length + 1);
});

test('what today beats is not best, and what differs by less than the model can tell is as good', () => {
  const [one] = studyOf(placingCraft(), { stations: 2 }).points;
  const at = (ballast: number, timeTo90: number): PlacedPoint => ({
    ...one!,
    ...{ ballast, timeTo90, wire: 0, gustHeld: 1, perWatt: 1, strikes: false },
  });
  const bestOf = (points: PlacedPoint[], today: PlacedPoint) =>
    [today, ...judged(points, today).points].map((point, i) =>
      i === 0 ? judged(points, today).today.best : point.best,
    );
  expect(bestOf([at(0.05, 4), at(0.02, 5)], at(0.05, 3))).toEqual([true, false, true]);
  expect(bestOf([at(0.0509, 4)], at(0.05, 4))).toEqual([true, true]);
  expect(bestOf([at(0.0511, 4)], at(0.05, 4))).toEqual([true, false]);
  expect(bestOf([at(0.5045, 4), at(0.506, 4)], at(0.5, 4))).toEqual([true, true, false]);
  expect(bestOf([at(0.05, 4.11), at(0.05, 4.13)], at(0.05, 4))).toEqual([true, true, false]);
});

test('one that was stopped goes on with the stations not done yet, to the same end', () => {
  const whole = studyOf(placingCraft(), { stations: 21 });
  let heard = 0;
  const half = studyOf(placingCraft(), {
    stations: 21,
    onProgress: ({ points }) => {
      heard = points.length;
    },
    shouldStop: () => heard >= 8,
  });
  const shares: number[] = [];
  const rest = studyOf(placingCraft(), {
    stations: 21,
    done: half.points,
    onProgress: ({ share }) => shares.push(share),
  });
  expect(half.points).toHaveLength(8);
  expect(shares[0]).toBeGreaterThan(half.points.length / 21);
  expect(rest.complete).toBe(true);
  expect(rest.points.map(({ station, best }) => [station, best])).toEqual(
    whole.points.map(({ station, best }) => [station, best]),
  );
  whole.points.map(figuresOf).forEach((figures, i) => {
    figures.forEach((figure, k) => {
      const found = figuresOf(rest.points[i]!)[k]!;
      if (figure === null) expect(found).toBe(null);
      else expect(found).toBeCloseTo(figure, 6);
    });
  });
});

test('progress holds the stations so far; asked to stop half-way, the study ends there', () => {
  const shares: number[] = [];
  let heard: readonly PlacedPoint[] = [];
  const study = studyOf(placingCraft(), {
    stations: 41,
    onProgress: ({ share, points }) => {
      shares.push(share);
      heard = points;
    },
    shouldStop: () => heard.length >= 20,
  });
  expect(study.complete).toBe(false);
  expect(study.points).toEqual(heard);
  expect(study.points.map(({ station }) => station)).toEqual(
    [...study.points].sort((a, b) => a.station - b.station).map(({ station }) => station),
  );
  expect(shares.length).toBeGreaterThan(5);
  expect(shares.length).toBeLessThan(12);
  const whole = studyOf(placingCraft(), { stations: 41 });
  expect(whole.complete).toBe(true);
  expect(whole.points.slice(0, heard.length).map(figuresOf)).toEqual(heard.map(figuresOf));
});

test('stopped at once there is only the thruster where it is', () => {
  const study = studyOf(placingCraft(), { shouldStop: () => true });
  expect(study).toMatchObject({ points: [], complete: false, today: { station: 4.2 } });
});

test('what is no thruster with figures is refused, those that are one named', () => {
  const craft = placingCraft({ part: { name: 'Tail motor' } });
  for (const part of ['battery', 'gone', '__proto__']) {
    expect(placementStudy(craft, part, solver)).toEqual({
      status: 'infeasible',
      why: 'There are no thrust figures for this part.',
      remedy: 'Parts that have them: thruster (Tail motor).',
    });
  }
});
