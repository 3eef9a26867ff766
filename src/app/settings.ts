/** What the builder chose for the page, apart from any craft. */
import type { UnitSystem } from '../units/units.ts';

export const THEMES = ['system', 'light', 'dark'] as const;
export type Theme = (typeof THEMES)[number];

export interface Settings {
  readonly units: UnitSystem;
  readonly theme: Theme;
}

export const DEFAULTS: Settings = { units: 'metric', theme: 'system' };

/** Settings from whatever was kept: what cannot be read is as at first. */
export function settingsFrom(kept: unknown): Settings {
  const { units, theme } = (kept ?? {}) as Record<string, unknown>;
  return {
    units: units === 'metric' || units === 'imperial' ? units : DEFAULTS.units,
    theme: THEMES.find((each) => each === theme) ?? DEFAULTS.theme,
  };
}

export const otherUnits = (units: UnitSystem): UnitSystem => (units === 'metric' ? 'imperial' : 'metric');

export const nextTheme = (theme: Theme): Theme => THEMES[(THEMES.indexOf(theme) + 1) % THEMES.length]!;
