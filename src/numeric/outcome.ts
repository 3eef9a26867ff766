/**
 * What a solver answers: the value, or why there is none. Nothing in the core throws for a craft that passed the
 * loading gate, and nothing returns a bare NaN.
 */
export type Outcome<T> = Solved<T> | Infeasible;

export interface Solved<T> {
  readonly status: 'solved';
  readonly value: T;
}

export interface Infeasible {
  readonly status: 'infeasible';
  /** One sentence: what stands in the way, and by how much. */
  readonly why: string;
  /** One sentence: what would help. Empty when nothing simple would. */
  readonly remedy: string;
}

export const solved = <T>(value: T): Solved<T> => ({ status: 'solved', value });

export const infeasible = (why: string, remedy = ''): Infeasible => ({ status: 'infeasible', why, remedy });

/** The value, or null where there is none. */
export const valueOrNull = <T>(outcome: Outcome<T>): T | null =>
  outcome.status === 'solved' ? outcome.value : null;
