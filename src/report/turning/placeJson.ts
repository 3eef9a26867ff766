/** A placement study as JSON: SI units throughout, sentences beside the figures. */
import type { Craft } from '../../craft/craft.ts';
import type { PlacedPoint } from '../../physics/placing/placedPoint.ts';
import type { PlacementStudy } from '../../physics/placing/study.ts';
import { inUnits } from '../../units/sentence.ts';
import type { UnitSystem } from '../../units/units.ts';
import { partName } from '../limitWords.ts';
import { placeReport } from './placeReport.ts';

export function placeJson(
  craft: Craft,
  study: PlacementStudy,
  units: UnitSystem = 'metric',
): Record<string, unknown> {
  const { part, points, today, complete } = study;
  const { headline, obstacles, notes } = placeReport(craft, study, units);
  return {
    place: {
      part,
      name: partName(craft, part),
      headline,
      complete,
      today: pointJson(today, units),
      points: points.map((point) => pointJson(point, units)),
      obstacles,
      notes,
    },
  };
}

/** Without the stowage: `plan` tells it for the craft with the thruster there. */
const pointJson = ({ stowage: _, ...point }: PlacedPoint, units: UnitSystem): Record<string, unknown> => ({
  ...point,
  why: point.why || null,
  cautions: point.cautions.map((caution) => inUnits(caution, units)),
});
