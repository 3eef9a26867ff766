/**
 * Wire runs and where their mass lies.
 *
 * Straight: from end to end. Along the skin: from its end straight out (or in) to the skin at the end's own clock
 * angle, round the girth to the clock angle of the run, along that meridian, round and out again at the other end.
 * Mass per metre × conductors × (1 + slack) lies evenly along that line. A run to a pair or a ring has a branch for
 * each piece; the branch to the port piece of a pair follows the mirrored clock angle.
 */
import type { WireRun } from '../../craft/schema.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import type { Hull } from '../hull/hull.ts';
import type { Body } from './body.ts';
import type { Second } from './inertia.ts';
import { addLeg, type Leg, type LineSums, noSums, pointsOf, reversed } from './leg.ts';
import { clockOf, distanceFromAxis, onClock } from './position.ts';

/** One branch of a wire run. */
export interface Branch extends Body {
  /** Path length without slack, m. */
  readonly length: number;
  /** Nose to tail or the other way, as the run goes; without legs of no length. */
  readonly legs: readonly Leg[];
}

/** Where a run ends: the points it goes to, and whether the second is the port piece of a pair. */
export interface RunEnd {
  readonly points: readonly Vec3[];
  readonly pair: boolean;
}

/** The branches of a run: one, or as many as the ends have points. */
export function branchesOf(wire: WireRun, from: RunEnd, to: RunEnd, hull: Hull): Branch[] {
  return Array.from({ length: Math.max(from.points.length, to.points.length) }, (_, i) => {
    const start = from.points[i % from.points.length]!;
    const end = to.points[i % to.points.length]!;
    return branchOf(
      wire,
      legsOf(wire.path, start, end, i === 1 && (from.pair || to.pair), hull),
      start,
      hull,
    );
  });
}

/** The line of a branch, for drawing. */
export const drawnBranch = ({ legs }: Branch, hull: Hull): Vec3[] =>
  legs.flatMap((leg) => pointsOf(leg, hull));

function legsOf(path: WireRun['path'], from: Vec3, to: Vec3, port: boolean, hull: Hull): Leg[] {
  if (path.kind === 'straight') return straight(from, to);
  const clock = port ? -path.clock : path.clock;
  const start = boarding(from, clock, hull);
  const end = boarding(to, clock, hull);
  const along: Leg[] =
    start.station === end.station ? [] : [{ kind: 'meridian', from: start.station, to: end.station, clock }];
  return [...start.legs, ...along, ...end.legs.map(reversed).reverse()];
}

/** From an end to the meridian of the run: out to the skin, then round the girth. */
function boarding(at: Vec3, clock: number, hull: Hull): { station: number; legs: Leg[] } {
  const station = Math.min(Math.max(at[0], 0), hull.length);
  const own = distanceFromAxis(at) > 1e-9 ? clockOf(at) : clock;
  const out = straight(at, onClock(station, hull.radius(station, own), own));
  const sweep = shorterWay(clock - own);
  return { station, legs: sweep === 0 ? out : [...out, { kind: 'girth', station, from: own, sweep }] };
}

const straight = (a: Vec3, b: Vec3): Leg[] =>
  a[0] === b[0] && a[1] === b[1] && a[2] === b[2] ? [] : [{ kind: 'straight', a, b }];

/** The same turn within −π … π, free of rounding at 0. */
function shorterWay(turn: number): number {
  const short = turn - 2 * Math.PI * Math.round(turn / (2 * Math.PI));
  return Math.abs(short) < 1e-12 ? 0 : short;
}

function branchOf(wire: WireRun, legs: readonly Leg[], start: Vec3, hull: Hull): Branch {
  const sums = noSums();
  for (const leg of legs) addLeg(sums, leg, hull);
  const massPerMetre = wire.massPerMetre * wire.conductors * (1 + wire.slack);
  return { ...bodyOf(sums, massPerMetre, start), length: sums[0], legs };
}

/** The body of a line of that mass per metre; one of no length stays where it starts. */
function bodyOf(sums: LineSums, massPerMetre: number, start: Vec3): Body {
  const [length, sx, sy, sz, xx, yy, zz, xy, yz, zx] = sums;
  if (length === 0) return { mass: 0, cg: start, second: [0, 0, 0, 0, 0, 0] };
  const [x, y, z] = [sx / length, sy / length, sz / length];
  const second: Second = [
    massPerMetre * (xx - sx * x),
    massPerMetre * (yy - sy * y),
    massPerMetre * (zz - sz * z),
    massPerMetre * (xy - sx * y),
    massPerMetre * (yz - sy * z),
    massPerMetre * (zx - sz * x),
  ];
  return { mass: massPerMetre * length, cg: [x, y, z], second };
}
