/**
 * US Standard Atmosphere 1976 (identical with ICAO's and ISO 2533 at these heights), below the tropopause.
 *
 *   H = r z / (r + z)        geopotential from geometric elevation z above sea level, m
 *   T = T₀ − L H             temperature, K
 *   p = p₀ (T / T₀)ⁿ         pressure, Pa;  n = g₀ M₀ / (R* L) = 5.25588
 *   ρ = p M₀ / (R* T)        density of dry air, kg/m³
 *
 * Source: U.S. Standard Atmosphere, 1976, NOAA-S/T 76-1562, part 1. Its R* and M₀ are kept as it has them, because
 * its tables rest on them; they differ from those of CIPM-2007 by 2 and 4 parts in 100,000.
 */
import { STANDARD_GRAVITY, STANDARD_PRESSURE } from '../../units/constants.ts';

const EARTH_RADIUS = 6_356_766;
const SEA_LEVEL_TEMPERATURE = 288.15;
const LAPSE_RATE = 0.0065;
const GAS_CONSTANT = 8.31432;
const AIR_MOLAR_MASS = 28.9644e-3;
const EXPONENT = (STANDARD_GRAVITY * AIR_MOLAR_MASS) / (GAS_CONSTANT * LAPSE_RATE);

export interface StandardAir {
  /** K */
  readonly temperature: number;
  /** Pa */
  readonly pressure: number;
  /** kg/m³, dry */
  readonly density: number;
}

/** The standard air at a geometric elevation, m above sea level, from −500 to 11,000. */
export function standardAirAt(elevation: number): StandardAir {
  const height = geopotential(elevation);
  const temperature = SEA_LEVEL_TEMPERATURE - LAPSE_RATE * height;
  const pressure = standardPressure(height);
  return { temperature, pressure, density: (pressure * AIR_MOLAR_MASS) / (GAS_CONSTANT * temperature) };
}

/** Geopotential height, m, of a geometric elevation, m. */
export const geopotential = (elevation: number): number =>
  (EARTH_RADIUS * elevation) / (EARTH_RADIUS + elevation);

/** Standard pressure, Pa, at a geopotential height, m. */
export const standardPressure = (height: number): number =>
  STANDARD_PRESSURE * (1 - (LAPSE_RATE * height) / SEA_LEVEL_TEMPERATURE) ** EXPONENT;

/** Geopotential height, m, at which the standard pressure is `pressure`, Pa: what an altimeter set to standard reads. */
export const pressureHeight = (pressure: number): number =>
  (SEA_LEVEL_TEMPERATURE / LAPSE_RATE) * (1 - (pressure / STANDARD_PRESSURE) ** (1 / EXPONENT));
