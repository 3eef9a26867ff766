/** The side view on its three layers: the ground that rarely changes, what stands still on it, and what moves. */
import { type ReactNode, useCallback, useMemo } from 'react';
import { Group, Layer, Stage } from 'react-konva/es/ReactKonvaCore.js';
import { idsOf, isSelected, type Selection } from '../edit/selection.ts';
import { rectsAlong } from '../scene/clearSpot.ts';
import { handlesOf } from '../scene/grip.ts';
import { type BalanceMarks, marksTaken, sideMarks } from '../scene/marks.ts';
import { around, type Rect, screenBox } from '../scene/rect.ts';
import { axisMarks, tapeMarks, textsTaken, withoutCovered } from '../scene/tapeMarks.ts';
import { type ScreenPoint, toScreen, toWorld, type View } from '../scene/view.ts';
import { leadWords, pitchAngle } from '../scene/words.ts';
import { BalanceMark } from './BalanceMark.tsx';
import { type Handle, HandMarks, type HandMarksProps, Outlines } from './HandMarks.tsx';
import { HullMarks } from './HullMarks.tsx';
import { Labels, useLabels, wantedLabels } from './Labels.tsx';
import type { Overlay } from './overlay.ts';
import { PartMarks } from './PartMarks.tsx';
import { PointMarks, type PointMarksProps } from './PointMarks.tsx';
import { worldTransform } from './paint.ts';
import { FOOT, FootRuler, footNameTaken, HullRulers } from './Rulers.tsx';
import { arcShown, ThrustMarks, thrustHandles } from './ThrustMarks.tsx';
import type { SideScene } from './useSideScene.ts';
import { WireMarks } from './WireMarks.tsx';

export interface SideDrawingProps {
  readonly scene: SideScene;
  readonly selection: Selection;
  readonly overlay: Overlay;
  /** Drawn faint, for it is not the craft as it stands. */
  readonly faded: boolean;
  /** Few names of parts, for the words of a plan need the room. */
  readonly sparing: boolean;
  /** A layer between what stands still and what moves. */
  children(labels: ReturnType<typeof useLabels>): ReactNode;
}

export function SideDrawing({ scene, selection, overlay, faded, sparing, children }: SideDrawingProps) {
  const { view, palette, units, geometry, craft, still } = scene;
  const px = 1 / view.scale;
  const world = worldTransform(view);
  const marks = sideMarks(view, geometry);
  const { hover } = overlay;
  const points = pointsOf(scene, selection);
  const handles = handlesShown(scene, overlay);
  const { hull } = geometry;
  const rulers = useMemo(
    () => [
      ...withoutCovered(
        tapeMarks(hull, view, units),
        still.map((figure) => screenBox(figure, view)),
      ),
      ...(view.tilt === 0 ? [] : axisMarks(hull, view, units)),
    ],
    [hull, view, units, still],
  );
  const amiss = useMemo(() => new Set(still.filter((each) => each.amiss).map(({ part }) => part)), [still]);
  const hoveredPart = hover?.kind === 'part' ? hover.id : null;
  const labels = useLabels({
    wanted: wantedLabels(craft, scene.still, view, idsOf(selection, 'part'), hoveredPart, sparing),
    ground: () => ({
      taken: [
        ...takenBy(marks, points, handles),
        ...arrowsTaken(scene),
        ...textsTaken(rulers),
        footNameTaken(view),
      ],
      boxes: scene.still.map((figure) => ({ id: figure.part, box: screenBox(figure, view) })),
      frame: { left: 2, top: 2, right: view.width - 2, bottom: view.height - FOOT - 4 },
    }),
    busy: overlay.held !== null,
    hovered: hoveredPart,
  });
  const onGas = useCallback(
    ({ x, y }: ScreenPoint) => {
      const { u, z } = toWorld(view, { x: x + 8, y });
      return Math.abs(z) < hull.radius(u, 0);
    },
    [view, hull],
  );
  const isHovered = (id: string) => (hover?.kind === 'part' && hover.id === id) || overlay.join === id;
  const selectedWires = idsOf(selection, 'wire');
  const hoverWire = hover?.kind === 'wire' ? hover.id : null;
  return (
    <Stage width={view.width} height={view.height} listening={false} opacity={faded ? 0.45 : 1}>
      <Layer listening={false}>
        <Group {...world}>
          <HullMarks hull={geometry.hull} palette={palette} px={px} />
        </Group>
        <HullRulers marks={rulers} palette={palette} />
      </Layer>
      <Layer listening={false}>
        <Group {...world}>
          <WireMarks lines={scene.stillLines} ink={palette.wire} px={px} />
          <PartMarks figures={scene.still} palette={palette} px={px} />
        </Group>
        <Labels labels={labels} amiss={amiss} palette={palette} onGas={onGas} />
        {view.tilt === 0 && <FootRuler view={view} palette={palette} units={units} />}
      </Layer>
      {children(labels)}
      <Layer listening={false}>
        <Group {...world}>
          <WireMarks lines={scene.movingLines} ink={palette.wire} px={px} />
          <PartMarks figures={scene.moving} palette={palette} px={px} />
          <Outlines
            selected={scene.figures.filter(({ part }) => isSelected(selection, { kind: 'part', id: part }))}
            hovered={scene.figures.filter(({ part }) => isHovered(part))}
            selectedLines={scene.lines.filter(({ id }) => selectedWires.includes(id) || id === hoverWire)}
            palette={palette}
            px={px}
          />
        </Group>
        <ThrustMarks marks={scene.thrust} arc={arcShown(scene, overlay)} view={view} palette={palette} />
        <PointMarks {...points} palette={palette} />
        <BalanceMark marks={marks} palette={palette} angle={pitchAngle(scene)} />
        <HandMarks
          handles={[...handles, ...thrustHandles(scene, overlay)]}
          wireEnds={endsShown(scene)}
          guide={guideShown(scene, overlay)}
          marquee={overlay.marquee}
          palette={palette}
        />
      </Layer>
    </Stage>
  );
}

