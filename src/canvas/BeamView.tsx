/** The beam of moments, under the side view on its station scale. A click on a bar selects what it stands for. */
import { useMemo, useRef, useState } from 'react';
import { Layer, Stage } from 'react-konva/es/ReactKonvaCore.js';
import { isSelected, type Selectable } from '../edit/selection.ts';
import { beamOf, type PlacedBar } from '../scene/beam.ts';
import { barAt, layBeam } from '../scene/beamLayout.ts';
import type { View } from '../scene/view.ts';
import { beamInWords } from '../scene/words.ts';
import { BeamMarks, onBeam } from './BeamMarks.tsx';
import { Frame } from './Frame.tsx';
import type { Hand } from './gestures/gesture.ts';
import { pan } from './gestures/pan.ts';
import { click } from './gestures/select.ts';
import type { Take } from './gestures/take.ts';
import { keysOf } from './keys.ts';
import type { DrawnProps, SharedProps } from './props.ts';
import { Unformed } from './Unformed.tsx';
import { useGeometry } from './useGeometry.ts';
import { useGestures } from './useGestures.ts';
import { useGround, useOverlay } from './useGround.ts';
import { useSize } from './useSize.ts';

const TOUCH_SLOP = 10;

export function BeamView(props: SharedProps) {
  const { geometry } = useGeometry(props);
  if (!geometry) return <Unformed why="" palette={props.palette} testId="beam-view" />;
  return <BeamFrame {...props} geometry={geometry} />;
}

/** What a bar stands for, where that can be selected. */
function thingOf({ kind, id }: PlacedBar): Selectable | null {
  if (kind === 'part' || kind === 'wire') return { kind, id };
  return kind === 'lead' ? { kind: 'hardpoint', id } : null;
}

function BeamFrame(props: SharedProps & DrawnProps) {
  const { selection, palette, viewState, geometry, units, craft, assessment } = props;
  const frame = useRef<HTMLDivElement>(null);
  const size = useSize(frame);
  const [hovered, setHovered] = useState<string | null>(null);
  const { scale, originX, originY } = viewState.view;
  const pivot = geometry.cb[0];
  const view: View = useMemo(
    () => ({ scale, originX, originY, tilt: 0, pivot, ...size }),
    [scale, originX, originY, pivot, size],
  );
  const beam = useMemo(() => beamOf(geometry.beam, geometry.lead), [geometry.beam, geometry.lead]);
  const page = layBeam(beam, view);
  const scene = {
    craft,
    assessment,
    units,
    palette,
    view,
    geometry,
    figures: [],
    lines: [],
    hardpoints: [],
    support: null,
    wireHandles: [],
  };
  const ground = useGround(props, scene, useOverlay(), viewState);

  const under = ({ x, y, touch }: Hand) => (onBeam(y, size) ? barAt(page, x, touch ? TOUCH_SLOP : 0) : null);
  const take: Take = (on, down) => {
    const bar = under(down);
    const thing = bar && thingOf(bar);
    const panning = pan(on, down);
    if (!thing) return panning;
    return { ...panning, end: (hand, moved) => (moved ? undefined : click(on, thing, hand)) };
  };
  const gestures = useGestures(frame, ground, take, (hand) => {
    const bar = hand && under(hand);
    setHovered(bar ? `${bar.kind} ${bar.id}` : null);
  });
  const isLit = (bar: PlacedBar) => {
    const thing = thingOf(bar);
    return thing !== null && isSelected(selection, thing);
  };
  return (
    <Frame
      frame={frame}
      testId="beam-view"
      label="Beam of moments about the CB"
      description={beamInWords(beam, units)}
      status=""
      view={view}
      cursor={hovered ? 'pointer' : 'default'}
      handlers={{ ...gestures.handlers, ...keysOf(ground, gestures, 'side') }}
      leave={() => setHovered(null)}
    >
      <Stage width={size.width} height={size.height} listening={false}>
        <Layer listening={false}>
          <BeamMarks
            beam={beam}
            page={page}
            size={size}
            units={units}
            palette={palette}
            isLit={isLit}
            hovered={hovered}
          />
        </Layer>
      </Stage>
    </Frame>
  );
}
