/** Dragging the support point in the side view, as a part is dragged. */
import { placeSupport } from '../../edit/edits/hardpoints.ts';
import { follow } from './dragAlong.ts';
import { dragging } from './dragging.ts';
import type { Gesture, Ground, Hand } from './gesture.ts';

const ALONE: ReadonlySet<string> = new Set();

export function dragSupport(ground: Ground, down: Hand): Gesture {
  const start = ground.scene();
  return dragging(ground, 'Move the support point', () => ({
    held: { kind: 'support' },
    moving: ALONE,
    step: (hand) => {
      const { place, guide } = follow(ground, start, down, hand, start.craft.support!, ALONE);
      return { recipe: placeSupport(place), show: { guide } };
    },
  }));
}
