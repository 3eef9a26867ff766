/** The five verdicts: does it float as wanted, level, upright, even, and with how much lead on the nose. */
import { leadHardpoint } from '../craft/craft.ts';
import type { Targets } from '../craft/schema.ts';
import type { CraftState } from '../physics/craftState.ts';
import { say } from '../units/sentence.ts';
import type { Quantity } from '../units/units.ts';
import type { Row } from './row.ts';
import { insignificant, type Rows } from './rows.ts';
import type { Verdict } from './verdict.ts';
import { heavinessWords } from './words.ts';

/** A verdict before its figure is put into words, with the word for each sign of it. */
export interface PlainVerdict extends Omit<Verdict, 'figure' | 'side'> {
  readonly sides: readonly [below: string, above: string];
}

export function verdictsOf(state: CraftState, rows: Rows): PlainVerdict[] {
  const { targets } = state.craft;
  return [
    floats(targets, rows),
    level(targets, rows),
    upright(targets, rows),
    even(targets, rows),
    lead(state, rows),
  ];
}

/** Whether the craft meets its targets: the lead is advice, not a target. */
export const meetsTargets = (verdicts: readonly PlainVerdict[]): boolean =>
  verdicts.every(({ key, state }) => key === 'lead' || state === 'met');

const inputs = (rows: Rows, ...keys: string[]): Row[] => keys.flatMap((key) => rows[key] ?? []);
/** To spare, off by, or just on the limit. */
export function marginWords(margin: number | null, quantity: Quantity): string {
  if (margin === null) return '';
  if (insignificant(margin, quantity)) return margin < 0 ? 'just outside' : 'just inside';
  return margin < 0 ? `off by ${say(-margin, quantity)}` : `${say(margin, quantity)} to spare`;
}

const stateOf = (margin: number | null): Verdict['state'] =>
  margin === null ? 'open' : margin >= 0 ? 'met' : 'missed';

function floats({ heaviness: { least, most } }: Targets, rows: Rows): PlainVerdict {
  const row = rows.heaviness!;
  const value = row.value ?? Number.NaN;
  const margin = Number.isNaN(value) ? null : Math.min(most - value, value - least);
  const word = value > most ? 'too heavy' : value < least ? 'too light' : 'as wanted';
  return {
    key: 'floats',
    sides: ['light', 'heavy'],
    title: 'Floats',
    state: stateOf(margin),
    word: margin === null ? 'cannot be told' : word,
    row,
    target: `${heavinessWords(least)} to ${heavinessWords(most)}`,
    margin,
    marginWords: marginWords(margin, row.quantity),
    working: {
      formula: 'heaviness = solid mass − (air density − gas density) × gas volume',
      inputs: inputs(rows, 'mass.solid', 'air.density', 'gas.density', 'hull.volume', 'lift.gross'),
      source: 'Archimedes; air after CIPM-2007 or the US Standard Atmosphere 1976, gas ideal.',
    },
  };
}

function level({ pitchTolerance }: Targets, rows: Rows): PlainVerdict {
  const row = rows['float.pitch']!;
  const margin = row.value === null ? null : pitchTolerance - Math.abs(row.value);
  const tilted = (row.value ?? 0) > 0 ? 'tail-heavy' : 'nose-heavy';
  return {
    key: 'level',
    sides: ['nose-down', 'nose-up'],
    title: 'Level',
    state: stateOf(margin),
    word: margin === null ? 'any attitude' : margin >= 0 ? 'level' : tilted,
    row,
    target: `within ±${say(pitchTolerance, 'angle')}`,
    margin,
    marginWords: marginWords(margin, row.quantity),
    working: {
      formula: 'pitch = atan2(CG station − CB station, CB height − CG height), + nose-up',
      inputs: inputs(rows, 'cg.station', 'hull.cbStation', 'cg.height', 'float.pitch'),
      source: 'At rest the line from CG to CB stands vertical; moments after FAA-H-8083-1.',
    },
  };
}

