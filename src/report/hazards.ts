/** The usual cautions, each where its hazard is. They defer to local rules, the site and the makers' sheets. */
import { type Craft, listed } from '../craft/craft.ts';
import type { PartKind } from '../craft/schema.ts';
import type { ThrusterData } from '../craft/thrustSchema.ts';

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
  vectored:
    'A thruster that turns moves without warning and throws its wash, and whatever comes loose, wherever it points. Keep hands and faces out of its whole sweep, and try it first with the propeller off.',
  ballast:
    'Lead is poisonous: wash your hands after touching it, and fix it so that it cannot fall on anybody.',
  people:
    'Flying near people can hurt them, and a light craft drifts in any draught. Fly by the rules of the local aviation authority and of the site; these figures stand in for no inspection, licence or makers’ sheet.',
} as const;

/** The caution about parts of a kind; null for most. */
export const partHazard = (kind: PartKind): string | null =>
  kind === 'battery' || kind === 'thruster' || kind === 'ballast' ? HAZARDS[kind] : null;

/** Whether its thrust turns. */
export const isVectored = ({ yaw, pitch }: ThrusterData): boolean =>
  yaw.least !== yaw.most || pitch.least !== pitch.most;

/** Every caution that belongs to a craft. */
export function hazardsOf(craft: Craft): string[] {
  const parts = listed(craft.parts);
  const kinds = new Set(
    parts.flatMap(({ kind, thruster }) => (thruster ? ([kind, 'thruster'] as const) : [kind])),
  );
  return [
    HAZARDS[craft.gas.lifting],
    HAZARDS.pressure,
    ...[...kinds].flatMap((kind) => partHazard(kind) ?? []),
    ...(parts.some(({ thruster }) => thruster && isVectored(thruster)) ? [HAZARDS.vectored] : []),
    HAZARDS.people,
  ];
}
