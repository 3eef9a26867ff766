/** How rows are made: one place that keeps "no bare NaN" and gives every figure its unit. */
import type { Outcome } from '../numeric/outcome.ts';
import { type Quantity, siSymbolOf, unitOf } from '../units/units.ts';
import type { Row, RowStatus } from './row.ts';

export interface RowSpec {
  readonly label: string;
  readonly quantity: Quantity;
  readonly value: number;
  readonly uncertainty?: number | null;
  /** A caution; the value stands. */
  readonly caution?: string | null;
  readonly why?: string;
}

export function row({ label, quantity, value, uncertainty, caution, why }: RowSpec): Row {
  if (!Number.isFinite(value))
    return noRow(label, quantity, 'The figures of this craft give no finite value here.');
  return {
    label,
    quantity,
    value,
    unit: unitText(quantity),
    ...(uncertainty ? { uncertainty } : {}),
    status: caution ? 'caution' : 'solved',
    why: caution || why || '',
  };
}

/** A row without a value, and why. */
export const noRow = (label: string, quantity: Quantity, why: string): Row => ({
  label,
  quantity,
  value: null,
  unit: unitText(quantity),
  status: 'infeasible' satisfies RowStatus,
  why,
});

/** A row from what a solver answered. */
export const rowOf = (
  outcome: Outcome<number>,
  label: string,
  quantity: Quantity,
  more: Pick<RowSpec, 'uncertainty' | 'caution' | 'why'> = {},
): Row =>
  outcome.status === 'solved'
    ? row({ label, quantity, value: outcome.value, ...more })
    : noRow(label, quantity, [outcome.why, outcome.remedy].filter(Boolean).join(' '));

/** The SI unit as JSON gives it; 1 for plain numbers, as the SI Brochure writes it. */
const unitText = (quantity: Quantity): string => siSymbolOf(quantity) || '1';

/** Whether it is less than half of the last digit that is usually shown. */
export function insignificant(si: number, quantity: Quantity): boolean {
  const unit = unitOf(quantity, 'metric');
  return Math.abs(si) < (unit.si * 10 ** -unit.digits) / 2;
}

export type Rows = Readonly<Record<string, Row>>;
