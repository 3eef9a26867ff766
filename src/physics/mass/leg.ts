/**
 * One leg of the line along which a wire lies, and the integrals ∫ds, ∫p ds, ∫p pᵀ ds over it about the nose tip.
 *
 * Straight leg a → b of length l: ∫p ds = l (a + b)/2, ∫p pᵀ ds = l (2aaᵀ + 2bbᵀ + abᵀ + baᵀ)/6. Along a meridian at
 * clock θ: from the hull's own tables of ∫x ds, ∫r ds … with y = r sin θ, z = r cos θ. Round the girth: 8-point
 * Gauss–Legendre over the clock angle, ds = √(r² + r′²) dθ; exact to rounding where the section is a circle.
 */
import { kept } from '../../numeric/kept.ts';
import { gaussLegendre } from '../../numeric/quadrature.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import type { Hull } from '../hull/hull.ts';
import { onClock } from './position.ts';

export type Leg =
  | { readonly kind: 'straight'; readonly a: Vec3; readonly b: Vec3 }
  | { readonly kind: 'meridian'; readonly from: number; readonly to: number; readonly clock: number }
  | { readonly kind: 'girth'; readonly station: number; readonly from: number; readonly sweep: number };

/** ∫ds, ∫x, ∫y, ∫z, ∫xx, ∫yy, ∫zz, ∫xy, ∫yz, ∫zx. */
export type LineSums = [number, number, number, number, number, number, number, number, number, number];
export const noSums = (): LineSums => [0, 0, 0, 0, 0, 0, 0, 0, 0, 0];

export function addLeg(sums: LineSums, leg: Leg, hull: Hull): void {
  if (leg.kind === 'straight') addStraight(sums, leg.a, leg.b);
  else if (leg.kind === 'meridian') addMeridian(sums, leg.from, leg.to, leg.clock, hull);
  else addGirth(sums, leg.station, leg.from, leg.sweep, hull);
}

function addStraight(sums: LineSums, a: Vec3, b: Vec3): void {
  const length = Math.hypot(b[0] - a[0], b[1] - a[1], b[2] - a[2]);
  // Simpson's rule is exact for second moments of a straight line.
  addPoint(sums, length / 6, a[0], a[1], a[2]);
  addPoint(sums, (4 * length) / 6, (a[0] + b[0]) / 2, (a[1] + b[1]) / 2, (a[2] + b[2]) / 2);
  addPoint(sums, length / 6, b[0], b[1], b[2]);
}

function addPoint(sums: LineSums, ds: number, x: number, y: number, z: number): void {
  sums[0] += ds;
  sums[1] += ds * x;
  sums[2] += ds * y;
  sums[3] += ds * z;
  sums[4] += ds * x * x;
  sums[5] += ds * y * y;
  sums[6] += ds * z * z;
  sums[7] += ds * x * y;
  sums[8] += ds * y * z;
  sums[9] += ds * z * x;
}

function addMeridian(sums: LineSums, from: number, to: number, clock: number, hull: Hull): void {
  const path = hull.skinPath(from, to, clock);
  const [, s, c] = onClock(0, 1, clock);
  sums[0] += path.length;
  sums[1] += path.x;
  sums[2] += s * path.r;
  sums[3] += c * path.r;
  sums[4] += path.xx;
  sums[5] += s * s * path.rr;
  sums[6] += c * c * path.rr;
  sums[7] += s * path.xr;
  sums[8] += s * c * path.rr;
  sums[9] += c * path.xr;
}

const GIRTH_RULE = gaussLegendre(8);

function addGirth(sums: LineSums, station: number, from: number, sweep: number, hull: Hull): void {
  for (let i = 0; i < GIRTH_RULE.nodes.length; i += 1) {
    const clock = from + (sweep * (GIRTH_RULE.nodes[i]! + 1)) / 2;
    const ds = (arcPerClock(station, clock, hull) * Math.abs(sweep) * GIRTH_RULE.weights[i]!) / 2;
    const [x, y, z] = onClock(station, hull.radius(station, clock), clock);
    addPoint(sums, ds, x, y, z);
  }
}

const CLOCK_STEP = 1e-4;

/** ds/dθ round the section: √(r² + r′²). */
function arcPerClock(station: number, clock: number, hull: Hull): number {
  const ahead = hull.radius(station, clock + CLOCK_STEP);
  const behind = hull.radius(station, clock - CLOCK_STEP);
  return Math.hypot(hull.radius(station, clock), (ahead - behind) / (2 * CLOCK_STEP));
}

/** Points to draw the leg through, its ends among them. */
export function pointsOf(leg: Leg, hull: Hull): Vec3[] {
  if (leg.kind === 'straight') return [leg.a, leg.b];
  return leg.kind === 'meridian' ? meridianPoints(leg, hull) : girthPoints(leg, hull);
}

const MERIDIAN_STEPS = 64;
const GIRTH_STEPS = 24;

/** Points of whole meridians, by clock angle: many runs share one. */
const meridiansOf = kept((_: Hull) => new Map<number, readonly Vec3[]>());

function wholeMeridian(clock: number, hull: Hull): readonly Vec3[] {
  const known = meridiansOf(hull);
  const points =
    known.get(clock) ??
    hull.drawStations(MERIDIAN_STEPS).map((station) => onClock(station, hull.radius(station, clock), clock));
  known.set(clock, points);
  return points;
}

function meridianPoints({ from, to, clock }: Leg & { kind: 'meridian' }, hull: Hull): Vec3[] {
  const [low, high] = [Math.min(from, to), Math.max(from, to)];
  const between = wholeMeridian(clock, hull).filter(([station]) => station > low && station < high);
  const end = (station: number) => onClock(station, hull.radius(station, clock), clock);
  return [end(from), ...(from < to ? between : between.toReversed()), end(to)];
}

const girthPoints = ({ station, from, sweep }: Leg & { kind: 'girth' }, hull: Hull): Vec3[] =>
  Array.from({ length: GIRTH_STEPS + 1 }, (_, i) => {
    const clock = from + (sweep * i) / GIRTH_STEPS;
    return onClock(station, hull.radius(station, clock), clock);
  });

/** The same leg walked the other way. */
export function reversed(leg: Leg): Leg {
  switch (leg.kind) {
    case 'straight':
      return { ...leg, a: leg.b, b: leg.a };
    case 'meridian':
      return { ...leg, from: leg.to, to: leg.from };
    case 'girth':
      return { ...leg, from: leg.from + leg.sweep, sweep: -leg.sweep };
  }
}
