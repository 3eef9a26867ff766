/** A placement study as comma-separated text, one line a station; SI units, in the heads. */
import type { PlacedPoint } from '../../physics/placing/placedPoint.ts';
import { inUnits } from '../../units/sentence.ts';
import { siSymbolOf } from '../../units/units.ts';
import { PLACE_FIGURES } from './placeFigures.ts';

export const placeCsv = (points: readonly PlacedPoint[]): string =>
  [heads(), ...points.map(cells)].map((row) => `${row.map(quoted).join(',')}\r\n`).join('');

const heads = (): string[] => [
  ...PLACE_FIGURES.map(({ key, quantity }) => `${key} ${siSymbolOf(quantity)}`.trimEnd()),
  'place',
  'best',
  'strikes',
  'ballastProven',
  'why',
  'cautions',
];

/** Empty where there is no figure. */
const cells = (point: PlacedPoint): string[] => [
  ...PLACE_FIGURES.map(({ key }) => String(point[key] ?? '')),
  point.place.kind,
  ...[point.best, point.strikes, point.ballastProven].map((each) => (each ? 'yes' : 'no')),
  point.why,
  point.cautions.map((caution) => inUnits(caution, 'metric')).join(' '),
];

/** No sentence here begins like a formula of a spreadsheet. */
const quoted = (cell: string): string => (/[",\r\n]/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell);
