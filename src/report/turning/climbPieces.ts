/** The curve of climb over vectoring in pieces: it is broken where there is no steady path, and where the flow turns about. */
import type { ClimbPoint } from '../../physics/cruise/climb.ts';
import type { Rows } from '../rows.ts';

export interface ClimbAt {
  /** Thrust turned in pitch, rad, + up. */
  readonly x: number;
  /** m/s, + up */
  readonly y: number;
}

/** Between points of one piece the air does not come from another side than this, rad: flying ahead is not rising upright. */
const TURNED_ABOUT = Math.PI / 4;

/** Pieces of two points and more, in order, the fastest climb and descent of `rows` among them. */
export function climbPieces(curve: readonly ClimbPoint[], rows: Rows): ClimbAt[][] {
  const pieces: ClimbAt[][] = [];
  let before: number | null = null;
  for (const { vector, climb } of curve) {
    if (climb.status === 'infeasible') {
      before = null;
      continue;
    }
    const { climbRate, attack } = climb.value;
    if (before === null || Math.abs(attack - before) > TURNED_ABOUT) pieces.push([]);
    pieces.at(-1)!.push({ x: vector, y: climbRate });
    before = attack;
  }
  for (const key of ['climb.best', 'climb.descent']) {
    const [y, x] = [rows[key]?.value ?? null, rows[`${key}Vector`]?.value ?? null];
    if (x !== null && y !== null) addTo(pieces, { x, y });
  }
  return pieces.filter(({ length }) => length > 1);
}

/** To the piece that it lies in or nearest to. */
function addTo(pieces: ClimbAt[][], at: ClimbAt): void {
  const away = (piece: readonly ClimbAt[]) => Math.max(piece[0]!.x - at.x, at.x - piece.at(-1)!.x, 0);
  const [nearest] = [...pieces].sort((a, b) => away(a) - away(b));
  if (!nearest || nearest.some(({ x }) => x === at.x)) return;
  nearest.push(at);
  nearest.sort((a, b) => a.x - b.x);
}
