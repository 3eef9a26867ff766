/** The usual cautions, each where its hazard is. They defer to local rules, the site and the makers' sheets. */
import { type Craft, listed } from '../craft/craft.ts';
import type { PartKind } from '../craft/schema.ts';

export const HAZARDS = {
  helium:
    'Helium displaces the air one breathes, and whoever breathes it has no warning before fainting. Fill and vent only where air moves freely, never inhale it, and follow the supplier’s sheet.',
  hydrogen:
    'Hydrogen burns with a flame one hardly sees, and mixed with air it explodes. Many sites forbid it. Use it only where local rules allow it and with people trained for it.',
  pressure:
    'A closed envelope in the sun gains pressure and can burst. Vent it, watch the gauge, and keep to the film maker’s limits.',
  battery:
    'Lithium cells burn when crushed, pierced, overcharged or shorted. Charge them watched and away from the hull, and follow the maker’s sheet.',
  thruster:
    'A turning propeller cuts and catches hair and cords. Take the propeller off or the battery out before you work on the craft, and guard it near people.',
  ballast:
    'Lead is poisonous: wash your hands after touching it, and fix it so that it cannot fall on anybody.',
  people:
    'Flying near people can hurt them, and a light craft drifts in any draught. Fly by the rules of the local aviation authority and of the site; these figures stand in for no inspection, licence or makers’ sheet.',
} as const;

/** The caution about parts of a kind; null for most. */
export const partHazard = (kind: PartKind): string | null =>
  kind === 'battery' || kind === 'thruster' || kind === 'ballast' ? HAZARDS[kind] : null;

/** Every caution that belongs to a craft. */
export function hazardsOf(craft: Craft): string[] {
  const kinds = new Set(listed(craft.parts).map(({ kind }) => kind));
  return [
    HAZARDS[craft.gas.lifting],
    HAZARDS.pressure,
    ...[...kinds].flatMap((kind) => partHazard(kind) ?? []),
    HAZARDS.people,
  ];
}
