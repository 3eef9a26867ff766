/**
 * What a plan is to be best in, in order: least dead ballast, then the builder's wishes, then fewest parts moved and the
 * least distance moved, which break ties. Each is a linear function of the columns, to be made small.
 */
import type { Wish } from '../../craft/planningSchema.ts';
import type { Term } from '../../numeric/linearProgram/problem.ts';
import { GRAMS } from './draft.ts';
import type { Linear } from './linear.ts';
import type { Program } from './program.ts';
import { loadMass, type Setting } from './setting.ts';
import { ballastAt } from './weightColumns.ts';

export type StageKey = 'trial' | 'ballast' | 'usefulLoad' | 'fewestMoved' | 'leastWire' | 'distance';

export interface Stage {
  readonly key: StageKey;
  /** In grams, a number of parts, or metres. */
  readonly terms: readonly Term[];
}

/**
 * plan: all of it. ballast: least dead ballast alone. follow: that and the least distance moved, in one. trial: the most of the
 * load that is tried, then least dead ballast.
 */
export type Aim = 'plan' | 'ballast' | 'follow' | 'trial';

export function stagesFor(aim: Aim, setting: Setting, linear: Linear, program: Program): Stage[] {
  switch (aim) {
    case 'plan':
      return stagesOf(setting, linear, program);
    case 'ballast':
      return [leastBallast(setting, program)];
    case 'follow':
      return [follow(setting, program)];
    case 'trial':
      return [mostTrial(program), leastBallast(setting, program)];
  }
}

/** Ballast that a metre of movement weighs as much as, g: too little to be weighed, enough to break a tie. */
const METRE = 1e-4;

const follow = (setting: Setting, program: Program): Stage => ({
  key: 'ballast',
  terms: [
    ...leastBallast(setting, program).terms,
    ...leastDistance(program).terms.map(([column, a]): Term => [column, a * METRE]),
  ],
});

const mostTrial = ({ columns }: Program): Stage => ({
  key: 'trial',
  terms: columns.trial === null ? [] : [[columns.trial, -1]],
});

function stagesOf(setting: Setting, linear: Linear, program: Program): Stage[] {
  const by: Record<Wish, () => Stage[]> = {
    usefulLoad: () => usefulLoad(setting, program),
    fewestMoved: () => [fewestMoved(program)],
    leastWire: () => [leastWire(linear, program)],
  };
  const wished = setting.craft.wishes.flatMap((wish) => by[wish]());
  const all = [leastBallast(setting, program), ...wished, fewestMoved(program), leastDistance(program)];
  const first = new Set<StageKey>();
  return all.filter(({ key, terms }) => {
    const again = key !== 'usefulLoad' && first.has(key);
    first.add(key);
    return key === 'ballast' || (!again && terms.some(([, a]) => a !== 0));
  });
}

export const leastBallast = (setting: Setting, { columns }: Program): Stage => ({
  key: 'ballast',
  terms: setting.hardpoints.flatMap((_, h) => ballastAt(setting, columns, h)),
});

/** The most of each rank, the wanted most first. Loads that must be carried are carried in any plan. */
function usefulLoad({ loads }: Setting, { columns }: Program): Stage[] {
  const ranks = [...new Set(loads.map(({ load }) => load.rank))].sort((a, b) => a - b);
  return ranks.map((rank) => ({
    key: 'usefulLoad',
    terms: loads.flatMap((choice, l) =>
      choice.load.rank === rank && !choice.load.must
        ? columns.loads[l]!.taken.map((column): Term => [column, -loadMass(choice) * GRAMS])
        : [],
    ),
  }));
}

const fewestMoved = ({ columns }: Program): Stage => ({
  key: 'fewestMoved',
  terms: columns.moved.map((column): Term => [column, 1]),
});

const leastDistance = ({ columns }: Program): Stage => ({
  key: 'distance',
  terms: columns.distances.map((column): Term => [column, 1]),
});

/** Mass of wire as it changes with the stations and with what is aboard. */
const leastWire = (linear: Linear, { columns }: Program): Stage => ({
  key: 'leastWire',
  terms: [
    ...columns.slides.map((column, i): Term => [column, linear.slides[i]!.slope[4] * GRAMS]),
    ...columns.loads.flatMap(({ taken, stations }, l) =>
      taken.flatMap((column, k): Term[] => {
        const { value, slope, at } = linear.loads[l]![k]!;
        const station = stations[k]!;
        if (station === null) return [[column, value[4] * GRAMS]];
        return [
          [column, (value[4] - slope[4] * at) * GRAMS],
          [station, slope[4] * GRAMS],
        ];
      }),
    ),
  ],
});
