/** What the page and the planning thread say to each other. Every message can be cloned; a reply names its request by id. */
import type { Craft } from '../craft/craft.ts';
import type { Outcome } from '../numeric/outcome.ts';
import type { CarryCurve, CarryLine, CarryOptions } from '../physics/ballast/carry.ts';
import type { CarryTable, TableOptions } from '../physics/ballast/carryTable.ts';
import type { Plan, PlanOptions, PlanProgress } from '../physics/ballast/plan.ts';
import type { PlacementStudy, StudyOptions, StudyProgress } from '../physics/placing/study.ts';

/** Options without the functions, which cannot be sent. */
type Sent<T> = Omit<T, 'onProgress' | 'shouldStop'>;

/** What is asked for, what comes back, and what is told meanwhile. */
export interface Tasks {
  plan: { asked: { craft: Craft; options: Sent<PlanOptions> }; value: Plan; progress: PlanProgress };
  /** Null when pieces or places are to be chosen, which waits for a plan. */
  follow: { asked: { craft: Craft; robust: boolean }; value: Plan | null; progress: never };
  carry: {
    asked: { craft: Craft; line: CarryLine; options: Sent<CarryOptions> };
    value: Outcome<CarryCurve>;
    progress: number;
  };
  table: { asked: { craft: Craft; options: Sent<TableOptions> }; value: CarryTable; progress: never };
  place: {
    asked: { craft: Craft; part: string; options: Sent<StudyOptions> };
    value: Outcome<PlacementStudy>;
    progress: StudyProgress;
  };
}

export type Task = keyof Tasks;

export type Request = { [T in Task]: { id: number; task: T } & Tasks[T]['asked'] }[Task];

/** Takes back a request that has not been begun. One that has runs on: to stop it the thread is ended. */
export interface Withdrawal {
  readonly id: number;
  readonly task: 'withdraw';
}

export type Reply =
  | { readonly id: number; readonly kind: 'progress'; readonly progress: Tasks[Task]['progress'] }
  | { readonly id: number; readonly kind: 'done'; readonly value: Tasks[Task]['value'] }
  | { readonly id: number; readonly kind: 'failed'; readonly why: string };
