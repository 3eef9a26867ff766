/**
 * Every unit the program can read or show, and what it is in SI:  SI value = zero + shown × si.
 *
 * Sources: the international yard and pound of 1959 (0.9144 m and 0.45359237 kg exactly; ounce 1/16 lb, inch
 * 1/36 yd, foot 1/3 yd); SI Brochure, 9th ed., table 8, for the degree, minute, hour and litre; NIST SP 811 (2008), app. B.8,
 * for the conventional inch of mercury (0 °C), millimetre of mercury and inch of water (4 °C).
 */
import { ICE_POINT, STANDARD_GRAVITY } from './constants.ts';

export interface Scale {
  /** Size of one unit in SI. */
  readonly si: number;
  /** SI value at a reading of 0: only temperatures have one. */
  readonly zero: number;
}

const POUND = 0.45359237;
const OUNCE = POUND / 16;
const INCH = 0.0254;
const FOOT = 0.3048;
const YARD = 0.9144;
const OUNCE_FORCE = OUNCE * STANDARD_GRAVITY;
const DEGREE = Math.PI / 180;
const FAHRENHEIT = 5 / 9;

const plain = (si: number): Scale => ({ si, zero: 0 });

export const SCALES = {
  '': plain(1),
  kg: plain(1),
  g: plain(1e-3),
  mg: plain(1e-6),
  lb: plain(POUND),
  oz: plain(OUNCE),
  m: plain(1),
  cm: plain(1e-2),
  mm: plain(1e-3),
  ft: plain(FOOT),
  in: plain(INCH),
  'm²': plain(1),
  'ft²': plain(FOOT ** 2),
  'm³': plain(1),
  L: plain(1e-3),
  'ft³': plain(FOOT ** 3),
  rad: plain(1),
  '°': plain(DEGREE),
  K: plain(1),
  '°C': { si: 1, zero: ICE_POINT },
  '°F': { si: FAHRENHEIT, zero: ICE_POINT - 32 * FAHRENHEIT },
  Pa: plain(1),
  hPa: plain(100),
  kPa: plain(1000),
  mbar: plain(100),
  inHg: plain(3386.389),
  mmHg: plain(133.3224),
  'inH₂O': plain(249.0889),
  'kg/m³': plain(1),
  'lb/ft³': plain(POUND / FOOT ** 3),
  'kg/m': plain(1),
  'g/m': plain(1e-3),
  'oz/ft': plain(OUNCE / FOOT),
  'kg/m²': plain(1),
  'g/m²': plain(1e-3),
  'oz/yd²': plain(OUNCE / YARD ** 2),
  s: plain(1),
  min: plain(60),
  h: plain(3600),
  '%': plain(1e-2),
  'm/s': plain(1),
  'km/h': plain(1 / 3.6),
  mph: plain(1609.344 / 3600),
  kn: plain(1852 / 3600),
  N: plain(1),
  ozf: plain(OUNCE_FORCE),
  lbf: plain(POUND * STANDARD_GRAVITY),
  kg·m: plain(1),
  g·m: plain(1e-3),
  oz·in: plain(OUNCE * INCH),
  'kg·m²': plain(1),
  'lb·ft²': plain(POUND * FOOT ** 2),
  'rad/kg': plain(1),
  '°/g': plain(DEGREE / 1e-3),
  '°/oz': plain(DEGREE / OUNCE),
  'N·m/rad': plain(1),
  'N·m/°': plain(1 / DEGREE),
  'ozf·in/°': plain((OUNCE_FORCE * INCH) / DEGREE),
  N·m: plain(1),
  mN·m: plain(1e-3),
  ozf·in: plain(OUNCE_FORCE * INCH),
  W: plain(1),
  kW: plain(1000),
  hp: plain(550 * FOOT * POUND * STANDARD_GRAVITY),
  'rad/s': plain(1),
  rpm: plain(Math.PI / 30),
  '°/s': plain(DEGREE),
  'N/W': plain(1),
  'ozf/W': plain(OUNCE_FORCE),
} as const satisfies Record<string, Scale>;

export type UnitSymbol = keyof typeof SCALES;