function upright({ leastPendulumDepth }: Targets, rows: Rows): PlainVerdict {
  const row = rows['float.pendulumDepth']!;
  const margin = row.value === null ? null : row.value - leastPendulumDepth;
  const short = (row.value ?? 0) > 0 ? 'tender' : 'top-heavy';
  return {
    key: 'upright',
    sides: ['', ''],
    title: 'Upright',
    // A craft whose CG is not below its CB turns over, however shallow a pendulum its targets allow.
    state: row.value !== null && row.value <= 0 ? 'missed' : stateOf(margin),
    word: margin === null ? 'cannot be told' : margin >= 0 && row.value! > 0 ? 'upright' : short,
    row,
    target: `at least ${say(leastPendulumDepth, 'smallLength')}`,
    margin,
    marginWords: marginWords(margin, row.quantity),
    working: {
      formula: 'pendulum depth = CB height − CG height; righting moment = solid mass × g × depth',
      inputs: inputs(rows, 'cg.height', 'mass.solid', 'float.rightingMoment', 'float.swingPeriod'),
      source: 'Statics of a hanging body; swing with added mass after Lamb, Hydrodynamics (1932).',
    },
  };
}

function even({ heelTolerance }: Targets, rows: Rows): PlainVerdict {
  const row = rows['float.heel']!;
  const margin = row.value === null ? null : heelTolerance - Math.abs(row.value);
  const heeled = (row.value ?? 0) > 0 ? 'starboard low' : 'port low';
  return {
    key: 'even',
    sides: ['port down', 'starboard down'],
    title: 'Even',
    state: stateOf(margin),
    word: margin === null ? 'any attitude' : margin >= 0 ? 'even' : heeled,
    row,
    target: `within ±${say(heelTolerance, 'angle')}`,
    margin,
    marginWords: marginWords(margin, row.quantity),
    working: {
      formula: 'heel = atan2(CG side, CB height − CG height), + starboard down',
      inputs: inputs(rows, 'cg.side', 'cg.height', 'float.heel'),
      source: 'At rest the line from CG to CB stands vertical.',
    },
  };
}

const liftWords = (heavinessAfter: number | null): string => {
  if (heavinessAfter === null) return '';
  return heavinessAfter > 0
    ? `${say(heavinessAfter, 'mass')} more than the lift left`
    : `leaves ${say(-heavinessAfter, 'mass')} of lift`;
};

function lead({ craft }: CraftState, rows: Rows): PlainVerdict {
  const exact = rows['lead.mass']!;
  const within = rows['lead.massWithinTolerance']!;
  const none = within.value === 0;
  const after = rows[none ? 'heaviness' : 'lead.heavinessAfter']!.value;
  const impossible = exact.status !== 'solved' && !none;
  return {
    key: 'lead',
    sides: ['', ''],
    title: `Lead on the ${leadHardpoint(craft).name.toLowerCase() || 'hardpoint'}`,
    state: none ? 'met' : impossible ? 'missed' : 'open',
    word: none ? 'none needed' : impossible ? 'does not do it' : 'levels it',
    row: none ? within : exact,
    target: 'within the lift left',
    margin: after === null ? null : -after,
    marginWords: liftWords(after),
    working: {
      formula:
        'lead = moment to cancel ÷ arm = solid mass × (CG station − CB station) ÷ (CB station − lead station)',
      inputs: inputs(
        rows,
        'mass.solid',
        'cg.station',
        'hull.cbStation',
        'lead.station',
        'lead.massWithinTolerance',
        'lead.degreesPerGram',
        'lead.heavinessAfter',
        'lead.pendulumDepthAfter',
        'oneWeight.mass',
        'oneWeight.station',
      ),
      source: 'Moments about the CB; permanent ballast after FAA-H-8083-1.',
    },
  };
}
