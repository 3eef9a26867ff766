/**
 * What works in the air outside and yet lies inside the hull: the middle of a fin, the disc of a propeller as it is turned
 * now. Depth is measured square to the axis or, where that is less, to the nearer end of the hull, m:
 *
 *   d = max min(r(x, θ) − ρ, x, L − x)   over the middle and, of a propeller, points of its rim
 *
 * Only what has thrust or fin figures, for only that is counted on.
 */
import type { Part } from '../craft/schema.ts';
import type { ThrusterData } from '../craft/thrustSchema.ts';
import type { Vec3 } from '../numeric/vector.ts';
import type { Hull } from '../physics/hull/hull.ts';
import { clockOf, distanceFromAxis } from '../physics/mass/position.ts';
import { directionOf, rimPoints } from '../physics/placing/sweep.ts';
import { say } from '../units/sentence.ts';

/** A hull is known, and sits in its straps, no better than this, m. */
const LEAST = 0.01;

type Inside = Pick<Part, 'thruster' | 'fin'>;

/** How deep under the skin one piece lies that should be outside, m; 0 when it does not. */
export function depthInside(part: Inside, middle: Vec3, hull: Hull): number {
  const { thruster, fin } = part;
  if (!thruster && !fin) return 0;
  const disc = thruster ? rimOf(thruster, middle) : [];
  const deepest = Math.max(...[middle, ...disc].map((point) => depthOf(point, hull)));
  return deepest > LEAST ? deepest : 0;
}

const rimOf = ({ diameter, yaw, pitch }: ThrusterData, at: Vec3): Vec3[] =>
  rimPoints({ at, radius: diameter / 2 }, directionOf(yaw.set, pitch.set));

function depthOf(point: Vec3, { length, radius }: Hull): number {
  const fromEnd = Math.min(point[0], length - point[0]);
  return fromEnd > LEAST ? Math.min(fromEnd, radius(point[0], clockOf(point)) - distanceFromAxis(point)) : 0;
}

/** "Fins: inside the hull, …"; null when none of its pieces is, and for what no figure counts. */
export function insideWords(
  part: Inside & Pick<Part, 'name' | 'kind'>,
  pieces: readonly { readonly middle: Vec3 }[],
  hull: Hull,
): string | null {
  const deepest = Math.max(0, ...pieces.map(({ middle }) => depthInside(part, middle, hull)));
  if (deepest === 0) return null;
  const depth = say(deepest, 'smallLength');
  const name = part.name || part.kind;
  return part.thruster
    ? `${name}: the propeller reaches ${depth} into the hull. The figures still count its thrust in full: move it out.`
    : `${name}: inside the hull, the middle of the fin ${depth} under the skin. The figures still count its area in full: move it out.`;
}
