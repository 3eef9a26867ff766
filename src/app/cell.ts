/** One value that can be watched; `get` and `subscribe` fit useSyncExternalStore. */
import { useSyncExternalStore } from 'react';

export class Cell<T> {
  #value: T;
  readonly #listeners = new Set<() => void>();

  constructor(value: T) {
    this.#value = value;
  }

  readonly get = (): T => this.#value;

  readonly subscribe = (listener: () => void): (() => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  readonly set = (value: T): void => {
    if (Object.is(value, this.#value)) return;
    this.#value = value;
    for (const listener of this.#listeners) listener();
  };
}

export const useCell = <T>(cell: Pick<Cell<T>, 'get' | 'subscribe'>): T =>
  useSyncExternalStore(cell.subscribe, cell.get);
