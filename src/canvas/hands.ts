/**
 * The hands on one view: which pointer is doing what. The first one down begins a gesture, which moves only once it is
 * past a threshold; a second one ends that and begins to pinch.
 */
import type { Gesture, Ground, Hand } from './gestures/gesture.ts';
import type { Take } from './gestures/take.ts';
import { idle, type Pinch, pinch } from './gestures/zoom.ts';

/** Farther than this the hand drags, px. */
const MOUSE_THRESHOLD = 3;
const TOUCH_THRESHOLD = 8;

interface Going {
  readonly pointer: number;
  readonly down: Hand;
  gesture: Gesture;
  moved: boolean;
}

export class Hands {
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
