/** Outlines of the hull: from the side and from above by its true profile, from astern by its section. m. */
import type { Hull } from '../report/assessment.ts';
import type { PlanePoint } from './view.ts';

const KEEL = Math.PI;

/** Closed: along the top from nose to tail, back along the keel. */
export function sideOutline(hull: Hull, count = 160): PlanePoint[] {
  const stations = hull.drawStations(count);
  const top = stations.map((u) => ({ u, z: hull.radius(u, 0) }));
  const keel = stations.map((u) => ({ u, z: -hull.radius(u, KEEL) }));
  return [...top, ...keel.reverse()];
}

const STARBOARD = Math.PI / 2;

/** From above, the nose up, closed: along the starboard side from nose to tail, back along the port side. */
export function planOutline(hull: Hull, count = 160): PlanePoint[] {
  const stations = hull.drawStations(count);
  const starboard = stations.map((x) => ({ u: hull.radius(x, STARBOARD), z: -x }));
  const port = stations.map((x) => ({ u: -hull.radius(x, -STARBOARD), z: -x }));
  return [...starboard, ...port.reverse()];
}

/** The keel line, nose to tail. */
export const keelLine = (hull: Hull, count = 160): PlanePoint[] =>
  hull.drawStations(count).map((u) => ({ u, z: keelAt(hull, u) }));

/** Height of the keel at a station; the axis beyond the ends. */
export const keelAt = (hull: Hull, station: number): number => -hull.radius(station, KEEL);

/** The section at a station seen from astern, closed, clockwise from the top. */
export function sectionOutline(hull: Hull, station: number, count = 96): PlanePoint[] {
  return Array.from({ length: count }, (_, i) => {
    const clock = (2 * Math.PI * i) / count;
    return onSection(clock, hull.radius(station, clock));
  });
}

/** A point seen from astern at a clock angle and a distance from the axis. */
export const onSection = (clock: number, distance: number): PlanePoint => ({
  u: distance * Math.sin(clock),
  z: distance * Math.cos(clock),
});

/** Clock angle of a point seen from astern, 0 … 2π. */
export function clockOf({ u, z }: PlanePoint): number {
  const clock = Math.atan2(u, z);
  return clock < 0 ? clock + 2 * Math.PI : clock;
}

/** Station of the greatest section. */
export function widestStation(hull: Hull): number {
  let widest = hull.length / 2;
  for (const station of hull.drawStations(200)) {
    if (hull.sectionArea(station) > hull.sectionArea(widest)) widest = station;
  }
  return widest;
}

/** A station kept on the hull. */
export const onHull = (hull: Hull, station: number): number => Math.min(hull.length, Math.max(0, station));
