/** What can be carried where: the curve follows the craft as it was last committed, the table is made when asked for. */
import type { Craft } from '../craft/craft.ts';
import { type CarriesState, type CarryState, NO_CARRIES, type TableState } from '../panels/plan/planning.ts';
import type { CarryLine } from '../report/plans.ts';
import type { Tasks } from '../worker/messages.ts';
import type { Answer, PlanClient } from '../worker/planClient.ts';
import { Cell } from './cell.ts';
import { OneJob } from './oneJob.ts';
import type { Store } from './store.ts';

type Curve = Tasks['carry']['value'];
type Table = Tasks['table']['value'];

/** Milliseconds without a further change before a curve is begun; longer than for a plan, which goes first. */
const PAUSE = 200;

export class Carries {
  readonly state = new Cell<CarriesState>(NO_CARRIES);
  readonly #shown: Store['shown'];
  readonly #client: PlanClient;
  readonly #pause: number;
  readonly #curve = new OneJob<Curve, number>();
  readonly #table = new OneJob<Table>();
  /** The craft, line and robustness of the last request, in one. */
  #asked: readonly unknown[] = [];
  #robust = false;
  #looked = false;
  #timer: ReturnType<typeof setTimeout> | undefined;

  constructor(shown: Store['shown'], client: PlanClient, pause = PAUSE) {
    this.#shown = shown;
    this.#client = client;
    this.#pause = pause;
    shown.subscribe(this.#look);
  }

  readonly lookAt = (looked: boolean): void => {
    this.#looked = looked;
    this.#look();
  };

  readonly setRobust = (robust: boolean): void => {
    this.#robust = robust;
    this.#look();
  };

  readonly setLine = (line: CarryLine | null): void => {
    this.#putCarry({ line, curve: null, why: null });
    this.#look();
  };

  /** Which load a click on the curve hangs. */
  readonly setLoad = (load: string): void => this.#putCarry({ load });

  readonly stopCurve = (): void => {
    clearTimeout(this.#timer);
    this.#curve.stop();
    this.#putCarry({ busy: false });
  };

  readonly workOutTable = (): void => {
    const { craft } = this.#shown.get();
    this.#putTable({ busy: true, why: null });
    this.#table.begin(
      () => this.#client.table({ craft, options: { robust: this.#robust } }),
      (answer) => this.#putTable({ busy: false, ...tableOutcome(answer, craft) }),
    );
  };

  readonly stopTable = (): void => void this.#table.stop();

  readonly forget = (): void => {
    this.#dropCurve();
    this.#table.drop();
    this.#asked = [];
    this.state.set(NO_CARRIES);
  };

  readonly #look = (): void => {
    const { craft, dragging } = this.#shown.get();
    const { line } = this.state.get().carry;
    if (!this.#looked || dragging) return;
    const asked = [craft, line, this.#robust];
    if (asked.every((each, i) => each === this.#asked[i])) return;
    this.#asked = asked;
    this.#dropCurve();
    if (!line) {
      this.#putCarry({ curve: null, busy: false });
      return;
    }
    this.#putCarry({ busy: true, share: 0, why: null });
    this.#timer = setTimeout(() => this.#workOut(craft, line), this.#pause);
  };

  #dropCurve(): void {
    clearTimeout(this.#timer);
    this.#curve.drop();
  }

  #workOut(craft: Craft, line: CarryLine): void {
    this.#curve.begin(
      (tell) => this.#client.carry({ craft, line, options: { robust: this.#robust } }, tell),
      (answer) => this.#putCarry({ busy: false, ...curveOutcome(answer) }),
      (share) => this.#putCarry({ share }),
    );
  }

  #putCarry(change: Partial<CarryState>): void {
    const { carry, table } = this.state.get();
    this.state.set({ carry: { ...carry, ...change }, table });
  }

  #putTable(change: Partial<TableState>): void {
    const { carry, table } = this.state.get();
    this.state.set({ carry, table: { ...table, ...change } });
  }
}

function curveOutcome(answer: Answer<Curve>): Partial<CarryState> {
  if (answer.status === 'stopped') return { curve: null, why: 'Stopped before the curve was worked out.' };
  if (answer.status === 'failed') return { curve: null, why: answer.why };
  const { value } = answer;
  return value.status === 'solved'
    ? { curve: value.value, why: null }
    : { curve: null, why: [value.why, value.remedy].filter(Boolean).join(' ') };
}

function tableOutcome(answer: Answer<Table>, craft: Craft): Partial<TableState> {
  if (answer.status === 'done') return { table: answer.value, craft };
  return answer.status === 'failed' ? { why: answer.why } : {};
}
