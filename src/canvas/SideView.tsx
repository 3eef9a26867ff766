/** The side view: hull, parts, wire runs, rulers and marks of balance, and everything a hand does there. */
import { useMemo, useRef } from 'react';
import { idsOf } from '../edit/selection.ts';
import { sameGrip } from '../scene/grip.ts';
import { sideMargins } from '../scene/margins.ts';
import { sideMarks } from '../scene/marks.ts';
import { sideOutline } from '../scene/outline.ts';
import { planInWords } from '../scene/planWords.ts';
import { sideReadout } from '../scene/readout.ts';
import { thrustInWords, turnStatus } from '../scene/thrustWords.ts';
import type { View } from '../scene/view.ts';
import { selectionInWords, sideInWords } from '../scene/words.ts';
import { BelowCarry } from './CarryPlot.tsx';
import { Frame } from './Frame.tsx';
import type { Hand } from './gestures/gesture.ts';
import { gripUnder, takeInSide } from './gestures/take.ts';
import { keysOf } from './keys.ts';
import { Notes } from './Notes.tsx';
import { inSightOf, thingUnder } from './notesOf.ts';
import { cursorOf } from './overlay.ts';
import { PlanLayer } from './PlanLayer.tsx';
import type { DrawnProps, SharedProps } from './props.ts';
import { FOOT } from './Rulers.tsx';
import { SideDrawing } from './SideDrawing.tsx';
import { Unformed } from './Unformed.tsx';
import { sidePoints, useFit, withTips } from './useFit.ts';
import { useGeometry } from './useGeometry.ts';
import { useGestures } from './useGestures.ts';
import { useGround, useOverlay } from './useGround.ts';
import { usePlanned } from './usePlanned.ts';
import { useRails } from './useRails.ts';
import { type SideScene, useLie, useSideScene, withoutLead } from './useSideScene.ts';
import { useSize } from './useSize.ts';

const OUTLINE_POINTS = 32;

const KEYS =
  'Arrow keys move what is selected by 1 millimetre, with Shift by 10. Comma and full stop turn the thrust of what is selected by 1 degree down and up, with Shift by 10. Square brackets select the part before or after. Plus, minus and 0 zoom and fit. Escape gives up a drag.';

export function SideView(props: SharedProps) {
  const { geometry, stale } = useGeometry(props);
  if (!geometry) return <Unformed why={stale ?? ''} palette={props.palette} testId="side-view" />;
  return (
    <BelowCarry {...props} length={geometry.hull.length}>
      <SideFrame {...props} geometry={geometry} stale={stale} />
    </BelowCarry>
  );
}

function SideFrame(props: SharedProps & DrawnProps & { stale: string | null }) {
  const { selection, palette, viewState, geometry, tilted, stale, turning = false } = props;
  const frame = useRef<HTMLDivElement>(null);
  const size = useSize(frame);
  const overlays = useOverlay();
  const { overlay, show } = overlays;
  const busy = overlay.held !== null;
  const pitch = tilted ? (geometry.attitude?.pitch ?? 0) : 0;
  const { tilt, pivot } = useLie({ tilt: pitch, pivot: geometry.cb[0] }, busy);
  const { scale, originX, originY } = viewState.view;
  const view: View = useMemo(
    () => ({ scale, originX, originY, tilt, pivot, ...size }),
    [scale, originX, originY, tilt, pivot, size],
  );
  const scene = useSideScene(props, view, overlay);
  const ground = useGround(props, scene, overlays, viewState);
  const { length, height } = geometry.hull;
  const margins = sideMargins(size, geometry.support !== null);
  useFit(
    viewState,
    view,
    `${tilted} ${length} ${height} ${turning}`,
    busy,
    () => {
      const points = sidePoints(props.craft, geometry);
      return turning ? withTips(points, geometry.thrust, view, margins, { way: 'pitch' }) : points;
    },
    margins,
  );

  const outline = useMemo(() => sideOutline(geometry.hull, OUTLINE_POINTS), [geometry.hull]);

  const hover = (hand: Hand | null) => {
    const next = hand && gripUnder(ground, hand);
    if (!sameGrip(next, overlay.hover)) show({ hover: next, hoverAt: hand });
  };
  const take: typeof takeInSide = (on, hand) => {
    show({ hint: null, hover: null });
    return takeInSide(on, hand);
  };
  const planned = usePlanned(props, geometry);
  const rails = useRails(scene, selection, props.planning ?? false);
  const gestures = useGestures(frame, ground, rails.take(take), rails.hover(hover));
  const onDoubleClick = () => {
    if (!overlay.hover) ground.fit();
  };
  const readout = overlay.held && sideReadout(scene, overlay.held);
  const hint = overlay.hint ?? stale;
  return (
    <Frame
      frame={frame}
      testId="side-view"
      label="Side view"
      description={[sideInWords(scene), thrustInWords(scene, 'pitch'), planInWords(scene, props), KEYS]
        .filter(Boolean)
        .join(' ')}
      status={hint ?? (busy ? '' : statusOf(scene, idsOf(selection, 'part')))}
      view={view}
      cursor={rails.cursor ?? cursorOf(overlay)}
      handlers={{ ...gestures.handlers, ...keysOf(ground, gestures, 'side'), onDoubleClick }}
      leave={() => hover(null)}
    >
      <SideDrawing
        scene={planned ? withoutLead(scene) : scene}
        selection={selection}
        overlay={overlay}
        faded={stale !== null}
        sparing={planned !== null}
      >
        {(labels) => <PlanLayer {...{ scene, selection, rails, planned, labels }} hover={overlay.hover} />}
      </SideDrawing>
      <Notes
        hint={hint}
        readout={readout}
        under={thingUnder(scene, overlay)}
        inSight={inSightOf(scene, sideMarks(view, geometry), overlay.held, outline)}
        size={{ width: size.width, height: size.height - FOOT }}
        palette={palette}
      />
    </Frame>
  );
}

/** What is selected, and how its thrust is turned. */
const statusOf = (scene: SideScene, parts: readonly string[]): string =>
  [selectionInWords(scene, parts), turnStatus(scene, parts, 'pitch')].filter(Boolean).join(' ');
