/** One job of the planning thread at a time: of one that was dropped, or followed by another, nothing is heard any more. */
import type { Answer, Job } from '../worker/planClient.ts';

export class OneJob<T, Progress = never> {
  #job: Job<T> | null = null;

  /** Drops what runs. `ask` is handed what to tell of its progress. */
  begin(
    ask: (tell: (progress: Progress) => void) => Job<T>,
    onAnswer: (answer: Answer<T>) => void,
    onProgress: (progress: Progress) => void = () => {},
  ): void {
    this.drop();
    const job = ask((progress) => {
      if (this.#job === job) onProgress(progress);
    });
    this.#job = job;
    void job.answer.then((answer) => {
      if (this.#job !== job) return;
      this.#job = null;
      onAnswer(answer);
    });
  }

  /** Ends what runs, and its answer is heard: that it was stopped. False when nothing runs. */
  stop(): boolean {
    this.#job?.stop();
    return this.#job !== null;
  }

  /** Ends what runs, unheard. */
  drop(): void {
    const job = this.#job;
    this.#job = null;
    job?.stop();
  }
}
