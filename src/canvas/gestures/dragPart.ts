/** Dragging a part in the side view: it keeps its kind of place, snaps along the hull, and takes the rest of the selection with it. */
import { placePart } from '../../edit/edits/parts.ts';
import { companyOf, sizeOf } from './company.ts';
import { follow, together } from './dragAlong.ts';
import { dragging, refusing } from './dragging.ts';
import type { Gesture, Ground, Hand } from './gesture.ts';
import { clickThrough, include, press } from './select.ts';

export function dragPart(ground: Ground, down: Hand, { id, copy }: { id: string; copy: number }): Gesture {
  const thing = { kind: 'part', id } as const;
  press(ground, thing, down);
  const clicked = (hand: Hand) => clickThrough(ground, thing, hand);
  const start = ground.scene();
  const { name, kind, locked, place } = start.craft.parts.byId[id]!;
  if (locked) return refusing(ground, `${name || kind} is locked. Unlock it to move it.`, clicked);
  const begin = () => {
    include(ground, thing);
    const company = companyOf(start.craft, ground.session.getState().selection);
    return {
      held: { kind: 'part', id, copy } as const,
      moving: company.keys,
      step: (hand: Hand) => {
        const to = follow(ground, start, down, hand, place, company.keys);
        return sizeOf(company) > 1
          ? together(start, company, place, to)
          : { recipe: placePart(id, to.place), show: { guide: to.guide } };
      },
    };
  };
  return dragging(ground, `Move ${name || kind}`, begin, clicked);
}
