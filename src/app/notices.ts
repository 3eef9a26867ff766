/** Short messages to the builder. Plain ones go by themselves; bad ones, and those with something to do, stay. */
import { Cell } from './cell.ts';

export type Tone = 'info' | 'bad';

export interface Notice {
  readonly id: number;
  readonly tone: Tone;
  readonly message: string;
  readonly action?: { readonly label: string; run(): void };
}

/** Milliseconds for which a plain notice stands. */
export const STANDS_FOR = 8000;
const MOST = 4;

export class Notices extends Cell<readonly Notice[]> {
  #last = 0;

  constructor() {
    super([]);
  }

  /** Shows a message; the same message again replaces itself. */
  readonly add = (message: string, tone: Tone = 'info', action?: Notice['action']): void => {
    const id = ++this.#last;
    const others = this.get().filter((notice) => notice.message !== message);
    this.set([...others, { id, tone, message, ...(action && { action }) }].slice(-MOST));
    if (tone === 'info' && !action) setTimeout(() => this.dismiss(id), STANDS_FOR);
  };

  readonly dismiss = (id: number): void => {
    if (this.get().some((notice) => notice.id === id)) {
      this.set(this.get().filter((notice) => notice.id !== id));
    }
  };
}