type Points = Omit<PointMarksProps, 'palette'>;

/** What labels keep clear of: the marks of balance with their names, handles, the ghost of the lead, the support, the eyelets. */
const takenBy = (
  marks: BalanceMarks,
  { lead, support, eyelets }: Points,
  handles: readonly Handle[],
): Rect[] => [
  ...marksTaken(marks),
  ...handles.map(({ at }) => around(at, 14)),
  ...(lead ? [{ left: lead.at.x - 48, right: lead.at.x + 48, top: lead.at.y, bottom: lead.at.y + 54 }] : []),
  ...(support
    ? [{ left: support.x - 9, right: support.x + 64, top: support.y, bottom: support.y + 16 }]
    : []),
  ...eyelets.map(({ at }) => around(at, 6)),
];

/** Arrows, as far as a hand can take them. */
const arrowsTaken = ({ thrust, view }: SideScene): Rect[] =>
  thrust.flatMap(({ at, tip, handle }) => rectsAlong(toScreen(view, at), toScreen(view, handle ?? tip), 8));

function pointsOf(scene: SideScene, selection: Selection): Points {
  const { view, geometry, hardpoints } = scene;
  const screen = hardpoints.map(({ id, at }) => ({
    id,
    at: toScreen(view, at),
    selected: isSelected(selection, { kind: 'hardpoint', id }),
  }));
  const at = geometry.lead && screen.find(({ id }) => id === geometry.lead?.id)?.at;
  const text = leadWords(scene);
  const { support } = geometry;
  return {
    eyelets: screen,
    lead: at && text ? { at, text } : null,
    support: support && toScreen(view, { u: support[0], z: support[2] }),
  };
}

/** Hidden while something else is in hand. */
function handlesShown({ geometry, view, thrust }: SideScene, { held, hover }: Overlay): Handle[] {
  if (held && held.kind !== 'hull') return [];
  const { tail, waist } = handlesOf(geometry, view.scale, thrust);
  const lit = (end: 'tail' | 'waist') =>
    [held, hover].some((grip) => grip?.kind === 'hull' && grip.end === end);
  const [cos, sin] = [Math.cos(view.tilt), Math.sin(view.tilt)];
  return [
    { at: toScreen(view, tail), way: { x: cos, y: sin }, lit: lit('tail') },
    { at: toScreen(view, waist), way: { x: sin, y: -cos }, lit: lit('waist') },
  ];
}

const endsShown = ({ wireHandles, view }: SideScene): HandMarksProps['wireEnds'] =>
  wireHandles.map(({ at, end }) => ({ at: toScreen(view, at), end: toScreen(view, end) }));

/** Across the whole view at the station snapped to. */
function guideShown({ view, geometry }: SideScene, { guide }: Overlay): HandMarksProps['guide'] {
  if (guide?.along !== 'station') return null;
  const reach = spanOf(view) + geometry.hull.height;
  const foot = toScreen(view, { u: guide.at, z: 0 });
  const level = view.tilt === 0;
  return {
    from: level ? { x: foot.x, y: 0 } : toScreen(view, { u: guide.at, z: geometry.hull.height }),
    to: level ? { x: foot.x, y: view.height } : toScreen(view, { u: guide.at, z: -reach }),
    label: guide.label,
  };
}

const spanOf = ({ height, scale }: View): number => height / scale;
