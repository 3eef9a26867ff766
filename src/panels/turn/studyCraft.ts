/** What the study is of, and whether it still holds: it tried the thruster everywhere, so where that one sits makes no difference. */
import type { Craft } from '../../craft/craft.ts';
import type { Place } from '../../craft/placeSchema.ts';
import type { Part } from '../../craft/schema.ts';
import type { PlacedPoint } from '../../report/turning/studies.ts';
import { askedOf } from './asked.ts';
import type { StudyState } from './studying.ts';
import type { TurningState } from './turning.ts';

/** Whether it was worked out for such a flight, and for a craft that differs from this one at most in the place of its thruster. */
export function holdsFor(
  { craft: then, part, asked }: StudyState,
  now: Craft,
  turning: TurningState,
): boolean {
  if (!then || part === null || !asked || !alike(asked, askedOf(now, turning))) return false;
  const place = then.parts.byId[part]!.place;
  const moved = now.parts.byId[part];
  if (!moved) return false;
  const byId = { ...now.parts.byId, [part]: { ...moved, place } };
  return alike(then, { ...now, parts: { ...now.parts, byId } });
}

/** Whether both hold the same throughout; what is one object is not looked into, so that two states of a craft are soon compared. */
function alike(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return false;
  const keys = Object.keys(a);
  const [of, other] = [a, b] as Readonly<Record<string, unknown>>[];
  return keys.length === Object.keys(b).length && keys.every((key) => alike(of![key], other![key]));
}

/** The thruster as it sits now, where it was then or among the stations tried; null where it was not tried. */
export function pointNow({ part, points, today }: StudyState, now: Craft): PlacedPoint | null {
  const place = now.parts.byId[part ?? '']?.place;
  const tried = today ? [today, ...points] : points;
  return (place && tried.find((point) => samePlace(point.place, place))) ?? null;
}

/** Whether a part sits where the point has it. */
export const isThere = (point: PlacedPoint | null, part: Part | undefined): boolean =>
  point !== null && part !== undefined && samePlace(point.place, part.place);

/** m, rad: edits round to the nanometre. */
const NEAR = 1e-8;

function samePlace(a: Place, b: Place): boolean {
  const of = b as Readonly<Record<string, unknown>>;
  return Object.entries(a).every(([key, value]) =>
    typeof value === 'number' ? Math.abs(value - (of[key] as number)) < NEAR : value === of[key],
  );
}
