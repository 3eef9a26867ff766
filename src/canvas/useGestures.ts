/**
 * Pointers become gestures: one hand at a time, a threshold between click and drag, two fingers for zoom and pan. The
 * pointer is captured, so a drag goes on outside the view.
 */
import { type PointerEvent, type RefObject, useEffect, useRef } from 'react';
import type { Gesture, Ground, Hand } from './gestures/gesture.ts';
import { pan } from './gestures/pan.ts';
import type { Take } from './gestures/take.ts';
import { idle, type Pinch, pinch, wheel } from './gestures/zoom.ts';

/** Farther than this the hand drags, px. */
const MOUSE_THRESHOLD = 3;
const TOUCH_THRESHOLD = 8;

interface Going {
  readonly pointer: number;
  readonly down: Hand;
  gesture: Gesture;
  moved: boolean;
}

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
        element.current!.focus({ preventScroll: true });
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

/** The hands on one view. */
class Hands {
  readonly #at = new Map<number, Hand>();
  #going: Going | null = null;
  #pinch: Pinch | null = null;

  down(pointer: number, hand: Hand, ground: Ground, take: Take): void {
    this.#at.set(pointer, hand);
    if (this.#at.size === 1) {
      this.#going = { pointer, down: hand, gesture: take(ground, hand), moved: false };
    } else if (this.#at.size === 2) {
      this.#going?.gesture.cancel();
      this.#going = null;
      const [a, b] = [...this.#at.values()];
      this.#pinch = pinch(ground, a!, b!);
    }
  }

  /** True when a hand was at work. */
  move(pointer: number, hand: Hand): boolean {
    if (!this.#at.has(pointer)) return false;
    this.#at.set(pointer, hand);
    const [a, b] = [...this.#at.values()];
    if (this.#pinch && a && b) this.#pinch.move(a, b);
    else if (this.#going?.pointer === pointer) this.#drag(this.#going, hand);
    return true;
  }

  #drag(going: Going, hand: Hand): void {
    const far = Math.hypot(hand.x - going.down.x, hand.y - going.down.y);
    going.moved ||= far > (hand.touch ? TOUCH_THRESHOLD : MOUSE_THRESHOLD);
    if (going.moved) going.gesture.move(hand);
  }

  up(pointer: number, hand: Hand): void {
    const going = this.#going;
    this.#leave(pointer);
    if (going?.pointer === pointer) going.gesture.end(hand, going.moved);
  }

  lost(pointer: number): void {
    const going = this.#going;
    this.#leave(pointer);
    if (going?.pointer === pointer) going.gesture.cancel();
  }

  #leave(pointer: number): void {
    this.#at.delete(pointer);
    if (this.#going?.pointer === pointer) this.#going = null;
    this.#pinch = null;
  }

  cancel(): boolean {
    const going = this.#going;
    if (!going) return false;
    this.#going = { ...going, gesture: idle() };
    going.gesture.cancel();
    return going.moved;
  }
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
