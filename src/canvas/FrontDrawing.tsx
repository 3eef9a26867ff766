/** The front view on two layers: sections, clock and parts; and what shows the hand what it does. */
import type { Context } from 'konva/lib/Context.js';
import { memo, useRef } from 'react';
import { Group, Layer, Shape, Stage } from 'react-konva/es/ReactKonvaCore.js';
import { isSelected, type Selection } from '../edit/selection.ts';
import { type ClockName, clockNames, radiusAt } from '../scene/clockNames.ts';
import { keepSame } from '../scene/keepSame.ts';
import { frontMarks, marksTaken } from '../scene/marks.ts';
import { onSection } from '../scene/outline.ts';
import type { Palette } from '../scene/palette.ts';
import { around, type Rect, screenBox } from '../scene/rect.ts';
import { type PlanePoint, toScreen, type View } from '../scene/view.ts';
import { heelAngle } from '../scene/words.ts';
import { BalanceMark } from './BalanceMark.tsx';
import type { Scene } from './gestures/gesture.ts';
import { HandMarks, type HandMarksProps, Outlines } from './HandMarks.tsx';
import type { Overlay } from './overlay.ts';
import { PartMarks } from './PartMarks.tsx';
import { PointMarks } from './PointMarks.tsx';
import { fontOf, paintHull, trace, traceOnScreen, worldTransform, writeOn } from './paint.ts';
import type { Movers } from './useMovers.ts';
import { WireMarks } from './WireMarks.tsx';

export interface FrontDrawingProps {
  readonly scene: Scene & Movers;
  readonly selection: Selection;
  readonly overlay: Overlay;
  readonly greatest: readonly PlanePoint[];
  /** At the station of the part selected; null when none is. */
  readonly section: readonly PlanePoint[] | null;
  /** Whether something is being dragged, in whichever view. */
  readonly busy: boolean;
}

export function FrontDrawing({ scene, selection, overlay, greatest, section, busy }: FrontDrawingProps) {
  const { view, palette, geometry, figures, still, moving, lines } = scene;
  const px = 1 / view.scale;
  const world = worldTransform(view);
  const { hover } = overlay;
  const names = useClockNames(scene, greatest, busy);
  const eyelets = scene.hardpoints.map(({ id, at }) => ({
    id,
    at: toScreen(view, at),
    selected: isSelected(selection, { kind: 'hardpoint', id }),
  }));
  return (
    <Stage width={view.width} height={view.height} listening={false}>
      <Layer listening={false}>
        <Group {...world}>
          <Greatest outline={greatest} palette={palette} px={px} />
          <PartMarks figures={still} palette={palette} px={px} />
        </Group>
        <Clock view={view} palette={palette} outline={greatest} names={names} />
      </Layer>
      <Layer listening={false}>
        <Group {...world}>
          {section && <Section outline={section} palette={palette} px={px} />}
          <WireMarks lines={lines} ink={palette.wire} px={px} />
          <PartMarks figures={moving} palette={palette} px={px} />
          <Outlines
            selected={figures.filter(({ part }) => isSelected(selection, { kind: 'part', id: part }))}
            hovered={figures.filter(({ part }) => hover?.kind === 'part' && hover.id === part)}
            selectedLines={[]}
            palette={palette}
            px={px}
          />
        </Group>
        <PointMarks eyelets={eyelets} lead={null} support={null} palette={palette} />
        <BalanceMark marks={frontMarks(view, geometry)} palette={palette} angle={heelAngle(scene)} />
        <HandMarks
          handles={[]}
          wireEnds={[]}
          guide={guideShown(view, overlay, reachOf(greatest))}
          marquee={overlay.marquee}
          palette={palette}
        />
      </Layer>
    </Stage>
  );
}

const reachOf = (outline: readonly PlanePoint[]): number =>
  Math.max(...outline.map(({ u, z }) => Math.hypot(u, z)));

interface SectionProps {
  readonly outline: readonly PlanePoint[];
  readonly palette: Palette;
  readonly px: number;
}

const Greatest = memo(({ outline, palette, px }: SectionProps) => (
  <Shape sceneFunc={(context) => paintHull(context, outline, palette, px)} />
));

/** The section at the part selected. */
const Section = memo(({ outline, palette, px }: SectionProps) => (
  <Shape
    sceneFunc={(context) => {
      trace(context, outline, true);
      context.strokeStyle = palette.brass;
      context.lineWidth = 1.2 * px;
      context.setLineDash([5 * px, 3 * px]);
      context.stroke();
    }}
  />
));

const STEP = 15;

interface ClockProps {
  readonly view: View;
  readonly palette: Palette;
  /** Clockwise from the top, evenly. */
  readonly outline: readonly PlanePoint[];
  readonly names: readonly ClockName[];
}

/** Ticks every 15° round the section, clockwise from the top as seen from astern, longer and named every 90°. */
const Clock = memo(({ view, palette, outline, names }: ClockProps) => (
  <Shape
    sceneFunc={(context) => {
      for (let degrees = 0; degrees < 360; degrees += STEP) tick(context, view, palette, outline, degrees);
      context.font = fontOf(11);
      context.textAlign = 'center';
      context.textBaseline = 'middle';
      for (const { text, at, onGas } of names) {
        writeOn(context, text, at, palette.inkSoft, onGas ? palette.gas : palette.paper);
      }
      context.textAlign = 'left';
      writeOn(context, 'from astern', { x: 6, y: 11 }, palette.inkSoft, palette.paper);
    }}
  />
));

/** What 'from astern' takes up. */
const TITLE: Rect = { left: 0, right: 78, top: 0, bottom: 20 };

/** Where the names are free; they hold still while a hand is at work. */
function useClockNames(
  scene: Scene & Movers,
  outline: readonly PlanePoint[],
  busy: boolean,
): readonly ClockName[] {
  const last = useRef<readonly ClockName[]>([]);
  if (!busy) {
    const { view, geometry, figures, hardpoints } = scene;
    const taken = [
      TITLE,
      ...marksTaken(frontMarks(view, geometry)),
      ...figures.map((figure) => screenBox(figure, view)),
      ...hardpoints.map(({ at }) => around(toScreen(view, at), 6)),
    ];
    last.current = keepSame(last.current, clockNames(outline, view, taken), sameName);
  }
  return last.current;
}

const sameName = (a: ClockName, b: ClockName): boolean =>
  a.text === b.text && a.onGas === b.onGas && a.at.x === b.at.x && a.at.y === b.at.y;

function tick(
  context: Context,
  view: View,
  palette: Palette,
  outline: readonly PlanePoint[],
  degrees: number,
): void {
  const radius = radiusAt(outline, degrees);
  const clock = (degrees * Math.PI) / 180;
  const at = (px: number) => toScreen(view, onSection(clock, radius + px / view.scale));
  context.strokeStyle = palette.inkSoft;
  context.lineWidth = 1;
  traceOnScreen(context, [at(degrees % 90 === 0 ? -8 : -5), at(0)], false);
  context.stroke();
}

function guideShown(view: View, { guide }: Overlay, radius: number): HandMarksProps['guide'] {
  if (guide?.along !== 'clock') return null;
  return {
    from: toScreen(view, onSection(guide.at, radius + 14 / view.scale)),
    to: toScreen(view, { u: 0, z: 0 }),
    label: guide.label,
  };
}
