/**
 * Reading a plot over stations: the pointer reads the station under it and a click asks for it; with the focus on the plot arrows move
 * the station and Enter asks. A tap, which cannot read before it asks, may only read: what it read stays.
 */
import { type FocusEvent, type KeyboardEvent, type PointerEvent, type RefObject, useState } from 'react';
import { type Stationed, spotAfter, spotAt } from '../scene/carryPlot.ts';
import type { View } from '../scene/view.ts';

export interface StationReader {
  /** Index of the point that is read; null when none is. */
  readonly index: number | null;
  /** Of the point that the keys are at. */
  readonly chosen: number;
  /** Whether the pointer reads it. */
  readonly pointing: boolean;
  /** Whether a tap has read it. */
  readonly tapped: boolean;
  readonly handlers: {
    onPointerMove(event: PointerEvent): void;
    onPointerLeave(): void;
    onPointerUp(event: PointerEvent): void;
    onFocus(event: FocusEvent): void;
    onBlur(): void;
    onKeyDown(event: KeyboardEvent): void;
  };
}

/** `ask`: hears the index of the point that was asked for. `tapReads`: a tap does not ask. */
export function useStationReader(
  frame: RefObject<HTMLElement | null>,
  points: readonly Stationed[],
  view: View,
  ask: (index: number) => void,
  tapReads = false,
): StationReader {
  const [pointed, setPointed] = useState<number | null>(null);
  const [tap, setTap] = useState<number | null>(null);
  const [kept, setKept] = useState(Math.floor(points.length / 2));
  const [focused, setFocused] = useState(false);
  const chosen = Math.max(0, Math.min(kept, points.length - 1));
  const under = (event: PointerEvent): number | null =>
    spotAt(points, view, event.clientX - frame.current!.getBoundingClientRect().left);
  return {
    index: pointed ?? tap ?? (focused && points.length > 0 ? chosen : null),
    chosen,
    pointing: pointed !== null,
    tapped: pointed === null && tap !== null,
    handlers: {
      onPointerMove: (event) => {
        setPointed(under(event));
        setTap(null);
      },
      onPointerLeave: () => setPointed(null),
      onPointerUp: (event) => {
        const at = under(event);
        if (at === null) return;
        setKept(at);
        if (tapReads && event.pointerType === 'touch') {
          setPointed(null);
          setTap(at);
        } else if (event.button === 0) ask(at);
      },
      onFocus: (event) => setFocused(event.currentTarget.matches(':focus-visible')),
      onBlur: () => setFocused(false),
      onKeyDown: (event) => {
        if (event.ctrlKey || event.metaKey || event.altKey) return;
        const next = spotAfter(event.key, event.shiftKey, chosen, points.length);
        if (event.key === 'Enter') ask(chosen);
        else if (next === null) return;
        else setKept(next);
        setPointed(null);
        setTap(null);
        setFocused(true);
        event.preventDefault();
        event.stopPropagation();
      },
    },
  };
}
