/** Keeps the whole craft in the window until a hand moves it: after a resize, a change of hull, a tilt, or when asked. */
import { useLayoutEffect, useRef } from 'react';
import type { Craft } from '../craft/craft.ts';
import { fromAbove, fromAstern, fromSide } from '../scene/flatten.ts';
import { onSection, planOutline, sideOutline, widestStation } from '../scene/outline.ts';
import type { Geometry } from '../scene/subject.ts';
import { type ThrustArrow, type ThrustShown, thrustMarks } from '../scene/thrustArrows.ts';
import { fitted, type Margins, type PlanePoint, type View } from '../scene/view.ts';
import type { ViewState } from './useView.ts';

/** The corners of what a piece takes up, `across` in the view and `high`, m. */
const cornersOf = ({ u, z }: PlanePoint, across: number, high: number): PlanePoint[] => [
  { u: u - across / 2, z: z - high / 2 },
  { u: u + across / 2, z: z + high / 2 },
];

/** Everything that should be seen of the side. */
export const sidePoints = (
  { parts }: Craft,
  { hull, pieces, hardpoints, support }: Geometry,
): PlanePoint[] => [
  ...sideOutline(hull, 40),
  ...pieces.flatMap(({ part, middle, roll }) => {
    const { length, width, height } = parts.byId[part]?.size ?? POINT;
    const high = height * Math.abs(Math.cos(roll)) + width * Math.abs(Math.sin(roll));
    return cornersOf(fromSide(middle), length, high);
  }),
  ...[...hardpoints.map(({ at }) => at), ...(support ? [support] : [])].map(fromSide),
];

/** Everything that should be seen from astern. */
export const frontPoints = ({ parts }: Craft, { hull, pieces, hardpoints }: Geometry): PlanePoint[] => [
  ...[0, 90, 180, 270].map((degrees) => {
    const clock = (degrees * Math.PI) / 180;
    return onSection(clock, hull.radius(widestStation(hull), clock));
  }),
  ...pieces.flatMap(({ part, middle, roll }) => {
    const { width, height } = parts.byId[part]?.size ?? POINT;
    const [cos, sin] = [Math.abs(Math.cos(roll)), Math.abs(Math.sin(roll))];
    return cornersOf(fromAstern(middle), width * cos + height * sin, height * cos + width * sin);
  }),
  ...hardpoints.map(({ at }) => fromAstern(at)),
];

/** Everything that should be seen from above. */
export const abovePoints = ({ parts }: Craft, { hull, pieces }: Geometry): PlanePoint[] => [
  ...planOutline(hull, 40),
  ...pieces.flatMap(({ part, middle, roll }) => {
    const { length, width, height } = parts.byId[part]?.size ?? POINT;
    const across = width * Math.abs(Math.cos(roll)) + height * Math.abs(Math.sin(roll));
    return cornersOf(fromAbove(middle), across, length);
  }),
];

/** The points, and where arrows of thrust end once they are fitted. */
export function withTips(
  points: readonly PlanePoint[],
  arrows: readonly ThrustArrow[],
  view: View,
  margins: Margins,
  how: Pick<ThrustShown, 'way' | 'longest'>,
): PlanePoint[] {
  const { scale } = fitted(view, points, margins);
  const all = () => true;
  const marks = thrustMarks(arrows, { ...how, scale, shows: all, hands: all });
  return [...points, ...marks.map(({ tip, handle }) => handle ?? tip)];
}

/** Of what is no longer there. */
const POINT = { length: 0, width: 0, height: 0 };

/** `key` names what a fit depends on; `busy` holds it off while a hand is at work. */
export function useFit(
  state: ViewState,
  view: View,
  key: string,
  busy: boolean,
  points: () => readonly PlanePoint[],
  margins: Margins,
): void {
  const done = useRef('');
  const wanted = `${key} ${view.width} ${view.height} ${state.asked}`;
  useLayoutEffect(() => {
    if (!state.fitted) done.current = '';
    if (!state.fitted || busy || view.width === 0 || done.current === wanted) return;
    done.current = wanted;
    state.setView(() => fitted(view, points(), margins), true);
  });
}
