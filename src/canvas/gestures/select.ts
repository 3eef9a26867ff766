/**
 * Selecting: a click takes the smallest thing there, further clicks on the spot the others in turn. Ctrl, Shift or the habit of
 * picking several adds or takes away, and a box takes what is in it.
 */
import { isSelected, type Selectable, type Selection, sameThing, toggled } from '../../edit/selection.ts';
import { stackAt } from '../../scene/grip.ts';
import { figuresIn } from '../../scene/hit.ts';
import { boxOf, toWorld, turnedBy } from '../../scene/view.ts';
import { AT_REST } from '../overlay.ts';
import type { Gesture, Ground, Hand } from './gesture.ts';
import { reachable, slopOf } from './reach.ts';

const adds = ({ habits }: Ground, hand: Hand): boolean => habits.several || hand.ctrl || hand.shift;

const selection = (ground: Ground): Selection => ground.session.getState().selection;

/** Pressing: what is not selected yet becomes so at once, so that it can be dragged without a click before. */
export function press(ground: Ground, thing: Selectable, hand: Hand): void {
  if (adds(ground, hand) || isSelected(selection(ground), thing)) return;
  ground.session.select([thing]);
}

/** A drag of something not yet selected, begun with Ctrl or Shift, takes it along. */
export function include(ground: Ground, thing: Selectable): void {
  const now = selection(ground);
  if (!isSelected(now, thing)) ground.session.select([...now, thing]);
}

/** A click on one thing that nothing else can lie under. */
export function click(ground: Ground, thing: Selectable, hand: Hand): void {
  const now = selection(ground);
  if (adds(ground, hand)) ground.session.select(toggled(now, thing));
  else if (now.length !== 1 || !sameThing(now[0]!, thing)) ground.session.select([thing]);
}

/** Letting go in a view where it was pressed, on `thing` and perhaps others: the smallest, or the next on the same spot. */
export function clickThrough(ground: Ground, thing: Selectable, hand: Hand): void {
  const { view } = ground.scene();
  const point = toWorld(view, hand);
  const stack = stackAt(reachable(ground), point, view.scale, slopOf(hand));
  const last = ground.lastClick.current;
  const again = last && Math.hypot(last.u - point.u, last.z - point.z) <= slopOf(hand) / view.scale;
  ground.lastClick.current = point;
  const [only, more] = selection(ground);
  const at = again && !more && only ? stack.findIndex((each) => sameThing(each, only)) : -1;
  click(ground, stack[(at + 1) % stack.length] ?? thing, hand);
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
