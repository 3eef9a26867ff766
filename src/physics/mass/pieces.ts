/**
 * A part as the pieces it stands for: several at one place, a port–starboard pair, or a ring round the axis.
 * A piece on the skin, or one of a ring, stands square to the axis: its height points outward.
 */
import type { Part } from '../../craft/schema.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import type { Hull } from '../hull/hull.ts';
import type { Body } from './body.ts';
import { boxSecond, turnedSecond } from './inertia.ts';
import { clockOf, distanceFromAxis, mirrored, positionOf, turnedAboutAxis } from './position.ts';

export interface Piece extends Body {
  /** Middle of its length, m. Its CG lies `cgOffset` aft of it. */
  readonly middle: Vec3;
  /** Clock angle towards which its height points, rad; 0 upright. */
  readonly roll: number;
}

export function piecesOf(part: Part, hull: Hull): Piece[] {
  const first = positionOf(part.place, hull);
  const roll = part.place.kind === 'skin' ? part.place.clock : 0;
  const { copies } = part;
  switch (copies.kind) {
    case 'together':
      return Array.from({ length: copies.count }, () => pieceAt(part, first, roll));
    case 'pair':
      return [pieceAt(part, first, roll), pieceAt(part, mirrored(first), -roll)];
    case 'ring': {
      const outward = distanceFromAxis(first) > 0 ? clockOf(first) : roll;
      return Array.from({ length: copies.count }, (_, i) => {
        const turn = (2 * Math.PI * i) / copies.count;
        return pieceAt(part, turnedAboutAxis(first, turn), outward + turn);
      });
    }
  }
}

function pieceAt({ mass, size, cgOffset }: Part, middle: Vec3, roll: number): Piece {
  const second = turnedSecond(boxSecond(mass, size.length, size.width, size.height), roll);
  return { mass, middle, cg: [middle[0] + cgOffset, middle[1], middle[2]], second, roll };
}
