/** One station of a placement study in words. */
import { formatQuantity } from '../units/format.ts';
import { inUnits } from '../units/sentence.ts';
import { CURVES, type StudySpot } from './placePlot.ts';
import type { UnitSystem } from './subject.ts';

/** What each curve says there; why there is nothing, where there is nothing. */
export const curveWords = (spot: StudySpot, units: UnitSystem): string[] =>
  CURVES.map(({ quantity, value }) => {
    const figure = value(spot);
    return figure === null ? 'none' : formatQuantity(figure, quantity, units);
  });

/** What stands in no curve. */
export function besideWords({ station, radius, cruisePitch }: StudySpot, units: UnitSystem): string {
  const facts = [
    radius === null ? '' : `radius ${formatQuantity(radius, 'pathLength', units)}`,
    cruisePitch === null ? '' : pitchWords(cruisePitch, units),
  ].filter(Boolean);
  return facts.length > 0
    ? `${atWords(station, units)}: ${facts.join(', ')}.`
    : `${atWords(station, units)}.`;
}

const atWords = (station: number, units: UnitSystem): string =>
  `Station ${formatQuantity(station, 'length', units)}`;

/** What is the matter there: no plan, or something the propeller would strike. One sentence each. */
export const matterWords = ({ why, cautions }: StudySpot, units: UnitSystem): string[] =>
  [why, ...cautions].filter(Boolean).map((sentence) => inUnits(sentence, units));

function pitchWords(pitch: number, units: UnitSystem): string {
  const angle = formatQuantity(Math.abs(pitch), 'angle', units);
  return `${angle} ${pitch < 0 ? 'nose-down' : 'nose-up'} in cruise`;
}

/** What stands above the curves, for more room and for less: what is the matter goes before what stands in no curve. `press`: what a press does. */
export function headWords(spot: StudySpot, press: string, units: UnitSystem): string[] {
  const beside = besideWords(spot, units);
  const [first, ...more] = matterWords(spot, units);
  if (first === undefined) return [`${beside} ${press}`, beside];
  const matter = more.length > 0 ? `${first} And ${more.length} more.` : first;
  const short = `${atWords(spot.station, units)}. ${matter}`;
  return [
    [beside, first, ...more, press].join(' '),
    `${beside} ${matter} ${press}`,
    `${short} ${press}`,
    short,
  ].map((words) => words.trim());
}

/** Everything, for those who do not see the drawing. */
export function stationSentence(spot: StudySpot, units: UnitSystem): string {
  const figures = curveWords(spot, units).map((words, i) => `${CURVES[i]!.name} ${words}`);
  return [
    besideWords(spot, units),
    `${figures.join(', ')}.`,
    ...matterWords(spot, units),
    ...(spot.best ? ['Nothing beats it.'] : []),
  ].join(' ');
}
