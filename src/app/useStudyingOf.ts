/** What the turn panel and the drawing are given of the placement study, made from the store. */
import { useMemo, useState } from 'react';
import type { Studying } from '../panels/turn/studying.ts';
import type { PlanClient } from '../worker/planClient.ts';
import { useCell } from './cell.ts';
import type { Store } from './store.ts';
import { Studies } from './studies.ts';

export function useStudyingOf(store: Store, client: PlanClient): Studying {
  const [studies] = useState(() => begin(store, client));
  const state = useCell(studies.state);
  return useMemo(() => {
    const { start, goOn, stop, close } = studies;
    return { ...state, start, goOn, stop, close };
  }, [state, studies]);
}

/** On another craft there is no study. */
function begin(store: Store, client: PlanClient): Studies {
  const studies = new Studies(store.shown, client);
  let { craftId } = store;
  store.shown.subscribe(() => {
    if (store.craftId === craftId) return;
    craftId = store.craftId;
    studies.close();
  });
  return studies;
}
