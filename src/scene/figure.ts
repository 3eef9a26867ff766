/**
 * One drawn piece of a part: its paths where it is and as large as it is, in the plane of a view, m. A piece that would
 * shrink to a speck is drawn larger and says so; its middle is always true. A thruster is drawn turned as its thrust is.
 */
import { finOutline } from '../craft/finOutline.ts';
import type { Part } from '../craft/schema.ts';
import type { Hull, PieceView } from '../report/assessment.ts';
import { depthInside } from '../report/insideHull.ts';
import { keelAt, onSection } from './outline.ts';
import { box, carried, type Path, p, polygon, stroke } from './path.ts';
import { FRONT_SHAPES } from './shapesFront.ts';
import { SIDE_SHAPES } from './shapesSide.ts';
import { type Box, boxOf, type PlanePoint, turnedBy } from './view.ts';

export interface Figure {
  readonly part: string;
  readonly copy: number;
  readonly kind: Part['kind'];
  readonly middle: PlanePoint;
  readonly paths: readonly Path[];
  /** Lines by which it hangs from the keel. */
  readonly struts: readonly (readonly PlanePoint[])[];
  readonly box: Box;
  /** Drawn larger than it is. */
  readonly enlarged: boolean;
  /** On the side away from the eye. */
  readonly far: boolean;
  /** A propeller or a fin inside the hull, where it works nothing. */
  readonly amiss: boolean;
}

/** Least size on screen, px: of the larger and of the smaller dimension. */
export const LEAST_PX = 15;
const LEAST_SMALLER_PX = 5;

interface Apparent {
  readonly across: number;
  readonly outward: number;
  readonly enlarged: boolean;
}

/** Dimensions as drawn, at `px` metres to a pixel. */
export function apparentSize(across: number, outward: number, px: number): Apparent {
  const larger = Math.max(across, outward);
  const enlarged = larger < LEAST_PX * px;
  if (larger === 0) return { across: LEAST_PX * px, outward: 0.7 * LEAST_PX * px, enlarged };
  const factor = enlarged ? (LEAST_PX * px) / larger : 1;
  const least = LEAST_SMALLER_PX * px;
  return {
    across: Math.max(across * factor, least),
    outward: Math.max(outward * factor, least),
    enlarged,
  };
}

/** A thruster is as wide as its propeller, a fin as large as its outline, all else as its box. */
function drawnSize({ kind, size, thruster, fin }: Part): Part['size'] {
  if (kind === 'thruster' && thruster) {
    return { ...size, width: thruster.diameter, height: thruster.diameter };
  }
  if (kind !== 'fin' || !fin) return size;
  const { span, chord } = finOutline(fin);
  return { ...size, length: chord, height: span };
}

/** From the side; `px` is the size of a pixel, m. */
export function sideFigure(part: Part, piece: PieceView, hull: Hull, px: number): Figure {
  const { kind } = part;
  const size = drawnSize(part);
  const [x, y, z] = piece.middle;
  const cos = Math.cos(piece.roll);
  const seen = size.height * Math.abs(cos) + size.width * Math.abs(Math.sin(piece.roll));
  const { across, outward, enlarged } = apparentSize(size.length, seen, px);
  const up = cos < -1e-9 ? -1 : 1;
  const carry = turnedAt(p(x, z), part.thruster?.pitch.set ?? 0);
  const rooted = isRooted(part);
  const paths = rooted
    ? finOnSkin(size, piece, hull, ({ z: height }, station) => p(station, height))
    : SIDE_SHAPES[kind](across, outward).map((path) =>
        carried(path, ({ u, z: out }) => carry(p(u, up * out))),
      );
  const top = z + outward / 2;
  const struts =
    part.place.kind === 'keel' ? strutsTo(hull, x, top, kind === 'gondola' ? 0.3 * across : 0) : [];
  return finish(part, piece, hull, {
    middle: p(x, z),
    paths,
    struts,
    enlarged: enlarged && !rooted,
    far: y > 1e-6,
  });
}

/** About the middle of a piece, as its thrust is turned, carried to where it is. */
const turnedAt =
  (middle: PlanePoint, angle: number) =>
  (point: PlanePoint): PlanePoint => {
    const { u, z } = turnedBy({ tilt: angle, pivot: 0 }, point);
    return p(middle.u + u, middle.z + z);
  };

