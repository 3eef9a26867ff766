/**
 * A meridian known by tape distance: s from the nose tip, r(s); the station follows from dx/ds = √(1 − (dr/ds)²).
 * Where the outline has slack the film round the section is wider than the girth: `film(s)` gives its width.
 */
import { heightAt, placesOfSlope, slopeAt } from './cubicPiece.ts';
import type { Stretch } from './meridian.ts';
import type { OutlinePiece } from './tautOutline.ts';

export function tapeStretch(piece: OutlinePiece, film: (s: number) => number): Stretch {
  const h = piece.to - piece.from;
  const place = (t: number) => piece.from + h * t;
  const stretch: Stretch = {
    at: (t) => {
      const s = place(t);
      const slope = slopeAt(piece, s);
      return {
        r: Math.max(0, heightAt(piece, s)),
        dx: h * Math.sqrt(Math.max(0, (1 - slope) * (1 + slope))),
        dr: h * slope,
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
