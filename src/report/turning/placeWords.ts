/** A placement study in words. In SI, for `inUnits`. */
import type { Craft } from '../../craft/craft.ts';
import type { Targets } from '../../craft/schema.ts';
import { valueOrNull } from '../../numeric/outcome.ts';
import { hullOfCraft } from '../../physics/craftState.ts';
import { asGood, isAble, type PlacedPoint } from '../../physics/placing/placedPoint.ts';
import type { PlacementStudy } from '../../physics/placing/study.ts';
import { say } from '../../units/sentence.ts';
import { joined } from '../planWords.ts';
import { insignificant } from '../rows.ts';

export type Tried = Pick<PlacementStudy, 'part' | 'points' | 'today'>;

/**
 * The place to tell of, among those that nothing beats: the one that costs least where turning targets are set and it meets
 * them, else the quickest to turn, else the cheapest; today's where that is as good as the model can tell. Null when there is none.
 */
export function toldPlace(study: Tried, targets: Targets): PlacedPoint | null {
  const told = foremost(study, targets);
  return told && isAble(study.today) && asGood(study.today, told) ? study.today : told;
}

function foremost(study: Tried, targets: Targets): PlacedPoint | null {
  const best = unbeatenOf(study);
  const asked = targets.turnTime !== null || targets.sideGust !== null;
  const meeting = asked ? best.filter((point) => meets(point, targets)) : [];
  if (meeting.length > 0) return leastBy(meeting, costOf);
  const turning = best.filter(({ timeTo90 }) => timeTo90 !== null);
  return turning.length > 0 ? leastBy(turning, ({ timeTo90 }) => timeTo90!) : leastBy(best, costOf);
}

const unbeatenOf = ({ points, today }: Tried): PlacedPoint[] => [today, ...points].filter(({ best }) => best);

export const meets = ({ timeTo90, gustHeld }: PlacedPoint, { turnTime, sideGust }: Targets): boolean =>
  (turnTime === null || (timeTo90 !== null && timeTo90 <= turnTime)) &&
  (sideGust === null || (gustHeld !== null && gustHeld >= sideGust));

const costOf = ({ ballast, wire }: PlacedPoint): number => (ballast ?? Number.POSITIVE_INFINITY) + wire;

const leastBy = (points: readonly PlacedPoint[], of: (point: PlacedPoint) => number): PlacedPoint | null =>
  points.reduce<PlacedPoint | null>(
    (least, point) => (least && of(least) <= of(point) ? least : point),
    null,
  );

/**
 * "In the tail at 4.2 m: 90° in 3.1 s, holds 2.4 m/s from the side; costs 96 g of lead and 8 g of wire more than at 1.9 m, where
 * it is now and takes 9.0 s." Where the thruster is there already, against the cheapest of those that nothing beats. `moved`:
 * whether it has been moved since the study.
 */
export function placeHeadline(craft: Craft, study: Tried, moved = false): string {
  const { today } = study;
  const told = toldPlace(study, craft.targets);
  if (!told) return 'At no station is there both a ballast plan and room for the propeller.';
  const does = doesWords(told);
  const then = moved ? 'where it was' : 'where it is now';
  if (told !== today) return `${whereWords(craft, told)}: ${does}; ${againstToday(told, today, then)}.`;
  const cheapest = leastBy(unbeatenOf(study), costOf) ?? told;
  const more = asGood(cheapest, told)
    ? ''
    : `; ${costWords(told, cheapest)} at ${fareWords(cheapest, ', where it ')}`;
  const other = foremost(study, craft.targets);
  if (!other || isAt(other, told)) return `${whereWords(craft, told)}, ${then}: ${does}${more}.`;
  const stays = moved ? 'Where it was,' : 'Staying';
  return `${stays} at ${say(told.station, 'length')} is as good as moving to ${say(other.station, 'length')}: ${does}${more}.`;
}

