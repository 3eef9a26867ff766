/**
 * The outline of a hull as curved panels, nose tip to tail tip, flat end faces included.
 *
 * The outline is r(x) = √(section area/π): the hull itself where it is a body of revolution, else the body of equal
 * sections. It is cut at its corners; between them x runs over t so that r(t) is smooth at blunt tips (x − x₀ ~ t²);
 * each piece is halved until the panel follows it, bends little and is short against the whole, and, near a corner,
 * against its distance from there, since the flow is steep at corners. A step too abrupt for that is taken as a
 * straight line.
 */
import type { Hull } from '../hull/hull.ts';
import { type FlowPanel, flowPanel, powerSum, samplePlaces } from './flowPanel.ts';

interface Point {
  readonly x: number;
  readonly r: number;
}

/** A smooth piece of the outline, t from 0 to 1, and the corners it runs into. */
interface Piece {
  at(t: number): Point;
  readonly corners: readonly Point[];
}

interface Limits {
  /** Greatest length of a panel, and at a corner, m. */
  readonly longest: number;
  readonly cornered: number;
  /** Least length that it is worth halving, m. */
  readonly shortest: number;
  /** Greatest bend, rad. */
  readonly bend: number;
  /** How far a panel may miss the outline, m. */
  readonly miss: number;
}

/** `detail` 2 halves every panel: the answer must hardly depend on it. */
export function flowPanels(hull: Hull, detail: number): FlowPanel[] {
  const span = Math.hypot(hull.length, hull.height);
  const limits = {
    longest: (0.12 * span) / detail,
    cornered: (0.02 * span) / detail,
    shortest: 2e-3 * Math.min(hull.length, hull.height),
    bend: 0.6 / detail,
    miss: (2e-4 * Math.min(hull.length, hull.height)) / detail ** 2,
  };
  return piecesOf(hull).flatMap((piece) => halved(piece, 0, 1, limits));
}

/** A face smaller than this share of the height is a tip; a turn sharper than this, rad, is a corner. */
const FACE = 1e-6;
const CORNER = 0.15;
const MARKS = 160;

function piecesOf(hull: Hull): Piece[] {
  const radius = (x: number): number => Math.sqrt(Math.max(0, hull.sectionArea(x)) / Math.PI);
  const cuts = cutsOf(hull, radius);
  const smooth = cuts
    .slice(1)
    .map((to, i) => smoothPiece(cuts[i]!, to, i > 0, i + 2 < cuts.length, hull, radius));
  return [...face(hull, 0, radius(0)), ...smooth, ...face(hull, hull.length, radius(hull.length))];
}

/** Stations of the ends and of the corners between them, ascending. */
function cutsOf(hull: Hull, radius: (x: number) => number): number[] {
  const marks = hull.drawStations(MARKS).map((x) => ({ x, r: radius(x) }));
  const heading = (i: number): number =>
    Math.atan2(marks[i + 1]!.r - marks[i]!.r, marks[i + 1]!.x - marks[i]!.x);
  const corners = marks.filter(
    (_, i) => i > 0 && i + 1 < marks.length && Math.abs(heading(i) - heading(i - 1)) > CORNER,
  );
  const cuts = [0, ...corners.map(({ x }) => x), hull.length];
  return cuts.filter((x, i) => i === 0 || x === hull.length || isClear(x, cuts[i - 1]!, hull));
}

/** Corners closer together, or to an end, than this share of the length are one step. */
const isClear = (x: number, before: number, { length }: Hull): boolean =>
  x - before > FACE * length && length - x > FACE * length;

/** A flat end: from the axis to the rim at the nose, back at the tail. */
function face(hull: Hull, x: number, rim: number): Piece[] {
  if (rim <= FACE * hull.height) return [];
  const [start, end] = x === 0 ? [0, rim] : [rim, 0];
  return [{ ...straightPiece({ x, r: start }, { x, r: end }), corners: [{ x, r: rim }] }];
}

