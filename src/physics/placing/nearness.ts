/**
 * How near a propeller comes to what it must not strike: the least gap over the room it sweeps, m, negative where it
 * would cut in.
 *
 * Into the skin it is measured square to the axis. Of other parts the boxes of their outside
 * dimensions are taken, which stand upright or, on the skin, square to it: there only whether the blades pass through.
 */
import type { Vec3 } from '../../numeric/vector.ts';
import type { Hull } from '../hull/hull.ts';
import type { Piece } from '../mass/pieces.ts';
import { clockOf, distanceFromAxis, turnedAboutAxis } from '../mass/position.ts';
import { bladePoints, distanceTo, fromMiddle, HUB, type Sweep } from './sweep.ts';

export interface Box {
  readonly piece: Pick<Piece, 'middle' | 'roll'>;
  readonly size: { readonly length: number; readonly width: number; readonly height: number };
}

/** Gaps below `room` are told to within a fraction of it; of greater ones only that they are. */
export function gapToSkin(sweep: Sweep, hull: Hull, room: number): number {
  const near = { hull, room, rise: riseOf(hull, room) };
  let least = gapAt(sweep.at, near);
  for (const normal of sweep.normals) {
    for (const tip of [0, hull.length]) least = Math.min(least, distanceTo(sweep, normal, [tip, 0, 0]));
    for (const point of bladePoints(sweep, normal)) least = Math.min(least, gapAt(point, near));
  }
  return least;
}

interface Near {
  readonly hull: Hull;
  readonly room: number;
  /** A point farther from the skin than this, square to the axis, has none of it within `room`, m. */
  readonly rise: number;
}

/** A hull widens fastest at its ends, dents in measured ones left aside. */
const riseOf = ({ length, radius }: Hull, room: number): number =>
  Math.max(radius(room, 0), radius(length - room, 0), radius(room, ATHWART), radius(length - room, ATHWART)) +
  room;

const ATHWART = Math.PI / 2;

/** How far fore and aft the nearest skin is looked for, as shares of the room to be kept. */
const LOOKED = [-1, -0.5, 0.5, 1];

/** Square to the axis, or to the skin a little fore or aft where the hull is blunt. */
function gapAt(point: Vec3, { hull, room, rise }: Near): number {
  const clock = clockOf(point);
  const rho = distanceFromAxis(point);
  const to = (station: number): number => {
    const held = Math.min(Math.max(station, 0), hull.length);
    const off = rho - hull.radius(held, clock);
    return held === point[0] ? off : Math.hypot(point[0] - held, Math.max(0, off));
  };
  const square = to(point[0]);
  if (square < 0 || square > rise) return square;
  return Math.min(square, ...LOOKED.map((share) => to(point[0] + share * room)));
}

/**
 * Whether the blades pass through a box: whether it meets the plane of a disc between hub and rim. The hub is left out, since
 * what carries a propeller comes near to that.
 */
export function passesThrough({ at, radius, normals }: Sweep, { piece, size }: Box): boolean {
  const { length, width, height } = size;
  const middle = turnedAboutAxis(minus(at, piece.middle), -piece.roll);
  if (Math.hypot(...middle) > radius + Math.hypot(length, width, height) / 2) return false;
  const half: Vec3 = [length / 2, width / 2, height / 2];
  const corners = CORNERS.map((corner): Vec3 => minus(timesEach(corner, half), middle));
  const holdsMiddle = middle.every((each, axis) => Math.abs(each) <= half[axis]!);
  return normals.some((normal) => {
    const cut = cutThrough(corners, turnedAboutAxis(normal, -piece.roll));
    const farthest = Math.max(0, ...cut.map((point) => Math.hypot(...point)));
    return farthest > HUB * radius && (holdsMiddle || nearestOf(cut) <= radius);
  });
}

const SIGNS = [-1, 1];
const CORNERS: readonly Vec3[] = SIGNS.flatMap((a) =>
  SIGNS.flatMap((b) => SIGNS.map((c): Vec3 => [a, b, c])),
);
/** Pairs of corners. */
const EDGES = CORNERS.flatMap((_, i) =>
  [1, 2, 4].filter((bit) => !(i & bit)).map((bit) => [i, i | bit] as const),
);

/** Where a plane through the origin cuts the edges of a box. */
function cutThrough(corners: readonly Vec3[], normal: Vec3): Vec3[] {
  const heights = corners.map((corner) => dot(corner, normal));
  return EDGES.flatMap(([i, j]) => {
    const [a, b] = [heights[i]!, heights[j]!];
    if (a * b > 0) return [];
    return a === b ? [corners[i]!, corners[j]!] : [along(corners[i]!, corners[j]!, a / (a - b))];
  });
}

/** From the origin to the convex figure of some points in one plane with it, the origin outside: its edges are among their joins. */
const nearestOf = (points: readonly Vec3[]): number =>
  Math.min(...points.flatMap((a, i) => points.slice(i).map((b) => fromOrigin(a, b))));

function fromOrigin(a: Vec3, b: Vec3): number {
  const way = minus(b, a);
  const square = dot(way, way);
  const share = square > 0 ? Math.min(Math.max(-dot(a, way) / square, 0), 1) : 0;
  return Math.hypot(...along(a, b, share));
}

/** Of another propeller, however either is turned; Infinity when it is farther off than `near`. */
export function gapToPropeller(sweep: Sweep, other: Sweep, near: number): number {
  if (apart(sweep.at, other.at) > sweep.radius + other.radius + near) return Number.POSITIVE_INFINITY;
  let gap = Number.POSITIVE_INFINITY;
  for (const point of sweep.normals.flatMap((normal) => bladePoints(sweep, normal))) {
    for (const normal of other.normals) gap = Math.min(gap, distanceTo(other, normal, point));
  }
  return gap;
}

/** Between two propellers of one part, which turn alike. */
export const gapToFellow = (sweep: Sweep, fellow: Sweep): number =>
  Math.min(
    ...sweep.normals.map((normal) => {
      const { h, rho } = fromMiddle(sweep, normal, fellow.at);
      return Math.hypot(h, Math.max(0, rho - sweep.radius - fellow.radius));
    }),
  );

/** How low a box reaches, m. */
export const footOf = ({ piece: { middle, roll }, size }: Box): number =>
  middle[2] - (Math.abs(size.height * Math.cos(roll)) + Math.abs(size.width * Math.sin(roll))) / 2;

const minus = (a: Vec3, b: Vec3): Vec3 => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
const dot = (a: Vec3, b: Vec3): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const timesEach = (a: Vec3, b: Vec3): Vec3 => [a[0] * b[0], a[1] * b[1], a[2] * b[2]];
const along = (a: Vec3, b: Vec3, share: number): Vec3 => [
  a[0] + share * (b[0] - a[0]),
  a[1] + share * (b[1] - a[1]),
  a[2] + share * (b[2] - a[2]),
];

const apart = (a: Vec3, b: Vec3): number => Math.hypot(...minus(a, b));
