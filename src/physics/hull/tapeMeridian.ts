/**
 * A meridian known by tape distance: s from the nose tip, r(s); the station follows from dx/ds = √(1 − (dr/ds)²).
 * Where the outline has slack the film round the section is wider than the girth: `film(s)` gives its width.
 *
 * Where the slope is ±1 at an end of a piece, as at a blunt tip, dx/ds starts like a root; s then runs as the square
 * of t there, which leaves nothing singular.
 */
import { heightAt, placesOfSlope, slopeAt } from './cubicPiece.ts';
import type { Stretch } from './meridian.ts';
import type { OutlinePiece } from './tautOutline.ts';

/** A place on the piece and its change with t, both in shares of the piece. */
type Grading = (t: number) => { readonly share: number; readonly rate: number };

const even: Grading = (t) => ({ share: t, rate: 1 });
const fromStart: Grading = (t) => ({ share: t * t, rate: 2 * t });
const toEnd: Grading = (t) => ({ share: t * (2 - t), rate: 2 * (1 - t) });
const both: Grading = (t) => ({ share: t * t * (3 - 2 * t), rate: 6 * t * (1 - t) });

function gradingOf(piece: OutlinePiece): Grading {
  if (piece.slack) return even;
  const steep = (s: number) => Math.abs(slopeAt(piece, s)) > 1 - 1e-9;
  if (steep(piece.from)) return steep(piece.to) ? both : fromStart;
  return steep(piece.to) ? toEnd : even;
}

export function tapeStretch(piece: OutlinePiece, film: (s: number) => number): Stretch {
  const h = piece.to - piece.from;
  const grading = gradingOf(piece);
  const place = (t: number) => piece.from + h * grading(t).share;
  const stretch: Stretch = {
    at: (t) => {
      const { share, rate } = grading(t);
      const s = piece.from + h * share;
      const slope = slopeAt(piece, s);
      return {
        r: Math.max(0, heightAt(piece, s)),
        dx: h * rate * Math.sqrt(Math.max(0, (1 - slope) * (1 + slope))),
        dr: h * rate * slope,
      };
    },
  };
  return piece.slack ? { ...stretch, film: (t) => film(place(t)) } : stretch;
}

/** Greatest r of an outline: at the end of a piece or where r(s) is level inside one. */
export function greatestRadius(pieces: readonly OutlinePiece[]): number {
  return Math.max(
    ...pieces.flatMap((piece) =>
      [piece.from, piece.to, ...placesOfSlope(piece, 0)].map((s) => heightAt(piece, s)),
    ),
  );
}
