/** Snapping: what a station or a clock angle in hand is drawn to, within a few pixels. */
import type { Craft } from '../craft/craft.ts';
import { listed } from '../craft/craft.ts';
import type { Hardpoint, Part } from '../craft/schema.ts';
import type { UnitSystem } from '../units/units.ts';
import { stationOfPlace } from './dragPlace.ts';
import { keyOf } from './grip.ts';
import type { Geometry } from './subject.ts';

export interface SnapTarget {
  /** Station, m, or clock angle, rad. */
  readonly at: number;
  readonly label: string;
}

export interface Snapped {
  readonly value: number;
  /** What it snapped to; null when it stays where the hand is, or went to a whole step of the grid. */
  readonly to: SnapTarget | null;
}

export interface SnapRule {
  /** Farthest it may be drawn, in the unit of the value. */
  readonly tolerance: number;
  /** Step of the grid it falls back to. */
  readonly grid: number;
  /** Held off by a key. */
  readonly suspended: boolean;
}

const DEGREE = Math.PI / 180;
const TOLERANCE_PX = 7;

/** The value, or the nearest target within the tolerance, or the nearest step of the grid within it. */
export function snapped(value: number, targets: readonly SnapTarget[], rule: SnapRule): Snapped {
  if (rule.suspended) return { value, to: null };
  let nearest: SnapTarget | null = null;
  for (const target of targets) {
    const gap = Math.abs(target.at - value);
    if (gap <= rule.tolerance && (!nearest || gap < Math.abs(nearest.at - value))) nearest = target;
  }
  if (nearest) return { value: nearest.at, to: nearest };
  const step = Math.round(value / rule.grid) * rule.grid;
  return { value: Math.abs(step - value) <= rule.tolerance ? step : value, to: null };
}

/** Stations snap within 7 px, else to whole centimetres or quarter inches. `scale` px/m. */
export const stationRule = (scale: number, units: UnitSystem, suspended: boolean): SnapRule => ({
  tolerance: TOLERANCE_PX / scale,
  grid: units === 'metric' ? 0.01 : 0.00635,
  suspended,
});

/** Clock angles snap within 7 px at that distance (m) from the axis, else to whole degrees. */
export const clockRule = (scale: number, distance: number, suspended: boolean): SnapRule => ({
  tolerance: Math.min(5 * DEGREE, TOLERANCE_PX / (scale * Math.max(distance, 1e-3))),
  grid: DEGREE,
  suspended,
});

/** Angles to which thrust is turned snap to every 5°. */
export const turnRule = (suspended: boolean): SnapRule => ({
  tolerance: 2.5 * DEGREE,
  grid: 5 * DEGREE,
  suspended,
});

/** Stations of the CB, of other parts and of hardpoints; `moving` holds the keys (see grip.ts) of what is in hand. */
export function stationTargets(craft: Craft, geometry: Geometry, moving: ReadonlySet<string>): SnapTarget[] {
  const still = (kind: 'part' | 'hardpoint') =>
    listed<Part | Hardpoint>(craft[`${kind}s`]).filter(({ id }) => !moving.has(keyOf(kind, id)));
  return [
    { at: geometry.cb[0], label: 'CB' },
    ...[...still('part'), ...still('hardpoint')].map(({ place, name, id }) => ({
      at: stationOfPlace(place),
      label: name || id,
    })),
  ];
}

/** Clock angles every 15°, and those of other parts on the skin. */
export function clockTargets(craft: Craft, moving: ReadonlySet<string>): SnapTarget[] {
  const round = Array.from({ length: 25 }, (_, i) => ({ at: i * 15 * DEGREE, label: `${(i * 15) % 360}°` }));
  const others = listed(craft.parts).flatMap((part) =>
    part.place.kind === 'skin' && !moving.has(keyOf('part', part.id))
      ? [{ at: part.place.clock, label: part.name || part.id }]
      : [],
  );
  return [...others, ...round];
}
