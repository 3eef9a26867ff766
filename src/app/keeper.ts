/**
 * Keeps writing what it is handed, one write at a time and always the newest: a burst of changes while a write is
 * under way costs one more write, and nothing waits for a timer.
 */
import type { Keep } from './keep.ts';
import type { KeptCraft } from './kept.ts';

export interface KeeperReports {
  /** Another page had changed this craft. */
  displaced(craft: KeptCraft): void;
  /** The browser would not write. */
  failed(error: unknown): void;
}

export class Keeper {
  readonly #waiting = new Map<string, KeptCraft>();
  /** By craft, the text this page last read or wrote. */
  readonly #known = new Map<string, string>();
  #working: Promise<void> | null = null;

  constructor(
    private readonly keep: Pick<Keep, 'put' | 'jot' | 'unjot'>,
    private readonly reports: KeeperReports,
  ) {}

  /** To be told of every text read from the keep. */
  knows(id: string, text: string): void {
    this.#known.set(id, text);
  }

  put(craft: KeptCraft): void {
    this.keep.jot({ craft, known: this.#knownOf(craft) });
    this.#waiting.set(craft.id, craft);
    this.#working ??= this.#work();
  }

  /** Resolves once all that was handed in is written or has failed. */
  async settled(): Promise<void> {
    while (this.#working) await this.#working;
  }

  async #work(): Promise<void> {
    for (let craft = this.#next(); craft; craft = this.#next()) {
      try {
        await this.#write(craft);
      } catch (error) {
        this.reports.failed(error);
      }
    }
    this.#working = null;
  }

  async #write(craft: KeptCraft): Promise<void> {
    const { displaced } = await this.keep.put(craft, this.#knownOf(craft));
    this.knows(craft.id, craft.text);
    if (displaced) this.reports.displaced(craft);
    if (!this.#waiting.has(craft.id)) await this.keep.unjot(craft);
  }

  #knownOf = ({ id }: KeptCraft): string | null => this.#known.get(id) ?? null;

  #next(): KeptCraft | undefined {
    const [next] = this.#waiting.values();
    if (next) this.#waiting.delete(next.id);
    return next;
  }
}
