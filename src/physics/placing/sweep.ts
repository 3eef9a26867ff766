/**
 * The room a propeller sweeps: a flat disc square to the thrust, in every direction its vectoring can turn it to.
 *
 *   direction of thrust  n = (−cos ε cos δ, cos ε sin δ, sin ε): δ in yaw, + to starboard; ε in pitch, + up
 *   distance from a point p to the disc about c:  h = (p − c)·n,  ρ = |p − c − h n|,  √(h² + max(0, ρ − R)²)
 *
 * The disc turns about its middle, which is the middle of the part. Directions are taken every 15° or closer.
 */
import type { Vectoring } from '../../craft/thrustSchema.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import type { Thruster } from '../thrust/thrusters.ts';

export interface Sweep {
  /** Middle of the disc: station, side, height, m. */
  readonly at: Vec3;
  /** m */
  readonly radius: number;
  /** Directions of thrust. */
  readonly normals: readonly Vec3[];
}

/** Room to keep about a propeller, m: common practice, no source. */
export const clearanceOf = (diameter: number): number => Math.max(0.01, 0.05 * diameter);

export const sweepOf = ({ at, diameter, yaw, pitch }: Thruster): Sweep => ({
  at,
  radius: diameter / 2,
  normals: anglesOf(pitch).flatMap((up) => anglesOf(yaw).map((side) => directionOf(side, up))),
});

const STEP = Math.PI / 12;

/** Straight ahead among them, if it can. Half a turn brings a disc back onto itself. */
function anglesOf({ least, most }: Vectoring): number[] {
  const last = Math.min(most, least + Math.PI);
  const straight = Math.min(Math.max(0, least), last);
  return [...between(least, straight), straight, ...between(last, straight).reverse()];
}

/** From one angle up to the other, that left out. */
function between(from: number, to: number): number[] {
  const steps = Math.ceil(Math.abs(to - from) / STEP - 1e-9);
  return Array.from({ length: steps }, (_, i) => from + ((to - from) * i) / steps);
}

export const directionOf = (yaw: number, pitch: number): Vec3 => [
  -Math.cos(pitch) * Math.cos(yaw),
  Math.cos(pitch) * Math.sin(yaw),
  Math.sin(pitch),
];

const RINGS = [0.5, 1];
const SPOKES = 24;
/** Within this share of the radius is the hub, which the craft may come near to. */
export const HUB = 0.2;

const SPOTS: readonly (readonly [number, number])[] = RINGS.flatMap((ring) =>
  Array.from({ length: SPOKES }, (_, i): [number, number] => [
    ring * Math.cos((2 * Math.PI * i) / SPOKES),
    ring * Math.sin((2 * Math.PI * i) / SPOKES),
  ]),
);

/** Points all over the blades' part of one disc. */
export const bladePoints = ({ at, radius }: Sweep, normal: Vec3): Vec3[] =>
  pointsAt(SPOTS, at, radius, normal);

const RIM: readonly (readonly [number, number])[] = SPOTS.filter((_, i) => i >= SPOKES && i % 2 === 0);

/** A dozen points round the edge of one disc. */
export const rimPoints = ({ at, radius }: Pick<Sweep, 'at' | 'radius'>, normal: Vec3): Vec3[] =>
  pointsAt(RIM, at, radius, normal);

function pointsAt(
  spots: readonly (readonly [number, number])[],
  at: Vec3,
  radius: number,
  normal: Vec3,
): Vec3[] {
  const [e, f] = acrossOf(normal);
  return spots.map(
    ([a, b]): Vec3 => [
      at[0] + radius * (a * e[0] + b * f[0]),
      at[1] + radius * (a * e[1] + b * f[1]),
      at[2] + radius * (a * e[2] + b * f[2]),
    ],
  );
}

/** Two directions square to n and to each other. */
function acrossOf(n: Vec3): [Vec3, Vec3] {
  const level = Math.hypot(n[0], n[1]);
  const e: Vec3 = level > 1e-9 ? [-n[1] / level, n[0] / level, 0] : [1, 0, 0];
  return [e, [n[1] * e[2] - n[2] * e[1], n[2] * e[0] - n[0] * e[2], n[0] * e[1] - n[1] * e[0]]];
}

/** How far a point lies along and across the direction of a disc, from its middle, m. */
export function fromMiddle({ at }: Sweep, n: Vec3, p: Vec3): { readonly h: number; readonly rho: number } {
  const d = [p[0] - at[0], p[1] - at[1], p[2] - at[2]] as const;
  const h = d[0] * n[0] + d[1] * n[1] + d[2] * n[2];
  return { h, rho: Math.sqrt(Math.max(0, d[0] ** 2 + d[1] ** 2 + d[2] ** 2 - h * h)) };
}

/** m; 0 on the disc. */
export function distanceTo(sweep: Sweep, normal: Vec3, p: Vec3): number {
  const { h, rho } = fromMiddle(sweep, normal, p);
  return Math.hypot(h, Math.max(0, rho - sweep.radius));
}

/** The lowest height it reaches, m. */
export const lowestOf = ({ at, radius, normals }: Sweep): number =>
  at[2] - radius * Math.max(...normals.map((n) => Math.hypot(n[0], n[1])));
