/** Dragging a stop of a slide in the side view: the part stays, the stretch along which the plan may move it changes. */
import type { Slide } from '../../craft/planningSchema.ts';
import type { Recipe } from '../../edit/edit.ts';
import { changeLoadOption } from '../../edit/edits/loads.ts';
import { stretchSlide } from '../../edit/edits/parts.ts';
import { atStation, stationOfPlace } from '../../scene/dragPlace.ts';
import type { Knob, Rail } from '../../scene/rails.ts';
import { snapped, stationRule, stationTargets } from '../../scene/snap.ts';
import { toWorld } from '../../scene/view.ts';
import { dragging } from './dragging.ts';
import type { Gesture, Ground, Hand } from './gesture.ts';

const ALONE: ReadonlySet<string> = new Set();

export function dragSlideEnd(ground: Ground, down: Hand, { rail, end }: Knob): Gesture {
  const start = ground.scene();
  const from = toWorld(start.view, down).u;
  const targets = stationTargets(start.craft, start.geometry, ALONE);
  return dragging(ground, `Change the slide of ${rail.name}`, () => ({
    held: null,
    moving: ALONE,
    step: (hand) => {
      const { view } = ground.scene();
      const asked = rail.slide[end] + toWorld(view, hand).u - from;
      const { value, to } = snapped(asked, targets, stationRule(view.scale, start.units, hand.alt));
      const station = stationOfPlace(atStation(rail.place, start.geometry.hull, value));
      const guide = to && station === to.at ? ({ along: 'station', ...to } as const) : null;
      return { recipe: stretch(rail, { ...rail.slide, [end]: station }), show: { guide } };
    },
  }));
}

/** Past the other end the two change places. */
const stretch = ({ owner, place }: Rail, slide: Slide): Recipe =>
  owner.kind === 'part'
    ? stretchSlide(owner.id, slide)
    : changeLoadOption(owner.id, owner.option, { kind: 'slide', place, ...slide });
