/** The frame of every drag that edits the craft: one transaction, begun at the first move, kept or given up whole. */
import type { Recipe } from '../../edit/edit.ts';
import type { Drag } from '../../edit/session.ts';
import { AT_REST, type Overlay } from '../overlay.ts';
import { type Gesture, type Ground, type Hand, problemHint } from './gesture.ts';

export interface Step {
  readonly recipe: Recipe;
  readonly show?: Partial<Overlay>;
}

export interface Work extends Pick<Overlay, 'held' | 'moving'> {
  /** The edit for where the hand is, counted from the start of the drag. */
  step(hand: Hand): Step;
}

/** `label` is what undo will say; `begin` is asked at the first move, `click` when there was none. */
export function dragging(
  ground: Ground,
  label: string,
  begin: () => Work,
  click: (hand: Hand) => void = () => undefined,
): Gesture {
  let going: { drag: Drag; work: Work } | null = null;
  const started = () => {
    const work = begin();
    ground.lastClick.current = null;
    ground.show({ held: work.held, moving: work.moving, hint: null });
    return { work, drag: ground.session.beginDrag(label) };
  };
  return {
    move: (hand) => {
      going ??= started();
      const { recipe, show } = going.work.step(hand);
      going.drag.move(recipe);
      ground.show({ guide: null, join: null, hint: null, ...show });
    },
    end: (hand, moved) => {
      if (!moved) click(hand);
      const hint = problemHint(going?.drag.commit() ?? []);
      ground.show(hint ? { ...AT_REST, hint } : AT_REST);
    },
    cancel: () => {
      going?.drag.cancel();
      ground.show({ ...AT_REST, hint: null });
    },
  };
}

/** A gesture that only says why it does nothing. */
export const refusing = (ground: Ground, hint: string, click: (hand: Hand) => void): Gesture => ({
  move: () => ground.show({ hint }),
  end: (hand, moved) => {
    if (!moved) click(hand);
  },
  cancel: () => undefined,
});
