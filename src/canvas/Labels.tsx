/** Names of parts, placed so that none covers another, each with a fine line where it stands off its part. Pixels. */
import type { Context } from 'konva/lib/Context.js';
import { memo, useRef } from 'react';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import type { Craft } from '../craft/craft.ts';
import type { Figure } from '../scene/figure.ts';
import { type KeptLabels, type LabelsAsked, nextLabels } from '../scene/keptLabels.ts';
import { type Label, MOST_LABELS, type Wanted } from '../scene/labels.ts';
import type { Palette } from '../scene/palette.ts';
import { screenBox } from '../scene/rect.ts';
import type { View } from '../scene/view.ts';
import { fontOf, textWidth, traceOnScreen, writeOn } from './paint.ts';

const SIZE = 12;

/**
 * What is to be named, what is selected first: everything while it is few, else only that and the part under the
 * pointer; only these too when `sparing`, where other words need the room.
 */
export function wantedLabels(
  craft: Craft,
  figures: readonly Figure[],
  view: View,
  selected: readonly string[],
  hovered: string | null,
  sparing: boolean,
): Wanted[] {
  const first = new Set(selected);
  const few = !sparing && craft.parts.order.length <= MOST_LABELS;
  const named = figures.filter(
    ({ part, copy }) => copy === 0 && (few || first.has(part) || part === hovered),
  );
  const ordered = [
    ...named.filter(({ part }) => first.has(part)),
    ...named.filter(({ part }) => !first.has(part)),
  ];
  return ordered.map((figure) => {
    const { name, kind } = craft.parts.byId[figure.part]!;
    const text = name || kind;
    return { id: figure.part, text, width: textWidth(text, fontOf(SIZE)), box: screenBox(figure, view) };
  });
}

export function useLabels(asked: LabelsAsked): readonly Label[] {
  const kept = useRef<KeptLabels | null>(null);
  kept.current = nextLabels(kept.current, asked);
  return kept.current.labels;
}

export interface LabelsProps {
  readonly labels: readonly Label[];
  /** Parts that are amiss: their names stand out. */
  readonly amiss: ReadonlySet<string>;
  readonly palette: Palette;
  /** Whether gas, not paper, lies under a label. */
  onGas(at: Label): boolean;
}

export const Labels = memo(({ labels, amiss, palette, onGas }: LabelsProps) => (
  <Shape
    sceneFunc={(context) => {
      for (const { leader } of labels) if (leader) line(context, leader, palette);
      context.font = fontOf(SIZE);
      context.textAlign = 'left';
      context.textBaseline = 'middle';
      for (const label of labels) {
        const ink = amiss.has(label.id) ? palette.bad : palette.ink;
        writeOn(context, label.text, label, ink, onGas(label) ? palette.gas : palette.paper);
      }
    }}
  />
));

function line(context: Context, { from, to }: NonNullable<Label['leader']>, palette: Palette): void {
  context.strokeStyle = palette.inkSoft;
  context.lineWidth = 0.8;
  traceOnScreen(context, [from, to], false);
  context.stroke();
  context.beginPath();
  context.arc(to.x, to.y, 1.6, 0, 2 * Math.PI, false);
  context.fillStyle = palette.inkSoft;
  context.fill();
}
