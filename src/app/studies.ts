/**
 * Where a thruster had better sit, worked out when asked for and for the craft as it is then. A study stopped half-way
 * leaves the stations it has told of.
 */
import { NO_STUDY, type StudyState } from '../panels/turn/studying.ts';
import type { PlacementStudy, TurnAsked } from '../report/turning/studies.ts';
import type { Tasks } from '../worker/messages.ts';
import type { Answer, Job, PlanClient } from '../worker/planClient.ts';
import { Cell } from './cell.ts';
import type { Store } from './store.ts';

type Study = Tasks['place']['value'];

export class Studies {
  readonly state = new Cell<StudyState>(NO_STUDY);
  readonly #shown: Store['shown'];
  readonly #client: PlanClient;
  #job: Job<Study> | null = null;

  constructor(shown: Store['shown'], client: PlanClient) {
    this.#shown = shown;
    this.#client = client;
  }

  /** Drops the study there is. */
  readonly start = (part: string, asked: TurnAsked): void => {
    this.close();
    const { craft } = this.#shown.get();
    this.state.set({ ...NO_STUDY, part, craft, asked, busy: true });
    const job = this.#client.place({ craft, part, options: { asked } }, (progress) => {
      if (this.#job === job) this.#put(progress);
    });
    this.#job = job;
    void job.answer.then((answer) => {
      if (this.#job !== job) return;
      this.#job = null;
      this.#put({ busy: false, ...outcome(answer, this.state.get()) });
    });
  };

  readonly stop = (): void => this.#job?.stop();

  readonly close = (): void => {
    const job = this.#job;
    this.#job = null;
    job?.stop();
    this.state.set(NO_STUDY);
  };

  #put(change: Partial<StudyState>): void {
    this.state.set({ ...this.state.get(), ...change });
  }
}

function outcome(answer: Answer<Study>, { points }: StudyState): Partial<StudyState> {
  switch (answer.status) {
    case 'stopped':
      return {
        why: `Stopped before the ${points.length > 0 ? 'last' : 'first'} station was worked out.`,
      };
    case 'failed':
      return { why: answer.why };
    case 'done':
      return answer.value.status === 'solved'
        ? found(answer.value.value)
        : { why: [answer.value.why, answer.value.remedy].filter(Boolean).join(' ') };
  }
}

const found = ({ points, today, complete }: PlacementStudy): Partial<StudyState> => ({
  points,
  today,
  complete,
  share: 1,
});
