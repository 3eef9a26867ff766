/**
 * A hull as the rest of the program sees it, whatever form it was given in.
 *
 * Axes: x (station) aft from the nose tip, y to starboard, z up; the hull axis is y = z = 0. Every hull is
 * symmetric about the planes y = 0 and z = 0, so CB and skin centroid lie on the axis.
 * All values SI. Clock angle: 0 top, π/2 starboard, π keel.
 */
export interface Hull {
  /** Nose tip to tail tip, m. */
  readonly length: number;
  /** Greatest height (z) and greatest breadth (y), m; equal for a body of revolution. */
  readonly height: number;
  readonly breadth: number;
  /** Gas volume, m³. */
  readonly volume: number;
  /** Wetted area of the inflated hull, m². */
  readonly area: number;
  /** Area of film it is made from, m²; more than `area` where flat film lies in folds: along the rim of two round sheets, at wide tips of a pattern. */
  readonly filmArea: number;
  /** Length of one meridional seam, nose tip to tail tip with any flat end faces (the whole edge of a two-sheet hull is two of them), m. */
  readonly seamLength: number;
  /** Greatest section area seen from ahead, m². */
  readonly frontalArea: number;
  /** Area of the outline seen from above, m². */
  readonly planformArea: number;
  /** Centroid of the gas volume, m. */
  readonly cbStation: number;
  /** Centroid of the film, m. */
  readonly skinStation: number;
  /** Second moments ∫(y²+z²)dV, ∫(z²+x′²)dV, ∫(x′²+y²)dV about CB, m⁵: times a density they are the moments of inertia of the displaced air about x, y, z. */
  readonly volumeInertia: Triple;
  /** The same of the film about its own centroid, per unit areal density, m⁴. */
  readonly skinInertia: Triple;
  /** The same of one unit of seam mass per metre, all seams together taken as spread evenly round the section (the round two-sheet balloon: along its rim), per seam, m³, about the seam centroid; and that centroid's station. */
  readonly seamInertia: Triple;
  readonly seamStation: number;

  /** Distance from the axis to the skin at a station and clock angle, m; at a flat end face its rim; 0 beyond the ends. */
  radius(station: number, clock: number): number;
  /** Section area at a station, m²; 0 beyond the ends. */
  sectionArea(station: number): number;
  /** Girth at a station, m; 0 beyond the ends. */
  girth(station: number): number;
  /** Tape distance from the nose tip along the skin at a clock angle, m; clamped to the ends. At a flat end face: to its rim. */
  tapeAt(station: number, clock: number): number;
  /** Station reached by a tape from the nose tip along the skin at a clock angle, m; clamped to the ends. Anywhere on a flat face it is the station of that face. */
  stationAt(tape: number, clock: number): number;
  /** Length and first moments of the skin path at one clock angle between two stations (order does not matter). */
  skinPath(from: number, to: number, clock: number): SkinPath;
  /** Stations for drawing, dense where the outline bends, nose to tail; about `count` of them, ends included. */
  drawStations(count: number): readonly number[];
}

export type Triple = readonly [number, number, number];

/** A stretch of meridian: its length ∫ds, and ∫x ds, ∫r ds, ∫x² ds, ∫x r ds, ∫r² ds with r the distance from the axis. */
export interface SkinPath {
  readonly length: number;
  readonly x: number;
  readonly r: number;
  readonly xx: number;
  readonly xr: number;
  readonly rr: number;
}
