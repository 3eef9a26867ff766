/**
 * Thrust as arrows in the side view, which shows how it is turned in pitch, and in the view from above, which shows yaw.
 *
 * An angle φ in the plane of a view is counted from the nose, + up or to starboard. Thrust turned by δ in yaw and θ in pitch
 * points (cos θ cos δ, cos θ sin δ, sin θ) forward, to starboard, up, so that
 *   from the side  tan φ = sin θ / (cos θ cos δ),   from above  φ = δ, or δ + π where cos θ < 0.
 * Seen end-on an arrow has no length; it is never drawn shorter than what a hand can take.
 */
import type { Vectoring } from '../craft/thrustSchema.ts';
import type { ThrustArrow } from '../report/turning/arrows.ts';
import { type Flatten, fromAbove, fromSide } from './flatten.ts';
import type { PlanePoint } from './view.ts';

export type { ThrustArrow, Vectoring };

/** The way in which a view shows and turns it. */
export type Way = 'yaw' | 'pitch';

export interface ThrustMark {
  readonly part: string;
  readonly copy: number;
  readonly way: Way;
  /** From the middle of the disc, m in the plane of the view. */
  readonly at: PlanePoint;
  readonly tip: PlanePoint;
  /** φ, rad. */
  readonly angle: number;
  /** Where a hand takes it; null where it cannot. */
  readonly handle: PlanePoint | null;
}

/** px; the longest arrow is shorter where the pane is small. */
export const LONGEST_PX = 60;
const SHORTEST_PX = 24;
/** From the tip to the middle of the handle. */
const HANDLE_OFF_PX = 12;

const PLANES: Readonly<Record<Way, { flatten: Flatten; along(angle: number): PlanePoint }>> = {
  pitch: { flatten: fromSide, along: (angle) => ({ u: -Math.cos(angle), z: Math.sin(angle) }) },
  yaw: { flatten: fromAbove, along: (angle) => ({ u: Math.sin(angle), z: Math.cos(angle) }) },
};

/** Seen so nearly end-on, the thrust is taken as if it were not turned the other way. */
const END_ON = 1e-3;

/** φ, and the share of the length that is seen. */
function seen(
  way: Way,
  { yaw, pitch }: Pick<ThrustArrow, 'yaw' | 'pitch'>,
): { angle: number; share: number } {
  const ahead = Math.cos(pitch) * Math.cos(yaw);
  const across = way === 'yaw' ? Math.cos(pitch) * Math.sin(yaw) : Math.sin(pitch);
  const share = Math.hypot(ahead, across);
  return { angle: share < END_ON ? (way === 'yaw' ? yaw : pitch) : Math.atan2(across, ahead), share };
}

/** The angle of vectoring, −π … π, that is seen as φ; `other` is the angle it is turned to the other way. */
export function angleSeenAs(way: Way, angle: number, other: number): number {
  const cos = Math.cos(other);
  const turned = Math.abs(cos) < END_ON ? 1 : cos;
  const across = Math.sin(angle) * (way === 'yaw' ? Math.sign(turned) : Math.abs(turned));
  return Math.atan2(across, Math.cos(angle) * Math.sign(turned));
}

/** φ of a point as seen from where an arrow begins. */
export function angleTo(way: Way, from: PlanePoint, to: PlanePoint): number {
  const [u, z] = [to.u - from.u, to.z - from.z];
  return way === 'yaw' ? Math.atan2(u, z) : Math.atan2(z, -u);
}

/** An angle held within the limits: beyond them the nearer one, the shorter way round. */
export function heldWithin({ least, most }: Vectoring, angle: number): number {
  if (angle >= least && angle <= most) return angle;
  return apart(angle, least) < apart(angle, most) ? least : most;
}

const apart = (a: number, b: number): number => Math.abs(Math.atan2(Math.sin(a - b), Math.cos(a - b)));

export interface ThrustShown {
  readonly way: Way;
  /** px/m */
  readonly scale: number;
  readonly longest?: number;
  shows(part: string): boolean;
  /** Whether a hand can take the arrow of a part that turns. */
  hands(part: string): boolean;
}

/** Lengths on one scale for the whole craft. Pieces that lie on each other have one arrow. */
export function thrustMarks(arrows: readonly ThrustArrow[], shown: ThrustShown): ThrustMark[] {
  const greatest = Math.max(0, ...arrows.map(({ thrust }) => thrust));
  const marks: ThrustMark[] = [];
  for (const arrow of arrows) {
    if (!shown.shows(arrow.part)) continue;
    const mark = markOf(arrow, greatest, shown);
    const covered = ({ part, at }: ThrustMark) =>
      part === mark.part && Math.hypot(at.u - mark.at.u, at.z - mark.at.z) * shown.scale < 1;
    if (!marks.some(covered)) marks.push(mark);
  }
  return marks;
}

function markOf(
  arrow: ThrustArrow,
  greatest: number,
  { way, scale, longest = LONGEST_PX, hands }: ThrustShown,
): ThrustMark {
  const { flatten, along } = PLANES[way];
  const { part, copy, thrust, movesInYaw, movesInPitch } = arrow;
  const { angle, share } = seen(way, arrow);
  const length = Math.max(SHORTEST_PX, greatest > 0 ? (longest * share * thrust) / greatest : 0) / scale;
  const at = flatten(arrow.at);
  const out = (distance: number) => from(at, along(angle), distance);
  const turns = way === 'yaw' ? movesInYaw : movesInPitch;
  return {
    ...{ part, copy, way, at, angle },
    tip: out(length),
    handle: turns && hands(part) ? out(length + HANDLE_OFF_PX / scale) : null,
  };
}

const from = (at: PlanePoint, way: PlanePoint, distance: number): PlanePoint => ({
  u: at.u + way.u * distance,
  z: at.z + way.z * distance,
});

const ARC_STEP = Math.PI / 60;

/** Along which the handle goes, from one limit to the other. */
export function limitArc(
  { at, way, handle, tip }: ThrustMark,
  { least, most }: Vectoring,
  other: number,
): PlanePoint[] {
  const end = handle ?? tip;
  const radius = Math.hypot(end.u - at.u, end.z - at.z);
  const steps = Math.max(1, Math.ceil((most - least) / ARC_STEP));
  return Array.from({ length: steps + 1 }, (_, i) => {
    const angle = least + ((most - least) * i) / steps;
    const turned = way === 'yaw' ? { yaw: angle, pitch: other } : { yaw: other, pitch: angle };
    return from(at, PLANES[way].along(seen(way, turned).angle), radius);
  });
}
