/** A placement study for reading: one sentence on top, where what is in the way, and what the figures are of. */
import type { Craft } from '../../craft/craft.ts';
import { TOLD_APART } from '../../physics/placing/placedPoint.ts';
import type { PlacementStudy } from '../../physics/placing/study.ts';
import { clearanceOf } from '../../physics/placing/sweep.ts';
import { inUnits, say } from '../../units/sentence.ts';
import type { UnitSystem } from '../../units/units.ts';
import { HAZARDS } from '../hazards.ts';
import { matterOf, placeHeadline, stretchesOf } from './placeWords.ts';

export interface PlaceReport {
  readonly headline: string;
  /** Where the propeller would strike what, where there is no plan: one sentence each, with the stations. */
  readonly obstacles: readonly string[];
  readonly notes: readonly string[];
  readonly cautions: readonly string[];
}

/** Sentences come in the units asked for. `moved`: whether the thruster has been moved since. */
export function placeReport(
  craft: Craft,
  study: PlacementStudy,
  units: UnitSystem = 'metric',
  moved = false,
): PlaceReport {
  const { points } = study;
  const obstacles = [
    ...stretchesOf(points, ({ why }) => (why ? [matterOf(why)] : [])),
    ...stretchesOf(points, ({ cautions }) => cautions.map(matterOf)),
  ];
  const read = (sentence: string) => inUnits(sentence, units);
  return {
    headline: read(placeHeadline(craft, study, moved)),
    obstacles: obstacles.map(read),
    notes: notesOf(craft, study).map(read),
    cautions: [
      HAZARDS.thruster,
      ...(points.some(({ ballast }) => ballast) ? [HAZARDS.ballast] : []),
      HAZARDS.people,
    ],
  };
}

function notesOf(craft: Craft, { part, points, complete }: PlacementStudy): string[] {
  const { place, thruster } = craft.parts.byId[part]!;
  const hung = points.some((point) => point.place.kind !== place.kind);
  const room = thruster ? clearanceOf(thruster.diameter) : 0;
  return [
    ...(complete ? [] : ['The study was stopped before the last station.']),
    'At each station the figures are of the craft with the ballast planned for it; where no plan can be made, of the craft as it hangs today.',
    'Nothing beats a place when no other is as good in all of lead and wire, time to 90°, gust held and thrust per watt, and better in one; where it is today counts as one of them.',
    `Closer than the model can tell is taken as equal (our choice): lead and wire within ${say(TOLD_APART.mass.step, 'mass')} or ${say(TOLD_APART.mass.share, 'fraction')}, time within ${say(TOLD_APART.time.share, 'fraction')}, gust within ${say(TOLD_APART.gust.share, 'fraction')}, thrust per watt within ${say(TOLD_APART.perWatt.share, 'fraction')}.`,
    ...(hung
      ? [
          'On the axis between the ends of the hull the thruster would be inside it: there it is tried below the keel.',
        ]
      : []),
    `About the propeller ${say(room, 'smallLength')} is kept clear of skin, ground and other propellers (common practice, no source). Other parts are taken as boxes, the craft as level; a fitting in the way where the thruster is today is taken as its mount, and where its propeller is the lowest of the craft today that rules no station out.`,
    'Thrust per watt is that in the slowed or quickened air at the propeller over that in free air; what its own suction does to the hull is left out.',
    'Try a new place on a tether before free flight.',
  ];
}
