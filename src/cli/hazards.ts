/** The usual cautions of what is on a craft. They defer to those who have the say. */
import { type Craft, listed } from '../craft/craft.ts';

export function hazards(craft: Craft): string[] {
  const has = (kind: string) => listed(craft.parts).some((part) => part.kind === kind);
  return [
    craft.gas.lifting === 'helium'
      ? 'Helium displaces the air one breathes, without warning: fill and vent where the air is fresh.'
      : 'Hydrogen burns, and explodes with air: only where local rules and trained people allow it.',
    ...(craft.gas.gaugePressure > 0
      ? [
          'A hull under pressure swells in the sun and can burst: relieve it by the maker’s sheet of the film.',
        ]
      : []),
    ...(has('battery')
      ? ['Lithium cells burn when crushed, pierced or overcharged: charge them watched.']
      : []),
    ...(has('thruster') ? ['Propellers cut: take the battery out before reaching near one.'] : []),
    'Flying near people needs care and often leave: the aviation authority and the site have the say.',
  ];
}
