/** The name under which a burst of changes in one field enters history, so that it is undone at once. */
import { useId, useRef } from 'react';

export interface Burst {
  readonly run: () => string;
  /** What comes next is another burst. */
  readonly end: () => void;
}

export function useBurst(): Burst {
  const id = useId();
  const count = useRef(0);
  return {
    run: () => `${id} ${count.current}`,
    end: () => {
      count.current++;
    },
  };
}
