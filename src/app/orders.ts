/** Plans for the other orders of the wishes: worked out when asked for, one after another, for the craft as it is then. */
import type { Wish } from '../craft/planningSchema.ts';
import { NO_ORDERS, type OrdersState, type PlanAnswer } from '../panels/plan/planning.ts';
import type { Plan } from '../report/plans.ts';
import { otherOrders } from '../report/wishOrders.ts';
import type { PlanClient } from '../worker/planClient.ts';
import { Cell } from './cell.ts';
import { OneJob } from './oneJob.ts';
import type { Store } from './store.ts';

export class Orders {
  readonly state = new Cell<OrdersState>(NO_ORDERS);
  readonly #shown: Store['shown'];
  readonly #client: PlanClient;
  readonly #job = new OneJob<Plan>();

  constructor(shown: Store['shown'], client: PlanClient) {
    this.#shown = shown;
    this.#client = client;
    shown.subscribe(this.#look);
  }

  /** Beside a plan for the order of now. */
  readonly start = ({ craft, plan: { robust } }: PlanAnswer): void => {
    this.state.set({ ...NO_ORDERS, asked: { craft, robust }, busy: true });
    this.#tryNext(otherOrders(craft.wishes));
  };

  readonly stop = (): void => void this.#job.stop();

  readonly forget = (): void => {
    this.#job.drop();
    this.state.set(NO_ORDERS);
  };

  /** Of a craft that has changed nobody asked, and its own plan waits behind. */
  readonly #look = (): void => {
    const { asked } = this.state.get();
    if (asked && asked.craft !== this.#shown.get().craft) this.forget();
  };

  #tryNext([order, ...rest]: readonly Wish[][]): void {
    const { asked } = this.state.get();
    if (!order || !asked) {
      this.#put({ busy: false });
      return;
    }
    const { craft, robust } = asked;
    this.#job.begin(
      () => this.#client.plan({ ...craft, wishes: order }, { robust, explain: false }),
      (answer) => {
        if (answer.status === 'done') {
          this.#put({ tried: [...this.state.get().tried, { order, plan: answer.value }] });
          this.#tryNext(rest);
        } else {
          const why = answer.status === 'failed' ? answer.why : 'Stopped before every order was tried.';
          this.#put({ busy: false, why });
        }
      },
    );
  }

  #put(change: Partial<OrdersState>): void {
    this.state.set({ ...this.state.get(), ...change });
  }
}
