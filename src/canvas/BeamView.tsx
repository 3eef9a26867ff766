/** The beam of moments, under the side view on its station scale. A click on a bar selects what it stands for. */
import { useMemo, useRef, useState } from 'react';
import { Layer, Stage } from 'react-konva/es/ReactKonvaCore.js';
import { isSelected, type Selectable } from '../edit/selection.ts';
import { aboutBarShort } from '../scene/about.ts';
import { beamOf, type PlacedBar } from '../scene/beam.ts';
import { type BeamRows, barAt, beamRows, layBeam, type Zone, zonesOf } from '../scene/beamLayout.ts';
import { layTwo, planBeamInWords } from '../scene/beamPlan.ts';
import { spotBeside } from '../scene/clearSpot.ts';
import type { Readout } from '../scene/readout.ts';
import type { Rect } from '../scene/rect.ts';
import { isLevel } from '../scene/subject.ts';
import type { View } from '../scene/view.ts';
import { beamInWords } from '../scene/words.ts';
import { BeamMarks, keyOfBar, onBeam } from './BeamMarks.tsx';
import { abovePlan, BeamPlanMarks } from './BeamPlanMarks.tsx';
import { Bubble, bubbleExtent } from './Bubble.tsx';
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
import { usePlanned } from './usePlanned.ts';
import { type Size, useSize } from './useSize.ts';

const TOUCH_SLOP = 10;
/** rad */
const LEAST_LEAN = 0.01;

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

/** Drawn in an attitude in which stations above do not lie over those of the beam, so that no line may join them. */
const leansFrom = ({ tilted, geometry }: DrawnProps): boolean =>
  tilted && Math.abs(geometry.attitude?.pitch ?? 0) > LEAST_LEAN;

/** Under the beam or beside the bar, whichever the pane has room for. */
function bubbleRect({ title, lines }: Readout, { left, right }: Zone, rows: BeamRows, size: Size): Rect {
  const bars = { left, right, top: rows.top, bottom: rows.top + rows.bar };
  return spotBeside(size, bubbleExtent(title, lines, 260), bars, { clear: [bars] });
}

function BeamFrame(props: SharedProps & DrawnProps) {
  const { selection, palette, viewState, geometry, units, craft, assessment } = props;
  const frame = useRef<HTMLDivElement>(null);
  const whole = useSize(frame);
  const planned = usePlanned(props, geometry);
  const size = useMemo(() => (planned ? abovePlan(whole) : whole), [planned, whole]);
  const [hovered, setHovered] = useState<string | null>(null);
  const { scale, originX, originY } = viewState.view;
  const pivot = geometry.cb[0];
  const view: View = useMemo(
    () => ({ scale, originX, originY, tilt: 0, pivot, ...size }),
    [scale, originX, originY, pivot, size],
  );
  const beam = useMemo(() => beamOf(geometry.beam, geometry.lead), [geometry.beam, geometry.lead]);
  const two = planned && layTwo(beam, planned.after, view);
  const page = two?.today ?? layBeam(beam, view);
  const rows = beamRows(size.height);
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
    thrust: [],
  };
  const ground = useGround(props, scene, useOverlay(), viewState);

  const under = ({ x, y, touch }: Hand) => (onBeam(y, rows) ? barAt(page, x, touch ? TOUCH_SLOP : 0) : null);
  const take: Take = (on, down) => {
    const bar = under(down);
    const thing = bar && thingOf(bar);
    const panning = pan(on, down);
    if (!thing) return panning;
    return { ...panning, end: (hand, moved) => (moved ? undefined : click(on, thing, hand)) };
  };
  const gestures = useGestures(frame, ground, take, (hand) => {
    const bar = hand && under(hand);
    setHovered(bar && keyOfBar(bar));
  });
  const hoveredZone = zonesOf(page).find(({ bar }) => keyOfBar(bar) === hovered);
  const isLit = (bar: PlacedBar) => {
    const thing = thingOf(bar);
    return thing !== null && isSelected(selection, thing);
  };
  return (
    <Frame
      frame={frame}
      testId="beam-view"
      label="Beam of moments about the CB"
      description={[beamInWords(beam, scene), ...(two ? [planBeamInWords(two.plan.beam, units)] : [])].join(
        ' ',
      )}
      status=""
      view={view}
      cursor={hovered ? 'pointer' : 'default'}
      handlers={{ ...gestures.handlers, ...keysOf(ground, gestures, 'side') }}
      leave={() => setHovered(null)}
    >
      <Stage width={whole.width} height={whole.height} listening={false}>
        <Layer listening={false}>
          <BeamMarks
            beam={beam}
            page={page}
            rows={rows}
            leaders={rows.leaders && !leansFrom(props)}
            level={isLevel(assessment)}
            size={size}
            units={units}
            palette={palette}
            isLit={isLit}
            hovered={hovered}
          />
          {two && (
            <BeamPlanMarks
              {...two.plan}
              today={rows.top}
              size={whole}
              units={units}
              palette={palette}
              isLit={isLit}
            />
          )}
        </Layer>
      </Stage>
      {hoveredZone && size.width > 0 && (
        <Bubble
          {...aboutBarShort(scene, hoveredZone.bar)}
          rect={bubbleRect(aboutBarShort(scene, hoveredZone.bar), hoveredZone, rows, size)}
          palette={palette}
        />
      )}
    </Frame>
  );
}
