/** The one sentence with one number that says what is wrong with a craft, and what would mend it. */
import { stationOf } from '../craft/station.ts';
import type { CraftState } from '../physics/craftState.ts';
import { say } from '../units/sentence.ts';
import type { Advice } from './advice.ts';
import { insignificant, type Rows } from './rows.ts';
import type { VerdictKey } from './verdict.ts';
import type { PlainVerdict } from './verdicts.ts';
import { heavinessWords } from './words.ts';

/** In SI, to be put through `inUnits`. */
export function headlineOf(
  state: CraftState,
  rows: Rows,
  verdicts: readonly PlainVerdict[],
  advice: readonly Advice[],
): string {
  const verdict = (key: VerdictKey) => verdicts.find((each) => each.key === key)!;
  if (state.loading.solid.mass === 0) return 'Nothing weighs anything yet: add a part.';
  if ((rows['float.pendulumDepth']?.value ?? 1) <= 0) return topHeavy(rows);
  if (rows.heaviness!.value! > state.craft.targets.heaviness.most) return tooHeavy(state, rows);
  if (verdict('level').state !== 'met') return outOfLevel(state, rows, verdict('level'), advice);
  if (verdict('even').state !== 'met') return heeled(rows, verdict('even'));
  if (verdict('upright').state !== 'met') {
    return `Tender: the pendulum is only ${say(rows['float.pendulumDepth']!.value!, 'smallLength')} deep, and ${say(state.craft.targets.leastPendulumDepth, 'smallLength')} is wanted. Hang something lower.`;
  }
  if (verdict('floats').state !== 'met') return tooLight(rows);
  return `Floats level and upright, ${heavinessWords(rows.heaviness!.value!)}: within its targets.`;
}

function topHeavy(rows: Rows): string {
  const depth = rows['float.pendulumDepth']!.value!;
  return insignificant(depth, 'smallLength')
    ? 'Without a pendulum: the CG stands as high as the CB, so a touch turns the craft over. Hang something below it.'
    : `Top-heavy: the CG stands ${say(-depth, 'smallLength')} above the CB, so the craft turns over. Hang the heavy parts lower.`;
}

function tooHeavy({ air, gasDensity, craft }: CraftState, rows: Rows): string {
  const heaviness = rows.heaviness!.value!;
  const excess = heaviness - craft.targets.heaviness.most;
  const perVolume = air.density - gasDensity;
  const more = perVolume > 0 ? `, or ${say(excess / perVolume, 'volume')} more hull would carry it` : '';
  const is = `Too heavy: ${heavinessWords(heaviness)}, and at most ${heavinessWords(craft.targets.heaviness.most)} is wanted.`;
  return insignificant(excess, 'mass')
    ? `${is} A trace less would do.`
    : `${is} Take ${say(excess, 'mass')} out${more}.`;
}

function outOfLevel(state: CraftState, rows: Rows, level: PlainVerdict, advice: readonly Advice[]): string {
  const pitch = level.row.value;
  if (pitch === null) return level.row.why;
  const word = pitch > 0 ? 'Tail-heavy' : 'Nose-heavy';
  const floats = `floats ${say(Math.abs(pitch), 'angle')} ${pitch > 0 ? 'nose-up' : 'nose-down'}`;
  return `${word}: ${floats}. ${levelledBy(state, rows, advice)}`;
}

function levelledBy({ craft }: CraftState, rows: Rows, advice: readonly Advice[]): string {
  const lead = rows['lead.mass']!;
  const name = craft.hardpoints.byId[craft.leadAt]!.name.toLowerCase() || 'hardpoint';
  const slide = slideWords(advice);
  if (lead.status === 'solved') {
    const first = `${say(lead.value!, 'mass')} of lead at the ${name} levels it`;
    return slide ? `${first}; or ${slide}, without lead.` : `${first}.`;
  }
  const first =
    lead.value === null
      ? lead.why
      : `${say(lead.value, 'mass')} of lead at the ${name} would level it. ${lead.why}`;
  return slide ? `${first} Or ${slide}: that levels it without lead.` : first;
}

function slideWords(advice: readonly Advice[]): string | null {
  const slide = advice.find((each) => each.kind === 'slide');
  if (!slide) return null;
  const way = slide.forward ? 'forward' : 'aft';
  return `slide ${slide.name} ${way} to ${say(stationOf(slide.place), 'length')}`;
}

function heeled(rows: Rows, even: PlainVerdict): string {
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
