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
export function besideWords(spot: StudySpot, units: UnitSystem): string {
  const { radius, cruisePitch, cautions, why } = spot;
  const facts = [
    radius === null ? '' : `radius ${formatQuantity(radius, 'pathLength', units)}`,
    cruisePitch === null ? '' : pitchWords(cruisePitch, units),
  ].filter(Boolean);
  const at = `Station ${formatQuantity(spot.station, 'length', units)}`;
  const first = facts.length > 0 ? `${at}: ${facts.join(', ')}.` : `${at}.`;
  const matters = [why, ...cautions].filter(Boolean).map((sentence) => inUnits(sentence, units));
  return [first, ...matters].join(' ');
}

function pitchWords(pitch: number, units: UnitSystem): string {
  const angle = formatQuantity(Math.abs(pitch), 'angle', units);
  return `${angle} ${pitch < 0 ? 'nose-down' : 'nose-up'} in cruise`;
}

/** Everything, for those who do not see the drawing. */
export function stationSentence(spot: StudySpot, units: UnitSystem): string {
  const figures = curveWords(spot, units).map((words, i) => `${CURVES[i]!.name} ${words}`);
  return `${besideWords(spot, units)} ${figures.join(', ')}.${spot.best ? ' Nothing beats it.' : ''}`;
}
