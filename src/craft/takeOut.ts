/** Parts taken out of a craft. */
import type { Craft } from './craft.ts';
import type { WireEnd } from './schema.ts';

/** Takes parts out, in place. A wire run that ended at one stays, its end loose where the part was. */
export function takeOut(craft: Craft, ids: readonly string[]): void {
  if (ids.length === 0) return;
  for (const id of craft.wires.order) {
    const wire = craft.wires.byId[id]!;
    const [from, to] = [loosened(craft, wire.from, ids), loosened(craft, wire.to, ids)];
    if (from !== wire.from || to !== wire.to) craft.wires.byId[id] = { ...wire, from, to };
  }
  for (const id of ids) delete craft.parts.byId[id];
  craft.parts.order = craft.parts.order.filter((id) => !ids.includes(id));
}

const loosened = (craft: Craft, end: WireEnd, ids: readonly string[]): WireEnd =>
  end.kind === 'part' && ids.includes(end.part)
    ? { kind: 'loose', place: { ...craft.parts.byId[end.part]!.place } }
    : end;
