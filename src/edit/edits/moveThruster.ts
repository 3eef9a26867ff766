/** Moving a thruster to where a placement study tried it, with the ballast that was planned for it there or without. */
import type { Place } from '../../craft/placeSchema.ts';
import { type Stowage, stow } from '../../craft/stowage.ts';
import { type Edit, step } from '../edit.ts';
import { calledPart, type PartCalled, placePart } from './parts.ts';

export const moveThruster = (part: PartCalled, place: Place): Edit =>
  step(`Move ${calledPart(part)}`, placePart(part.id, place));

/** All as one step. */
export const moveAndHang = (part: PartCalled, place: Place, stowage: Stowage): Edit =>
  step(`Move ${calledPart(part)} and hang the ballast`, (craft) => {
    placePart(part.id, place)(craft);
    stow(craft, stowage);
  });
