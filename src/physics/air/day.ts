/**
 * The air of a day, however the day is given: measured on the spot, by QNH and elevation, or the standard
 * atmosphere. Equations and sources: moistAir.ts (CIPM-2007), stationPressure.ts, standardAtmosphere.ts.
 */
import type { Day } from '../../craft/schema.ts';
import { moistAirCautions, moistAirDensity } from './moistAir.ts';
import { standardAirAt } from './standardAtmosphere.ts';
import { stationPressure } from './stationPressure.ts';

export interface Air {
  /** K */
  readonly temperature: number;
  /** Station pressure, Pa. */
  readonly pressure: number;
  /** Relative humidity, 0…1; the standard atmosphere is dry. */
  readonly humidity: number;
  /** kg/m³ */
  readonly density: number;
  /** One sentence each; empty when there is nothing to say. */
  readonly cautions: readonly string[];
}

export function airOf(day: Day): Air {
  switch (day.kind) {
    case 'measured':
      return moistAir(day.temperature, day.pressure, day.humidity);
    case 'qnh':
      return moistAir(day.temperature, stationPressure(day.qnh, day.elevation), day.humidity);
    case 'standard':
      return { ...standardAirAt(day.elevation), humidity: 0, cautions: [] };
  }
}

const moistAir = (temperature: number, pressure: number, humidity: number): Air => ({
  temperature,
  pressure,
  humidity,
  density: moistAirDensity(temperature, pressure, humidity),
  cautions: moistAirCautions(temperature, pressure),
});
