/** Dragging in the front view: round the hull what sits on the skin, else as its kind of place allows; what is selected goes along. */
import type { Place } from '../../craft/placeSchema.ts';
import type { Copies } from '../../craft/schema.ts';
import type { Recipe } from '../../edit/edit.ts';
import { placeHardpoint } from '../../edit/edits/hardpoints.ts';
import { placePart } from '../../edit/edits/parts.ts';
import { type FrontWay, heldInFront, isMirrored, movedInFront, wayInFront } from '../../scene/dragPlace.ts';
import { clockRule, clockTargets, snapped } from '../../scene/snap.ts';
import { toWorld } from '../../scene/view.ts';
import type { Guide } from '../overlay.ts';
import { type Company, companyOf } from './company.ts';
import { dragging, refusing, type Step } from './dragging.ts';
import { type Gesture, type Ground, type Hand, type Scene, unsnapped } from './gesture.ts';
import { clickThrough, include, press } from './select.ts';

type Thing = { readonly kind: 'part' | 'hardpoint'; readonly id: string };

/** What is in hand: a place, and whether the hand has the mirrored piece of a pair. */
interface InHand {
  readonly place: Place;
  readonly mirrored: boolean;
}

export function dragPartInFront(
  ground: Ground,
  down: Hand,
  { id, copy }: { id: string; copy: number },
): Gesture {
  const thing = { kind: 'part', id } as const;
  press(ground, thing, down);
  const { name, kind, locked, place, copies } = ground.scene().craft.parts.byId[id]!;
  const why = locked ? 'is locked. Unlock it to move it.' : heldInFront(place);
  if (why) return refusing(ground, `${name || kind} ${why}`, (hand) => clickThrough(ground, thing, hand));
  const inHand = { place, mirrored: isMirrored(copies, copy) };
  return dragFrom(ground, down, { thing, name: name || kind, held: { ...thing, copy }, inHand });
}

export function dragHardpointInFront(ground: Ground, down: Hand, { id }: { id: string }): Gesture {
  const thing = { kind: 'hardpoint', id } as const;
  press(ground, thing, down);
  const { name, place } = ground.scene().craft.hardpoints.byId[id]!;
  const why = heldInFront(place);
  const clicked = (hand: Hand) => clickThrough(ground, thing, hand);
  if (why) return refusing(ground, `${name || 'The hardpoint'} ${why}`, clicked);
  const inHand = { place, mirrored: false };
  return dragFrom(ground, down, { thing, name: name || 'hardpoint', held: thing, inHand });
}

interface Taken {
  readonly thing: Thing;
  readonly name: string;
  readonly held:
    | { readonly kind: 'part'; readonly id: string; readonly copy: number }
    | (Thing & { readonly kind: 'hardpoint' });
  readonly inHand: InHand;
}

function dragFrom(ground: Ground, down: Hand, { thing, name, held, inHand }: Taken): Gesture {
  const start = ground.scene();
  const begin = () => {
    include(ground, thing);
    const company = companyOf(start.craft, ground.session.getState().selection);
    const step = (hand: Hand): Step => {
      const { way, guide } = followRound(ground, start, down, hand, inHand, company.keys);
      return { recipe: movedTogether(start, company, way, inHand.mirrored), show: { guide } };
    };
    return { held, moving: company.keys, step };
  };
  return dragging(ground, `Move ${name}`, begin, (hand) => clickThrough(ground, thing, hand));
}

/** A pair follows with the piece on the side where the hand has one. */
const senseOf = (copies: Copies, mirrored: boolean): boolean => mirrored && copies.kind === 'pair';

const movedTogether =
  ({ craft: before }: Scene, { parts, hardpoints }: Company, way: FrontWay, mirrored: boolean): Recipe =>
  (craft) => {
    for (const id of parts) {
      const { place, copies } = before.parts.byId[id]!;
      placePart(id, movedInFront(place, way, senseOf(copies, mirrored)))(craft);
    }
    for (const id of hardpoints) {
      placeHardpoint(id, movedInFront(before.hardpoints.byId[id]!.place, way, false))(craft);
    }
  };

/** The way the hand went, its turn snapped so that what is in hand comes to rest at a round clock angle or another part's. */
function followRound(
  ground: Ground,
  start: Scene,
  down: Hand,
  hand: Hand,
  { place, mirrored }: InHand,
  moving: ReadonlySet<string>,
): { way: FrontWay; guide: Guide | null } {
  const { view } = ground.scene();
  const to = toWorld(view, hand);
  const way = wayInFront(toWorld(start.view, down), to);
  const next = movedInFront(place, way, mirrored);
  if (place.kind !== 'skin' || next.kind !== 'skin') return { way, guide: null };
  const whole = 2 * Math.PI;
  const clock = next.clock - whole * Math.floor(next.clock / whole);
  const rule = clockRule(view.scale, Math.hypot(to.u, to.z), unsnapped(ground, hand));
  const { value, to: target } = snapped(clock, clockTargets(start.craft, moving), rule);
  const sense = mirrored ? -1 : 1;
  const guide = target && ({ along: 'clock', at: sense * target.at, label: target.label } as const);
  return { way: { ...way, turn: sense * (value - place.clock) }, guide };
}
