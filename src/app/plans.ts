/**
 * The ballast plan of the craft on the page. It is worked out only while somebody looks at it: anew after every change,
 * and during a drag along with it as far as that goes within the frame. What was asked before and is not answered yet is
 * dropped.
 */
import type { Craft } from '../craft/craft.ts';
import { type KeptPlan, MOST_KEPT, NO_PLANS, type PlansState } from '../panels/plan/planning.ts';
import type { Plan, PlanFound, PlanProgress } from '../report/plans.ts';
import type { Answer, PlanClient } from '../worker/planClient.ts';
import { Cell } from './cell.ts';
import { OneJob } from './oneJob.ts';
import type { Store } from './store.ts';

interface Asked {
  readonly craft: Craft;
  readonly robust: boolean;
  /** While it is dragged. */
  readonly live: boolean;
}

/** Milliseconds without a further change before a plan is begun, so that a burst of keys begins one. */
const PAUSE = 120;

export class Plans {
  readonly state = new Cell<PlansState>(NO_PLANS);
  readonly #shown: Store['shown'];
  readonly #client: PlanClient;
  readonly #pause: number;
  readonly #job = new OneJob<Plan, PlanProgress>();
  #looked = false;
  #asked: Asked | null = null;
  #timer: ReturnType<typeof setTimeout> | undefined;

  /** The client begins its thread with the first request. */
  constructor(shown: Store['shown'], client: PlanClient, pause = PAUSE) {
    this.#shown = shown;
    this.#client = client;
    this.#pause = pause;
    shown.subscribe(this.#look);
  }

  /** Whether somebody looks at the plan. */
  readonly lookAt = (looked: boolean): void => {
    this.#looked = looked;
    this.#look();
  };

  readonly setRobust = (robust: boolean): void => {
    this.#put({ robust });
    this.#look();
  };

  readonly again = (): void => {
    this.#asked = null;
    this.#look();
  };

  /** What was found so far stays, as a plan that is not proven. */
  readonly stop = (): void => {
    clearTimeout(this.#timer);
    if (!this.#job.stop()) this.#put({ busy: false });
  };

  readonly keep = ({ robust, stowage }: PlanFound): void => {
    const { kept } = this.state.get();
    if (kept.length >= MOST_KEPT) return;
    const number = Math.max(0, ...kept.map((each) => each.number)) + 1;
    this.#put({ kept: [...kept, { number, robust, stowage }] });
  };

  /** Takes in what was put by on an earlier visit. */
  readonly bringBack = (kept: readonly KeptPlan[]): void => this.#put({ kept });

  readonly show = (shown: KeptPlan | null): void => {
    const { beside } = this.state.get();
    this.#put({ shown, beside: shown === beside ? null : beside });
  };

  readonly showBeside = (beside: KeptPlan | null): void => this.#put({ beside });

  readonly drop = (dropped: KeptPlan): void => {
    const { kept, shown, beside } = this.state.get();
    const unless = (each: KeptPlan | null) => (each === dropped ? null : each);
    this.#put({
      kept: kept.filter((each) => each !== dropped),
      shown: unless(shown),
      beside: unless(beside),
    });
  };

  /** Plans belong to one craft: on another it begins with none. */
  readonly forget = (): void => {
    this.#dropJob();
    this.#asked = null;
    this.state.set({ ...NO_PLANS, robust: this.state.get().robust });
    this.#look();
  };

  readonly #look = (): void => {
    if (!this.#looked) return;
    const { craft, dragging } = this.#shown.get();
    const asked = { craft, robust: this.state.get().robust, live: dragging };
    if (this.#asked && isSame(this.#asked, asked)) return;
    this.#asked = asked;
    this.#dropJob();
    if (dragging) this.#follow(asked);
    else this.#workOutSoon(asked);
  };

  /** What runs is no longer wanted, nor what it found. */
  #dropJob(): void {
    clearTimeout(this.#timer);
    this.#job.drop();
  }

  #follow({ craft, robust }: Asked): void {
    this.#put({ busy: false, progress: null });
    this.#client.follow(craft, robust, (plan) => {
      if (!this.#asked?.live) return;
      this.#put(plan ? { answer: { plan, craft }, waiting: false } : { waiting: true });
    });
  }

  #workOutSoon(asked: Asked): void {
    this.#put({ busy: true, progress: null, waiting: false, failure: null });
    this.#timer = setTimeout(() => this.#workOut(asked), this.#pause);
  }

  #workOut({ craft, robust }: Asked): void {
    let best: PlanFound | null = null;
    this.#job.begin(
      (tell) => this.#client.plan(craft, { robust }, tell),
      (answer) => this.#put({ busy: false, progress: null, ...outcome(answer, craft, best) }),
      (progress) => {
        best = progress.plan ?? best;
        const done = progress.step === 'explaining' && best;
        this.#put({ progress, ...(done ? { answer: { plan: best!, craft } } : {}) });
      },
    );
  }

  #put(change: Partial<PlansState>): void {
    this.state.set({ ...this.state.get(), ...change });
  }
}

const isSame = (a: Asked, b: Asked): boolean =>
  a.craft === b.craft && a.robust === b.robust && a.live === b.live;

/** A stopped search leaves the best it found. */
function outcome(answer: Answer<Plan>, craft: Craft, best: PlanFound | null): Partial<PlansState> {
  switch (answer.status) {
    case 'done':
      return { answer: { plan: answer.value, craft } };
    case 'failed':
      return { failure: answer.why };
    case 'stopped':
      return best ? { answer: { plan: best, craft } } : { failure: 'Stopped before there was a plan.' };
  }
}
