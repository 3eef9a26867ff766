/** The front view, from astern: clock angles, port and starboard, heel. Shows the section at the part selected and the greatest one. */
import { useMemo, useRef, useState } from 'react';
import { idsOf } from '../edit/selection.ts';
import { frontFigure } from '../scene/figure.ts';
import { fromAstern, hardpointPoints, wireLines } from '../scene/flatten.ts';
import { sameGrip } from '../scene/grip.ts';
import { FigureCache } from '../scene/keepSame.ts';
import { frontMargins } from '../scene/margins.ts';
import { frontMarks } from '../scene/marks.ts';
import { sectionOutline, widestStation } from '../scene/outline.ts';
import { frontReadout } from '../scene/readout.ts';
import type { Geometry } from '../scene/subject.ts';
import type { View } from '../scene/view.ts';
import { frontInWords } from '../scene/words.ts';
import { Frame } from './Frame.tsx';
import { FrontDrawing } from './FrontDrawing.tsx';
import type { Hand } from './gestures/gesture.ts';
import { gripUnder, type Take, takeInFront } from './gestures/take.ts';
import { keysOf } from './keys.ts';
import { Notes } from './Notes.tsx';
import { inSightOf, thingUnder } from './notesOf.ts';
import { cursorOf } from './overlay.ts';
import type { CanvasProps, DrawnProps } from './props.ts';
import { Unformed } from './Unformed.tsx';
import { frontPoints, useFit } from './useFit.ts';
import { useGeometry } from './useGeometry.ts';
import { useGestures } from './useGestures.ts';
import { useGround, useOverlay } from './useGround.ts';
import { useMovers } from './useMovers.ts';
import { useLie } from './useSideScene.ts';
import { useSize } from './useSize.ts';
import { useView } from './useView.ts';

const KEYS =
  'Left and right arrows turn what is selected round the hull, up and down move it out and in. Square brackets select the part before or after.';

export function FrontView(props: CanvasProps) {
  const { geometry } = useGeometry(props);
  if (!geometry) return <Unformed why="" palette={props.palette} testId="front-view" />;
  return <FrontFrame {...props} geometry={geometry} />;
}

function FrontFrame(props: CanvasProps & DrawnProps) {
  const { session, selection, palette, geometry, tilted, craft, assessment, units } = props;
  const frame = useRef<HTMLDivElement>(null);
  const size = useSize(frame);
  const viewState = useView();
  const overlays = useOverlay();
  const { overlay, show } = overlays;
  const busy = overlay.held !== null;
  const { tilt } = useLie({ tilt: tilted ? (geometry.attitude?.heel ?? 0) : 0, pivot: 0 }, busy);
  const { scale, originX, originY } = viewState.view;
  const view: View = useMemo(
    () => ({ scale, originX, originY, tilt, pivot: 0, ...size }),
    [scale, originX, originY, tilt, size],
  );
  const [cache] = useState(() => new FigureCache(frontFigure));
  const figures = cache.figures(craft, geometry, 1 / view.scale);
  const { dragging } = session.getState();
  const movers = useMovers(figures, dragging);
  const scene = {
    ...movers,
    figures,
    ...{ craft, assessment, units, palette, view, geometry },
    lines: wireLines(geometry.wires, fromAstern),
    hardpoints: hardpointPoints(geometry, fromAstern),
    support: null,
    wireHandles: [],
    thrust: [],
  };
  const ground = useGround(props, scene, overlays, viewState);
  const { height, breadth } = geometry.hull;
  useFit(
    viewState,
    view,
    `${tilted} ${height} ${breadth}`,
    busy,
    () => frontPoints(craft, geometry),
    frontMargins(size),
  );
  const outlines = useOutlines(geometry, idsOf(selection, 'part'));

  const hover = (hand: Hand | null) => {
    const next = hand && gripUnder(ground, hand);
    const taken = next?.kind === 'hull' ? null : next;
    if (!sameGrip(taken, overlay.hover)) show({ hover: taken, hoverAt: hand });
  };
  const take: Take = (on, hand) => {
    show({ hint: null, hover: null });
    return takeInFront(on, hand);
  };
  const gestures = useGestures(frame, ground, take, hover);
  return (
    <Frame
      frame={frame}
      testId="front-view"
      label="Front view from astern"
      description={`${frontInWords(scene)} ${KEYS}`}
      status={overlay.hint ?? ''}
      view={view}
      cursor={cursorOf(overlay)}
      handlers={{
        ...gestures.handlers,
        ...keysOf(ground, gestures, 'front'),
        onDoubleClick: () => ground.fit(),
      }}
      leave={() => hover(null)}
    >
      <FrontDrawing scene={scene} selection={selection} overlay={overlay} busy={dragging} {...outlines} />
      <Notes
        hint={overlay.hint}
        readout={overlay.held && frontReadout(scene, overlay.held)}
        under={thingUnder(scene, overlay)}
        inSight={inSightOf(scene, frontMarks(view, geometry), overlay.held, outlines.greatest)}
        size={size}
        palette={palette}
        most={220}
      />
    </Frame>
  );
}

/** The greatest section, and the one at the part selected last. */
function useOutlines({ hull, pieces }: Geometry, selected: readonly string[]) {
  const greatest = useMemo(() => sectionOutline(hull, widestStation(hull)), [hull]);
  const last = selected.at(-1);
  const station = pieces.find(({ part }) => part === last)?.middle[0] ?? null;
  const section = useMemo(() => (station === null ? null : sectionOutline(hull, station)), [hull, station]);
  return { greatest, section };
}
