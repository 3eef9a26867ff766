/**
 * The kinds of quantity the program shows: the SI unit that files and JSON use, the unit and decimals on screen in
 * either system, and what else may be typed.
 */
import type { UnitSymbol } from './scales.ts';

export interface Shown {
  readonly symbol: UnitSymbol;
  /** Decimals when no uncertainty decides. */
  readonly digits: number;
}

export interface QuantityKind {
  /** What it is called in a message: "a mass". */
  readonly word: string;
  readonly si: UnitSymbol;
  readonly metric: Shown;
  readonly imperial: Shown;
  /** Units that can be typed besides the three above. */
  readonly also: readonly UnitSymbol[];
}

const shown = (symbol: UnitSymbol, digits: number): Shown => ({ symbol, digits });

const kind = (
  word: string,
  si: UnitSymbol,
  metric: Shown,
  imperial: Shown,
  also: readonly UnitSymbol[] = [],
): QuantityKind => ({ word, si, metric, imperial, also });

export const QUANTITIES = {
  mass: kind('a mass', 'kg', shown('g', 1), shown('oz', 2), ['mg', 'lb']),
  length: kind('a length', 'm', shown('m', 3), shown('in', 2), ['cm', 'mm', 'ft']),
  smallLength: kind('a length', 'm', shown('mm', 0), shown('in', 2), ['cm', 'ft']),
  pathLength: kind('a length', 'm', shown('m', 2), shown('ft', 1)),
  elevation: kind('an elevation', 'm', shown('m', 0), shown('ft', 0)),
  area: kind('an area', 'm²', shown('m²', 3), shown('ft²', 2)),
  volume: kind('a volume', 'm³', shown('m³', 4), shown('ft³', 2), ['L']),
  angle: kind('an angle', 'rad', shown('°', 1), shown('°', 1)),
  temperature: kind('a temperature', 'K', shown('°C', 1), shown('°F', 1)),
  temperatureDifference: kind('a temperature difference', 'K', shown('K', 1), shown('°F', 1), ['°C']),
  pressure: kind('a pressure', 'Pa', shown('hPa', 2), shown('inHg', 2), ['kPa', 'mbar', 'mmHg']),
  gaugePressure: kind('a pressure', 'Pa', shown('Pa', 0), shown('inH₂O', 2), ['hPa', 'kPa', 'mbar']),
  density: kind('a density', 'kg/m³', shown('kg/m³', 4), shown('lb/ft³', 5)),
  massPerMetre: kind('a mass per length', 'kg/m', shown('g/m', 2), shown('oz/ft', 3)),
  arealDensity: kind('an areal density', 'kg/m²', shown('g/m²', 1), shown('oz/yd²', 2)),
  time: kind('a time', 's', shown('s', 1), shown('s', 1), ['min', 'h']),
  fraction: kind('a share', '', shown('%', 1), shown('%', 1)),
  ratio: kind('a number', '', shown('', 3), shown('', 3)),
  factor: kind('a number', '', shown('', 2), shown('', 2)),
  count: kind('a count', '', shown('', 0), shown('', 0)),
  speed: kind('a speed', 'm/s', shown('m/s', 2), shown('mph', 1), ['km/h', 'kn']),
  force: kind('a force', 'N', shown('N', 3), shown('ozf', 2), ['lbf']),
  momentMass: kind('a moment', 'kg·m', shown('g·m', 2), shown('oz·in', 1)),
  inertia: kind('a moment of inertia', 'kg·m²', shown('kg·m²', 4), shown('lb·ft²', 3)),
  anglePerMass: kind('an angle per mass', 'rad/kg', shown('°/g', 3), shown('°/oz', 2)),
  momentPerAngle: kind('a moment per angle', 'N·m/rad', shown('N·m/°', 4), shown('ozf·in/°', 2)),
  torque: kind('a moment', 'N·m', shown('N·m', 3), shown('ozf·in', 1), ['mN·m']),
  power: kind('a power', 'W', shown('W', 1), shown('W', 1), ['kW', 'hp']),
  turnSpeed: kind('a speed of turning', 'rad/s', shown('rpm', 0), shown('rpm', 0)),
  yawRate: kind('a rate of turn', 'rad/s', shown('°/s', 1), shown('°/s', 1)),
  forcePerPower: kind('a thrust per power', 'N/W', shown('N/W', 3), shown('ozf/W', 2)),
} as const satisfies Record<string, QuantityKind>;

export type Quantity = keyof typeof QUANTITIES;
