/** A thruster tried at one station, and which of the stations tried nothing beats. */
import type { Place } from '../../craft/placeSchema.ts';
import type { Stowage } from '../../craft/stowage.ts';
import type { Figures } from './figures.ts';
import { equals, unbeaten } from './pareto.ts';

export interface PlacedPoint extends Figures {
  /** m */
  readonly station: number;
  /** Where the part is put: its own kind of place, but below the keel where on the axis it would be inside the hull. */
  readonly place: Place;
  /** All dead ballast of the exact plan, kg; null when there is no plan. The other figures are then of the craft as it hangs today. */
  readonly ballast: number | null;
  /** Whether no plan has less, to the proof. */
  readonly ballastProven: boolean;
  /** That plan, for carrying it out. */
  readonly stowage: Stowage | null;
  /** Why there is no plan; empty when there is one. */
  readonly why: string;
  /** Of all wire, kg; and more than with the thruster where it is today. */
  readonly wire: number;
  readonly wireChange: number;
  /** What the propeller would strike; that it stands beyond the hull. One sentence each. */
  readonly cautions: readonly string[];
  /** Whether one of them rules the station out: the propeller strikes something, or has less than the usual clearance. */
  readonly strikes: boolean;
  /** Whether there is a plan, nothing is struck, and no such place, today's among them, is as good in everything and better in something, as far as the model can tell: ballast and wire, time to 90°, gust held, thrust per watt. */
  readonly best: boolean;
}

export interface Judged {
  readonly points: readonly PlacedPoint[];
  readonly today: PlacedPoint;
}

/** With what nothing beats told from the rest; the place of today is a rival like any other. */
export function judged(points: readonly PlacedPoint[], today: PlacedPoint): Judged {
  const able = [today, ...points].filter(isAble);
  const stands = unbeaten(able.map(worthOf), 1);
  const best = new Set(able.filter((_, i) => stands[i]));
  const told = (point: PlacedPoint): PlacedPoint => ({ ...point, best: best.has(point) });
  return { points: points.map(told), today: told(today) };
}

export const isAble = ({ ballast, strikes }: PlacedPoint): boolean => ballast !== null && !strikes;

/** Whether every figure of the two is within what the model can tell. */
export const asGood = (a: PlacedPoint, b: PlacedPoint): boolean => equals(worthOf(a), worthOf(b), 1);

/** What the model can tell apart, by a step or by a share, whichever is more (kg, s, m/s; our choice). */
export const TOLD_APART = {
  mass: { step: 1e-3, share: 0.01 },
  time: { step: 0.01, share: 0.03 },
  gust: { step: 0.01, share: 0.03 },
  perWatt: { step: 0.01, share: 0.01 },
} as const;

/** What stations are compared by, in what the model can tell apart; the better the smaller, what there is none of is worst. */
export const worthOf = ({ ballast, wire, timeTo90, gustHeld, perWatt }: PlacedPoint): number[] => [
  worst(ballast === null ? null : inSteps(ballast + wire, TOLD_APART.mass)),
  worst(timeTo90 === null ? null : inSteps(timeTo90, TOLD_APART.time)),
  worst(gustHeld === null ? null : -inSteps(gustHeld, TOLD_APART.gust)),
  worst(perWatt === null ? null : -inSteps(perWatt, TOLD_APART.perWatt)),
];

const worst = (steps: number | null): number => steps ?? Number.POSITIVE_INFINITY;

/** Steps of one size while they are more than the share, from there on each greater than the one before by that share. */
function inSteps(figure: number, { step, share }: { readonly step: number; readonly share: number }): number {
  const knee = step / share;
  return figure <= knee ? figure / step : 1 / share + Math.log(figure / knee) / Math.log1p(share);
}
