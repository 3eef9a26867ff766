/** Everything the side view draws and gestures reach, each piece kept the same while it is. */
import { useMemo, useRef, useState } from 'react';
import { idsOf } from '../edit/selection.ts';
import { type Figure, sideFigure } from '../scene/figure.ts';
import { fromSide, hardpointPoints, wireLines } from '../scene/flatten.ts';
import { keyOf, type Line } from '../scene/grip.ts';
import { FigureCache, sameWire } from '../scene/keepSame.ts';
import type { View } from '../scene/view.ts';
import { wireHandles } from '../scene/wireHandle.ts';
import type { Scene } from './gestures/gesture.ts';
import type { Overlay } from './overlay.ts';
import type { DrawnProps } from './props.ts';
import { useSame } from './useSame.ts';
import { useThrust } from './useThrust.ts';

export interface SideScene extends Scene {
  /** Drawn on the layer that stands still, and on the one that moves. */
  readonly still: readonly Figure[];
  readonly moving: readonly Figure[];
  readonly stillLines: readonly Line[];
  readonly movingLines: readonly Line[];
}

export function useSideScene(props: DrawnProps, view: View, overlay: Overlay): SideScene {
  const { moving } = overlay;
  const { craft, assessment, units, palette, geometry, selection, turning = false } = props;
  const [cache] = useState(() => new FigureCache(sideFigure));
  const figures = cache.figures(craft, geometry, 1 / view.scale);
  const isMoving = ({ part }: Figure) => moving.has(keyOf('part', part));
  const still = useSame(figures.filter((figure) => !isMoving(figure)));
  const wires = geometry.wires.filter(({ wire }) => !moving.has(keyOf('wire', wire)));
  const stillWires = useSame(wires, sameWire);
  const stillLines = useMemo(() => wireLines(stillWires, fromSide), [stillWires]);
  const movingWires = geometry.wires.filter(({ wire }) => moving.has(keyOf('wire', wire)));
  const movingLines = wireLines(movingWires, fromSide);
  const lines = [...stillLines, ...movingLines];
  const thrust = useThrust(geometry, selection, overlay, { way: 'pitch', scale: view.scale, turning });
  return {
    ...{ craft, assessment, units, palette, view, geometry, figures, thrust, still, stillLines, movingLines },
    moving: figures.filter(isMoving),
    lines,
    wireHandles: wireHandles({ craft, lines, figures }, idsOf(selection, 'wire'), view.scale),
    hardpoints: hardpointPoints(geometry, fromSide),
    support: geometry.support && fromSide(geometry.support),
  };
}

/** The plan says what hangs where; the least lead at one hardpoint would lie over it. */
export const withoutLead = (scene: SideScene): SideScene => ({
  ...scene,
  geometry: { ...scene.geometry, lead: null },
});

export interface Lie {
  readonly tilt: number;
  readonly pivot: number;
}

/** How the drawing lies; it holds still while a hand is on it, so that nothing slips from under the pointer. */
export function useLie(wanted: Lie, busy: boolean): Lie {
  const last = useRef(wanted);
  if (!busy) last.current = wanted;
  return last.current;
}
