/** Rulers: round ticks along the station axis, and round tape distances where they fall on the skin. */
import type { Hull } from '../report/assessment.ts';
import { formatNumber } from '../units/format.ts';
import { type UnitSystem, unitOf } from '../units/units.ts';

export interface Tick {
  /** Station or tape distance, m. */
  readonly at: number;
  /** Number in the ruler's unit; null on a small tick. */
  readonly label: string | null;
}

export interface TapeTick extends Tick {
  readonly station: number;
}

interface Spacing {
  /** m between large ticks. */
  readonly step: number;
  /** Small ticks to one large. */
  readonly parts: number;
  readonly decimals: number;
}

/** px that two labels need between them, at least. */
const ROOM = 64;
const MOST_TICKS = 2000;

const metricSpacing = (least: number): Spacing => {
  const power = Math.floor(Math.log10(least));
  const round = [1, 2, 5, 10].find((n) => n * 10 ** power >= least * (1 - 1e-9)) ?? 10;
  const step = round * 10 ** power;
  const parts = round === 2 ? 4 : round === 5 ? 5 : 10;
  return { step, parts, decimals: Math.max(0, -Math.floor(Math.log10(step) + 1e-9)) };
};

const INCH = 0.0254;
const INCH_STEPS: readonly (readonly [inches: number, parts: number])[] = [
  [0.25, 4],
  [0.5, 4],
  [1, 4],
  [2, 4],
  [3, 3],
  [6, 6],
  [12, 4],
  [24, 4],
  [60, 5],
  [120, 5],
  [240, 4],
  [600, 5],
  [1200, 5],
];

const inchSpacing = (least: number): Spacing => {
  const [inches, parts] = INCH_STEPS.find(([n]) => n * INCH >= least) ?? INCH_STEPS.at(-1)!;
  return { step: inches * INCH, parts, decimals: inches === 0.25 ? 2 : inches === 0.5 ? 1 : 0 };
};

export const spacing = (scale: number, units: UnitSystem, room = ROOM): Spacing =>
  units === 'metric' ? metricSpacing(room / scale) : inchSpacing(room / scale);

/** The ruler's unit, as "m" or "in". */
export const rulerUnit = (units: UnitSystem): string => unitOf('length', units).symbol;

/** Round ticks between two stations (m), for a scale in px/m. */
export function stationTicks(from: number, to: number, scale: number, units: UnitSystem): Tick[] {
  const { step, parts, decimals } = spacing(scale, units);
  const small = step / parts;
  const first = Math.ceil(from / small - 1e-9);
  const last = Math.min(Math.floor(to / small + 1e-9), first + MOST_TICKS);
  const unit = unitOf('length', units);
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, i) => {
    const n = first + i;
    const at = n * small;
    return { at, label: n % parts === 0 ? formatNumber(unit.toDisplay(at), decimals) : null };
  });
}

/** Round tape distances along the skin at a clock angle, each at the station where the tape reaches it. */
export function tapeTicks(hull: Hull, clock: number, scale: number, units: UnitSystem): TapeTick[] {
  const whole = hull.tapeAt(hull.length, clock);
  return stationTicks(0, whole, scale, units).map((tick) => ({
    ...tick,
    station: hull.stationAt(tick.at, clock),
  }));
}
