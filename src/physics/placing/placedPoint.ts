/** A thruster tried at one station, and which of the stations tried nothing beats. */
import type { Place } from '../../craft/placeSchema.ts';
import type { Stowage } from '../../craft/stowage.ts';
import type { Figures } from './figures.ts';
import { beats, unbeaten } from './pareto.ts';

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
  /** Whether there is a plan, nothing is struck, and no such station is as good in everything and better in something: ballast and wire, time to 90°, gust held, thrust per watt. */
  readonly best: boolean;
}

export interface Judged {
  readonly points: readonly PlacedPoint[];
  readonly today: PlacedPoint;
}

/** With what nothing beats told from the rest. */
export function judged(points: readonly PlacedPoint[], today: PlacedPoint): Judged {
  const able = points.filter(isAble);
  const rivals = able.map(worthOf);
  const stands = unbeaten(rivals);
  const best = new Set(able.filter((_, i) => stands[i]));
  const worth = worthOf(today);
  return {
    points: points.map((point) => ({ ...point, best: best.has(point) })),
    today: { ...today, best: isAble(today) && !rivals.some((rival) => beats(rival, worth)) },
  };
}

const isAble = ({ ballast, strikes }: PlacedPoint): boolean => ballast !== null && !strikes;

/** What a builder can tell apart: 0.1 g, 0.01 s, 0.01 m/s, 0.1 %. */
const TOLD_APART = { mass: 1e-4, time: 0.01, speed: 0.01, share: 0.001 } as const;

/** What stations are compared by, the better the smaller; what there is none of is worst. */
export const worthOf = ({ ballast, wire, timeTo90, gustHeld, perWatt }: PlacedPoint): number[] => [
  steps(ballast === null ? null : ballast + wire, TOLD_APART.mass),
  steps(timeTo90, TOLD_APART.time),
  steps(gustHeld === null ? null : -gustHeld, TOLD_APART.speed),
  steps(perWatt === null ? null : -perWatt, TOLD_APART.share),
];

const steps = (figure: number | null, step: number): number =>
  figure === null ? Number.POSITIVE_INFINITY : Math.round(figure / step);
