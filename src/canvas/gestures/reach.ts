/** What of a view a hand can reach, and how far a fingertip or a pointer reaches. */
import type { Reachable } from '../../scene/grip.ts';
import { MOUSE_SLOP, TOUCH_SLOP } from '../../scene/hit.ts';
import type { Ground, Hand } from './gesture.ts';

/** px */
export const slopOf = ({ touch }: Hand): number => (touch ? TOUCH_SLOP : MOUSE_SLOP);

export const reachable = (ground: Ground): Reachable => ({
  ...ground.scene(),
  selection: ground.session.getState().selection,
});
