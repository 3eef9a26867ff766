/** Turning the arrow of a thruster by its tip: in pitch in the side view, in yaw in the view from above, within its limits. */
import { turnThrust } from '../../edit/edits/thrust.ts';
import { type Grip, keyOf } from '../../scene/grip.ts';
import { snapped, turnRule } from '../../scene/snap.ts';
import { angleSeenAs, angleTo, heldWithin } from '../../scene/thrustArrows.ts';
import { toWorld } from '../../scene/view.ts';
import { dragging } from './dragging.ts';
import { type Gesture, type Ground, type Hand, unsnapped } from './gesture.ts';
import { click } from './select.ts';

type Taken = Extract<Grip, { kind: 'thrust' }>;

export function turnArrow(ground: Ground, down: Hand, held: Taken): Gesture {
  const { id, copy, way } = held;
  const { craft, thrust, view } = ground.scene();
  const { at, angle } = thrust.find((mark) => mark.part === id && mark.copy === copy)!;
  const { name, kind, thruster } = craft.parts.byId[id]!;
  const limits = thruster![way];
  const other = thruster![way === 'yaw' ? 'pitch' : 'yaw'].set;
  // The hand seldom takes the handle in its middle; the arrow keeps the angle between them.
  const off = angle - angleTo(way, at, toWorld(view, down));
  const step = (hand: Hand) => {
    const drawn = angleTo(way, at, toWorld(ground.scene().view, hand)) + off;
    const { value } = snapped(angleSeenAs(way, drawn, other), [], turnRule(unsnapped(ground, hand)));
    return { recipe: turnThrust(id, way, heldWithin(limits, value)) };
  };
  const begin = () => ({ held, moving: new Set([keyOf('part', id)]), step });
  return dragging(ground, `Turn the thrust of ${name || kind}`, begin, (hand) =>
    click(ground, { kind: 'part', id }, hand),
  );
}
