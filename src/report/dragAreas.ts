/** The drag area of a part for want of a figure, for the field that asks for one. */
import type { Part } from '../craft/schema.ts';
import { isInside, reckonedArea } from '../physics/thrust/pods.ts';
import type { Geometry } from './assessment.ts';

/** Of one piece, m²; nil where all of them are inside the hull. */
export const reckonedDragArea = (part: Part, { hull, pieces }: Geometry): number =>
  pieces.some((piece) => piece.part === part.id && !isInside(hull, piece.middle)) ? reckonedArea(part) : 0;
