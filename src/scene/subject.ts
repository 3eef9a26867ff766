/** What every view is drawn from: one craft, one look at it, and how to show figures. */
import type { Craft } from '../craft/craft.ts';
import type { Assessment, Geometry } from '../report/assessment.ts';
import type { UnitSystem } from '../units/units.ts';
import type { Palette } from './palette.ts';

export interface Subject {
  readonly craft: Craft;
  readonly assessment: Assessment;
  readonly units: UnitSystem;
  readonly palette: Palette;
}

export type { Geometry, UnitSystem };

/** Where things are, or null when the hull itself cannot be formed. */
export const geometryOf = ({ geometry }: Assessment): Geometry | null =>
  geometry.status === 'solved' ? geometry : null;

/** Value of a row, SI; null when there is none. */
export const rowValue = ({ rows }: Assessment, key: string): number | null => rows[key]?.value ?? null;

/** Whether its pitch is within the tolerance. */
export const isLevel = ({ verdicts }: Pick<Assessment, 'verdicts'>): boolean =>
  verdicts.some(({ key, state }) => key === 'level' && state === 'met');