export const isAt = (a: PlacedPoint, b: PlacedPoint): boolean => Math.abs(a.station - b.station) < 1e-6;

const againstToday = (told: PlacedPoint, today: PlacedPoint, then: string): string =>
  today.ballast === null
    ? `at ${say(today.station, 'length')}, ${then}, no ballast plan can be made`
    : `${costWords(told, today)} at ${fareWords(today, `, ${then} and `)}`;

/** "1.9 m, where it takes 9.0 s" */
function fareWords({ station, strikes, timeTo90 }: PlacedPoint, joint: string): string {
  const fares = timeTo90 === null ? 'does not turn to 90°' : `takes ${say(timeTo90, 'time')}`;
  return `${say(station, 'length')}${joint}${strikes ? 'the propeller has no room' : fares}`;
}

/** Where the hull begins and ends to be its nose and its tail, as a share of its length. */
const ENDS = 0.15;

function whereWords(craft: Craft, { station, place }: PlacedPoint): string {
  const length = valueOrNull(hullOfCraft(craft))?.length ?? Number.NaN;
  const end = station < ENDS * length ? 'In the nose ' : station > (1 - ENDS) * length ? 'In the tail ' : '';
  const where = `${end}at ${say(station, 'length')}`;
  return end || place.kind !== 'keel' ? capital(where) : `Below the keel ${where}`;
}

const capital = (words: string): string => `${words.charAt(0).toUpperCase()}${words.slice(1)}`;

function doesWords({ timeTo90, gustHeld }: PlacedPoint): string {
  const time = timeTo90 === null ? 'does not turn to 90°' : `90° in ${say(timeTo90, 'time')}`;
  return gustHeld === null ? time : `${time}, holds ${say(gustHeld, 'speed')} from the side`;
}

/** "costs 96 g of lead and 8 g of wire more than", "costs 12 g of lead more and 3 g of wire less than" */
function costWords(told: PlacedPoint, today: PlacedPoint): string {
  const changes = [
    { mass: (told.ballast ?? 0) - (today.ballast ?? 0), of: 'lead' },
    { mass: told.wire - today.wire, of: 'wire' },
  ].filter(({ mass }) => !insignificant(mass, 'mass'));
  if (changes.length === 0) return 'costs no lead or wire more than';
  const words = (sign: 1 | -1) =>
    changes
      .filter(({ mass }) => sign * mass > 0)
      .map(({ mass, of }) => `${say(Math.abs(mass), 'mass')} of ${of}`);
  const [more, less] = [words(1), words(-1)];
  if (less.length === 0) return `costs ${joined(more)} more than`;
  if (more.length === 0) return `costs ${joined(less)} less than`;
  return `costs ${joined(more)} more and ${joined(less)} less than`;
}

/** "The propeller would strike the skin: 0 to 0.35 m, and at 2.1 m." One sentence for each matter, the stations at which it is so. */
export function stretchesOf(
  points: readonly PlacedPoint[],
  mattersOf: (point: PlacedPoint) => readonly string[],
): string[] {
  const runs = new Map<string, { from: number; to: number; last: number }[]>();
  points.forEach((point, i) => {
    for (const matter of mattersOf(point)) {
      const known = runs.get(matter) ?? [];
      runs.set(matter, known);
      const run = known.at(-1);
      if (run && run.last === i - 1) Object.assign(run, { to: point.station, last: i });
      else known.push({ from: point.station, to: point.station, last: i });
    }
  });
  return [...runs].map(([matter, known]) => `${matter}: ${joined(known.map(runWords))}.`);
}

const runWords = ({ from, to }: { from: number; to: number }): string =>
  from === to ? `at ${say(from, 'length')}` : `${say(from, 'length')} to ${say(to, 'length')}`;

/** What is the matter, without by how much: it differs from station to station. */
export const matterOf = (caution: string): string => caution.replace(/(: .*|\.)$/, '');
