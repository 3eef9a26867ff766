/** A gesture: what happens between pressing and letting go. Each lives in a file of its own, named for what the hand does. */
import type { Problem } from '../../craft/problem.ts';
import type { Session } from '../../edit/session.ts';
import type { Figure } from '../../scene/figure.ts';
import type { Line } from '../../scene/grip.ts';
import type { Geometry, Subject } from '../../scene/subject.ts';
import type { ThrustMark } from '../../scene/thrustArrows.ts';
import type { PlanePoint, View } from '../../scene/view.ts';
import type { WireHandle } from '../../scene/wireHandle.ts';
import type { Overlay } from '../overlay.ts';

/** Where the hand is on the view, px, and which keys it holds. */
export interface Hand {
  readonly x: number;
  readonly y: number;
  readonly shift: boolean;
  /** Ctrl, or Cmd on a Mac. */
  readonly ctrl: boolean;
  readonly alt: boolean;
  readonly touch: boolean;
}

export interface Gesture {
  /** Called once the hand has moved farther than a click does. */
  move(hand: Hand): void;
  /** Let go. `moved` is false for a click. */
  end(hand: Hand, moved: boolean): void;
  /** Escape, or the pointer was lost: everything as it was. */
  cancel(): void;
}

/** The view as drawn now. */
export interface Scene extends Subject {
  readonly view: View;
  readonly geometry: Geometry;
  /** What panning keeps in sight; by default the hull from the side. */
  readonly outline?: readonly PlanePoint[];
  readonly figures: readonly Figure[];
  readonly lines: readonly Line[];
  readonly hardpoints: readonly { readonly id: string; readonly at: PlanePoint }[];
  /** Where the view shows the support point; null where it does not. */
  readonly support: PlanePoint | null;
  /** Ends of the wire runs selected, where the view lets them be taken. */
  readonly wireHandles: readonly WireHandle[];
  readonly thrust: readonly ThrustMark[];
}

/** How the builder wants the hand to work. */
export interface Habits {
  /** Whether what is dragged snaps; Alt turns it round. */
  readonly snap: boolean;
  /** Whether a click adds to the selection or takes away, and a drag on empty ground draws a box. */
  readonly several: boolean;
}

/** What gestures work on. */
export interface Ground {
  readonly session: Session;
  readonly habits: Habits;
  /** Where the last click was, in the plane; null once something else happened. */
  readonly lastClick: { current: PlanePoint | null };
  scene(): Scene;
  show(change: Partial<Overlay>): void;
  /** The view was moved by hand. */
  setView(change: (view: View) => View): void;
  fit(): void;
}

/** Whether snapping is held off. */
export const unsnapped = ({ habits }: Ground, { alt }: Hand): boolean => alt === habits.snap;

/** What a drag that could not be kept says. */
export const problemHint = (problems: readonly Problem[]): string | null =>
  problems[0]
    ? `${problems[0].path} cannot be ${problems[0].found}: allowed is ${problems[0].allowed}`
    : null;
