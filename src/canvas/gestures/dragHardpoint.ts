/** Dragging a hardpoint in the side view, as a part is dragged. */
import { placeHardpoint } from '../../edit/edits/hardpoints.ts';
import { companyOf, sizeOf } from './company.ts';
import { follow, together } from './dragAlong.ts';
import { dragging } from './dragging.ts';
import type { Gesture, Ground, Hand } from './gesture.ts';
import { clickThrough, include, press } from './select.ts';

export function dragHardpoint(ground: Ground, down: Hand, { id }: { id: string }): Gesture {
  const thing = { kind: 'hardpoint', id } as const;
  press(ground, thing, down);
  const start = ground.scene();
  const { name, place } = start.craft.hardpoints.byId[id]!;
  const begin = () => {
    include(ground, thing);
    const company = companyOf(start.craft, ground.session.getState().selection);
    return {
      held: { kind: 'hardpoint', id } as const,
      moving: company.keys,
      step: (hand: Hand) => {
        const to = follow(ground, start, down, hand, place, company.keys);
        return sizeOf(company) > 1
          ? together(start, company, place, to)
          : { recipe: placeHardpoint(id, to.place), show: { guide: to.guide } };
      },
    };
  };
  return dragging(ground, `Move ${name || 'hardpoint'}`, begin, (hand) => clickThrough(ground, thing, hand));
}
