/**
 * The outline that skin of a given girth along the tape can take: r(s) never rises or falls faster than the tape.
 *
 *   r(s) = min over s′ of r_p(s′) + |s − s′|,   r_p = (width of film round the section)/2π
 *
 * the greatest function under r_p with |dr/ds| ≤ 1. Where a rounded tip of a flat pattern widens faster than the tape
 * allows, the skin lies there as a flat face (r = s from the tip, dx = 0) until it meets the pattern; film in excess
 * lies in folds. With closed ends the tips are points of the axis, r(0) = r(S) = 0, whatever the width there.
 */
import { findRoot } from '../../numeric/roots.ts';
import { type CubicPiece, heightAt, mirroredPieces, part, placesOfSlope, slopeAt } from './cubicPiece.ts';

/** A piece of r(s); `slack` where film is in excess. */
export interface OutlinePiece extends CubicPiece {
  readonly slack: boolean;
}

export function tautOutline(pattern: readonly CubicPiece[], ends: 'closed' | 'open'): OutlinePiece[] {
  const whole = pattern.at(-1)!.to;
  const risen = limitRise(pattern, ends);
  return mirrored(limitRise(mirrored(risen, whole), ends), whole);
}

function mirrored(pieces: readonly OutlinePiece[], whole: number): OutlinePiece[] {
  const slack = pieces.map((piece) => piece.slack).reverse();
  return mirroredPieces(pieces, whole).map((piece, i) => ({ ...piece, slack: slack[i]! }));
}

/** Where the outline has left the pattern: along r0 + (s − s0). */
interface Ramp {
  readonly s0: number;
  readonly r0: number;
}

/** Slopes this little over 1 are rounding. */
const SLOPE_ROUNDING = 1e-9;
/** A cubic can leave a line of slope 1 and meet it again only a few times; more is rounding. */
const MOST_TURNS = 8;

/** The same with dr/ds ≤ 1 only: nose to tail, leaving the pattern where it gets too steep until it is met again. */
function limitRise(pattern: readonly (CubicPiece & { slack?: boolean })[], ends: 'closed' | 'open') {
  const out: OutlinePiece[] = [];
  let ramp: Ramp | undefined =
    ends === 'closed' && pattern[0]!.c[0] > 0 ? { s0: pattern[0]!.from, r0: 0 } : undefined;
  for (const piece of pattern) {
    let from = piece.from;
    for (let turn = 0; from < piece.to && turn < MOST_TURNS; turn += 1) {
      const to: number = (ramp ? meeting(piece, ramp, from) : departure(piece, from)) ?? piece.to;
      const met = to < piece.to;
      if (to > from) out.push(ramp ? rampPiece(ramp, from, to) : kept(piece, from, to));
      if (met) ramp = ramp ? undefined : { s0: to, r0: heightAt(piece, to) };
      from = to;
    }
    if (from < piece.to) out.push(kept(piece, from, piece.to));
  }
  return out;
}

const kept = (piece: CubicPiece & { slack?: boolean }, from: number, to: number): OutlinePiece => ({
  ...part(piece, from, to),
  slack: piece.slack ?? false,
});

const rampPiece = ({ s0, r0 }: Ramp, from: number, to: number): OutlinePiece => ({
  from,
  to,
  c: [r0 + (from - s0), 1, 0, 0],
  slack: true,
});

/** First place at or after `from` beyond which the piece is steeper than 1. */
const departure = (piece: CubicPiece, from: number): number | undefined =>
  stages(piece, from).find(({ slope }) => slope > 1 + SLOPE_ROUNDING)?.start;

/** First place at or after `from` where the piece is no longer above the ramp: it comes down to it only where flatter. */
function meeting(piece: CubicPiece, { s0, r0 }: Ramp, from: number): number | undefined {
  const above = (s: number) => heightAt(piece, s) - (r0 + (s - s0));
  if (above(from) < 0) return from;
  const met = stages(piece, from).find(({ slope, end }) => slope < 1 && above(end) <= 0);
  if (!met) return undefined;
  const root = findRoot(above, met.start, met.end, 1e-15);
  return root.status === 'solved' ? root.value : met.start;
}

/** Stretches of the piece from `from` on over which it stays steeper or flatter than 1, with the slope half way. */
function stages(piece: CubicPiece, from: number) {
  const places = [from, ...placesOfSlope(piece, 1).filter((s) => s > from), piece.to];
  return places.slice(1).map((end, i) => {
    const start = places[i]!;
    return { start, end, slope: slopeAt(piece, (start + end) / 2) };
  });
}
