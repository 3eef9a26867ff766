/** The figures of a craft, worked out once for each craft object and system of units. */
import type { Craft } from '../craft/craft.ts';
import { assess } from '../report/assess.ts';
import type { Assessment } from '../report/assessment.ts';
import type { UnitSystem } from '../units/units.ts';

const metric = new WeakMap<Craft, Assessment>();
const imperial = new WeakMap<Craft, Assessment>();

export function assessed(craft: Craft, units: UnitSystem): Assessment {
  const known = units === 'metric' ? metric : imperial;
  const before = known.get(craft);
  if (before) return before;
  const assessment = assess(craft, units);
  known.set(craft, assessment);
  return assessment;
}
