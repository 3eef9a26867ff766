/**
 * Station pressure from QNH. QNH is the setting at which an altimeter on the ground reads the elevation, and an
 * altimeter reads the difference of two standard pressure heights:
 *
 *   H(p) = H(QNH) + elevation,   H(p) the height at which the standard atmosphere has the pressure p
 *
 * The day's temperature does not enter. Source: ICAO Doc 7488, Manual of the ICAO Standard Atmosphere; the use of
 * QNH after ICAO Annex 3 and Doc 8896 (from memory). Elevation is taken from geometric to geopotential metres, as the
 * standard atmosphere is, which makes 0.02 hPa at 1000 m.
 */
import { geopotential, pressureHeight, standardPressure } from './standardAtmosphere.ts';

/** Pressure on the spot, Pa, from QNH, Pa, and elevation, m. */
export const stationPressure = (qnh: number, elevation: number): number =>
  standardPressure(pressureHeight(qnh) + geopotential(elevation));
