/** Keeps the whole craft in the window until a hand moves it: after a resize, a change of hull, a tilt, or when asked. */
import { useLayoutEffect, useRef } from 'react';
import { sideOutline } from '../scene/outline.ts';
import type { Geometry } from '../scene/subject.ts';
import { fitted, type Margins, type PlanePoint, type View } from '../scene/view.ts';
import type { ViewState } from './useView.ts';

/** Everything that should be seen of the side. */
export const sidePoints = ({ hull, pieces, hardpoints, support }: Geometry): PlanePoint[] => [
  ...sideOutline(hull, 40),
  ...[
    ...pieces.map(({ middle }) => middle),
    ...hardpoints.map(({ at }) => at),
    ...(support ? [support] : []),
  ].map(([x, , z]) => ({ u: x, z })),
];

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
