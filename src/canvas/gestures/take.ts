/** Which gesture begins where the hand presses. */
import type { Vectoring } from '../../craft/thrustSchema.ts';
import { arrowAt, type Grip, gripAt } from '../../scene/grip.ts';
import { toWorld } from '../../scene/view.ts';
import { refusing } from './dragging.ts';
import { dragHardpoint } from './dragHardpoint.ts';
import { dragHullDiameter } from './dragHullDiameter.ts';
import { dragHullLength } from './dragHullLength.ts';
import { dragHardpointInFront, dragPartInFront } from './dragInFront.ts';
import { dragPart } from './dragPart.ts';
import { dragSupport } from './dragSupport.ts';
import { dragWireEnd } from './dragWireEnd.ts';
import type { Gesture, Ground, Hand } from './gesture.ts';
import { pan } from './pan.ts';
import { reachable, slopOf } from './reach.ts';
import { click, clickThrough, marquee } from './select.ts';
import { turnArrow } from './turnThrust.ts';

export type Take = (ground: Ground, hand: Hand) => Gesture;

/** What lies under the hand in the view. */
export function gripUnder(ground: Ground, hand: Hand): Grip | null {
  const { view } = ground.scene();
  return gripAt(reachable(ground), toWorld(view, hand), view.scale, slopOf(hand));
}

const onEmpty: Take = (ground, hand) =>
  hand.shift || ground.habits.several ? marquee(ground, hand) : pan(ground, hand);

/** An arrow that does not turn in this view stays; anywhere else the drawing is moved. */
function onArrowOrEmpty(ground: Ground, hand: Hand): Gesture {
  const { thrust, view, craft } = ground.scene();
  const mark = arrowAt(thrust, toWorld(view, hand), slopOf(hand) / view.scale);
  const part = mark && craft.parts.byId[mark.part];
  if (!mark || !part?.thruster || turns(part.thruster[mark.way])) return onEmpty(ground, hand);
  const hint = `${part.name || part.kind} is fixed in ${mark.way}: set its limits under Selected.`;
  return refusing(ground, hint, (at) => click(ground, { kind: 'part', id: part.id }, at));
}

const turns = ({ least, most }: Vectoring): boolean => most > least;

/** A wire run is selected by a click; dragging it moves the drawing. */
function onWire(ground: Ground, hand: Hand, id: string): Gesture {
  const panning = pan(ground, hand);
  return {
    ...panning,
    end: (at, moved) => {
      if (!moved) clickThrough(ground, { kind: 'wire', id }, at);
    },
  };
}

export const takeInSide: Take = (ground, hand) => {
  const grip = gripUnder(ground, hand);
  switch (grip?.kind) {
    case undefined:
      return onArrowOrEmpty(ground, hand);
    case 'part':
      return dragPart(ground, hand, grip);
    case 'hardpoint':
      return dragHardpoint(ground, hand, grip);
    case 'support':
      return dragSupport(ground, hand);
    case 'wire':
      return onWire(ground, hand, grip.id);
    case 'wireEnd':
      return dragWireEnd(ground, hand, grip);
    case 'thrust':
      return turnArrow(ground, hand, grip);
    case 'hull':
      return grip.end === 'tail' ? dragHullLength(ground, hand) : dragHullDiameter(ground, hand);
  }
};

export const takeInFront: Take = (ground, hand) => {
  const grip = gripUnder(ground, hand);
  switch (grip?.kind) {
    case 'part':
      return dragPartInFront(ground, hand, grip);
    case 'hardpoint':
      return dragHardpointInFront(ground, hand, grip);
    case 'wire':
      return onWire(ground, hand, grip.id);
    default:
      return onEmpty(ground, hand);
  }
};

/** From above thrust is turned and parts are picked; they are moved in the other views. */
export const takeFromAbove: Take = (ground, hand) => {
  const grip = gripUnder(ground, hand);
  switch (grip?.kind) {
    case 'thrust':
      return turnArrow(ground, hand, grip);
    case 'part':
      return refusing(ground, MOVED_ELSEWHERE, (at) =>
        clickThrough(ground, { kind: 'part', id: grip.id }, at),
      );
    default:
      return onArrowOrEmpty(ground, hand);
  }
};

const MOVED_ELSEWHERE = 'Parts are moved in the side view and from astern.';
