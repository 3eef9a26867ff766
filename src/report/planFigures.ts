/** The figures in which today and a plan are compared: what hangs there, and how the craft then floats. SI. */
import { type Craft, listed } from '../craft/craft.ts';
import type { Part } from '../craft/schema.ts';
import { ballastMass } from '../physics/ballast/setting.ts';
import { assess } from './assess.ts';
import type { Row } from './row.ts';
import { row } from './rows.ts';

export interface PlanFigures {
  /** In the order in which they are read; the same keys for every craft. */
  readonly rows: readonly KeyedRow[];
  /** Whether it meets its targets. */
  readonly met: boolean;
}

export interface KeyedRow {
  readonly key: string;
  readonly row: Row;
}

const ASSESSED = ['heaviness', 'float.pitch', 'float.heel', 'float.pendulumDepth'];

export function planFigures(craft: Craft): PlanFigures {
  const { rows, met } = assess(craft);
  return {
    rows: [
      {
        key: 'deadBallast',
        row: row({ label: 'Dead ballast', quantity: 'mass', value: ballastMass(listed(craft.parts)) }),
      },
      { key: 'usefulLoad', row: row({ label: 'Useful load', quantity: 'mass', value: usefulLoad(craft) }) },
      ...ASSESSED.flatMap((key) => (rows[key] ? [{ key, row: rows[key] }] : [])),
    ],
    met,
  };
}

/** Parts of kind useful load, and those that stand for a load of the list, kg. */
export const usefulLoad = ({ parts, loads }: Craft): number =>
  listed(parts)
    .filter(({ id, kind }) => kind === 'load' || id in loads.byId)
    .reduce((sum, part) => sum + part.mass * pieces(part), 0);

const pieces = ({ copies }: Part): number => (copies.kind === 'pair' ? 2 : copies.count);
