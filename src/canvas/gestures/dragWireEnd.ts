/** Dragging the end of a wire run: over a part it joins it, elsewhere it stays loose on its path and says so. */
import { joinWire } from '../../edit/edits/wires.ts';
import { keyOf } from '../../scene/grip.ts';
import { MOUSE_SLOP, TOUCH_SLOP } from '../../scene/hit.ts';
import { snapped, stationRule, stationTargets } from '../../scene/snap.ts';
import { toWorld } from '../../scene/view.ts';
import { joinedPart, looseEnd, unjoinedWords, type WireSide } from '../../scene/wireEnd.ts';
import { dragging } from './dragging.ts';
import { type Gesture, type Ground, type Hand, unsnapped } from './gesture.ts';

export function dragWireEnd(ground: Ground, _: Hand, { id, side }: { id: string; side: WireSide }): Gesture {
  const start = ground.scene();
  const wire = start.craft.wires.byId[id]!;
  const moving = new Set([keyOf('wire', id)]);
  const hint = unjoinedWords(start.craft, wire[side]);
  const step = (hand: Hand) => {
    const { view } = ground.scene();
    const point = toWorld(view, hand);
    const slop = (hand.touch ? TOUCH_SLOP : 2 * MOUSE_SLOP) / view.scale;
    const part = joinedPart(wire, side, start.figures, point, slop);
    if (part !== null) return { recipe: joinWire(id, side, { kind: 'part', part }), show: { join: part } };
    const targets = stationTargets(start.craft, start.geometry, moving);
    const { value, to } = snapped(
      point.u,
      targets,
      stationRule(view.scale, start.units, unsnapped(ground, hand)),
    );
    const end = looseEnd(wire, side, start.geometry, { u: value, z: point.z });
    const guide = to && ({ along: 'station', ...to } as const);
    return { recipe: joinWire(id, side, end), show: { guide, hint } };
  };
  return dragging(ground, `Move the end of ${wire.name || 'a wire run'}`, () => ({
    held: { kind: 'wireEnd', id, side },
    moving,
    step,
  }));
}
