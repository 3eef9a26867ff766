/**
 * Wire runs and where their mass lies.
 *
 * Straight: from end to end. Along the skin: from its end straight out (or in) to the skin at the end's own clock
 * angle, round the girth to the clock angle of the run, along that meridian, round and out again at the other end.
 * Mass per metre × (1 + slack) lies evenly along that line. A run to a pair or a ring has a branch for each piece;
 * branches to the port piece of a pair follow the mirrored clock angle.
 *
 * Integrals ∫ds, ∫p ds, ∫p pᵀ ds: closed form on straight legs; on the meridian from the hull's own tables; round the
 * girth by 8-point Gauss–Legendre, exact to rounding for a round section.
 */
import type { Craft } from '../../craft/craft.ts';
import type { WireEnd, WireRun } from '../../craft/schema.ts';
import { gaussLegendre } from '../../numeric/quadrature.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import type { Hull } from '../hull/hull.ts';
import type { Body } from './body.ts';
import type { Second } from './inertia.ts';
import type { Piece } from './pieces.ts';
import { clockOf, distanceFromAxis, onClock, positionOf } from './position.ts';

/** One leg of a path: its length, ∫p ds and ∫p pᵀ ds about the nose tip, and points to draw it through. */
export interface Leg {
  readonly length: number;
  readonly first: Vec3;
  readonly second: Second;
  readonly points: readonly Vec3[];
}

/** One branch of a wire run. */
export interface Branch extends Body {
  /** Path length without slack, m. */
  readonly length: number;
  readonly points: readonly Vec3[];
}

/** The branches of a run: one, or as many as the ends have pieces. */
export function branchesOf(
  wire: WireRun,
  craft: Craft,
  pieces: Readonly<Record<string, readonly Piece[]>>,
  hull: Hull,
): Branch[] {
  const from = endPoints(wire.from, pieces, hull);
  const to = endPoints(wire.to, pieces, hull);
  const fromPair = isPair(wire.from, craft);
  const toPair = isPair(wire.to, craft);
  return Array.from({ length: Math.max(from.length, to.length) }, (_, i) => {
    const port = i === 1 && (fromPair || toPair);
    return branch(wire, from[i % from.length]!, to[i % to.length]!, port, hull);
  });
}

/** A part of several pieces at one place is one end; a pair or a ring has an end at each piece. */
function endPoints(end: WireEnd, pieces: Readonly<Record<string, readonly Piece[]>>, hull: Hull): Vec3[] {
  if (end.kind === 'loose') return [positionOf(end.place, hull)];
  const middles = pieces[end.part]!.map((piece) => piece.middle);
  return middles.every((each) => samePoint(each, middles[0]!)) ? middles.slice(0, 1) : middles;
}

const samePoint = (a: Vec3, b: Vec3): boolean => a.every((value, i) => value === b[i]);

const isPair = (end: WireEnd, craft: Craft): boolean =>
  end.kind === 'part' && craft.parts.byId[end.part]!.copies.kind === 'pair';

function branch(wire: WireRun, from: Vec3, to: Vec3, port: boolean, hull: Hull): Branch {
  const { path } = wire;
  const legs =
    path.kind === 'straight'
      ? [straightLeg(from, to)]
      : skinLegs(from, to, port ? -path.clock : path.clock, hull);
  return branchOfLegs(legs, wire.massPerMetre * wire.conductors * (1 + wire.slack));
}

function skinLegs(from: Vec3, to: Vec3, clock: number, hull: Hull): Leg[] {
  const start = boarding(from, clock, hull);
  const end = boarding(to, clock, hull);
  return [
    ...start.legs,
    meridianLeg(start.station, end.station, clock, hull),
    ...end.legs.map(backwards).reverse(),
  ];
}

/** From an end to the meridian of the run: out to the skin, then round the girth. */
function boarding(at: Vec3, clock: number, hull: Hull): { station: number; legs: Leg[] } {
  const station = Math.min(Math.max(at[0], 0), hull.length);
  const own = distanceFromAxis(at) > 1e-9 ? clockOf(at) : clock;
  const skin = onClock(station, hull.radius(station, own), own);
  return { station, legs: [straightLeg(at, skin), girthLeg(station, own, clock, hull)] };
}

const backwards = (leg: Leg): Leg => ({ ...leg, points: [...leg.points].reverse() });

