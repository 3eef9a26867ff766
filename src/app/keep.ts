/** Where the work is kept. */
import type { KeptCraft, KeptVersion, Merged } from './kept.ts';

/** A craft handed in, and the text the page last knew to be kept of it. */
export interface Unmerged {
  readonly craft: KeptCraft;
  readonly known: string | null;
}

export interface Keep {
  /** False when nothing outlives this page. */
  readonly lasting: boolean;
  /** Newest first. */
  crafts(): Promise<readonly KeptCraft[]>;
  craft(id: string): Promise<KeptCraft | undefined>;
  /** Keeps the craft, merged with what is there; see `merge`. */
  put(next: KeptCraft, known: string | null): Promise<Pick<Merged, 'displaced'>>;
  /** With its versions and the plans put by for it. */
  remove(id: string): Promise<void>;
  versions(id: string): Promise<readonly KeptVersion[]>;
  setting(name: string): Promise<unknown>;
  putSetting(name: string, value: unknown): Promise<void>;
  /**
   * Writes the craft down unread and unmerged, which takes a millisecond. `put` has to read first and so takes as
   * long as the page is busy drawing, in which a tab can be killed.
   */
  jot(entry: Unmerged): void;
  jotted(): Promise<readonly Unmerged[]>;
  unjot(craft: KeptCraft): Promise<void>;
}
