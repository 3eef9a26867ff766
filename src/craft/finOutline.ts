/** A fin as the rectangle of its area and aspect ratio: span = √(A S) outward, chord = √(S/A) along the hull, m. */
import type { FinData } from './thrustSchema.ts';

export interface FinOutline {
  readonly span: number;
  readonly chord: number;
}

export const finOutline = ({ area, aspectRatio }: FinData): FinOutline => ({
  span: Math.sqrt(area * aspectRatio),
  chord: Math.sqrt(area / aspectRatio),
});
