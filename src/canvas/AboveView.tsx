/** The view from above: how the thrust is turned in yaw, and what that does about the CG. Thrust is turned and parts are picked here. */
import { useMemo, useRef, useState } from 'react';
import { idsOf } from '../edit/selection.ts';
import { aboveInWords, aboveMarks, piecesAbove } from '../scene/above.ts';
import { aboveFigure } from '../scene/figure.ts';
import { type Grip, sameGrip } from '../scene/grip.ts';
import { FigureCache } from '../scene/keepSame.ts';
import { aboveMargins } from '../scene/margins.ts';
import { planOutline } from '../scene/outline.ts';
import { LONGEST_PX } from '../scene/thrustArrows.ts';
import { angleReadout, turnStatus } from '../scene/thrustWords.ts';
import type { View } from '../scene/view.ts';
import { AboveDrawing } from './AboveDrawing.tsx';
import { Frame } from './Frame.tsx';
import type { Hand } from './gestures/gesture.ts';
import { gripUnder, type Take, takeFromAbove } from './gestures/take.ts';
import { keysOf } from './keys.ts';
import { Notes } from './Notes.tsx';
import { inSightOf, thingUnder } from './notesOf.ts';
import { cursorOf } from './overlay.ts';
import type { CanvasProps, DrawnProps } from './props.ts';
import { Unformed } from './Unformed.tsx';
import { abovePoints, useFit, withTips } from './useFit.ts';
import { useGeometry } from './useGeometry.ts';
import { useGestures } from './useGestures.ts';
import { useGround, useOverlay } from './useGround.ts';
import { useMovers } from './useMovers.ts';
import { type Size, useSize } from './useSize.ts';
import { useThrust } from './useThrust.ts';
import { useView } from './useView.ts';
import { captionTaken } from './YawMarks.tsx';

const KEYS =
  'Comma and full stop turn the thrust of what is selected by 1 degree to port and to starboard, with Shift by 10. Square brackets select the part before or after.';

export function AboveView(props: CanvasProps) {
  const { geometry } = useGeometry(props);
  if (!geometry) return <Unformed why="" palette={props.palette} testId="above-view" />;
  return <AboveFrame {...props} geometry={geometry} />;
}

/** Arrows no longer than a part of a small pane. */
const longestIn = ({ width, height }: Size): number => Math.min(LONGEST_PX, 0.2 * Math.min(width, height));

function AboveFrame(props: CanvasProps & DrawnProps) {
  const { session, selection, palette, geometry, craft, assessment, units } = props;
  const frame = useRef<HTMLDivElement>(null);
  const size = useSize(frame);
  const viewState = useView();
  const overlays = useOverlay();
  const { overlay, show } = overlays;
  const { scale, originX, originY } = viewState.view;
  const view: View = useMemo(
    () => ({ scale, originX, originY, tilt: 0, pivot: 0, ...size }),
    [scale, originX, originY, size],
  );
  const selected = idsOf(selection, 'part');
  const [cache] = useState(() => new FigureCache(aboveFigure));
  const pieces = piecesAbove(craft, geometry, selected);
  const figures = cache.figures(craft, { ...geometry, pieces }, 1 / view.scale);
  const { dragging } = session.getState();
  const movers = useMovers(figures, dragging);
  const longest = longestIn(size);
  const thrust = useThrust(geometry, selection, overlay, { way: 'yaw', scale, turning: true, longest });
  const outline = useMemo(() => planOutline(geometry.hull), [geometry.hull]);
  const scene = {
    ...movers,
    ...{ craft, assessment, units, palette, view, geometry, figures, thrust, outline },
    lines: [],
    hardpoints: [],
    support: null,
    wireHandles: [],
  };
  const ground = useGround(props, scene, overlays, viewState);
  const { length, breadth } = geometry.hull;
  const margins = aboveMargins(size);
  useFit(
    viewState,
    view,
    `${length} ${breadth}`,
    overlay.held !== null,
    () =>
      withTips(abovePoints(craft, { ...geometry, pieces }), geometry.thrust, view, margins, {
        way: 'yaw',
        longest,
      }),
    margins,
  );

  const hover = (hand: Hand | null) => {
    const next = hand && gripUnder(ground, hand);
    const taken = next?.kind === 'hull' ? null : next;
    if (!sameGrip(taken, overlay.hover)) show({ hover: taken, hoverAt: hand });
  };
  const take: Take = (on, hand) => {
    show({ hint: null, hover: null });
    return takeFromAbove(on, hand);
  };
  const gestures = useGestures(frame, ground, take, hover);
  const { held, hint } = overlay;
  // The drawing itself says what the thrust does: a label as large as elsewhere would cover half of this small view.
  const angleOf = (grip: Grip | null) =>
    grip?.kind === 'thrust' ? angleReadout(scene, grip.id, grip.way) : null;
  const under = thingUnder(scene, overlay);
  const angle = angleOf(overlay.hover);
  const inSight = inSightOf(scene, aboveMarks(view, geometry), held, outline);
  return (
    <Frame
      frame={frame}
      testId="above-view"
      label="View from above"
      description={`${aboveInWords(scene)} ${KEYS}`}
      status={hint ?? (held ? '' : turnStatus(scene, selected, 'yaw'))}
      view={view}
      cursor={cursorOf(overlay)}
      handlers={{
        ...gestures.handlers,
        ...keysOf(ground, gestures, 'above'),
        onDoubleClick: () => ground.fit(),
      }}
      leave={() => hover(null)}
    >
      <AboveDrawing scene={scene} selection={selection} overlay={overlay} />
      <Notes
        hint={hint}
        readout={angleOf(held)}
        under={under && angle ? { ...under, about: angle } : under}
        inSight={{ ...inSight, clear: [...inSight.clear, captionTaken(size)] }}
        size={size}
        palette={palette}
        most={220}
      />
    </Frame>
  );
}
