/** What the study is of, and whether it still holds: it tried the thruster everywhere, so where that one sits makes no difference. */
import type { Craft } from '../../craft/craft.ts';
import type { Place } from '../../craft/placeSchema.ts';
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
  if (!then || part === null || !asked || !same(asked, askedOf(now, turning))) return false;
  if (then === now) return true;
  const { parts, ...rest } = now;
  if (!same(then, rest) || parts.order !== then.parts.order) return false;
  return parts.order.every((id) => {
    const [a, b] = [then.parts.byId[id]!, parts.byId[id]!];
    return a === b || (id === part && same(a, { ...b, place: a.place }));
  });
}

const same = <T extends object>(whole: T, some: Partial<T>): boolean =>
  (Object.keys(some) as (keyof T)[]).every((key) => whole[key] === some[key]);

/** The thruster as it sits now, where it was then or among the stations tried; null where it was not tried. */
export function pointNow({ part, points, today }: StudyState, now: Craft): PlacedPoint | null {
  const place = now.parts.byId[part ?? '']?.place;
  const tried = today ? [today, ...points] : points;
  return (place && tried.find((point) => samePlace(point.place, place))) ?? null;
}

/** m, rad: edits round to the nanometre. */
const NEAR = 1e-8;

function samePlace(a: Place, b: Place): boolean {
  const of = b as Readonly<Record<string, unknown>>;
  return Object.entries(a).every(([key, value]) =>
    typeof value === 'number' ? Math.abs(value - (of[key] as number)) < NEAR : value === of[key],
  );
}
