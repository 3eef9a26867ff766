/** Dragging the handle beyond the tail makes the hull longer or shorter; the nose stays. */
import { reshape } from '../../edit/edits/craft.ts';
import { withLength } from '../../scene/dragHull.ts';
import { snapped, stationRule } from '../../scene/snap.ts';
import { toWorld } from '../../scene/view.ts';
import { dragging } from './dragging.ts';
import { type Gesture, type Ground, type Hand, unsnapped } from './gesture.ts';

export function dragHullLength(ground: Ground, down: Hand): Gesture {
  const { craft, geometry, units, view } = ground.scene();
  const { shape } = craft.hull;
  const { length } = geometry.hull;
  const from = toWorld(view, down);
  const step = (hand: Hand) => {
    const asked = length + toWorld(ground.scene().view, hand).u - from.u;
    const { value } = snapped(asked, [], stationRule(view.scale, units, unsnapped(ground, hand)));
    return { recipe: reshape(withLength(shape, length, value)) };
  };
  return dragging(ground, 'Change hull length', () => ({
    held: { kind: 'hull', end: 'tail' },
    moving: new Set(),
    step,
  }));
}
