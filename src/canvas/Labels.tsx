/** Names of parts, placed so that none covers another. Pixels. */
import { memo, useMemo, useRef } from 'react';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import type { Craft } from '../craft/craft.ts';
import type { Figure } from '../scene/figure.ts';
import { keepSame } from '../scene/keepSame.ts';
import { type Label, MOST_LABELS, placeLabels, type Wanted } from '../scene/labels.ts';
import type { Palette } from '../scene/palette.ts';
import { type Rect, screenBox } from '../scene/rect.ts';
import type { View } from '../scene/view.ts';
import { fontOf, textWidth, writeOn } from './paint.ts';

const SIZE = 12;

/** What is to be named: everything while it is few, else only the ids in `always`. */
export function wantedLabels(
  craft: Craft,
  figures: readonly Figure[],
  view: View,
  always: ReadonlySet<string>,
): Wanted[] {
  const few = craft.parts.order.length <= MOST_LABELS;
  return figures
    .filter(({ part, copy }) => copy === 0 && (few || always.has(part)))
    .map((figure) => {
      const { name, kind } = craft.parts.byId[figure.part]!;
      const text = name || kind;
      return { id: figure.part, text, width: textWidth(text, fontOf(SIZE)), box: screenBox(figure, view) };
    });
}

const sameRect = (a: Rect, b: Rect): boolean =>
  a.left === b.left && a.right === b.right && a.top === b.top && a.bottom === b.bottom;

const sameWanted = (a: Wanted, b: Wanted): boolean =>
  a.id === b.id && a.text === b.text && sameRect(a.box, b.box);

/** Placed anew only when something to be named changed; while a hand is at work, not for what moves among them. */
export function useLabels(
  wanted: readonly Wanted[],
  taken: readonly Rect[],
  frame: Rect,
  busy: boolean,
): readonly Label[] {
  const last = useRef<readonly Wanted[]>([]);
  const still = keepSame(last.current, wanted, sameWanted);
  last.current = still;
  const lastTaken = useRef<readonly Rect[]>([]);
  if (!busy || lastTaken.current.length === 0) {
    lastTaken.current = keepSame(lastTaken.current, [...taken, frame], sameRect);
  }
  const clear = lastTaken.current;
  return useMemo(() => placeLabels(still, clear.slice(0, -1), clear.at(-1)!), [still, clear]);
}

export interface LabelsProps {
  readonly labels: readonly Label[];
  readonly palette: Palette;
  /** Whether gas, not paper, lies under a label. */
  onGas(at: Label): boolean;
}

export const Labels = memo(({ labels, palette, onGas }: LabelsProps) => (
  <Shape
    sceneFunc={(context) => {
      context.font = fontOf(SIZE);
      context.textAlign = 'left';
      context.textBaseline = 'middle';
      for (const label of labels) {
        writeOn(context, label.text, label, palette.ink, onGas(label) ? palette.gas : palette.paper);
      }
    }}
  />
));
