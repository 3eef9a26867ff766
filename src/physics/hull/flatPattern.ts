/**
 * Hulls sewn or welded from flat patterns, full width w over the tape distance s of the pattern's centre line.
 *
 *   n equal gores      2πr = n w     (each gore bends to an arc of the round section)
 *   two sheets         2πr = 2 w     (slender hull: the length of the meridian is kept)
 *
 * The section is taken as round and the tape along the centre line as the meridian: elementary geometry of developable
 * gores, common practice, no source; slack film at rounded tips lies in folds (tautOutline.ts). w runs as a monotone
 * cubic through the rows. Both ends are closed to a point, also where the pattern is cut off with some width.
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { pchip } from '../../numeric/pchip.ts';
import { say } from '../../units/sentence.ts';
import { piecesOf } from './cubicPiece.ts';
import type { Meridian, ShapeOf } from './meridian.ts';
import { withRoundTips } from './roundTips.ts';
import { rowsFault } from './rows.ts';
import { greatestRadius, tapeStretch } from './tapeMeridian.ts';
import { tautOutline } from './tautOutline.ts';

type PatternRows = ShapeOf<'gores'>['rows'];

export const gores = ({ count, rows }: ShapeOf<'gores'>): Outcome<Meridian> => fromWidths(count, rows);
export const twoSheet = ({ rows }: ShapeOf<'twoSheet'>): Outcome<Meridian> => fromWidths(2, rows);

function fromWidths(count: number, rows: PatternRows): Outcome<Meridian> {
  const fault = rowsFault(
    rows.map(({ tape, width }) => ({ at: tape, size: width })),
    { at: 'tape distance', size: 'width' },
  );
  if (fault) return fault;
  const pattern = pchip(
    rows.map(({ tape }) => tape),
    rows.map(({ width }) => (count * width) / (2 * Math.PI)),
  );
  const pieces = tautOutline(piecesOf(withRoundTips(pattern)), 'closed');
  if (pieces.every((piece) => Math.abs(piece.c[1]) === 1 && piece.slack)) return tooWide(rows, count);
  return solved({
    stretches: pieces.map((piece) => tapeStretch(piece, (s) => 2 * Math.PI * pattern.at(s))),
    maxRadius: greatestRadius(pieces),
  });
}

function tooWide(rows: PatternRows, count: number) {
  const whole = rows.at(-1)!.tape;
  return infeasible(
    `The pattern is everywhere wider than its length of ${say(whole, 'length')} can use: inflated it has no length left.`,
    `Half way along, a width under ${say((Math.PI * whole) / count, 'length')} gives a hull.`,
  );
}
