/** The options of `place`, or one sentence on what is wrong with one. */
import { turnOptions } from './turnOptions.ts';

export interface PlaceOptions {
  /** Id of the thruster to be moved; null when none was named. */
  readonly part: string | null;
  readonly stations: number;
  /** Share of full thrust, above 0, to 1. */
  readonly throttle: number;
  readonly csv: boolean;
}

interface Typed {
  readonly part?: string;
  readonly stations?: string;
  readonly throttle?: string;
  readonly json?: boolean;
  readonly csv?: boolean;
}

const USUAL_STATIONS = '61';
const MOST_STATIONS = 1001;

export function placeOptions(typed: Typed): PlaceOptions | string {
  const { part = null, stations = USUAL_STATIONS, throttle, json = false, csv = false } = typed;
  if (json && csv) return 'place gives --json or --csv, not both';
  const count = /^\d{1,4}$/.test(stations) ? Number(stations) : 0;
  if (count < 2 || count > MOST_STATIONS) {
    return `--stations: found ${JSON.stringify(stations)}; allowed: a whole number from 2 to ${MOST_STATIONS}`;
  }
  const flown = turnOptions(throttle === undefined ? {} : { throttle });
  return typeof flown === 'string' ? flown : { part, stations: count, throttle: flown.throttle, csv };
}
