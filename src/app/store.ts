/**
 * What the page holds: the craft being edited, how it is looked at, what the builder chose, and where all of it is
 * kept. Parts of the page watch the cells they show.
 */
import type { Craft } from '../craft/craft.ts';
import { type Problem, problemText } from '../craft/problem.ts';
import { serialize } from '../craft/serialize.ts';
import type { Edit } from '../edit/edit.ts';
import { Session, type SessionState } from '../edit/session.ts';
import { Cell } from './cell.ts';
import { browserFrames, shownState } from './frameGate.ts';
import type { Keep } from './keep.ts';
import { Keeper } from './keeper.ts';
import type { KeptView } from './kept.ts';
import { freshId, rememberForTab } from './names.ts';
import { Notices } from './notices.ts';
import type { Settings } from './settings.ts';

export type DialogId = 'crafts' | 'newCraft' | 'keys';

/** A craft about to be edited, and under which id it is kept. `known`: its text in the keep, if it is there. */
export interface Opening {
  readonly id: string;
  readonly craft: Craft;
  readonly view: KeptView;
  readonly known: string | null;
}

/** A file that the loading gate turned away. */
export interface Refusal {
  readonly name: string;
  readonly problems: readonly Problem[];
}

/** How the hand works, for this visit. */
export interface Hands {
  /** Whether what is dragged snaps. */
  readonly snap: boolean;
  /** Whether a pick adds to what is selected. */
  readonly several: boolean;
}

export const FIRST_VIEW: KeptView = { tilted: false, tab: 'hull' };

export class Store {
  readonly session: Session;
  readonly shown: Cell<SessionState>;
  readonly view: Cell<KeptView>;
  readonly settings: Cell<Settings>;
  readonly hands = new Cell<Hands>({ snap: true, several: false });
  readonly notices = new Notices();
  readonly dialog = new Cell<DialogId | null>(null);
  readonly refusal = new Cell<Refusal | null>(null);
  /** The text of a table of parts that waits to be looked at. */
  readonly table = new Cell<string | null>(null);
  /** Counts the times the builder asked to see the whole craft. */
  readonly fit = new Cell(0);
  /** The file each craft was last saved to, where the browser lets a page write it again. */
  readonly fileHandles = new Map<string, FileSystemFileHandle>();
  readonly keeper: Keeper;
  readonly #writer = freshId();
  #craftId: string;
  #revision = 0;

  constructor(
    readonly keep: Keep,
    opening: Opening,
    settings: Settings,
    frames = browserFrames,
  ) {
    this.session = new Session(opening.craft);
    this.shown = shownState(this.session, frames);
    this.view = new Cell(opening.view);
    this.settings = new Cell(settings);
    this.keeper = new Keeper(keep, {
      displaced: this.#tellDisplaced,
      failed: this.#tellFailed,
    });
    this.#craftId = opening.id;
    this.#remember(opening);
    this.session.subscribe(this.#keepCommitted);
    this.view.subscribe(this.keepNow);
    this.settings.subscribe(() => this.#putSetting('page', this.settings.get()));
  }

  get craftId(): string {
    return this.#craftId;
  }

  /** Goes on to another craft; the one before is kept. */
  readonly take = (opening: Opening): void => {
    this.session.cancelDrag();
    this.#craftId = opening.id;
    this.#revision = this.session.getState().revision + 1;
    this.session.open(opening.craft);
    this.#remember(opening);
    this.view.set(opening.view);
  };

  /** Goes on to a new craft, kept under an id of its own. */
  readonly start = (craft: Craft): void =>
    this.take({ id: freshId(), craft, view: { ...this.view.get(), tilted: false }, known: null });

  readonly apply = (edit: Edit): boolean => {
    const problems = this.session.apply(edit);
    if (problems.length) this.notices.add(`Not done. ${problemText(problems[0]!)}`, 'bad');
    return problems.length === 0;
  };

  /** Hands the craft as it was last committed to the keeper. */
  readonly keepNow = (): void => {
    const { craft, dragging } = this.session.getState();
    if (dragging) return;
    this.keeper.put({
      id: this.#craftId,
      name: craft.name,
      changedAt: Date.now(),
      text: serialize(craft),
      view: this.view.get(),
      writer: this.#writer,
    });
  };

  readonly #keepCommitted = (): void => {
    const { revision, dragging } = this.session.getState();
    if (revision === this.#revision || dragging) return;
    this.#revision = revision;
    this.keepNow();
  };

  #remember({ id, known }: Opening): void {
    this.#putSetting('current', id);
    rememberForTab(id);
    if (known === null) this.keepNow();
    else this.keeper.knows(id, known);
  }

  #putSetting(name: string, value: unknown): void {
    this.keep.putSetting(name, value).catch(this.#tellFailed);
  }

  readonly #tellDisplaced = (): void =>
    this.notices.add(
      'Another tab changed this craft too. What it wrote is under Crafts, earlier versions.',
      'bad',
    );

  readonly #tellFailed = (): void =>
    this.notices.add('This browser could not keep the last change. Save the craft to a file.', 'bad', {
      label: 'Try again',
      run: this.keepNow,
    });
}
