/** The view from above on two layers: hull and parts; thrust, balance and what shows the hand what it does. */
import { memo } from 'react';
import { Group, Layer, Shape, Stage } from 'react-konva/es/ReactKonvaCore.js';
import { isSelected, type Selection } from '../edit/selection.ts';
import { aboveMarks, yawMark } from '../scene/above.ts';
import type { Palette } from '../scene/palette.ts';
import { type PlanePoint, toScreen, type View } from '../scene/view.ts';
import { BalanceMark } from './BalanceMark.tsx';
import type { Scene } from './gestures/gesture.ts';
import { HandMarks, Outlines } from './HandMarks.tsx';
import type { Overlay } from './overlay.ts';
import { PartMarks } from './PartMarks.tsx';
import { fontOf, paintAxis, paintHull, worldTransform, writeOn } from './paint.ts';
import { arcShown, ThrustMarks, thrustHandles } from './ThrustMarks.tsx';
import type { Movers } from './useMovers.ts';
import { YawMarks } from './YawMarks.tsx';

export interface AboveDrawingProps {
  readonly scene: Scene & Movers & { readonly outline: readonly PlanePoint[] };
  readonly selection: Selection;
  readonly overlay: Overlay;
}

export function AboveDrawing({ scene, selection, overlay }: AboveDrawingProps) {
  const { view, palette, geometry, figures, still, moving, thrust, units, outline } = scene;
  const px = 1 / view.scale;
  const world = worldTransform(view);
  const { hover } = overlay;
  const yaw = yawMark(geometry, units);
  return (
    <Stage width={view.width} height={view.height} listening={false}>
      <Layer listening={false}>
        <Group {...world}>
          <Hull outline={outline} palette={palette} px={px} />
          <PartMarks figures={still} palette={palette} px={px} />
        </Group>
        <Names view={view} palette={palette} />
      </Layer>
      <Layer listening={false}>
        <Group {...world}>
          <PartMarks figures={moving} palette={palette} px={px} />
          <Outlines
            selected={figures.filter(({ part }) => isSelected(selection, { kind: 'part', id: part }))}
            hovered={figures.filter(({ part }) => hover?.kind === 'part' && hover.id === part)}
            selectedLines={[]}
            palette={palette}
            px={px}
          />
        </Group>
        {yaw && <YawMarks yaw={yaw} view={view} palette={palette} beside={besideHull(view, outline)} />}
        <ThrustMarks marks={thrust} arc={arcShown(scene, overlay)} view={view} palette={palette} />
        <BalanceMark marks={aboveMarks(view, geometry)} palette={palette} angle={null} />
        <HandMarks
          handles={thrustHandles(scene, overlay)}
          wireEnds={[]}
          guide={null}
          marquee={overlay.marquee}
          palette={palette}
        />
      </Layer>
    </Stage>
  );
}

const OFF_HULL = 14;

/** Where there is room for a length along the hull on its port side, px. */
const besideHull = (view: View, outline: readonly PlanePoint[]): number =>
  toScreen(view, { u: Math.min(...outline.map(({ u }) => u)), z: 0 }).x - OFF_HULL;

interface HullProps {
  readonly outline: readonly PlanePoint[];
  readonly palette: Palette;
  readonly px: number;
}

const Hull = memo(({ outline, palette, px }: HullProps) => (
  <Shape
    sceneFunc={(context) => {
      paintHull(context, outline, palette, px);
      const ends = outline.map(({ z }) => z);
      paintAxis(context, { u: 0, z: Math.max(...ends) }, { u: 0, z: Math.min(...ends) }, px);
    }}
  />
));

/** Which view it is, and which side is starboard. */
const Names = memo(({ view, palette }: { readonly view: View; readonly palette: Palette }) => (
  <Shape
    sceneFunc={(context) => {
      context.font = fontOf(11);
      context.textBaseline = 'middle';
      context.textAlign = 'left';
      writeOn(context, 'from above', { x: 6, y: 11 }, palette.inkSoft, palette.paper);
      context.translate(view.width - 9, view.height / 2);
      context.rotate(Math.PI / 2);
      context.textAlign = 'center';
      writeOn(context, 'starboard', { x: 0, y: 0 }, palette.inkSoft, palette.paper);
    }}
  />
));
