/** One large propeller against several small ones, as a table: what the thrust of the craft costs with other discs. */
import { valueOrNull } from '../../numeric/outcome.ts';
import type { CraftState } from '../../physics/craftState.ts';
import { comparePropellers, type PowerNeeded } from '../../physics/thrust/compare.ts';
import { say } from '../../units/sentence.ts';
import type { Row } from '../row.ts';
import { noRow, row } from '../rows.ts';

export interface PropellerLine {
  /** "2 of 0.150 m" */
  readonly name: string;
  /** Of all discs together. */
  readonly area: Row;
  /** Ideal power, and that over today's. */
  readonly atRest: Row;
  readonly atRestOverToday: Row;
  readonly atTop: Row;
  readonly atTopOverToday: Row;
}

/** Today's propellers first; none without thrust. In SI, for `inUnits`. */
export function propellerLines(state: CraftState): PropellerLine[] {
  const comparison = valueOrNull(comparePropellers(state));
  if (!comparison) return [];
  const { today, choices } = comparison;
  const now = (power: number | null) => (power === null ? null : { power, relative: 1 });
  return [
    line(`Today: ${today.count} in all`, today.area, now(today.atRest), now(today.atTop)),
    ...choices.map(({ count, diameter, area, atRest, atTop }) =>
      line(`${count} of ${say(diameter, 'length')}`, area, atRest, atTop),
    ),
  ];
}

const line = (
  name: string,
  area: number,
  atRest: PowerNeeded | null,
  atTop: PowerNeeded | null,
): PropellerLine => ({
  name,
  area: row({ label: 'Disc area', quantity: 'area', value: area }),
  atRest: power(atRest, 'Ideal power at rest'),
  atRestOverToday: relative(atRest),
  atTop: power(atTop, 'Ideal power at top speed'),
  atTopOverToday: relative(atTop),
});

const NO_TOP = 'The craft has no top speed.';

const power = (needed: PowerNeeded | null, label: string): Row =>
  needed ? row({ label, quantity: 'power', value: needed.power }) : noRow(label, 'power', NO_TOP);

const relative = (needed: PowerNeeded | null): Row =>
  needed
    ? row({ label: 'Over today’s', quantity: 'factor', value: needed.relative })
    : noRow('Over today’s', 'factor', NO_TOP);

/** What the table says and leaves out. */
export const PROPELLERS_LEAVE_OUT =
  'The larger the discs, the less power for the same thrust. The mass of motors and mounts is not counted, nor that a small propeller is a little worse for its size.';
