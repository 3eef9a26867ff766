/**
 * The window on a plane of the craft: how metres become pixels, and back.
 *
 * Side view: u is the station (aft, to the right: the nose is on the left), z is up. Front view, from astern: u is the
 * side (starboard to the right), z is up. Screen x runs right and y down, px. The tilt turns the drawing clockwise
 * about the point (pivot, 0), which is the CB: pitch nose-up in the side view, heel starboard-down in the front view.
 */
export interface PlanePoint {
  readonly u: number;
  readonly z: number;
}

export interface ScreenPoint {
  readonly x: number;
  readonly y: number;
}

export interface View {
  /** px per metre. */
  readonly scale: number;
  /** Where (0, 0) of the plane lies when the view is not tilted, px. */
  readonly originX: number;
  readonly originY: number;
  /** Size of the window, px. */
  readonly width: number;
  readonly height: number;
  /** rad, + clockwise. */
  readonly tilt: number;
  /** u of the point about which it tilts, m. */
  readonly pivot: number;
}

export interface Margins {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

export const LEAST_SCALE = 2;
export const GREATEST_SCALE = 20_000;

const clamp = (value: number, low: number, high: number): number => Math.min(high, Math.max(low, value));

/** A plane point turned about the pivot, still in metres. */
export function turnedBy({ tilt, pivot }: Pick<View, 'tilt' | 'pivot'>, { u, z }: PlanePoint): PlanePoint {
  if (tilt === 0) return { u, z };
  const cos = Math.cos(tilt);
  const sin = Math.sin(tilt);
  return { u: pivot + (u - pivot) * cos + z * sin, z: z * cos - (u - pivot) * sin };
}

export function toScreen(view: View, point: PlanePoint): ScreenPoint {
  const { u, z } = turnedBy(view, point);
  return { x: view.originX + u * view.scale, y: view.originY - z * view.scale };
}

export function toWorld(view: View, { x, y }: ScreenPoint): PlanePoint {
  const turned = { u: (x - view.originX) / view.scale, z: (view.originY - y) / view.scale };
  return turnedBy({ tilt: -view.tilt, pivot: view.pivot }, turned);
}

export const panned = (view: View, dx: number, dy: number): View => ({
  ...view,
  originX: view.originX + dx,
  originY: view.originY + dy,
});

/** Zooms by a factor; what lies under the screen point stays under it. */
export function zoomedAt(view: View, at: ScreenPoint, factor: number): View {
  const scale = clamp(view.scale * factor, LEAST_SCALE, GREATEST_SCALE);
  const k = scale / view.scale;
  return {
    ...view,
    scale,
    originX: at.x + (view.originX - at.x) * k,
    originY: at.y + (view.originY - at.y) * k,
  };
}

export const zoomedAtMiddle = (view: View, factor: number): View =>
  zoomedAt(view, { x: view.width / 2, y: view.height / 2 }, factor);

/** Smallest upright box of turned points, m. */
export interface Box {
  readonly left: number;
  readonly right: number;
  readonly bottom: number;
  readonly top: number;
}

export const boxOf = (points: readonly PlanePoint[]): Box => ({
  left: Math.min(...points.map((p) => p.u)),
  right: Math.max(...points.map((p) => p.u)),
  bottom: Math.min(...points.map((p) => p.z)),
  top: Math.max(...points.map((p) => p.z)),
});

/** The view that shows all the points, as large as the margins (px) allow, in the middle. */
export function fitted(view: View, points: readonly PlanePoint[], margins: Margins): View {
  if (points.length === 0) return view;
  const box = boxOf(points.map((point) => turnedBy(view, point)));
  const roomX = Math.max(40, view.width - margins.left - margins.right);
  const roomY = Math.max(40, view.height - margins.top - margins.bottom);
  const wide = Math.max(box.right - box.left, 1e-6);
  const high = Math.max(box.top - box.bottom, 1e-6);
  const scale = clamp(Math.min(roomX / wide, roomY / high), LEAST_SCALE, GREATEST_SCALE);
  return {
    ...view,
    scale,
    originX: margins.left + roomX / 2 - (scale * (box.left + box.right)) / 2,
    originY: margins.top + roomY / 2 + (scale * (box.bottom + box.top)) / 2,
  };
}

/** Pans back just enough that some of the box of the points stays in the window, `keep` px of it. */
export function keptInSight(view: View, points: readonly PlanePoint[], keep = 60): View {
  if (points.length === 0) return view;
  const at = points.map((point) => toScreen(view, point));
  const left = Math.min(...at.map((p) => p.x));
  const right = Math.max(...at.map((p) => p.x));
  const top = Math.min(...at.map((p) => p.y));
  const bottom = Math.max(...at.map((p) => p.y));
  const dx = Math.max(0, keep - right) - Math.max(0, left - (view.width - keep));
  const dy = Math.max(0, keep - bottom) - Math.max(0, top - (view.height - keep));
  return dx || dy ? panned(view, dx, dy) : view;
}
