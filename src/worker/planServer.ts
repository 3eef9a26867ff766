/** The planning thread's side: takes requests in order, one at a time, and answers each. */
import type { Craft } from '../craft/craft.ts';
import type { LinearSolver } from '../numeric/linearProgram/result.ts';
import { carryCurve } from '../physics/ballast/carry.ts';
import { carryTable } from '../physics/ballast/carryTable.ts';
import { LivePlanner } from '../physics/ballast/live.ts';
import { planOf } from '../physics/ballast/plan.ts';
import { placementStudy } from '../physics/placing/study.ts';
import type { Reply, Request, Tasks, Withdrawal } from './messages.ts';
import { reunited } from './reunited.ts';

export class PlanServer {
  readonly #solver: Promise<LinearSolver>;
  readonly #post: (reply: Reply) => void;
  #queue: Request[] = [];
  #running = false;
  #live: LivePlanner | null = null;
  #craft: Craft | null = null;

  /** Progress of a curve is told no more often than this many times. */
  static readonly TOLD = 20;

  constructor(solver: Promise<LinearSolver>, post: (reply: Reply) => void) {
    this.#solver = solver;
    this.#post = post;
  }

  handle(message: Request | Withdrawal): void {
    if (message.task === 'withdraw') this.#queue = this.#queue.filter(({ id }) => id !== message.id);
    else {
      this.#queue.push(message);
      if (!this.#running) void this.#run();
    }
  }

  /** Before each request the thread listens, so that what came meanwhile can still be withdrawn. */
  async #run(): Promise<void> {
    this.#running = true;
    for (await nextTurn(); ; await nextTurn()) {
      const next = this.#queue.shift();
      if (!next) break;
      await this.#answer(next);
    }
    this.#running = false;
  }

  async #answer(request: Request): Promise<void> {
    const { id } = request;
    try {
      this.#post({ id, kind: 'done', value: this.#value(request, await this.#solver) });
    } catch (error) {
      this.#post({ id, kind: 'failed', why: `The planner failed: ${(error as Error).message}.` });
    }
  }

  #value(request: Request, solver: LinearSolver): Tasks[Request['task']]['value'] {
    const craft = reunited(this.#craft, request.craft);
    this.#craft = craft;
    const tell = (progress: Extract<Reply, { kind: 'progress' }>['progress']) =>
      this.#post({ id: request.id, kind: 'progress', progress });
    switch (request.task) {
      case 'plan':
        return planOf(craft, solver, { ...request.options, onProgress: tell });
      case 'follow':
        this.#live ??= new LivePlanner(solver);
        return this.#live.plan(craft, request.robust);
      case 'carry':
        return carryCurve(craft, solver, request.line, { ...request.options, onProgress: seldom(tell) });
      case 'table':
        return carryTable(craft, solver, request.options);
      case 'place':
        return placementStudy(craft, request.part, solver, { ...request.options, onProgress: tell });
    }
  }
}

/** Tells a share of 0 … 1 only when another twentieth is done. */
function seldom(tell: (share: number) => void): (share: number) => void {
  let told = 0;
  return (share) => {
    if (share < 1 && share < told + 1 / PlanServer.TOLD) return;
    told = share;
    tell(share);
  };
}

/** Once what has come in is heard; a timer would wait a millisecond for it, which a frame has not got. */
const nextTurn = (): Promise<void> =>
  new Promise((resolve) => {
    const { port1, port2 } = new MessageChannel();
    port1.onmessage = () => {
      port1.close();
      resolve();
    };
    port2.postMessage(null);
  });
