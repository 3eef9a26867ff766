/** The one sentence with one number that says what is wrong with a craft, and what would mend it. */
import { listed } from '../craft/craft.ts';
import { hangOf } from '../physics/balance/loading.ts';
import { levellingShift } from '../physics/balance/shift.ts';
import type { CraftState } from '../physics/craftState.ts';
import { say } from '../units/sentence.ts';
import type { Rows } from './rows.ts';
import type { Verdict, VerdictKey } from './verdict.ts';

/** In SI, to be put through `inUnits`. */
export function headlineOf(state: CraftState, rows: Rows, verdicts: readonly Verdict[]): string {
  const verdict = (key: VerdictKey) => verdicts.find((each) => each.key === key)!;
  if (state.loading.solid.mass === 0) return 'Nothing weighs anything yet: add a part.';
  if ((rows['float.pendulumDepth']?.value ?? 1) <= 0) return topHeavy(rows);
  if (rows.heaviness!.value! > state.craft.targets.heaviness.most) return tooHeavy(state, rows);
  if (verdict('level').state !== 'met') return outOfLevel(state, rows, verdict('level'));
  if (verdict('even').state !== 'met') return heeled(rows, verdict('even'));
  if (verdict('upright').state !== 'met') {
    return `Tender: the pendulum is only ${say(rows['float.pendulumDepth']!.value!, 'smallLength')} deep, and ${say(state.craft.targets.leastPendulumDepth, 'smallLength')} is wanted. Hang something lower.`;
  }
  if (verdict('floats').state !== 'met') return tooLight(rows);
  return `Floats level and upright, ${heavinessWords(rows.heaviness!.value!)}: within its targets.`;
}

const heavinessWords = (heaviness: number): string =>
  `${say(Math.abs(heaviness), 'mass')} ${heaviness > 0 ? 'heavy' : 'light'}`;

const topHeavy = (rows: Rows): string =>
  `Top-heavy: the CG stands ${say(-rows['float.pendulumDepth']!.value!, 'smallLength')} above the CB, so the craft turns over. Hang the heavy parts lower.`;

function tooHeavy({ air, gasDensity }: CraftState, rows: Rows): string {
  const excess = rows.heaviness!.value!;
  const perVolume = air.density - gasDensity;
  const more = perVolume > 0 ? `, or ${say(excess / perVolume, 'volume')} more hull would carry it` : '';
  return `Too heavy: ${say(excess, 'mass')} more than it lifts. Take that out${more}.`;
}

function outOfLevel(state: CraftState, rows: Rows, level: Verdict): string {
  const pitch = level.row.value;
  if (pitch === null) return level.row.why;
  const word = pitch > 0 ? 'Tail-heavy' : 'Nose-heavy';
  const floats = `floats ${say(Math.abs(pitch), 'angle')} ${pitch > 0 ? 'nose-up' : 'nose-down'}`;
  return `${word}: ${floats}. ${levelledBy(state, rows)}`;
}

function levelledBy(state: CraftState, rows: Rows): string {
  const lead = rows['lead.mass']!;
  const name = state.craft.hardpoints.byId[state.craft.leadAt]!.name.toLowerCase() || 'hardpoint';
  const slide = batterySlide(state);
  if (lead.status === 'solved') {
    const first = `${say(lead.value!, 'mass')} of lead at the ${name} levels it`;
    return slide ? `${first}; or ${slide}, without lead.` : `${first}.`;
  }
  const first =
    lead.value === null
      ? lead.why
      : `${say(lead.value, 'mass')} of lead at the ${name} would level it. ${lead.why}`;
  return slide ? `Or ${slide}: that levels it without lead.`.replace(/^Or /, `${first} Or `) : first;
}

/** Where the heaviest battery that may move would have to slide to level the craft, if that is on the hull. */
function batterySlide({ craft, hull, loading, pieces }: CraftState): string | null {
  const [qx] = hangOf(loading);
  const [heaviest] = listed(craft.parts)
    .filter((part) => part.kind === 'battery' && !part.locked)
    .map((part) => ({
      name: part.name,
      station: pieces[part.id]![0]!.middle[0],
      mass: part.mass * pieces[part.id]!.length,
    }))
    .sort((a, b) => b.mass - a.mass);
  const shift = heaviest && levellingShift(qx, heaviest.mass);
  if (!heaviest || shift === null || shift === undefined) return null;
  const station = heaviest.station + shift;
  if (station < 0 || station > hull.length) return null;
  const way = shift < 0 ? 'forward' : 'aft';
  return `slide ${heaviest.name || 'the battery'} ${way} to ${say(station, 'length')}`;
}

function heeled(rows: Rows, even: Verdict): string {
  const heel = even.row.value;
  if (heel === null) return even.row.why;
  const to = heel > 0 ? 'port' : 'starboard';
  const moment = Math.abs(rows['cg.side']!.value! * rows['mass.solid']!.value!);
  return `Heels ${say(Math.abs(heel), 'angle')}, ${even.word}: bring ${say(moment, 'momentMass')} over to ${to}.`;
}

const tooLight = (rows: Rows): string =>
  `Level, but ${say(-rows.heaviness!.value!, 'mass')} too light to stay down: ${oneWeightWords(rows)}`;

function oneWeightWords(rows: Rows): string {
  const station = rows['oneWeight.station']!;
  return station.value === null
    ? 'there is that much lift for useful load.'
    : `there is that much lift for useful load, hung at ${say(station.value, 'length')} to keep it level.`;
}
