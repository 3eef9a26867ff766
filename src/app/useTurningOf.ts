/** How the builder asks to see the craft fly, for as long as the page lives. Turning an arrow in yaw steers by it. */
import { useMemo, useState } from 'react';
import { type Craft, listed } from '../craft/craft.ts';
import { FIRST_TURNING, type Turning, type TurningState } from '../panels/turn/turning.ts';
import { Cell, useCell } from './cell.ts';
import type { Store } from './store.ts';

export function useTurningOf(store: Store): Turning {
  const [cell] = useState(() => turningOf(store));
  const state = useCell(cell);
  return useMemo(
    () => ({ ...state, set: (change) => cell.set({ ...cell.get(), ...change }) }),
    [state, cell],
  );
}

/** Watches the store for as long as the page lives; on another craft it begins as at first. */
export function turningOf(store: Pick<Store, 'shown' | 'craftId'>): Cell<TurningState> {
  const cell = new Cell(FIRST_TURNING);
  let { craftId } = store;
  let before = store.shown.get().craft;
  store.shown.subscribe(() => {
    const { craft } = store.shown.get();
    const turned = craftId === store.craftId ? turnedArrow(before, craft) : undefined;
    if (craftId !== store.craftId) cell.set(FIRST_TURNING);
    if (turned) cell.set({ ...cell.get(), steering: 'set', turned });
    craftId = store.craftId;
    before = craft;
  });
  return cell;
}

/** The part whose thrust was turned in yaw, and nothing else of it. */
function turnedArrow(before: Craft, { parts }: Craft): string | undefined {
  if (before.parts === parts) return undefined;
  return listed(parts).find(({ id, thruster }) => {
    const yaw = before.parts.byId[id]?.thruster?.yaw;
    return thruster && yaw && thruster.yaw !== yaw && thruster.yaw.set !== yaw.set;
  })?.id;
}
