import { expect, test } from 'vitest';
import { Cell } from '../../src/app/cell.ts';
import { turningOf } from '../../src/app/useTurningOf.ts';
import { type Craft, listed } from '../../src/craft/craft.ts';
import { step } from '../../src/edit/edit.ts';
import { setName } from '../../src/edit/edits/craft.ts';
import { turnThrust } from '../../src/edit/edits/thrust.ts';
import { Session, type SessionState } from '../../src/edit/session.ts';
import { FIRST_TURNING } from '../../src/panels/turn/turning.ts';
import { sampleCraft } from '../samples/readSamples.ts';

/** The opening craft with every thruster free to turn in yaw and pitch. */
function vectored(): Craft {
  const craft = structuredClone(sampleCraft('orchard-counter'));
  const vectoring = { least: -1, most: 1, set: 0, slew: 3 };
  for (const part of listed(craft.parts).filter(({ kind }) => kind === 'thruster')) {
    part.thruster = {
      thrust: { kind: 'measured', staticThrust: 0.5 },
      diameter: 0.1,
      pitchSpeed: { kind: 'given', speed: 8 },
      reverse: 0,
      yaw: { ...vectoring },
      pitch: { ...vectoring },
      differential: false,
    };
  }
  return craft;
}

function onPage() {
  const session = new Session(vectored());
  const shown = new Cell<SessionState>(session.getState());
  session.subscribe(() => shown.set(session.getState()));
  const store = { shown, craftId: 'a' };
  const thruster = session
    .getState()
    .craft.parts.order.find((id) => session.getState().craft.parts.byId[id]!.thruster)!;
  return { session, store, thruster, cell: turningOf(store) };
}

test('whoever turns an arrow in yaw steers by it, during the drag too; in pitch nothing is steered', () => {
  const { session, thruster, cell } = onPage();
  session.apply(step('Up', turnThrust(thruster, 'pitch', 0.3)));
  session.apply(setName('Renamed'));
  expect(cell.get()).toEqual(FIRST_TURNING);
  const drag = session.beginDrag('Turn the thrust');
  drag.move(turnThrust(thruster, 'yaw', 0.2));
  expect(cell.get()).toEqual({ ...FIRST_TURNING, steering: 'set', turned: thruster });
  drag.commit();
  cell.set({ ...cell.get(), steering: 'limit' });
  session.undo();
  expect(cell.get()).toMatchObject({ steering: 'set', turned: thruster });
});

test('another craft begins as at first', () => {
  const { session, store, thruster, cell } = onPage();
  session.apply(step('Turn', turnThrust(thruster, 'yaw', 0.2)));
  cell.set({ ...cell.get(), throttle: 0.4 });
  store.craftId = 'b';
  session.open(vectored());
  expect(cell.get()).toEqual(FIRST_TURNING);
});
