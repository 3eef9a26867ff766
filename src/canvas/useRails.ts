/** Rails in the side view: which are there, which stop is under the pointer, and taking it. */
import { useMemo, useState } from 'react';
import { idsOf, type Selection } from '../edit/selection.ts';
import {
  isOpen,
  type Knob,
  knobAt,
  knobKey,
  knobsOfAll,
  type Rail,
  railsOf,
  railsShown,
  sameKnob,
  sameRail,
} from '../scene/rails.ts';
import { dragSlideEnd } from './gestures/dragSlideEnd.ts';
import type { Ground, Hand, Scene } from './gestures/gesture.ts';
import type { Take } from './gestures/take.ts';
import { useSame } from './useSame.ts';

export interface Rails {
  readonly rails: readonly Rail[];
  /** Those whose stops can be taken. */
  readonly open: readonly Rail[];
  readonly knobs: readonly Knob[];
  /** Key of the one under the pointer. */
  readonly lit: string | null;
  readonly cursor: string | null;
  /** A stop under the hand is taken first. */
  take(otherwise: Take): Take;
  hover(otherwise: (hand: Hand | null) => void): (hand: Hand | null) => void;
}

export function useRails(scene: Scene, selection: Selection, planning: boolean): Rails {
  const { craft, geometry, view, figures } = scene;
  const { parts, loads } = craft;
  const { hull } = geometry;
  // biome-ignore lint/correctness/useExhaustiveDependencies: of the craft only parts and loads have slides
  const found = useMemo(() => railsShown(railsOf(craft, hull), planning), [parts, loads, hull, planning]);
  const rails = useSame(found, sameRail);
  const [lit, setLit] = useState<string | null>(null);
  const selected = idsOf(selection, 'part');
  const open = useSame(rails.filter((rail) => isOpen(rail, craft, selected)));
  const knobs = useSame(knobsOfAll(open, figures, view.scale), sameKnob);
  const light = (knob: Knob | null) => setLit(knob && knobKey(knob));
  return {
    rails,
    open,
    knobs,
    lit,
    cursor: lit ? 'ew-resize' : null,
    take: (otherwise) => (ground: Ground, hand: Hand) => {
      const knob = knobAt(knobs, view, hand);
      light(hand.touch ? null : knob);
      return knob ? dragSlideEnd(ground, hand, knob) : otherwise(ground, hand);
    },
    hover: (otherwise) => (hand) => {
      const knob = hand && knobAt(knobs, view, hand);
      light(knob);
      otherwise(knob ? null : hand);
    },
  };
}
