/**
 * Where a thruster had better sit, worked out when asked for and for the craft as it is then. A study stopped half-way
 * leaves the stations it has told of.
 */
import { NO_STUDY, type StudyState } from '../panels/turn/studying.ts';
import type { PlacementStudy, TurnAsked } from '../report/turning/studies.ts';
import type { Tasks } from '../worker/messages.ts';
import type { Answer, PlanClient } from '../worker/planClient.ts';
import { Cell } from './cell.ts';
import { OneJob } from './oneJob.ts';
import type { Store } from './store.ts';

type Study = Tasks['place']['value'];

export class Studies {
  readonly state = new Cell<StudyState>(NO_STUDY);
  readonly #shown: Store['shown'];
  readonly #client: PlanClient;
  readonly #job = new OneJob<Study, Tasks['place']['progress']>();

  constructor(shown: Store['shown'], client: PlanClient) {
    this.#shown = shown;
    this.#client = client;
  }

  /** Drops the study there is. */
  readonly start = (part: string, asked: TurnAsked): void => {
    this.close();
    const { craft } = this.#shown.get();
    this.#begin({ ...NO_STUDY, part, craft, asked });
  };

  /** Works out what was left when the study was stopped, for the craft as it was then. */
  readonly goOn = (): void => {
    const state = this.state.get();
    if (!state.busy && !state.complete) this.#begin(state);
  };

  #begin(state: StudyState): void {
    const { part, craft, asked, points } = state;
    if (part === null || !craft || !asked) return;
    this.state.set({ ...state, busy: true, why: null });
    this.#job.begin(
      (tell) => this.#client.place({ craft, part, options: { asked, done: points } }, tell),
      (answer) => this.#put({ busy: false, ...outcome(answer, this.state.get()) }),
      (progress) => this.#put(progress),
    );
  }

  readonly stop = (): void => void this.#job.stop();

  readonly close = (): void => {
    this.#job.drop();
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
