/** Edits of the pieces of lead at hand. */
import type { LeadPiece } from '../../craft/planningSchema.ts';
import { type Edit, step } from '../edit.ts';

export const addLeadPiece = (piece: LeadPiece): Edit =>
  step('Add pieces of lead', (craft) => {
    craft.pieces.push({ ...piece });
  });

export const setLeadPiece = (index: number, field: string, change: Partial<LeadPiece>): Edit =>
  step(`Change ${field} of the lead`, (craft) => {
    Object.assign(craft.pieces[index]!, change);
  });

export const removeLeadPieces = (indices: readonly number[]): Edit =>
  step('Remove pieces of lead', (craft) => {
    const left = craft.pieces.filter((_, i) => !indices.includes(i));
    if (left.length < craft.pieces.length) craft.pieces = left;
  });
