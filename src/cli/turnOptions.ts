/** The options of `turn`, from degrees and plain numbers as typed to SI, or one sentence on what is wrong with one. */

export interface TurnOptions {
  /** Share of full thrust, above 0, to 1. */
  readonly throttle: number;
  /** Vectoring in yaw, rad, + thrust to starboard; null for hardest to starboard. */
  readonly vector: number | null;
  /** Of the cruise it begins from, m/s; null for the steady speed at that throttle. */
  readonly speed: number | null;
  /** Of the craft with its ballast plan carried out. */
  readonly planned: boolean;
  /** Every figure, to read; JSON has them always. */
  readonly all: boolean;
}

interface Typed {
  readonly vector?: string;
  readonly throttle?: string;
  readonly speed?: string;
  readonly planned?: boolean;
  readonly all?: boolean;
}

const DEGREE = Math.PI / 180;
const MOST_SPEED = 50;

export function turnOptions({
  vector,
  throttle = '1',
  speed,
  planned = false,
  all = false,
}: Typed): TurnOptions | string {
  const share = numberOf(throttle);
  if (!(share > 0 && share <= 1)) return wrong('throttle', throttle, 'a share above 0 and up to 1');
  const degrees = numberOf(vector ?? '0');
  if (!(Math.abs(degrees) <= 180)) return wrong('vector', vector, 'degrees from -180 to 180');
  const cruise = numberOf(speed ?? '0');
  if (!(cruise >= 0 && cruise <= MOST_SPEED)) return wrong('speed', speed, `m/s from 0 to ${MOST_SPEED}`);
  return {
    throttle: share,
    vector: vector === undefined ? null : degrees * DEGREE,
    speed: speed === undefined ? null : cruise,
    planned,
    all,
  };
}

const wrong = (option: string, found: string | undefined, allowed: string): string =>
  `--${option}: found ${JSON.stringify(found)}; allowed: ${allowed}`;

/** NaN for what is no plain decimal number. */
const numberOf = (typed: string): number =>
  /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(typed) ? Number(typed) : Number.NaN;