function smoothPiece(
  from: number,
  to: number,
  cornerFore: boolean,
  cornerAft: boolean,
  hull: Hull,
  radius: (x: number) => number,
): Piece {
  const tip = (x: number): boolean => radius(x) <= FACE * hull.height;
  const share = grading(!cornerFore && tip(from), !cornerAft && tip(to));
  const at = (t: number): Point => {
    const x = t === 1 ? to : from + (to - from) * share(t);
    return { x, r: radius(x) };
  };
  const ends = [at(0), at(1)];
  const inner = [at(BESIDE), at(1 - BESIDE)];
  return { at, corners: ends.filter((end, i) => end.r > FACE * hull.height || !isBlunt(end, inner[i]!)) };
}

/** A tip whose outline rises this steeply, rad, close beside it is round. */
const BLUNT = 1.3;
const BESIDE = 1e-3;

const isBlunt = (tip: Point, beside: Point): boolean =>
  Math.atan2(beside.r, Math.abs(beside.x - tip.x)) > BLUNT;

/** Share of the piece at t, even or going as a square from a tip. */
function grading(tipFore: boolean, tipAft: boolean): (t: number) => number {
  if (tipFore && tipAft) return (t) => Math.sin((Math.PI / 2) * t) ** 2;
  if (tipFore) return (t) => t * t;
  return tipAft ? (t) => t * (2 - t) : (t) => t;
}

function halved(piece: Piece, from: number, to: number, limits: Limits): FlowPanel[] {
  const points = samplePlaces.map((place) => piece.at(from + ((to - from) * (1 + place)) / 2));
  const [start, end] = [points[0]!, points.at(-1)!];
  const length = lengthOf(points);
  if (length < NIL * limits.longest) return [];
  const panel = flowPanel(
    points.map(({ x }) => x),
    points.map(({ r }) => r),
  );
  if (isShort(points, piece, limits) && isFollowed(points, panel, piece, from, to, limits)) return [panel];
  if (length <= limits.shortest || to - from < SMALLEST_SHARE)
    return halved(straightPiece(start, end), 0, 1, limits);
  const middle = (from + to) / 2;
  return [...halved(piece, from, middle, limits), ...halved(piece, middle, to, limits)];
}

/** A panel shorter than this share of the longest is none. */
const NIL = 1e-9;
/** A piece of the outline is not halved more often than this allows. */
const SMALLEST_SHARE = 1 / 2000;

const lengthOf = (points: readonly Point[]): number =>
  points.slice(1).reduce((sum, { x, r }, i) => sum + Math.hypot(x - points[i]!.x, r - points[i]!.r), 0);

/** Short against the hull, and against the distance of its nearer end from every corner. */
function isShort(points: readonly Point[], { corners }: Piece, limits: Limits): boolean {
  const ends = [points[0]!, points.at(-1)!];
  const room = Math.min(
    ...corners.map((corner) => Math.min(...ends.map(({ x, r }) => Math.hypot(x - corner.x, r - corner.r)))),
  );
  return lengthOf(points) <= Math.min(limits.longest, limits.cornered + room);
}

function isFollowed(
  points: readonly Point[],
  panel: FlowPanel,
  piece: Piece,
  from: number,
  to: number,
  limits: Limits,
): boolean {
  if (bendOf(points) > limits.bend) return false;
  return BETWEEN.every((t) => {
    const { x, r } = piece.at(from + ((to - from) * (1 + t)) / 2);
    return Math.hypot(powerSum(panel.xs, t) - x, powerSum(panel.rs, t) - r) <= limits.miss;
  });
}

/** Places between the samples, where a panel would stray most. */
const BETWEEN = [-0.97, -0.5, 0.05, 0.6, 0.97];

function bendOf(points: readonly Point[]): number {
  const headings = points.slice(1).map(({ x, r }, i) => Math.atan2(r - points[i]!.r, x - points[i]!.x));
  return headings.slice(1).reduce((sum, heading, i) => sum + Math.abs(heading - headings[i]!), 0);
}

const straightPiece = (a: Point, b: Point): Piece => ({
  at: (t) => ({ x: a.x + (b.x - a.x) * t, r: a.r + (b.r - a.r) * t }),
  corners: [a, b],
});
