/** What a placement study tells of each station, in the order of its tables. */
import type { PlacedPoint } from '../../physics/placing/placedPoint.ts';
import type { Quantity } from '../../units/units.ts';

/** Keys are those of JSON and CSV. */
export type PlaceFigureKey = keyof Pick<
  PlacedPoint,
  | 'station'
  | 'ballast'
  | 'wire'
  | 'wireChange'
  | 'arm'
  | 'timeTo90'
  | 'radius'
  | 'gustHeld'
  | 'inflowRatio'
  | 'perWatt'
  | 'cruisePitch'
>;

export interface PlaceFigure {
  readonly key: PlaceFigureKey;
  /** The head of a narrow column. */
  readonly head: string;
  readonly quantity: Quantity;
}

const figure = (key: PlaceFigureKey, head: string, quantity: Quantity): PlaceFigure => ({
  key,
  head,
  quantity,
});

export const PLACE_FIGURES: readonly PlaceFigure[] = [
  figure('station', 'station', 'length'),
  figure('ballast', 'lead', 'mass'),
  figure('wire', 'wire', 'mass'),
  figure('wireChange', 'change', 'mass'),
  figure('arm', 'arm', 'pathLength'),
  figure('timeTo90', '90°', 'time'),
  figure('radius', 'radius', 'pathLength'),
  figure('gustHeld', 'gust', 'speed'),
  figure('inflowRatio', 'inflow', 'ratio'),
  figure('perWatt', 'per W', 'ratio'),
  figure('cruisePitch', 'pitch', 'angle'),
];
