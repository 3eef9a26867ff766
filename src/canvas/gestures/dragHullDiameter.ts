/** Dragging the handle on the waist makes the hull thicker or thinner; the axis stays, so the waist follows the hand at half the change. */
import { reshape } from '../../edit/edits/craft.ts';
import { withDiameter } from '../../scene/dragHull.ts';
import { snapped, stationRule } from '../../scene/snap.ts';
import { toWorld } from '../../scene/view.ts';
import { dragging } from './dragging.ts';
import { type Gesture, type Ground, type Hand, unsnapped } from './gesture.ts';

export function dragHullDiameter(ground: Ground, down: Hand): Gesture {
  const { craft, geometry, units, view } = ground.scene();
  const { shape } = craft.hull;
  const { height } = geometry.hull;
  const from = toWorld(view, down);
  const step = (hand: Hand) => {
    const asked = height + 2 * (toWorld(ground.scene().view, hand).z - from.z);
    const { value } = snapped(asked, [], stationRule(view.scale, units, unsnapped(ground, hand)));
    return { recipe: reshape(withDiameter(shape, height, value)) };
  };
  return dragging(ground, 'Change hull diameter', () => ({
    held: { kind: 'hull', end: 'waist' },
    moving: new Set(),
    step,
  }));
}
