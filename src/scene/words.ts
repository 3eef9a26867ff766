/** Figures in the words of the trade, for readouts beside the hand and for those who do not see the drawing. */
import { type Craft, listed } from '../craft/craft.ts';
import type { BeamBar } from '../report/assessment.ts';
import { formatQuantity } from '../units/format.ts';
import type { UnitSystem } from '../units/units.ts';
import { type Beam, netWords } from './beam.ts';
import type { Grip } from './grip.ts';
import { geometryOf, isLevel, rowValue, type Subject } from './subject.ts';

const DEGREE = Math.PI / 180;

const turnWords = (
  angle: number | null,
  units: UnitSystem,
  plus: string,
  minus: string,
  none: string,
): string => {
  if (angle === null) return 'has no attitude of rest';
  if (Math.abs(angle) < 0.05 * DEGREE) return none;
  return `${formatQuantity(Math.abs(angle), 'angle', units)} ${angle > 0 ? plus : minus}`;
};

/** "6.2° nose-up", "level". */
export const pitchWords = (pitch: number | null, units: UnitSystem): string =>
  turnWords(pitch, units, 'nose-up', 'nose-down', 'level');

/** "1.3° starboard down", "even". */
export const heelWords = (heel: number | null, units: UnitSystem): string =>
  turnWords(heel, units, 'starboard down', 'port down', 'even');

/** "172 g × 0.210 m = 36.12 g·m aft". */
export function momentWords(mass: number, arm: number, units: UnitSystem): string {
  const way = arm < 0 ? 'forward' : 'aft';
  const arms = formatQuantity(Math.abs(arm), 'length', units);
  return `${formatQuantity(mass, 'mass', units)} × ${arms} = ${momentAmount(mass * arm, units)} ${way}`;
}

export const floatWords = (assessment: Subject['assessment'], units: UnitSystem): string =>
  `floats ${pitchWords(rowValue(assessment, 'float.pitch'), units)}`;

/** What to call the thing in hand or under the pointer. */
export function nameOfGrip(craft: Craft, grip: Grip): string {
  switch (grip.kind) {
    case 'part':
    case 'thrust':
      return craft.parts.byId[grip.id]?.name || craft.parts.byId[grip.id]?.kind || 'Part';
    case 'wire':
      return craft.wires.byId[grip.id]?.name || 'Wire run';
    case 'wireEnd':
      return `End of ${craft.wires.byId[grip.id]?.name || 'a wire run'}`;
    case 'hardpoint':
      return craft.hardpoints.byId[grip.id]?.name || 'Hardpoint';
    case 'support':
      return 'Support point';
    case 'hull':
      return grip.end === 'tail' ? 'Hull length' : 'Hull diameter';
  }
}

/** The side view in words. */
export function sideInWords({ craft, assessment, units }: Subject): string {
  const geometry = geometryOf(assessment);
  if (!geometry) return 'The hull cannot be formed, so nothing is drawn.';
  const { hull, cb, cg } = geometry;
  const length = (value: number) => formatQuantity(value, 'length', units);
  const below = cg && formatQuantity(Math.abs(cg[2] - cb[2]), 'smallLength', units);
  return [
    `Side view, nose to the left. Hull ${length(hull.length)} long and ${length(hull.height)} high,`,
    `${craft.parts.order.length} parts, ${craft.wires.order.length} wire runs.`,
    `CB at station ${length(cb[0])}${cg ? `, CG at ${length(cg[0])} and ${below} ${cg[2] < cb[2] ? 'below' : 'above'} it` : ''}.`,
    `It ${floatWords(assessment, units)}.`,
  ].join(' ');
}

/** The front view in words. */
export function frontInWords({ craft, assessment, units }: Subject): string {
  const onSkin = listed(craft.parts).filter((part) => part.place.kind === 'skin').length;
  const heel = heelWords(rowValue(assessment, 'float.heel'), units);
  return `Front view from astern, starboard on the right. ${onSkin} of ${craft.parts.order.length} parts sit on the skin. Heel: ${heel}.`;
}

/** What is selected, for a screen reader: "Battery at station 1.300 m, floats 53.9° nose-up." */
export function selectionInWords({ craft, assessment, units }: Subject, parts: readonly string[]): string {
  const geometry = geometryOf(assessment);
  const names = parts.slice(0, 3).flatMap((id) => {
    const part = craft.parts.byId[id];
    const piece = geometry?.pieces.find((each) => each.part === id);
    if (!part || !piece) return [];
    return [`${part.name || part.kind} at station ${formatQuantity(piece.middle[0], 'length', units)}`];
  });
  if (names.length === 0) return '';
  const more = parts.length > names.length ? ` and ${parts.length - names.length} more` : '';
  return `${names.join(', ')}${more}; ${floatWords(assessment, units)}.`;
}

/** "148.0 g of lead", for the ghost at its hardpoint; null when there is none to show. */
export function leadWords({ assessment, units }: Subject): string | null {
  const lead = geometryOf(assessment)?.lead;
  return lead ? `${formatQuantity(lead.mass, 'mass', units)} of lead` : null;
}

/** The pitch without its sign, "6.2°"; null when there is none. */
export function pitchAngle({ assessment, units }: Subject): string | null {
  const pitch = rowValue(assessment, 'float.pitch');
  return pitch === null ? null : formatQuantity(Math.abs(pitch), 'angle', units);
}

/** The same of the heel. */
export function heelAngle({ assessment, units }: Subject): string | null {
  const heel = rowValue(assessment, 'float.heel');
  return heel === null ? null : formatQuantity(Math.abs(heel), 'angle', units);
}

/** A moment without its side, "36.1 g·m". */
export const momentAmount = (moment: number, units: UnitSystem): string =>
  formatQuantity(Math.abs(moment), 'momentMass', units);

/** "148.0 g of lead at Nose", and shorter where there is less room. */
export function leadBarWords({ mass, name }: BeamBar, units: UnitSystem): string[] {
  const grams = formatQuantity(mass, 'mass', units);
  return [`${grams} of lead at ${name || 'the hardpoint'}`, `${grams} of lead`, grams];
}

/** The beam in words: the sums of both sides, the longest bars, and what is left. */
export function beamInWords(beam: Beam, { units, assessment }: Subject): string {
  const longest = beam.bars
    .slice(0, 4)
    .map(({ name, moment }) => `${name} ${momentAmount(moment, units)} ${moment < 0 ? 'forward' : 'aft'}`);
  const sums = `${momentAmount(beam.fore, units)} forward of the CB, ${momentAmount(beam.aft, units)} aft`;
  return `Moments about the CB: ${sums}; ${netWords(beam.net, units, isLevel(assessment))}. Longest: ${longest.join(', ') || 'none'}.`;
}
