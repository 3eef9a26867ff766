/**
 * One craft being edited: the craft, its history, the selection, and at most one drag. The page holds one and asks
 * it for everything that changes. Knows nothing of React; `subscribe` and `getState` fit useSyncExternalStore.
 */
import type { Craft } from '../craft/craft.ts';
import { parseJson } from '../craft/parse.ts';
import type { Problem } from '../craft/problem.ts';
import { fileOf } from '../craft/serialize.ts';
import type { Edit, Recipe } from './edit.ts';
import { closeRun, EMPTY_HISTORY, type History, record, redo, run, undo } from './history.ts';
import { pruned, type Selection } from './selection.ts';

export interface SessionState {
  readonly craft: Craft;
  readonly selection: Selection;
  /** Whether `craft` is in the middle of a drag and not yet committed. */
  readonly dragging: boolean;
  /** What undo and redo would take back or bring back; null when there is nothing. */
  readonly undoLabel: string | null;
  readonly redoLabel: string | null;
  /** Goes up with every committed change: the moment to keep the work. */
  readonly revision: number;
}

/** A drag in progress. Each move starts again from the craft as it was when the drag began. */
export interface Drag {
  /** Shows the craft as the recipe would make it. */
  move(recipe: Recipe): void;
  /** Enters history as one step, if anything changed. */
  commit(): readonly Problem[];
  /** Puts the craft back as it was. */
  cancel(): void;
}

export class Session {
  #state: SessionState;
  #history: History = EMPTY_HISTORY;
  #drag: Drag | null = null;
  readonly #listeners = new Set<() => void>();

  constructor(craft: Craft) {
    this.#state = { craft, selection: [], dragging: false, undoLabel: null, redoLabel: null, revision: 0 };
  }

  readonly getState = (): SessionState => this.#state;

  readonly subscribe = (listener: () => void): (() => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  /** Runs an edit. Returns what is wrong with its result, in which case the craft stays as it was. */
  apply(edit: Edit): readonly Problem[] {
    this.#drag?.cancel();
    return this.#commit(this.#state.craft, edit);
  }

  beginDrag(label: string): Drag {
    this.#drag?.cancel();
    const start = this.#state.craft;
    let last: Recipe | null = null;
    const end = (craft: Craft) => {
      this.#drag = null;
      this.#set({ craft, dragging: false });
    };
    const drag: Drag = {
      move: (recipe) => {
        if (this.#drag !== drag) return;
        last = recipe;
        this.#set({ craft: run(start, recipe).craft, dragging: true });
      },
      commit: () => {
        if (this.#drag !== drag) return [];
        end(start);
        return last ? this.#commit(start, { label, history: 'step', recipe: last }) : [];
      },
      cancel: () => {
        if (this.#drag === drag) end(start);
      },
    };
    this.#drag = drag;
    return drag;
  }

  cancelDrag(): boolean {
    const dragging = this.#drag !== null;
    this.#drag?.cancel();
    return dragging;
  }

  undo(): void {
    this.#drag?.cancel();
    this.#travel(undo(this.#state.craft, this.#history));
  }

  redo(): void {
    this.#drag?.cancel();
    this.#travel(redo(this.#state.craft, this.#history));
  }

  select(selection: Selection): void {
    this.#history = closeRun(this.#history);
    this.#set({ selection: pruned(selection, this.#state.craft) });
  }

  /** Starts afresh on another craft; nothing of the one before can be undone. */
  open(craft: Craft): void {
    this.#drag = null;
    this.#history = EMPTY_HISTORY;
    this.#set({ craft, selection: [], dragging: false, revision: this.#state.revision + 1 });
  }

  #commit(start: Craft, edit: Edit): readonly Problem[] {
    const { craft, patches, inverse } = run(start, edit.recipe);
    if (patches.length === 0) return [];
    const checked = parseJson(fileOf(craft));
    if (!checked.ok) return checked.problems;
    this.#history = record(this.#history, edit, patches, inverse);
    this.#set({ craft, revision: this.#state.revision + 1 });
    return [];
  }

  #travel(to: { craft: Craft; history: History } | null): void {
    if (!to) return;
    this.#history = to.history;
    this.#set({ craft: to.craft, revision: this.#state.revision + 1 });
  }

  #set(change: Partial<SessionState>): void {
    const next = { ...this.#state, ...change };
    this.#state = {
      ...next,
      selection: pruned(next.selection, next.craft),
      undoLabel: this.#history.past.at(-1)?.label ?? null,
      redoLabel: this.#history.future[0]?.label ?? null,
    };
    for (const listener of this.#listeners) listener();
  }
}
