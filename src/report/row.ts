/** One figure as panels, print and terminal alike show it. */
import type { Quantity } from '../units/units.ts';

/** solved: the value stands. caution: it stands, but `why` says what to mind. infeasible: there is none; `why` says by how much it fails and what would help. */
export type RowStatus = 'solved' | 'caution' | 'infeasible';

export interface Row {
  /** The name a builder reads, as "CG station". */
  readonly label: string;
  /** What kind of quantity it is, for showing it in the builder's units. */
  readonly quantity: Quantity;
  /** SI; null when infeasible. */
  readonly value: number | null;
  /** The SI unit. */
  readonly unit: string;
  /** Standard uncertainty from the tolerances in the craft file, SI; absent where none is given. */
  readonly uncertainty?: number;
  readonly status: RowStatus;
  readonly why: string;
}
