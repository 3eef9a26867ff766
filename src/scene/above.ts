/**
 * The view from above, the nose up and starboard to the right: what drives and steadies the craft, and how its thrust as
 * set turns it about the CG. m in the plane of the view.
 */
import type { Craft } from '../craft/craft.ts';
import type { Part } from '../craft/schema.ts';
import { formatQuantity } from '../units/format.ts';
import { fromAbove } from './flatten.ts';
import type { BalanceMarks } from './marks.ts';
import { type Geometry, geometryOf, type Subject, type UnitSystem } from './subject.ts';
import { armLength, senseOf, thrustInWords, yawOf, yawWords } from './thrustWords.ts';
import { type PlanePoint, toScreen, type View } from './view.ts';

const steers = ({ kind, thruster, fin }: Part): boolean =>
  kind === 'thruster' || kind === 'fin' || thruster !== null || fin !== null;

/** Pieces to draw: of thrusters and fins, and of what is selected. */
export const piecesAbove = (
  { parts }: Craft,
  { pieces }: Geometry,
  selected: readonly string[],
): Geometry['pieces'] =>
  pieces.filter(({ part }) => {
    const found = parts.byId[part];
    return found && (steers(found) || selected.includes(part));
  });

/** The CB and the CG. No line hangs between them: it points at the eye. */
export function aboveMarks(view: View, { cb, cg }: Geometry): BalanceMarks {
  const bob = cg && toScreen(view, fromAbove(cg));
  return { ring: toScreen(view, fromAbove(cb)), bob, lean: UPRIGHT, line: 0 };
}

/** So that CG is written to the right of its mark, and CB to the left of its own. */
const UPRIGHT = 1e-9;

export interface YawMark {
  /** Of the CG. */
  readonly at: PlanePoint;
  /** −1 to port, 1 to starboard, 0 for none. */
  readonly sense: -1 | 0 | 1;
  /** "yaws to starboard", "0.208 N·m"; nothing for none. */
  readonly words: readonly string[];
  /** Levers from the CG: aft to the thrusters that turn in yaw, and athwart to those throttled apart. */
  readonly levers: readonly Lever[];
}

export interface Lever {
  readonly from: PlanePoint;
  readonly to: PlanePoint;
  readonly words: string;
}

/** Null without thrust. */
export function yawMark(geometry: Geometry, units: UnitSystem): YawMark | null {
  const { thrust, cg, cb } = geometry;
  if (thrust.length === 0) return null;
  const yaw = yawOf(geometry);
  const at = fromAbove(cg ?? cb);
  const lever = (length: number | null, to: (length: number) => PlanePoint): Lever[] =>
    length === null || Math.abs(length) < SHORTEST
      ? []
      : [{ from: at, to: to(length), words: `arm ${armLength(length, units)}` }];
  return {
    at,
    sense: senseOf(yaw),
    words: yawWords(yaw, units),
    levers: [
      ...lever(yaw.arm, (arm) => ({ u: at.u, z: at.z - arm })),
      ...lever(yaw.side, (side) => ({ u: at.u + side, z: at.z })),
    ],
  };
}

/** m */
const SHORTEST = 0.01;

/** The view from above in words. */
export function aboveInWords(subject: Subject): string {
  const geometry = geometryOf(subject.assessment);
  if (!geometry) return '';
  const { units } = subject;
  const length = (value: number) => formatQuantity(value, 'length', units);
  const yaw = geometry.thrust.length > 0 ? yawOf(geometry) : null;
  return [
    `View from above, nose up, starboard on the right. Hull ${length(geometry.hull.length)} long and ${length(geometry.hull.breadth)} broad.`,
    thrustInWords(subject, 'yaw'),
    ...(yaw?.arm
      ? [`What turns in yaw is ${armLength(yaw.arm, units)} ${yaw.arm < 0 ? 'forward' : 'aft'} of the CG.`]
      : []),
    ...(yaw ? [`As set it ${yawWords(yaw, units).join(', ') || 'does not yaw'}.`] : []),
  ]
    .filter(Boolean)
    .join(' ');
}
