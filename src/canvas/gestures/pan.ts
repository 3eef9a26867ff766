/** Dragging empty ground moves the drawing; a click on it selects nothing. */
import { sideOutline } from '../../scene/outline.ts';
import { keptInSight, panned } from '../../scene/view.ts';
import type { Gesture, Ground, Hand } from './gesture.ts';

export function pan(ground: Ground, down: Hand): Gesture {
  let last = down;
  return {
    move: (hand) => {
      const [dx, dy] = [hand.x - last.x, hand.y - last.y];
      last = hand;
      slide(ground, dx, dy);
    },
    end: (_, moved) => {
      if (!moved && !down.ctrl && !down.shift) ground.session.select([]);
    },
    cancel: () => undefined,
  };
}

/** Moves the drawing by px, but never the whole hull out of sight. */
export function slide(ground: Ground, dx: number, dy: number): void {
  const { geometry, outline = sideOutline(geometry.hull, 24) } = ground.scene();
  ground.setView((view) => keptInSight(panned(view, dx, dy), outline));
}
