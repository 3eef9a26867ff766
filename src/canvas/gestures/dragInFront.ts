/** Dragging a part or hardpoint in the front view: round the hull when it sits on the skin, else as its kind of place allows. */
import type { Place } from '../../craft/placeSchema.ts';
import type { Recipe } from '../../edit/edit.ts';
import { placeHardpoint } from '../../edit/edits/hardpoints.ts';
import { placePart } from '../../edit/edits/parts.ts';
import type { Selectable } from '../../edit/selection.ts';
import { draggedInFront, heldInFront, isMirrored } from '../../scene/dragPlace.ts';
import { keyOf } from '../../scene/grip.ts';
import { clockRule, clockTargets, snapped } from '../../scene/snap.ts';
import { toWorld } from '../../scene/view.ts';
import type { Guide } from '../overlay.ts';
import { companyOf } from './company.ts';
import { dragging, refusing } from './dragging.ts';
import type { Gesture, Ground, Hand, Scene } from './gesture.ts';
import { click, press } from './select.ts';

export function dragPartInFront(
  ground: Ground,
  down: Hand,
  { id, copy }: { id: string; copy: number },
): Gesture {
  const thing = { kind: 'part', id } as const;
  press(ground, thing, down);
  const clicked = (hand: Hand) => click(ground, thing, hand);
  const start = ground.scene();
  const { name, kind, locked, place, copies } = start.craft.parts.byId[id]!;
  const why = locked ? 'is locked. Unlock it to move it.' : heldInFront(place);
  if (why) return refusing(ground, `${name || kind} ${why}`, clicked);
  const { keys } = companyOf(start.craft, [thing]);
  const step = (hand: Hand) => {
    const to = followRound(ground, start, down, hand, place, isMirrored(copies, copy), keys);
    return { recipe: placePart(id, to.place), show: { guide: to.guide } };
  };
  const begin = () => ({ held: { ...thing, copy }, moving: keys, step });
  return dragging(ground, `Move ${name || kind}`, begin, clicked);
}

export function dragHardpointInFront(ground: Ground, down: Hand, { id }: { id: string }): Gesture {
  const thing: Selectable & { kind: 'hardpoint' } = { kind: 'hardpoint', id };
  press(ground, thing, down);
  const clicked = (hand: Hand) => click(ground, thing, hand);
  const start = ground.scene();
  const { name, place } = start.craft.hardpoints.byId[id]!;
  const why = heldInFront(place);
  if (why) return refusing(ground, `${name || 'The hardpoint'} ${why}`, clicked);
  const keys = new Set([keyOf('hardpoint', id)]);
  const step = (hand: Hand): { recipe: Recipe; show: { guide: Guide | null } } => {
    const to = followRound(ground, start, down, hand, place, false, keys);
    return { recipe: placeHardpoint(id, to.place), show: { guide: to.guide } };
  };
  return dragging(
    ground,
    `Move ${name || 'hardpoint'}`,
    () => ({ held: thing, moving: keys, step }),
    clicked,
  );
}

function followRound(
  ground: Ground,
  start: Scene,
  down: Hand,
  hand: Hand,
  place: Place,
  mirrored: boolean,
  moving: ReadonlySet<string>,
): { place: Place; guide: Guide | null } {
  const { view } = ground.scene();
  const from = toWorld(start.view, down);
  const to = toWorld(view, hand);
  const next = draggedInFront(place, { from, to, mirrored });
  if (next.kind !== 'skin') return { place: next, guide: null };
  const turn = 2 * Math.PI;
  const clock = next.clock - turn * Math.floor(next.clock / turn);
  const rule = clockRule(view.scale, Math.hypot(to.u, to.z), hand.alt);
  const { value, to: target } = snapped(clock, clockTargets(start.craft, moving), rule);
  const seen = mirrored ? -1 : 1;
  const guide = target && ({ along: 'clock', at: seen * target.at, label: target.label } as const);
  return { place: { ...next, clock: value }, guide };
}
