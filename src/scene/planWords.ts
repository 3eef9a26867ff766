/** The ballast plan in the words that stand beside its marks, and for those who do not see the drawing. */
import type { Craft } from '../craft/craft.ts';
import type { LeadPiece } from '../craft/planningSchema.ts';
import { stationOf } from '../craft/station.ts';
import type { CarrySpot, HardpointFill, PlanToDraw } from '../report/planView.ts';
import { formatQuantity } from '../units/format.ts';
import type { PlanSubject } from './planned.ts';
import type { Subject, UnitSystem } from './subject.ts';
import { floatWords } from './words.ts';

const mass = (value: number, units: UnitSystem): string => formatQuantity(value, 'mass', units);

/** "0.420 m" */
export const stationWords = (station: number, units: UnitSystem): string =>
  formatQuantity(station, 'length', units);

/** "2 × 5 g + 1 g": masses of pieces are as they were bought, so that zeros after the point say nothing. */
export const piecesWords = (pieces: readonly LeadPiece[], units: UnitSystem): string =>
  pieces
    .map(({ mass: each, count }) => {
      const one = mass(each, units).replace(/\.0+(?= )/, '');
      return count === 1 ? one : `${count} × ${one}`;
    })
    .join(' + ');

/** "11.0 of 200.0 g, in pieces" */
export function fillWords(fill: HardpointFill, units: UnitSystem): string {
  const [value] = mass(fill.mass, units).split(' ');
  return `${value} of ${mass(fill.limit, units)}${fill.fill === 'pieces' ? ', in pieces' : ''}`;
}

/** What the side view tells of the plan; empty without one. */
export function planInWords(subject: Subject, { plan, planned }: PlanSubject): string {
  if (!plan || !planned) return '';
  const { craft, units } = subject;
  const moves = [
    ...plan.slides.map(({ part, to }) => `${partName(craft, part)} to ${stationWords(to, units)}`),
    ...loadMoves(craft, plan, units),
    ...plan.weights.map((weight) => weightWords(craft, weight, units)),
  ];
  const ballast = `Dead ballast ${mass(plan.deadBallast, units)} instead of ${mass(plan.deadBallastToday, units)}`;
  const then = `it then ${floatWords(planned, units)}.`;
  return `Plan: ${moves.length > 0 ? moves.join('; ') : 'everything stays where it is'}. ${ballast}; ${then}`;
}

const partName = ({ parts }: Craft, id: string): string =>
  parts.byId[id]?.name || parts.byId[id]?.kind || 'a part';

function loadMoves(craft: Craft, { loads }: PlanToDraw, units: UnitSystem): string[] {
  return loads.flatMap(({ load, place, hardpoint, placeToday }) => {
    const name = craft.loads.byId[load]?.name || 'a load';
    if (!place) return placeToday ? [`${name} left ashore`] : [];
    if (JSON.stringify(place) === JSON.stringify(placeToday)) return [];
    return [
      `${name} ${hardpoint ? atHardpoint(craft, hardpoint) : `to ${stationWords(stationOf(place), units)}`}`,
    ];
  });
}

const atHardpoint = ({ hardpoints }: Craft, id: string): string =>
  `at hardpoint ${hardpoints.byId[id]?.name || id}`;

function weightWords(
  craft: Craft,
  { hardpoint, mass: value, pieces }: PlanToDraw['weights'][number],
  units: UnitSystem,
): string {
  const made = pieces.length > 0 ? ` (${piecesWords(pieces, units)})` : '';
  return `${mass(value, units)}${made} ${atHardpoint(craft, hardpoint)}`;
}

/** One station of the curve in words; why nothing can hang there, where nothing can. */
export function carryWords(spot: CarrySpot, units: UnitSystem): string {
  const at = `Station ${stationWords(spot.station, units)}`;
  if (spot.mass === null || spot.deadBallast === null) {
    return spot.proven
      ? `${at}: no plan keeps every target, whatever hangs here.`
      : `${at}: no plan was found in the time there was.`;
  }
  const least = spot.proven ? 'up to' : 'at least';
  return `${at}: ${least} ${mass(spot.mass, units)} of load, which leaves ${mass(spot.deadBallast, units)} of dead ballast.`;
}
