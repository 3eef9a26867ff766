/** Which figures change while something is dragged, whichever view the hand is on: those are drawn on the layer that moves. */
import { useRef } from 'react';
import type { Figure } from '../scene/figure.ts';
import { useSame } from './useSame.ts';

export interface Movers {
  readonly still: readonly Figure[];
  readonly moving: readonly Figure[];
}

export function useMovers(figures: readonly Figure[], dragging: boolean): Movers {
  const before = useRef(figures);
  const changed = useRef(new Set<string>());
  if (!dragging) changed.current.clear();
  else if (before.current.length === figures.length) {
    figures.forEach((figure, i) => {
      if (figure !== before.current[i]) changed.current.add(figure.part);
    });
  }
  before.current = figures;
  const isMoving = ({ part }: Figure) => changed.current.has(part);
  const still = useSame(figures.filter((figure) => !isMoving(figure)));
  return { still, moving: figures.filter(isMoving) };
}
