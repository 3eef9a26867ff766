/** The arrows of thrust that a view shows: all while the turn is in front, else of what is selected or under the pointer. */
import { idsOf, type Selection } from '../edit/selection.ts';
import type { Geometry } from '../scene/subject.ts';
import { type ThrustMark, thrustMarks, type Way } from '../scene/thrustArrows.ts';
import type { Overlay } from './overlay.ts';
import { useSame } from './useSame.ts';

interface Shown {
  readonly way: Way;
  /** px/m */
  readonly scale: number;
  readonly turning: boolean;
  readonly longest?: number;
}

export function useThrust(
  { thrust }: Geometry,
  selection: Selection,
  { hover, held }: Overlay,
  { turning, ...shown }: Shown,
): readonly ThrustMark[] {
  const selected = idsOf(selection, 'part');
  const grip = held ?? hover;
  const near = grip?.kind === 'part' || grip?.kind === 'thrust' ? grip.id : null;
  const hands = (part: string) => turning || selected.includes(part);
  const marks = thrustMarks(thrust, {
    ...shown,
    hands,
    shows: (part) => hands(part) || part === near,
  });
  return useSame(marks, sameMark);
}

/** A few numbers each. */
const sameMark = (a: ThrustMark, b: ThrustMark): boolean => JSON.stringify(a) === JSON.stringify(b);
