/**
 * A hull from measured offsets, with a monotone cubic between the rows (Fritsch & Carlson 1980).
 *
 * Along the station the cubic goes through r²: near a blunt nose r² = 2ϱx, a straight line, where r itself rises
 * upright and no cubic in x could follow it; and the volume is its plain integral.
 * Along the tape it goes through r: there r(s) is smooth at a blunt nose (slope 1), and x′ = √(1 − r′²) gives the
 * station. The skin is straight in section, so a diameter cannot grow faster than twice the tape.
 * Size > 0 in the last row, or at station 0, is a flat face.
 */
import { type Infeasible, infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { pchip } from '../../numeric/pchip.ts';
import { say } from '../../units/sentence.ts';
import { type CubicPiece, piecesOf } from './cubicPiece.ts';
import { type Meridian, mirrored, type ShapeOf, type Stretch, straight } from './meridian.ts';
import { withRoundTips } from './roundTips.ts';
import { type Row, rowsFault } from './rows.ts';
import { greatestRadius, tapeStretch } from './tapeMeridian.ts';
import { tautOutline } from './tautOutline.ts';

type Offsets = ShapeOf<'offsets'>;

export function offsets({ along, across, rows }: Offsets): Outcome<Meridian> {
  const words = { at: along === 'station' ? 'station' : 'tape distance', size: across };
  const fault = rowsFault(rows, words);
  if (fault) return fault;
  const perSize = across === 'diameter' ? 1 / 2 : 1 / (2 * Math.PI);
  const radii = rows.map(({ at, size }) => ({ at, size: size * perSize }));
  return along === 'station' ? solved(alongStation(radii)) : alongTape(radii);
}

function alongStation(radii: readonly Row[]): Meridian {
  const squares = pchip(
    radii.map(({ at }) => at),
    radii.map(({ size }) => size * size),
  );
  const nose = radii[0]!.size;
  const tail = radii.at(-1)!.size;
  return {
    stretches: [...face(0, nose), ...piecesOf(squares).map(squareStretch), ...face(tail, 0)],
    maxRadius: Math.max(...radii.map(({ size }) => size)),
  };
}

const face = (from: number, to: number): Stretch[] => (from === to ? [] : [straight(from, to, 0)]);

/** One piece of r²(x). From r = 0 it runs over t = √(u/h), so that r = t √(…) is smooth there; so too, mirrored, to r = 0. */
function squareStretch(piece: CubicPiece): Stretch {
  const { from, to, c } = piece;
  const h = to - from;
  if (c[0] === 0) return fromTip(h, c);
  const end = c[0] + h * (c[1] + h * (c[2] + h * c[3]));
  const endSlope = c[1] + h * (2 * c[2] + 3 * h * c[3]);
  if (Math.abs(end) <= 1e-12 * c[0]) return mirrored(fromTip(h, [0, -endSlope, c[2] + 3 * c[3] * h, -c[3]]));
  return {
    at: (t) => {
      const u = h * t;
      const r = Math.sqrt(Math.max(0, c[0] + u * (c[1] + u * (c[2] + u * c[3]))));
      const slope = c[1] + u * (2 * c[2] + u * 3 * c[3]);
      return { r, dx: h, dr: r > 0 ? (h * slope) / (2 * r) : 0 };
    },
  };
}

function fromTip(h: number, [, c1, c2, c3]: CubicPiece['c']): Stretch {
  return {
    at: (t) => {
      const u = h * t * t;
      const root = Math.sqrt(Math.max(0, h * (c1 + u * (c2 + u * c3))));
      const bend = root > 0 ? (h * u * (c2 + 2 * u * c3)) / root : 0;
      return { r: t * root, dx: 2 * h * t, dr: root + bend };
    },
  };
}

function alongTape(radii: readonly Row[]): Outcome<Meridian> {
  const fault = noseFault(radii) ?? steepnessFault(radii);
  if (fault) return fault;
  const curve = pchip(
    radii.map(({ at }) => at),
    radii.map(({ size }) => size),
  );
  const pieces = tautOutline(piecesOf(withRoundTips(curve)), 'open');
  return solved({
    // Measured girths are those of the taut skin: where the cubic was cut back there is no film in excess.
    stretches: [
      ...pieces.map((piece) => tapeStretch({ ...piece, slack: false }, () => 0)),
      ...face(radii.at(-1)!.size, 0),
    ],
    maxRadius: greatestRadius(pieces),
  });
}

function noseFault([first]: readonly Row[]): Infeasible | undefined {
  if (first!.size === 0) return undefined;
  return infeasible(
    'The first row has a size at tape distance 0, but the tape starts on the axis.',
    `Start with size 0, and give the edge of a flat face its own row at tape distance ${say(first!.size, 'length')}.`,
  );
}

function steepnessFault(radii: readonly Row[]): Infeasible | undefined {
  for (let i = 1; i < radii.length; i += 1) {
    const step = radii[i]!.at - radii[i - 1]!.at;
    const change = Math.abs(radii[i]!.size - radii[i - 1]!.size);
    if (change > step * (1 + 1e-9))
      return infeasible(
        `Between rows ${i} and ${i + 1} the diameter changes by ${say(2 * change, 'length')} over ${say(step, 'length')} of tape.`,
        `It can change by at most twice the tape, ${say(2 * step, 'length')}: measure these rows again.`,
      );
  }
  return undefined;
}
