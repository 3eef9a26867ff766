/** A day given in one way taken over into another, as far as the other has the same fields. */
import type { Day } from '../craft/schema.ts';
import { ICE_POINT, STANDARD_PRESSURE } from '../units/constants.ts';

/** What an indoor day is taken to be until somebody says: 20 °C, half humid, at sea level. */
const ROOM = { temperature: ICE_POINT + 20, humidity: 0.5, elevation: 0 };

/** `pressure`: station pressure that the day before came to, Pa; null when unknown. */
export function dayAs(kind: Day['kind'], before: Day, pressure: number | null): Day {
  if (before.kind === kind) return before;
  const { temperature, humidity, elevation } = { ...ROOM, ...before };
  switch (kind) {
    case 'measured':
      return { kind, temperature, pressure: pressure ?? STANDARD_PRESSURE, humidity };
    case 'qnh':
      return { kind, temperature, qnh: STANDARD_PRESSURE, elevation, humidity };
    case 'standard':
      return { kind, elevation };
  }
}
