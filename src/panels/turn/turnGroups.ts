/** The figures of thrust and turning under headings, each with the one figure that stands beside the heading. */
import type { Row } from '../../report/row.ts';
import type { FigureGroup } from '../figureGroups.ts';

export interface TurnGroup extends FigureGroup {
  readonly id: GroupId;
  /** The figure said beside the title, and how it is said, with a # for it. */
  readonly beside: Beside | null;
}

interface Beside {
  readonly key: string;
  readonly words: string;
}

type GroupId = 'turning' | 'need' | 'cut' | 'pitch' | 'speed' | 'inflow' | 'mass' | 'more';

interface GroupKind {
  readonly id: GroupId;
  readonly title: string;
  readonly beside: Beside | null;
  readonly keys: RegExp;
}

/** A key belongs to the first group that knows it. */
const GROUPS: readonly GroupKind[] = [
  {
    id: 'need',
    title: 'Needed and available',
    beside: { key: 'turn.neededMoment', words: '# needed' },
    keys: /^turn\.(share|needed|gust(Moment|Thrust|Vector|Arm)$)/,
  },
  {
    id: 'mass',
    title: 'Inertia, and air carried along',
    beside: null,
    keys: /^(added|inertia|turn\.virtual)/,
  },
  {
    id: 'turning',
    title: 'Turning',
    beside: { key: 'turn.timeTo90', words: 'passes 90° in #' },
    keys: /^turn\./,
  },
  {
    id: 'cut',
    title: 'When the throttle is cut',
    beside: { key: 'glide.halving', words: 'halves in #' },
    keys: /^glide\./,
  },
  {
    id: 'pitch',
    title: 'Pitch',
    beside: { key: 'cruise.pitch', words: '# in cruise' },
    keys: /^(cruise|climb|hover)\./,
  },
  {
    id: 'speed',
    title: 'Speed and drag',
    beside: { key: 'speed.top', words: 'at most #' },
    keys: /^(speed|drag|thrust|power)\./,
  },
  {
    id: 'inflow',
    title: 'Air at the propellers',
    beside: { key: 'inflow.perWatt', words: '# per watt' },
    keys: /^inflow\./,
  },
  { id: 'more', title: 'More', beside: null, keys: /./ },
];

/** In the order of the panel. */
const ORDER: readonly GroupId[] = ['turning', 'need', 'cut', 'pitch', 'speed', 'inflow', 'mass', 'more'];

/** Every row stands in one group; a group without rows is left out. */
export function turnGroups(rows: Readonly<Record<string, Row>>): TurnGroup[] {
  const entries = Object.entries(rows).map(([key, row]) => ({
    key,
    row,
    id: GROUPS.find(({ keys }) => keys.test(key))!.id,
  }));
  return ORDER.map((id) => {
    const { title, beside } = GROUPS.find((each) => each.id === id)!;
    return { id, title, beside, rows: entries.filter((entry) => entry.id === id) };
  }).filter((group) => group.rows.length > 0);
}