export function straightLeg(a: Vec3, b: Vec3): Leg {
  const length = Math.hypot(b[0] - a[0], b[1] - a[1], b[2] - a[2]);
  const mean = (i: 0 | 1 | 2) => (a[i] + b[i]) / 2;
  const product = (i: 0 | 1 | 2, j: 0 | 1 | 2) =>
    (length * (2 * a[i] * a[j] + 2 * b[i] * b[j] + a[i] * b[j] + b[i] * a[j])) / 6;
  return {
    length,
    first: [length * mean(0), length * mean(1), length * mean(2)],
    second: [product(0, 0), product(1, 1), product(2, 2), product(0, 1), product(1, 2), product(2, 0)],
    points: [a, b],
  };
}

const DRAWN_STEPS = 24;

export function meridianLeg(from: number, to: number, clock: number, hull: Hull): Leg {
  const path = hull.skinPath(from, to, clock);
  const [, s, c] = onClock(0, 1, clock);
  return {
    length: path.length,
    first: [path.x, s * path.r, c * path.r],
    second: [path.xx, s * s * path.rr, c * c * path.rr, s * path.xr, s * c * path.rr, c * path.xr],
    points: Array.from({ length: DRAWN_STEPS + 1 }, (_, i) => {
      const station = from + ((to - from) * i) / DRAWN_STEPS;
      return onClock(station, hull.radius(station, clock), clock);
    }),
  };
}

const GIRTH_RULE = gaussLegendre(8);
const CLOCK_STEP = 1e-4;

/** Round the section the shorter way. */
export function girthLeg(station: number, from: number, to: number, hull: Hull): Leg {
  const sweep = shorterWay(to - from);
  let length = 0;
  const first: [number, number, number] = [0, 0, 0];
  const second: [number, number, number, number, number, number] = [0, 0, 0, 0, 0, 0];
  GIRTH_RULE.nodes.forEach((node, i) => {
    const clock = from + (sweep * (node + 1)) / 2;
    const ds = (arcPerClock(station, clock, hull) * Math.abs(sweep) * GIRTH_RULE.weights[i]!) / 2;
    const [x, y, z] = onClock(station, hull.radius(station, clock), clock);
    length += ds;
    [x, y, z].forEach((value, k) => {
      first[k]! += value * ds;
    });
    [x * x, y * y, z * z, x * y, y * z, z * x].forEach((value, k) => {
      second[k]! += value * ds;
    });
  });
  return { length, first, second, points: girthPoints(station, from, sweep, hull) };
}

/** ds/dθ round the section: √(r² + r′²). */
function arcPerClock(station: number, clock: number, hull: Hull): number {
  const ahead = hull.radius(station, clock + CLOCK_STEP);
  const behind = hull.radius(station, clock - CLOCK_STEP);
  return Math.hypot(hull.radius(station, clock), (ahead - behind) / (2 * CLOCK_STEP));
}

const girthPoints = (station: number, from: number, sweep: number, hull: Hull): Vec3[] =>
  Array.from({ length: DRAWN_STEPS + 1 }, (_, i) => {
    const clock = from + (sweep * i) / DRAWN_STEPS;
    return onClock(station, hull.radius(station, clock), clock);
  });

/** The same turn within −π … π, free of rounding at 0. */
function shorterWay(turn: number): number {
  const short = turn - 2 * Math.PI * Math.round(turn / (2 * Math.PI));
  return Math.abs(short) < 1e-12 ? 0 : short;
}

function branchOfLegs(legs: readonly Leg[], massPerMetre: number): Branch {
  const total = (pick: (leg: Leg) => number) => legs.reduce((sum, leg) => sum + pick(leg), 0);
  const length = total((leg) => leg.length);
  const points = legs.flatMap((leg) => (leg.length > 0 ? leg.points : []));
  if (length === 0) return { mass: 0, cg: legs[0]!.points[0]!, second: [0, 0, 0, 0, 0, 0], length, points };
  const mean = (i: 0 | 1 | 2) => total((leg) => leg.first[i]) / length;
  const cg: Vec3 = [mean(0), mean(1), mean(2)];
  const central = (k: number, i: 0 | 1 | 2, j: 0 | 1 | 2) =>
    massPerMetre * (total((leg) => leg.second[k]!) - length * cg[i] * cg[j]);
  return {
    mass: massPerMetre * length,
    cg,
    second: [
      central(0, 0, 0),
      central(1, 1, 1),
      central(2, 2, 2),
      central(3, 0, 1),
      central(4, 1, 2),
      central(5, 2, 0),
    ],
    length,
    points,
  };
}
