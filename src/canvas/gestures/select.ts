/** Selecting: a click takes one thing, Ctrl or Shift adds or takes away, and a box dragged with Shift takes what is in it. */
import { isSelected, type Selectable, type Selection, sameThing, toggled } from '../../edit/selection.ts';
import { figuresIn } from '../../scene/hit.ts';
import { boxOf, toWorld, turnedBy } from '../../scene/view.ts';
import { AT_REST } from '../overlay.ts';
import type { Gesture, Ground, Hand } from './gesture.ts';

const adds = (hand: Hand): boolean => hand.ctrl || hand.shift;

const selection = (ground: Ground): Selection => ground.session.getState().selection;

/** Pressing: what is not selected yet becomes so at once, so that it can be dragged without a click before. */
export function press(ground: Ground, thing: Selectable, hand: Hand): void {
  if (adds(hand) || isSelected(selection(ground), thing)) return;
  ground.session.select([thing]);
}

/** A drag of something not yet selected, begun with Ctrl or Shift, takes it along. */
export function include(ground: Ground, thing: Selectable): void {
  const now = selection(ground);
  if (!isSelected(now, thing)) ground.session.select([...now, thing]);
}

/** Letting go where it was pressed. */
export function click(ground: Ground, thing: Selectable, hand: Hand): void {
  const now = selection(ground);
  if (adds(hand)) ground.session.select(toggled(now, thing));
  else if (now.length !== 1 || !sameThing(now[0]!, thing)) ground.session.select([thing]);
}

/** A box dragged over empty ground. The sides of the box are those of the screen. */
export function marquee(ground: Ground, from: Hand): Gesture {
  const before = selection(ground);
  return {
    move: (to) => ground.show({ marquee: { from, to } }),
    end: (to, moved) => {
      ground.show(AT_REST);
      if (moved) ground.session.select(merged(before, caught(ground, from, to)));
    },
    cancel: () => {
      ground.show(AT_REST);
    },
  };
}

function caught(ground: Ground, from: Hand, to: Hand): Selection {
  const { figures, view } = ground.scene();
  const level = { ...view, tilt: 0 };
  const box = boxOf([toWorld(level, from), toWorld(level, to)]);
  const upright = figures.map((figure) => ({ ...figure, middle: turnedBy(view, figure.middle) }));
  const ids = new Set(figuresIn(upright, box).map(({ part }) => part));
  return [...ids].map((id) => ({ kind: 'part', id }));
}

const merged = (before: Selection, more: Selection): Selection => [
  ...before,
  ...more.filter((thing) => !isSelected(before, thing)),
];