/** From astern. */
export function frontFigure(part: Part, piece: PieceView, hull: Hull, px: number): Figure {
  const { kind } = part;
  const size = drawnSize(part);
  const [x, y, z] = piece.middle;
  const { across, outward, enlarged } = apparentSize(size.width, size.height, px);
  const cos = Math.cos(piece.roll);
  const sin = Math.sin(piece.roll);
  const paths = FRONT_SHAPES[kind](across, outward).map((path) =>
    carried(path, ({ u, z: out }) => p(y + u * cos + out * sin, z - u * sin + out * cos)),
  );
  const struts = part.place.kind === 'keel' ? [[p(0, keelAt(hull, x)), p(y, z + outward / 2)]] : [];
  const hanging = struts.filter(([keel, end]) => keel!.z > end!.z + 1e-9);
  return finish(part, piece, hull, { middle: p(y, z), paths, struts: hanging, enlarged, far: false });
}

/** From above, the nose up: what drives and steadies the craft; of anything else its box. */
export function aboveFigure(part: Part, piece: PieceView, hull: Hull, px: number): Figure {
  const { kind } = part;
  const size = drawnSize(part);
  const [x, y, z] = piece.middle;
  const { across, outward, enlarged } = apparentSize(size.length, size.width, px);
  const carry = turnedAt(p(y, -x), part.thruster?.yaw.set ?? 0);
  const rooted = isRooted(part);
  const shape =
    kind === 'thruster'
      ? SIDE_SHAPES.thruster(across, outward)
      : [box(-across / 2, across / 2, -outward / 2, outward / 2)];
  const paths = rooted
    ? finOnSkin(size, piece, hull, ({ u }, station) => p(u, -station))
    : shape.map((path) => carried(path, ({ u, z: out }) => carry(p(out, -u))));
  return finish(part, piece, hull, {
    middle: p(y, -x),
    paths,
    struts: [],
    enlarged: enlarged && !rooted,
    far: z < -1e-6,
  });
}

type Drawn = Pick<Figure, 'middle' | 'paths' | 'struts' | 'enlarged' | 'far'>;

const finish = (part: Part, piece: PieceView, hull: Hull, drawn: Drawn): Figure => ({
  part: part.id,
  copy: piece.copy,
  kind: part.kind,
  ...drawn,
  amiss: depthInside(part, piece.middle, hull) > 0,
  box: boxOf(drawn.paths.flatMap((path) => path.points)),
});

/** Straight up to the keel: one line, or two `spread` either way of the middle; none where it touches. */
function strutsTo(hull: Hull, station: number, top: number, spread: number): PlanePoint[][] {
  const stations = spread > 0 ? [station - spread, station + spread] : [station];
  return stations.flatMap((u) => {
    const keel = keelAt(hull, u);
    return keel > top + 1e-6 ? [[p(u, keel), p(u, top)]] : [];
  });
}

const isRooted = ({ kind, place, size }: Part): boolean =>
  kind === 'fin' && place.kind === 'skin' && size.height > 0;

const ROOT_STEPS = 8;

/**
 * A plate standing on the skin: its root follows the skin, its tip lies half the span beyond the middle, and the whole is
 * seen under its clock angle: `seen` puts a point of a section into the plane of the view. The leading edge is swept back,
 * the trailing edge square.
 */
function finOnSkin(
  size: Part['size'],
  { middle: [x, y, z], roll }: PieceView,
  hull: Hull,
  seen: (onSection: PlanePoint, station: number) => PlanePoint,
): Path[] {
  const tip = Math.hypot(y, z) + size.height / 2;
  const at = (station: number, distance: number) => seen(onSection(roll, distance), station);
  const root = Array.from({ length: ROOT_STEPS + 1 }, (_, i) => {
    const station = x + size.length * (i / ROOT_STEPS - 0.5);
    return at(station, Math.min(tip, hull.radius(station, roll)));
  });
  const aft = x + size.length / 2;
  const hinge = x + 0.26 * size.length;
  return [
    polygon([...root, at(aft, tip), at(x - 0.05 * size.length, tip)]),
    stroke(at(hinge, Math.min(tip, hull.radius(hinge, roll))), at(hinge, tip)),
  ];
}
