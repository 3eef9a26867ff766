/** What hangs, stands or is left ashore differently in two crafts that differ by their plans. In SI, for `inUnits`. */
import { type Craft, listed } from '../craft/craft.ts';
import type { Part } from '../craft/schema.ts';
import { stationOf } from '../craft/station.ts';
import { hungBallast } from '../craft/stowage.ts';
import { ballastMass } from '../physics/ballast/setting.ts';
import { say } from '../units/sentence.ts';
import { partName, spotName } from './limitWords.ts';
import { isElsewhere } from './movedParts.ts';
import { hardpointOf } from './planView.ts';
import { LEAST_LEAD } from './planWords.ts';

export interface PlanDifference {
  readonly key: string;
  /** "Lead at the nose", or the name of a part or load. */
  readonly label: string;
  /** "11.2 g", "none"; "at 0.42 m", "at the chin", "ashore". */
  readonly words: readonly [string, string];
}

type Two = readonly [Craft, Craft];

/** Lead first, then what slides or is carried. */
export const planDifferences = (one: Craft, other: Craft): PlanDifference[] => [
  ...leadDifferences([one, other]),
  ...placeDifferences([one, other]),
];

function leadDifferences([one, other]: Two): PlanDifference[] {
  const [a, b] = [hungBallast(one), hungBallast(other)];
  return listed(one.hardpoints).flatMap(({ id }) => {
    const masses = [ballastMass(a.get(id) ?? []), ballastMass(b.get(id) ?? [])] as const;
    if (Math.abs(masses[0] - masses[1]) < LEAST_LEAD) return [];
    return {
      key: `lead ${id}`,
      label: `Lead at the ${spotName(one, id)}`,
      words: [leadText(masses[0]), leadText(masses[1])],
    };
  });
}

const leadText = (mass: number): string => (mass > 0 ? say(mass, 'mass') : 'none');

function placeDifferences([one, other]: Two): PlanDifference[] {
  const both = { ...other.parts.byId, ...one.parts.byId };
  return Object.values(both).flatMap(({ id, kind }) => {
    const [a, b] = [one.parts.byId[id], other.parts.byId[id]];
    if (kind === 'ballast' || (a && b && isSameSpot(one, a, b))) return [];
    const words = [placeText(one, a), placeText(other, b)] as const;
    return { key: `part ${id}`, label: partName(a ? one : other, id), words };
  });
}

/** Whether a part is where it was, to the half millimetre, and at the same hardpoint if at any. */
export const isSameSpot = (craft: Craft, a: Part, b: Part): boolean =>
  !isElsewhere(a.place, b.place) && hardpointOf(craft, a.id, a.place) === hardpointOf(craft, b.id, b.place);

function placeText(craft: Craft, part: Part | undefined): string {
  if (!part) return 'ashore';
  const hardpoint = hardpointOf(craft, part.id, part.place);
  return `at ${hardpoint ? `the ${spotName(craft, hardpoint)}` : say(stationOf(part.place), 'length')}`;
}
