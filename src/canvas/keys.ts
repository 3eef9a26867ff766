/** Keys of a view that has the focus. What it does not know goes on to the page. */
import type { KeyboardEvent } from 'react';
import type { Edit } from '../edit/edit.ts';
import { zoomedAtMiddle } from '../scene/view.ts';
import type { Ground } from './gestures/gesture.ts';
import { type Facing, neighbour, nudgeEdit, nudgeFor } from './gestures/nudge.ts';
import { thrustNudgeEdit, thrustNudgeFor } from './gestures/nudgeThrust.ts';
import type { Gestures } from './useGestures.ts';

const ZOOM = 1.25;

export interface KeyHandlers {
  onKeyDown(event: KeyboardEvent): void;
  onKeyUp(event: KeyboardEvent): void;
  onBlur(): void;
}

export function keysOf(ground: Ground, gestures: Gestures, facing: Facing): KeyHandlers {
  return {
    onKeyDown: (event) => {
      if (event.ctrlKey || event.metaKey || event.altKey) return;
      if (event.key === ' ') gestures.space.current = true;
      if (event.key === ' ' || act(ground, gestures, facing, event)) event.preventDefault();
    },
    onBlur: () => {
      gestures.space.current = false;
    },
    onKeyUp: (event) => {
      if (event.key === ' ') gestures.space.current = false;
    },
  };
}

/** True when the key meant something here. */
function act(ground: Ground, gestures: Gestures, facing: Facing, event: KeyboardEvent): boolean {
  const { key, shiftKey } = event;
  switch (key) {
    case 'Escape':
      return gestures.cancel();
    case '+':
    case '=':
      ground.setView((view) => zoomedAtMiddle(view, ZOOM));
      return true;
    case '-':
    case '−':
      ground.setView((view) => zoomedAtMiddle(view, 1 / ZOOM));
      return true;
    case '0':
      ground.fit();
      return true;
    case '[':
      return pick(ground, -1);
    case ']':
      return pick(ground, 1);
    default:
      return turnBy(ground, facing, event) || nudgeBy(ground, facing, key, shiftKey);
  }
}

function pick({ session }: Ground, way: 1 | -1): boolean {
  const { craft, selection } = session.getState();
  session.select(neighbour(craft.parts.order, selection, way));
  return true;
}

function nudgeBy(ground: Ground, facing: Facing, key: string, shift: boolean): boolean {
  const nudge = nudgeFor(key, shift, facing);
  if (!nudge) return false;
  const edit = nudgeEdit(ground.session.getState().selection, nudge);
  if (!edit) return false;
  apply(ground, edit);
  return true;
}

function turnBy(ground: Ground, facing: Facing, event: KeyboardEvent): boolean {
  const nudge = thrustNudgeFor(event, facing);
  const { craft, selection } = ground.session.getState();
  const edit = nudge && thrustNudgeEdit(craft, selection, nudge);
  if (!edit) return false;
  if (typeof edit === 'string') ground.show({ hint: edit });
  else apply(ground, edit);
  return true;
}

function apply({ session, show }: Ground, edit: Edit): void {
  const [problem] = session.apply(edit);
  show({ hint: problem ? `${problem.path}: allowed is ${problem.allowed}` : null });
}
