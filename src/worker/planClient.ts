/**
 * The page's side: asks the planning thread, hears of its progress, and stops it. A request that is running cannot be
 * interrupted from outside, so to stop it the thread is ended and another begun; what waited is asked again there.
 */
import type { Craft } from '../craft/craft.ts';
import type { Plan } from '../physics/ballast/plan.ts';
import type { Reply, Request, Task, Tasks, Withdrawal } from './messages.ts';

/** What of a Worker is needed. */
export interface Thread {
  postMessage(message: Request | Withdrawal): void;
  terminate(): void;
  onmessage: ((event: MessageEvent<Reply>) => void) | null;
  onerror: ((event: ErrorEvent) => void) | null;
}

export type Answer<T> =
  | { readonly status: 'done'; readonly value: T }
  | { readonly status: 'stopped' }
  | { readonly status: 'failed'; readonly why: string };

export interface Job<T> {
  readonly answer: Promise<Answer<T>>;
  stop(): void;
}

interface Pending {
  readonly request: Request;
  readonly settle: (answer: Answer<unknown>) => void;
  readonly tell: (progress: unknown) => void;
}

/** The planning thread as a Worker of the page. */
export const planThread = (): Thread =>
  new Worker(new URL('./planWorker.ts', import.meta.url), { type: 'module', name: 'ballast plan' });

export class PlanClient {
  readonly #begin: () => Thread;
  readonly #pending = new Map<number, Pending>();
  #thread: Thread | null = null;
  #lastId = 0;
  #following: { next: (() => void) | null } | null = null;

  /** The thread begins with the first request. */
  constructor(begin: () => Thread = planThread) {
    this.#begin = begin;
  }

  /** Each progress may hold a plan that keeps every limit: what is left when one stops. */
  plan(
    craft: Craft,
    options: Tasks['plan']['asked']['options'] = {},
    onProgress: (progress: Tasks['plan']['progress']) => void = () => {},
  ): Job<Plan> {
    return this.#ask('plan', { craft, options }, onProgress);
  }

  /** `onProgress` hears the share of the stations done. */
  carry(
    asked: Tasks['carry']['asked'],
    onProgress: (share: number) => void = () => {},
  ): Job<Tasks['carry']['value']> {
    return this.#ask('carry', asked, onProgress);
  }

  table(asked: Tasks['table']['asked']): Job<Tasks['table']['value']> {
    return this.#ask('table', asked, () => {});
  }

  /** Each progress holds the stations so far: what is left when one stops. */
  place(
    asked: Tasks['place']['asked'],
    onProgress: (progress: Tasks['place']['progress']) => void = () => {},
  ): Job<Tasks['place']['value']> {
    return this.#ask('place', asked, onProgress);
  }

  /**
   * The plan while something is dragged. Of crafts that come faster than plans only the newest is planned for; `onPlan`
   * hears null when pieces or places are to be chosen.
   */
  follow(craft: Craft, robust: boolean, onPlan: (plan: Plan | null) => void): void {
    const begin = () => {
      this.#following = { next: null };
      void this.#ask('follow', { craft, robust }, () => {}).answer.then((answer) => {
        const next = this.#following?.next;
        this.#following = null;
        if (answer.status === 'done') onPlan(answer.value);
        next?.();
      });
    };
    if (this.#following) this.#following.next = begin;
    else begin();
  }

  dispose(): void {
    this.#thread?.terminate();
    this.#thread = null;
    for (const { settle } of this.#pending.values()) settle({ status: 'stopped' });
    this.#pending.clear();
  }

  #ask<T extends Task>(
    task: T,
    asked: Tasks[T]['asked'],
    tell: (progress: Tasks[T]['progress']) => void,
  ): Job<Tasks[T]['value']> {
    const id = ++this.#lastId;
    const request = { id, task, ...asked } as Request;
    const answer = new Promise<Answer<Tasks[T]['value']>>((resolve) => {
      this.#pending.set(id, {
        request,
        settle: (each) => resolve(each as Answer<Tasks[T]['value']>),
        tell: (progress) => tell(progress as Tasks[T]['progress']),
      });
    });
    this.#running().postMessage(request);
    return { answer, stop: () => this.#stop(id) };
  }

  #running(): Thread {
    if (this.#thread) return this.#thread;
    const thread = this.#begin();
    thread.onmessage = ({ data }) => this.#hear(data);
    thread.onerror = ({ message }) => this.#fail(message);
    this.#thread = thread;
    return thread;
  }

  #hear(reply: Reply): void {
    const pending = this.#pending.get(reply.id);
    if (!pending) return;
    if (reply.kind === 'progress') {
      pending.tell(reply.progress);
      return;
    }
    this.#pending.delete(reply.id);
    pending.settle(
      reply.kind === 'done' ? { status: 'done', value: reply.value } : { status: 'failed', why: reply.why },
    );
  }

  /** The oldest that is pending is the one that runs. */
  #stop(id: number): void {
    const pending = this.#pending.get(id);
    if (!pending) return;
    const runs = this.#pending.keys().next().value === id;
    this.#pending.delete(id);
    pending.settle({ status: 'stopped' });
    if (runs) this.#beginAnew();
    else this.#thread?.postMessage({ id, task: 'withdraw' });
  }

  #beginAnew(): void {
    this.#thread?.terminate();
    this.#thread = null;
    for (const { request } of this.#pending.values()) this.#running().postMessage(request);
  }

  /** A thread that broke down takes everything asked of it along; the next request begins another. */
  #fail(message: string): void {
    this.#thread?.terminate();
    this.#thread = null;
    const lost = [...this.#pending.values()];
    this.#pending.clear();
    for (const { settle } of lost) settle({ status: 'failed', why: `The planner broke down: ${message}.` });
  }
}
