/**
 * Pointers become gestures: one hand at a time, a threshold between click and drag, two fingers for zoom and pan. The
 * pointer is captured, so a drag goes on outside the view.
 */
import { type PointerEvent, type RefObject, useEffect, useRef } from 'react';
import type { Ground, Hand } from './gestures/gesture.ts';
import { pan } from './gestures/pan.ts';
import type { Take } from './gestures/take.ts';
import { wheel } from './gestures/zoom.ts';
import { Hands } from './hands.ts';

export interface GestureHandlers {
  onPointerDown(event: PointerEvent): void;
  onPointerMove(event: PointerEvent): void;
  onPointerUp(event: PointerEvent): void;
  onPointerCancel(event: PointerEvent): void;
  onLostPointerCapture(event: PointerEvent): void;
}

export interface Gestures {
  readonly handlers: GestureHandlers;
  /** Gives up what is going on; false when nothing is. */
  cancel(): boolean;
  /** Whether the space bar is down: pressing then pans. */
  readonly space: RefObject<boolean>;
}

export function useGestures(
  element: RefObject<HTMLElement | null>,
  ground: Ground,
  take: Take,
  hover: (hand: Hand | null) => void,
): Gestures {
  const hands = useRef(new Hands());
  const space = useRef(false);
  useWheel(element, ground);

  const handOf = (event: PointerEvent): Hand => {
    const box = element.current!.getBoundingClientRect();
    return {
      x: event.clientX - box.left,
      y: event.clientY - box.top,
      shift: event.shiftKey,
      ctrl: event.ctrlKey || event.metaKey,
      alt: event.altKey,
      touch: event.pointerType === 'touch',
    };
  };

  return {
    space,
    cancel: () => hands.current.cancel(),
    handlers: {
      onPointerDown: (event) => {
        if (event.button > 1) return;
        element.current!.setPointerCapture(event.pointerId);
        const panning = event.button === 1 || space.current;
        hands.current.down(event.pointerId, handOf(event), ground, panning ? pan : take);
      },
      onPointerMove: (event) => {
        const hand = handOf(event);
        if (!hands.current.move(event.pointerId, hand) && event.buttons === 0)
          hover(hand.touch ? null : hand);
      },
      onPointerUp: (event) => hands.current.up(event.pointerId, handOf(event)),
      onPointerCancel: (event) => hands.current.lost(event.pointerId),
      onLostPointerCapture: (event) => hands.current.lost(event.pointerId),
    },
  };
}

/** React listens passively to the wheel; the page must not scroll under it. */
function useWheel(element: RefObject<HTMLElement | null>, ground: Ground): void {
  const latest = useRef(ground);
  latest.current = ground;
  useEffect(() => {
    const node = element.current;
    const turn = (event: WheelEvent) => {
      event.preventDefault();
      const box = node!.getBoundingClientRect();
      wheel(latest.current, { x: event.clientX - box.left, y: event.clientY - box.top }, event);
    };
    node?.addEventListener('wheel', turn, { passive: false });
    return () => node?.removeEventListener('wheel', turn);
  }, [element]);
}
