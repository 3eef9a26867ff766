/** Edits of what parts do in the air: thrusters, fins, drag areas. */
import { finOfBox, firstThruster } from '../../craft/firstFigures.ts';
import type { Part } from '../../craft/schema.ts';
import type { FinData, ThrusterData, Vectoring } from '../../craft/thrustSchema.ts';
import { type Edit, type Recipe, step } from '../edit.ts';
import { calledPart, type PartCalled } from './parts.ts';

export type Way = 'yaw' | 'pitch';

const held = (angle: number, { least, most }: Vectoring): number => Math.min(Math.max(angle, least), most);

/** Turns the thrust of a part to an angle, held within what it can be turned to, rad. For drags and nudges: pass the recipe to `Drag.move`. */
export const turnThrust =
  (id: string, way: Way, angle: number): Recipe =>
  (craft) => {
    const vectoring = craft.parts.byId[id]?.thruster?.[way];
    if (vectoring) vectoring.set = held(angle, vectoring);
  };

/** Gives a part the thrust figures of its size, to be changed. */
export const giveThruster = (part: PartCalled & Pick<Part, 'size'>): Edit =>
  step(`Enter thrust figures of ${calledPart(part)}`, (craft) => {
    craft.parts.byId[part.id]!.thruster = firstThruster(part.size);
  });

export const takeThruster = (part: PartCalled): Edit =>
  step(`Remove the thrust figures of ${calledPart(part)}`, (craft) => {
    craft.parts.byId[part.id]!.thruster = null;
  });

/**
 * Sets figures of a thruster. The angle it is turned to stays within limits that change, and sides of the part's box that
 * were as large as its propeller stay so. `field` names what is typed, for the undo button.
 */
export const setThruster = (part: PartCalled, field: string, change: Partial<ThrusterData>): Edit =>
  step(`Change ${field} of ${calledPart(part)}`, (craft) => {
    const { thruster, size } = craft.parts.byId[part.id]!;
    if (!thruster) return;
    const before = { yaw: thruster.yaw, pitch: thruster.pitch };
    if (change.diameter !== undefined) resize(size, thruster.diameter, change.diameter);
    Object.assign(thruster, change);
    for (const way of ['yaw', 'pitch'] as const) {
      const next = change[way];
      if (next) thruster[way] = withinLimits(before[way], next);
    }
  });

/** An angle set out of limits that stay is left for the gate to refuse. */
const withinLimits = (before: Vectoring, next: Vectoring): Vectoring =>
  next.least === before.least && next.most === before.most ? next : { ...next, set: held(next.set, next) };

function resize(size: Part['size'], from: number, to: number): void {
  if (size.width === from) size.width = to;
  if (size.height === from) size.height = to;
}

export const setFin = (part: PartCalled, field: string, change: Partial<FinData>): Edit =>
  step(`Change ${field} of ${calledPart(part)}`, (craft) => {
    const { fin } = craft.parts.byId[part.id]!;
    if (fin) Object.assign(fin, change);
  });

/** Makes a fin as large as its box. A box without sides makes none. */
export const finFromBox = (part: PartCalled & Pick<Part, 'size'>): Edit =>
  step(`Take ${calledPart(part)} from its box`, (craft) => {
    const fin = finOfBox(part.size);
    if (fin) craft.parts.byId[part.id]!.fin = fin;
  });

export const takeFin = (part: PartCalled): Edit =>
  step(`Remove the fin figures of ${calledPart(part)}`, (craft) => {
    craft.parts.byId[part.id]!.fin = null;
  });

/** m²; null to have it reckoned from kind and size. */
export const setDragArea = (part: PartCalled, dragArea: number | null): Edit =>
  step(`Change drag area of ${calledPart(part)}`, (craft) => {
    craft.parts.byId[part.id]!.dragArea = dragArea;
  });
