/** A list that stays the same object while its elements do. */
import { useRef } from 'react';
import { keepSame } from '../scene/keepSame.ts';

export function useSame<T>(next: readonly T[], same: (a: T, b: T) => boolean = Object.is): readonly T[] {
  const last = useRef(next);
  last.current = keepSame(last.current, next, same);
  return last.current;
}
